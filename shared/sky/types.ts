import type {
  Clarity,
  NightState,
  PatchClass,
  Phenomenon,
  PhenomenonOutcome,
  SkylineRule,
  SkyNote,
  StarOutcome,
  StarOutcomeDetail,
  SunCourse,
  ThresholdSetId,
} from './vocabulary.js';

/** One point of a skyline table. Azimuth 0…360° from north through east, altitude −5…60°. */
export interface SkylinePoint {
  azimuthDeg: number;
  altitudeDeg: number;
}

/** Where people watch. East longitude positive. No skyline, or an empty one, means a flat horizon. */
export interface Site {
  latitudeDeg: number;
  longitudeDeg: number;
  elevationM: number;
  /** IANA zone; null means local mean solar time. */
  timeZone: string | null;
  skyline: readonly SkylinePoint[];
}

/** How a place turns brightness into a needed depth of the Sun. */
export interface VisibilitySettings {
  thresholdSet: ThresholdSetId;
  sameSideShiftDeg: number;
  oppositeSideShiftDeg: number;
  /** Twelve values, January first. */
  clarityByMonth: readonly Clarity[];
  skylineRule: SkylineRule;
}

/** A star of the table, as the eye sees it. */
export interface Star {
  hr: number;
  hip: number | null;
  name: string;
  /** Greek letter, may be empty. */
  bayer: string;
  flamsteed: string;
  constellation: string;
  vMag: number;
}

/** A part of the sky that no star stands for: a piece of the Milky Way, a dark cloud, a faint cluster. */
export interface SkyPatch {
  /** Equator and equinox of J2000; right ascension 0…360°, declination −90…90°. It has no motion of its own. */
  rightAscensionDeg: number;
  declinationDeg: number;
  patchClass: PatchClass;
}

/** A group of stars, or a patch of sky, that is watched as one: built in, or a community's own. */
export interface Figure {
  key: string;
  name: string;
  /** The star whose dates are the figure's; null for a patch. */
  indicatorHr: number | null;
  memberHrs: readonly number[];
  /** Where the dates come from when there is no indicator star; otherwise null. */
  patch: SkyPatch | null;
  /** Depths to use instead of those of the indicator's magnitude or the patch's class; null keeps those. */
  thresholdOverride: { sameSideDeg: number; oppositeSideDeg: number; source: string } | null;
}

/** `hr<number>` for a star, the figure's key for a figure. */
export type MarkerKey = string;

export interface CalendarDate {
  /** Astronomical year: 0 = 1 BC. */
  year: number;
  month: number;
  day: number;
}

/** A civil day with both labels. */
export interface CivilDay {
  /** Julian Day Number of the civil day (the JD at its noon). */
  dayNumber: number;
  gregorian: CalendarDate;
  julian: CalendarDate;
}

/** One crossing of the skyline that carries a date. */
export interface Crossing extends CivilDay {
  /** Julian Day (UT) of the crossing. */
  jdUt: number;
  /** Depth of the Sun's centre at the crossing, degrees below the mathematical horizon. */
  sunDepressionDeg: number;
  /** Depth that was asked for at this crossing. */
  neededDepressionDeg: number;
  starAzimuthDeg: number;
  /** Altitude of the skyline where the star crosses it. */
  starAltitudeDeg: number;
  sunAzimuthDeg: number;
}

/** How far the ends of a range stand from what the expected day needs, degrees of the Sun's depth. */
export interface RangeWidth {
  /** What the ends are computed with: the larger of the two below. */
  halfWidthDeg: number;
  /** From published scatter, by brightness and side. */
  byScatterDeg: number;
  /** From the model of visibility: clearer and hazier air around that of the month, half a magnitude of eyesight. */
  byModelDeg: number;
}

/** One occurrence of a phenomenon: the expected day and the two ends of its range, all of the same disappearance. */
export interface Occurrence {
  expected: Crossing;
  /** Null where the sky never gets dark enough for that end. Sorted by date: early ≤ expected ≤ late. */
  early: Crossing | null;
  late: Crossing | null;
  clarity: Clarity;
  /** Null for Venus, whose range is that of the brightest stars. */
  width: RangeWidth | null;
  notes: readonly SkyNote[];
}

export interface PhenomenonResult {
  phenomenon: Phenomenon;
  outcome: PhenomenonOutcome;
  /** Occurrences whose expected day falls in the civil year: 0, 1 or 2. */
  occurrences: readonly Occurrence[];
}

/** What a result rests on. */
export interface Basis {
  thresholdSet: ThresholdSetId;
  thresholdSource: string;
  sameSideDeg: number;
  oppositeSideDeg: number;
  sameSideShiftDeg: number;
  oppositeSideShiftDeg: number;
  skylineRule: SkylineRule;
  clarityByMonth: readonly Clarity[];
  year: number;
  engineVersion: string;
}

