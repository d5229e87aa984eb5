import type { CivilDay, MarkerKey } from '../types.js';
import type { MoonEvent, VenusAppearance } from '../moon/words.js';
import type { Phenomenon, SkyNote } from '../vocabulary.js';
import type {
  DarkNightEnd,
  Facing,
  NightDepthDeg,
  NoonSunPassage,
  PolePosition,
  SkyMarkerKind,
  SkyMarkerOutcome,
  SkyMarkerReason,
  SkyMarkerTime,
  SkySide,
  SunEvent,
  SunSeason,
  Twilight,
  TwilightDepthDeg,
} from './words.js';

/** The star or figure stands highest when the Sun is so deep after sunset or before sunrise. */
export interface CulminationSpec {
  kind: 'culmination';
  markerKey: MarkerKey;
  twilight: Twilight;
  depthDeg: TwilightDepthDeg;
}

/** When a star is looked at. Hours are local mean solar time, 0…23.75; hours before noon belong to the morning. */
export type SkyHour =
  { clock: 'after-sunset' | 'before-sunrise'; minutes: number } | { clock: 'solar-hour'; solarHour: number };

/** The star or figure has a true altitude (no refraction) at a set time, climbing in the east or sinking in the west. */
export interface StarAltitudeSpec {
  kind: 'star-altitude';
  markerKey: MarkerKey;
  altitudeDeg: number;
  side: SkySide;
  at: SkyHour;
}

/** The star or figure stands due south or due north, at its highest, at an hour of local mean solar time. */
export interface DueMeridianSpec {
  kind: 'due-meridian';
  markerKey: MarkerKey;
  facing: Facing;
  solarHour: number;
}

/** Where the star or figure stands on its circle about the pole at an hour of local mean solar time. */
export interface AboutPoleSpec {
  kind: 'about-pole';
  markerKey: MarkerKey;
  position: PolePosition;
  solarHour: number;
}

export interface SunSeasonSpec {
  kind: 'sun-season';
  season: SunSeason;
}

/** The Sun's upper edge first shows, or last shows, over a point of the skyline. Both passages of a year. */
export interface SunAzimuthSpec {
  kind: 'sun-azimuth';
  event: SunEvent;
  /** 0…360° from north through east. */
  azimuthDeg: number;
  /** How people call the point; may be empty. */
  pointName: string;
}

/** The noon Sun's upper edge shows over the skyline at the meridian again, or for the last time. */
export interface NoonSunSpec {
  kind: 'noon-sun';
  passage: NoonSunPassage;
  /** How people call the ridge; may be empty. */
  ridgeName: string;
}

/** The noon Sun stands overhead: no shadow. Both passages of a year. */
export interface ZenithSunSpec {
  kind: 'zenith-sun';
}

/** The last or first night at whose middle the Sun is so deep. */
export interface DarkNightSpec {
  kind: 'dark-night';
  end: DarkNightEnd;
  depthDeg: NightDepthDeg;
}

/** Every new Moon, first crescent or full Moon of the year; the entry says which. */
export interface MoonPhaseSpec {
  kind: 'moon-phase';
  event: MoonEvent;
}

/** The n-th new Moon, first crescent or full Moon on or after a day of a star or figure. */
export interface MoonCountedSpec {
  kind: 'moon-counted';
  markerKey: MarkerKey;
  phenomenon: Phenomenon;
  event: MoonEvent;
  /** 1…13. */
  count: number;
}

/** Venus comes or goes, as morning star or as evening star. */
export interface VenusAppearanceSpec {
  kind: 'venus-appearance';
  appearance: VenusAppearance;
}

export type SkyMarkerSpec =
  | CulminationSpec
  | StarAltitudeSpec
  | DueMeridianSpec
  | AboutPoleSpec
  | SunSeasonSpec
  | SunAzimuthSpec
  | NoonSunSpec
  | ZenithSunSpec
  | DarkNightSpec
  | MoonPhaseSpec
  | MoonCountedSpec
  | VenusAppearanceSpec;

export type SpecOf<K extends SkyMarkerKind> = Extract<SkyMarkerSpec, { kind: K }>;

/** The day of a marker with its instant, and where star or Sun stands then. */
export interface SkyMarkerDay extends CivilDay {
  jdUt: number;
  /** 0…360° from north through east; null where there is no one direction. */
  azimuthDeg: number | null;
  altitudeDeg: number | null;
}

export interface SkyMarkerOccurrence {
  expected: SkyMarkerDay;
  /** Early ≤ expected ≤ late; null where light nights cut the range off. May lie in a neighbouring year. */
  early: CivilDay | null;
  late: CivilDay | null;
  notes: readonly SkyNote[];
}

/** What a marker's dates rest on. */
export interface SkyMarkerBasis {
  /** Why the range is as wide as it is: a code whose sentence stands with the words of the kind. */
  range: string;
  /** By how much the eye, the air or the day's length may miss, in degrees (of sky, or of the Sun's depth). */
  toleranceDeg: number;
  engineVersion: string;
}

/** A marker of the sky at a place in a civil year. */
export interface SkyMarkerYear {
  spec: SkyMarkerSpec;
  year: number;
  outcome: SkyMarkerOutcome;
  /** Null where the outcome is `dated`. */
  reason: SkyMarkerReason | null;
  /** In order of date; those whose expected day falls in the civil year. */
  occurrences: readonly SkyMarkerOccurrence[];
  time: SkyMarkerTime;
  /** Key of SOURCES.md. */
  sourceKey: string;
  basis: SkyMarkerBasis;
}
