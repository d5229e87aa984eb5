import type { MarkerKey } from '../types.js';
import type {
  Clarity,
  LookOutcome,
  Moonlight,
  MoonShape,
  NakedEyePlanet,
  Phenomenon,
  SightFallback,
  SightRuleWord,
  StarOutcomeDetail,
  SunCourse,
  WatchSide,
} from '../vocabulary.js';

/** One moment of a star's path. True altitudes, without refraction. */
export interface LookMoment {
  jdUt: number;
  azimuthDeg: number;
  altitudeDeg: number;
  /** Altitude above the skyline in the star's own direction; negative behind it. */
  aboveSkylineDeg: number;
  /** Depth of the Sun's centre below the mathematical horizon; negative by day. */
  sunDepressionDeg: number;
  isUp: boolean;
  /** Up, above the thick air, and the sky dark enough for it. */
  isSeen: boolean;
}

/** A bright star from which the eye finds its way. */
export interface Pointer {
  hr: number;
  name: string;
  vMag: number;
  azimuthDeg: number;
  altitudeDeg: number;
  aboveSkylineDeg: number;
  separationDeg: number;
  /** From the pointer to the star looked for: 0° is up, 90° to the right, [0, 360). */
  bearingDeg: number;
}

/** A planet that somebody could take for the star. */
export interface PlanetBeside {
  planet: NakedEyePlanet;
  /** The moment of the place below. */
  jdUt: number;
  vMag: number;
  azimuthDeg: number;
  altitudeDeg: number;
  aboveSkylineDeg: number;
  separationDeg: number;
  /** From the star to the planet: 0° is up, 90° to the right, [0, 360). */
  bearingDeg: number;
  isBrighter: boolean;
}

export interface MoonThen {
  shape: MoonShape;
  /** Share of the disc that is lit, 0…1. */
  litShare: number;
  azimuthDeg: number;
  /** Of the centre, seen from the place (parallax included), without refraction. */
  altitudeDeg: number;
  aboveSkylineDeg: number;
  isUp: boolean;
  vMag: number;
  /** Null where the star has no place in the sky to be measured from. */
  separationDeg: number | null;
  /** `none` as well where there is no star to be outshone. */
  moonlight: Moonlight;
}

/** What the seen part of a path goes by. */
export interface LookSight {
  by: SightRuleWord;
  /** Why it goes by the rule of the dates; null where it goes by the model. */
  because: SightFallback | null;
  /** Magnitudes by which eyes are taken keener than the model has them, −3…3; null by the rule of the dates. */
  offsetMag: number | null;
  /** The day that set the model: on it the best moment just shows the star. Null by the rule of the dates. */
  phenomenon: Phenomenon | null;
  expectedDayNumber: number | null;
  /** When the model left to itself would show the star in this watch; null where not at all, and by the rule of the dates. */
  plainFromJdUt: number | null;
  plainToJdUt: number | null;
}

/** Where and when to look for a marker on one morning or evening. */
export interface Look {
  markerKey: MarkerKey;
  dayNumber: number;
  side: WatchSide;
  outcome: LookOutcome;
  outcomeDetail: StarOutcomeDetail | null;
  sunCourse: SunCourse;
  clarity: Clarity;
  /** When to stop (dawn) or to begin (dusk); null where the Sun does not cross. */
  limitJdUt: number | null;
  /** The stretch of time that `path` covers; both null where the Sun stays up. */
  watchFromJdUt: number | null;
  watchToJdUt: number | null;
  /** Crossings of the skyline nearest to the watch, inside it or not; null where the star does not rise and set. */
  comesUpJdUt: number | null;
  goesDownJdUt: number | null;
  seenFromJdUt: number | null;
  seenToJdUt: number | null;
  /** When it stands best; where it is not seen, when least is missing. Null where it is not up at all. */
  best: LookMoment | null;
  /** In order of time, the moments named above among them. Empty where the Sun stays up. */
  path: readonly LookMoment[];
  sight: LookSight;
  pointers: readonly Pointer[];
  planets: readonly PlanetBeside[];
  /** Null where the Sun stays up. */
  moon: MoonThen | null;
}