/** A star's or a figure's year at a place. */
export interface MarkerYear {
  markerKey: MarkerKey;
  year: number;
  outcome: StarOutcome;
  outcomeDetail: StarOutcomeDetail | null;
  phenomena: Readonly<Record<Phenomenon, PhenomenonResult>>;
  /** Nights between the last evening and the first morning; null where the question has no answer. */
  nightsHidden: number | null;
  notes: readonly SkyNote[];
  basis: Basis;
}

/** One occurrence of an epoch, with the one label that no calendar bends. */
export interface DriftDay extends Occurrence {
  /** Apparent ecliptic longitude of the Sun on the expected day, 0…360°: 90 is the June solstice in any year. */
  sunLongitudeDeg: number;
}

/** What a marker does in one of the years asked for; the same days as in its MarkerYear. */
export interface DriftEpoch {
  year: number;
  outcome: StarOutcome;
  outcomeDetail: StarOutcomeDetail | null;
  phenomena: Readonly<Record<Phenomenon, { outcome: PhenomenonOutcome; occurrences: readonly DriftDay[] }>>;
}

/** Where a phenomenon begins or ceases to exist between two of the years asked for. */
export interface DriftTurn {
  phenomenon: Phenomenon;
  change: 'begins' | 'ceases';
  /** First year of the new state. */
  year: number;
  /** What the star does while there is no date; `rises-and-sets` means that the sky is never dark enough. */
  outcome: StarOutcome;
  outcomeDetail: StarOutcomeDetail | null;
}

/** A marker across the centuries at a place. */
export interface MarkerDrift {
  markerKey: MarkerKey;
  /** In the order of the years asked for. */
  epochs: readonly DriftEpoch[];
  /** Days per century, later in the Gregorian year positive; null with fewer than two dated epochs. */
  daysPerCentury: Readonly<Record<Phenomenon, number | null>>;
  turns: readonly DriftTurn[];
  /** That of the first year; only its year differs from the others'. */
  basis: Basis;
}

/** A run of nights in the same state; both days belong to it. Day numbers lie within the civil year. */
export interface StripSegment {
  state: NightState;
  fromDayNumber: number;
  toDayNumber: number;
}

/** When to stop in the morning and begin in the evening of a civil day (Julian Days UT; null where the Sun does not cross). */
export interface WatchTimes {
  /** Null unless the Sun sets and rises: also where only a hill hides a Sun that is up all night. */
  stopLookingJdUt: number | null;
  startLookingJdUt: number | null;
  /** What the Sun does in the night before the morning, and in the one after the evening. */
  dawnSun: SunCourse;
  duskSun: SunCourse;
  flatSunriseJdUt: number | null;
  flatSunsetJdUt: number | null;
  /** The Sun's upper edge over the place's own skyline. */
  skylineSunriseJdUt: number | null;
  skylineSunsetJdUt: number | null;
}

/** One question of the `dates` command: a level skyline, thresholds exactly as given, local mean solar time. */
export interface DepthAtCrossingCase {
  hr: number;
  latitudeDeg: number;
  longitudeDeg: number;
  year: number;
  /** Altitude of the skyline all around. */
  skylineDeg: number;
  /** Needed depths of the Sun; 0 asks for the true phases, which are geometry and cannot be seen. */
  thresholdsDeg: { sameSide: number; oppositeSide: number };
}

export interface DepthAtCrossingYear {
  outcome: StarOutcome;
  outcomeDetail: StarOutcomeDetail | null;
  /** Null unless the outcome is `rises-and-sets`. Day numbers of the civil year, ascending; mostly one, at times none or two. */
  dayNumbers: Readonly<Record<Phenomenon, readonly number[]>> | null;
}

/** Expected dates of many stars, packed: one row of four columns per star in the order of PHENOMENA. */
export interface ExpectedDates {
  hrs: readonly number[];
  /** First day number of the phenomenon in the civil year; 0 where there is none. */
  dayNumbers: Int32Array;
}

export const MOON_QUARTERS = ['new', 'first-quarter', 'full', 'last-quarter'] as const;
export type MoonQuarter = (typeof MOON_QUARTERS)[number];

export interface MoonPhase {
  quarter: MoonQuarter;
  jdUt: number;
}

/** The Moon at one instant over a place. */
export interface MoonOverPlace {
  /** 0 at new Moon, 1 at full Moon. */
  litShare: number;
  /** Of its centre above the mathematical horizon, without refraction. */
  altitudeDeg: number;
}

export type * from './sky-markers/types.js';
