import type {
  Phenomenon,
  PhenomenonOutcome,
  SkyMarkerOutcome,
  SkyMarkerReason,
  SkyMarkerSpec,
  SkyNote,
  StarOutcome,
} from '#shared/sky/index.js';
import type { IsoDate } from '#shared/kernel/iso-date.js';

/**
 * What the calendar's rules need to know of an entry. The API's own shapes live in the contracts; a test proves
 * that the two describe the same thing.
 */
export interface MonthDay {
  month: number;
  day: number;
}

export type EntryLead =
  | { type: 'marker'; markerKey: string; phenomenon: Phenomenon; occurrence: 1 | 2 }
  /**
   * `occurrence` counts within the year: up to thirteen for Moons, two for the rest. `seen` is left out where the computed
   * day leads, and null until people have seen it where the day on which they do leads.
   */
  | { type: 'sky'; spec: SkyMarkerSpec; occurrence: number; seen?: SeenDay | null | undefined }
  | { type: 'fixed-date'; date: MonthDay; source: string }
  /** Counted from the computed day until people have seen it; from then on from the day on which they saw it. */
  | {
      type: 'marker-as-seen';
      markerKey: string;
      phenomenon: Phenomenon;
      occurrence: 1 | 2;
      seen: SeenDay | null;
    }
  /** Something that grows, flies or blows, with the days on which it usually comes. */
  | { type: 'nature-sign'; name: string; usual: { from: MonthDay; to: MonthDay }; source: string }
  | { type: 'entry-planned'; entryId: string; day: PlannedDay }
  | { type: 'entry-actual'; entryId: string }
  /** Nothing is chosen yet, in the way that is picked for it. */
  | { type: 'none'; way: LeadWay };

export type LeadWay =
  'marker' | 'sky' | 'fixed-date' | 'marker-as-seen' | 'nature-sign' | 'entry-planned' | 'entry-actual';

export type PlannedDay = 'earliest' | 'bestFrom' | 'bestTo' | 'lastAdvised';

export interface SeenDay {
  date: IsoDate;
  by: string;
  /** The elder who says so, too. */
  agreedBy: string;
}

export type StarLead = Extract<EntryLead, { type: 'marker' | 'marker-as-seen' }>;

/** Does a star's or figure's first or last day lead, as computed or as seen? */
export function isStarLead(lead: EntryLead): lead is StarLead {
  return lead.type === 'marker' || lead.type === 'marker-as-seen';
}

/** Days from the lead day, in order. */
export interface EntryOffsets {
  earliestDays: number;
  bestFromDays: number;
  bestToDays: number;
  lastAdvisedDays: number;
}

/** The part of an entry's content on which its dates and warnings rest. */
export interface EntryTiming {
  kind: string;
  crop: string;
  lead: EntryLead;
  offsets: EntryOffsets;
  hasLastDate: boolean;
  lastDate: { date: MonthDay; source: string } | null;
  protectiveWatch: boolean;
}

export const ENTRY_WARNINGS = [
  'no-lead-yet',
  'no-date-this-year',
  'star-does-not-serve',
  'sign-not-here',
  'one-occurrence-only',
  'weak-marker',
  'never-disappears',
  'lost-in-light-nights',
  'window-closed-by-last-date',
  'window-shortened-by-last-date',
  'belief-not-agreed-to-print',
  'windows-overlap',
  'waits-for-actual-day',
  'anchor-without-days',
  'anchor-gone',
] as const;
export type EntryWarning = (typeof ENTRY_WARNINGS)[number];

export interface EntryWindow {
  earliest: IsoDate;
  bestFrom: IsoDate;
  bestTo: IsoDate;
  lastAdvised: IsoDate;
  /** Which of the two gave `lastAdvised`: the days counted from the lead, or the fixed last date. */
  lastAdvisedBy: 'offset' | 'fixed';
}

/** A civil day with its labels as text, e.g. `2027-06-07`. */
export interface LabelledDay {
  dayNumber: number;
  gregorian: string;
  julian: string;
}

export interface OccurrenceDays {
  expected: LabelledDay;
  early: LabelledDay | null;
  late: LabelledDay | null;
  notes: SkyNote[];
}

/** From what the window is counted, where it is not a computed day or a fixed date. */
export interface CountedDays {
  basis: 'seen' | 'usual' | 'planned' | 'actual' | 'waiting' | 'gone';
  /** The days that it is counted from: early days from the first of them, late days from the last. */
  from: IsoDate | null;
  to: IsoDate | null;
  /** The other counting: as computed beside as seen, as planned beside as done or while it waits. */
  beside: EntryWindow | null;
}

export interface EntryDates {
  starOutcome: StarOutcome | null;
  phenomenonOutcome: PhenomenonOutcome | null;
  /** Only where a marker beyond a star's first and last days leads. */
  sky?: { outcome: SkyMarkerOutcome; reason: SkyMarkerReason | null } | undefined;
  marker: OccurrenceDays | null;
  /** Only where something else is counted from. */
  counted?: CountedDays | undefined;
  window: EntryWindow | null;
  warnings: EntryWarning[];
}
