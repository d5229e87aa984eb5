import type { CivilDay, MarkerKey, Occurrence } from '../types.js';
import type {
  Clarity,
  Phenomenon,
  PhenomenonOutcome,
  StarOutcome,
  StarOutcomeDetail,
  ThresholdSetId,
} from '../vocabulary.js';

/** The day of a phenomenon by the model of visibility, with the minutes in which the star shows then. */
export interface ModelDay extends CivilDay {
  fromJdUt: number;
  toJdUt: number;
  minutes: number;
}

/** One morning or evening beside the date: minutes in which the star shows. */
export interface NightMinutes {
  /** The civil day of the rising or setting. */
  dayNumber: number;
  /** Without a Moon. */
  byClarity: Readonly<Record<Clarity, number>>;
  /** In the place's own air of the month, with the Moon of that night. */
  underMoon: number;
}

/** One occurrence, all of the same disappearance; days may fall into a neighbouring year. */
export interface AirOccurrence {
  /** By the place's own rule, with range; null where that has no date. */
  rule: Occurrence | null;
  bySet: Readonly<Record<ThresholdSetId, Occurrence | null>>;
  /** By the model; null where that air never shows the star in this turn of the year. */
  byModel: Readonly<Record<Clarity, ModelDay | null>>;
  /** Empty for acronychal risings and cosmical settings, where minutes say nothing. In order of days. */
  nights: readonly NightMinutes[];
}

export interface AirPhenomenon {
  phenomenon: Phenomenon;
  /** By the place's own rule. */
  outcome: PhenomenonOutcome;
  occurrences: readonly AirOccurrence[];
}

/** The year of a marker in clear, ordinary and hazy air, by the rules and by the model. */
export interface AirYear {
  markerKey: MarkerKey;
  year: number;
  outcome: StarOutcome;
  outcomeDetail: StarOutcomeDetail | null;
  phenomena: Readonly<Record<Phenomenon, AirPhenomenon>>;
  /** Mean of the year overhead, magnitudes per airmass. */
  extinctionMag: Readonly<Record<Clarity, number>>;
}
