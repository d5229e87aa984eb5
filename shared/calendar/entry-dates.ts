import type {
  CalendarDate,
  CivilDay,
  MarkerYear,
  Occurrence,
  Phenomenon,
  PhenomenonOutcome,
  SkyMarkerOccurrence,
  SkyMarkerOutcome,
  SkyMarkerReason,
  SkyMarkerSpec,
  SkyMarkerYear,
  SkyNote,
  StarOutcome,
} from '#shared/sky/index.js';
import { sameJson } from '#shared/kernel/canonical-json.js';
import { dayNumberFromIso, dayNumberOf, isoDateOf } from '#shared/kernel/iso-date.js';
import type {
  CountedDays,
  EntryDates,
  EntryLead,
  EntryTiming,
  EntryWarning,
  LabelledDay,
  MonthDay,
  OccurrenceDays,
  StarLead,
} from './entry-model.js';
import { seenOf } from './as-seen.js';
import { ENTRY_WARNINGS } from './entry-model.js';
import { windowOf, type WindowResult } from './window.js';

/** Remarks of the sky that an officer must know before tying work to a marker. */
const WARNED_NOTES = ['weak-marker', 'never-disappears', 'lost-in-light-nights'] as const satisfies SkyNote[];

/**
 * A marker's year as far as these rules look at it: its days without the geometry of their crossings. That is what
 * the API hands to the screens, where an editor shows the dates of an entry while it is being written.
 */
export interface MarkerDays {
  markerKey: string;
  year: number;
  outcome: StarOutcome;
  notes: readonly SkyNote[];
  phenomena: Readonly<
    Record<Phenomenon, { outcome: PhenomenonOutcome; occurrences: readonly OccurrenceDays[] }>
  >;
}

/** The same of a marker beyond a star's first and last days. */
export interface SkyMarkerDays {
  spec: SkyMarkerSpec;
  year: number;
  outcome: SkyMarkerOutcome;
  reason: SkyMarkerReason | null;
  occurrences: readonly OccurrenceDays[];
}

/** Days that lead, by number; the same one twice for a single day. */
export interface DaySpell {
  first: number;
  last: number;
}

/** What an entry that is counted from another one is told about it. */
export interface AnchorDays {
  basis: 'planned' | 'actual' | 'waiting' | 'gone';
  spell: DaySpell | null;
  /** The planned day beside the actual one, or while that is not known. */
  planned: DaySpell | null;
}

/**
 * What the sky and the rules make of one entry in one civil year. `leadYear` is the leading marker's year at the
 * calendar's place; it is not asked for where a fixed date leads. The answer rests on this entry alone, so the
 * same entry always gives the same answer; what two entries have to do with each other is in `overlap.ts`.
 */
export function entryDatesOf(
  timing: EntryTiming,
  year: number,
  leadYear: MarkerYear | SkyMarkerYear | null,
): EntryDates {
  if (leadYear !== null && 'spec' in leadYear) {
    const occurrences = leadYear.occurrences.map(occurrenceDaysOf);
    return entryDatesFromDays(timing, year, { ...leadYear, occurrences });
  }
  return entryDatesFromDays(timing, year, leadYear && markerDaysOf(leadYear));
}

/** The same from days that are at hand already. */
export function entryDatesFromDays(
  timing: EntryTiming,
  year: number,
  leadDays: MarkerDays | SkyMarkerDays | null,
  anchor: AnchorDays | null = null,
): EntryDates {
  const lead = leadOf(timing, year, leadDays, anchor);
  const warnings = new Set(lead.warnings);
  let window: EntryDates['window'] = null;
  if (lead.spell !== null) {
    const result = windowFrom(lead.spell, timing);
    window = result.window;
    if (result.lastDateEffect === 'closed') warnings.add('window-closed-by-last-date');
    if (result.lastDateEffect === 'shortened') warnings.add('window-shortened-by-last-date');
  }
  return {
    starOutcome: lead.starOutcome,
    phenomenonOutcome: lead.phenomenonOutcome,
    // Left out, not undefined: an entry that goes by a star must give the same text as before there were such signs.
    ...(lead.sky && { sky: lead.sky }),
    marker: lead.marker,
    ...(lead.counted && { counted: countedDays(lead.counted, timing) }),
    window,
    warnings: inOrder(warnings),
  };
}

function windowFrom({ first, last }: DaySpell, timing: EntryTiming): WindowResult {
  return windowOf({
    leadDayNumber: first,
    leadLastDayNumber: last,
    offsets: timing.offsets,
    lastDate: timing.hasLastDate ? (timing.lastDate?.date ?? null) : null,
    protectiveWatch: timing.protectiveWatch,
  });
}

function countedDays({ basis, spell, beside }: Counted, timing: EntryTiming): CountedDays {
  return {
    basis,
    from: spell && isoDateOf(spell.first),
    to: spell && isoDateOf(spell.last),
    beside: beside && windowFrom(beside, timing).window,
  };
}

/** Warnings once each and in the order of their list, so that equal findings are equal texts. */
export function inOrder(warnings: ReadonlySet<EntryWarning>): EntryWarning[] {
  return ENTRY_WARNINGS.filter((warning) => warnings.has(warning));
}

interface Counted {
  basis: CountedDays['basis'];
  spell: DaySpell | null;
  beside: DaySpell | null;
}

interface Lead {
  spell: DaySpell | null;
  counted?: Counted;
  starOutcome: EntryDates['starOutcome'];
  phenomenonOutcome: EntryDates['phenomenonOutcome'];
  sky?: NonNullable<EntryDates['sky']>;
  marker: OccurrenceDays | null;
  warnings: EntryWarning[];
}

type LeadDays = MarkerDays | SkyMarkerDays | null;

function leadOf({ lead }: EntryTiming, year: number, leadDays: LeadDays, anchor: AnchorDays | null): Lead {
  switch (lead.type) {
    case 'none':
      return withoutSky(null, ['no-lead-yet']);
    case 'fixed-date':
      return withoutSky(oneDay(dayNumberOf(year, lead.date.month, lead.date.day)));
    case 'sky':
      return asSeen(lead, skyLeadOf(lead, year, leadDays));
    case 'marker':
      return starLeadOf(lead, year, leadDays);
    case 'marker-as-seen':
      return asSeen(lead, starLeadOf(lead, year, leadDays));
    case 'nature-sign': {
      const spell = spellIn(year, lead.usual);
      return { ...withoutSky(spell), counted: { basis: 'usual', spell, beside: null } };
    }
    case 'entry-planned':
    case 'entry-actual':
      return hungLeadOf(lead, anchor);
  }
}

/** Usual days of a year; they may begin before New Year and end after it. */
function spellIn(year: number, { from, to }: { from: MonthDay; to: MonthDay }): DaySpell {
  const first = dayNumberOf(year, from.month, from.day);
  const last = dayNumberOf(year, to.month, to.day);
  return { first, last: last < first ? dayNumberOf(year + 1, to.month, to.day) : last };
}

function oneDay(dayNumber: number): DaySpell {
  return { first: dayNumber, last: dayNumber };
}

function withoutSky(spell: DaySpell | null, warnings: EntryWarning[] = []): Lead {
  return { spell, starOutcome: null, phenomenonOutcome: null, marker: null, warnings };
}

/** The computed day stays beside; doubts about whether there is one are settled once somebody has seen it. */
function asSeen(lead: EntryLead, computed: Lead): Lead {
  const seen = seenOf(lead);
  if (seen === null) return computed;
  const spell = oneDay(dayNumberFromIso(seen.date));
  const warnings = computed.warnings.filter((warning) =>
    (WARNED_NOTES as readonly string[]).includes(warning),
  );
  return { ...computed, spell, warnings, counted: { basis: 'seen', spell, beside: computed.spell } };
}

function hungLeadOf(
  lead: Extract<EntryLead, { type: 'entry-planned' | 'entry-actual' }>,
  anchor: AnchorDays | null,
): Lead {
  if (anchor === null)
    throw new RangeError(`The entry is counted from ${lead.entryId}; nothing was told of it.`);
  const { basis, spell, planned } = anchor;
  const warnings: EntryWarning[] = [];
  if (basis === 'gone') warnings.push('anchor-gone');
  else if (basis === 'waiting') warnings.push('waits-for-actual-day');
  else if (spell === null) warnings.push('anchor-without-days');
  return { ...withoutSky(spell, warnings), counted: { basis, spell, beside: planned } };
}

function starLeadOf(lead: StarLead, year: number, leadDays: LeadDays): Lead {
  const markerDays = leadDays && 'markerKey' in leadDays ? leadDays : null;
  if (markerDays?.markerKey !== lead.markerKey || markerDays.year !== year) {
    throw new RangeError(`The entry goes by ${lead.markerKey} in ${year}; another marker's year was given.`);
  }
  if (markerDays.outcome !== 'rises-and-sets') {
    // A star that is always or never there has no first and last days, so there is nothing to say about one of them.
    return undated(markerDays.outcome, null, 'star-does-not-serve');
  }
  const { outcome, occurrences } = markerDays.phenomena[lead.phenomenon];
  const occurrence = occurrences[lead.occurrence - 1];
  if (occurrence) {
    const notes = new Set<SkyNote>([...markerDays.notes, ...occurrence.notes]);
    return {
      spell: oneDay(occurrence.expected.dayNumber),
      starOutcome: markerDays.outcome,
      phenomenonOutcome: outcome,
      marker: { ...occurrence, notes: [...occurrence.notes] },
      warnings: WARNED_NOTES.filter((note) => notes.has(note)),
    };
  }
  if (occurrences.length > 0) return undated(markerDays.outcome, outcome, 'one-occurrence-only');
  return undated(
    markerDays.outcome,
    outcome,
    outcome === 'never-dark-enough' ? 'star-does-not-serve' : 'no-date-this-year',
  );
}

function skyLeadOf(
  lead: Extract<EntryTiming['lead'], { type: 'sky' }>,
  year: number,
  leadDays: MarkerDays | SkyMarkerDays | null,
): Lead {
  const days = leadDays && 'spec' in leadDays ? leadDays : null;
  if (days?.year !== year || !sameJson(days.spec, lead.spec)) {
    throw new RangeError(`The entry goes by ${lead.spec.kind} in ${year}; another sign's year was given.`);
  }
  const { outcome, reason, occurrences } = days;
  const sky = { outcome, reason };
  const occurrence = occurrences[lead.occurrence - 1];
  if (occurrence) {
    const { expected, early, late, notes } = occurrence;
    return {
      spell: oneDay(expected.dayNumber),
      starOutcome: null,
      phenomenonOutcome: null,
      sky,
      // Written out: days from the API carry the direction and the time as well, which are no part of an entry.
      marker: { expected, early, late, notes: [...notes] },
      warnings: WARNED_NOTES.filter((note) => notes.includes(note)),
    };
  }
  const warning =
    occurrences.length > 0
      ? 'one-occurrence-only'
      : outcome === 'never-here'
        ? 'sign-not-here'
        : 'no-date-this-year';
  return { ...undated(null, null, warning), sky };
}

function undated(
  starOutcome: EntryDates['starOutcome'],
  phenomenonOutcome: EntryDates['phenomenonOutcome'],
  warning: EntryWarning,
): Lead {
  return { spell: null, starOutcome, phenomenonOutcome, marker: null, warnings: [warning] };
}

function markerDaysOf({ markerKey, year, outcome, notes, phenomena }: MarkerYear): MarkerDays {
  const daysOf = (phenomenon: Phenomenon) => ({
    outcome: phenomena[phenomenon].outcome,
    occurrences: phenomena[phenomenon].occurrences.map(occurrenceDaysOf),
  });
  return {
    markerKey,
    year,
    outcome,
    notes,
    phenomena: {
      'heliacal-rising': daysOf('heliacal-rising'),
      'cosmical-setting': daysOf('cosmical-setting'),
      'acronychal-rising': daysOf('acronychal-rising'),
      'heliacal-setting': daysOf('heliacal-setting'),
    },
  };
}

/** The days of an occurrence without the geometry of its crossings. */
export function occurrenceDaysOf(occurrence: Occurrence | SkyMarkerOccurrence): OccurrenceDays {
  return {
    expected: labelled(occurrence.expected),
    early: occurrence.early && labelled(occurrence.early),
    late: occurrence.late && labelled(occurrence.late),
    notes: [...occurrence.notes],
  };
}

/** A civil day with its labels as text. */
export function labelled({ dayNumber, gregorian, julian }: CivilDay): LabelledDay {
  return { dayNumber, gregorian: labelOf(gregorian), julian: labelOf(julian) };
}

/** `YYYY-MM-DD` with the astronomical year, with a minus sign before year 0. */
function labelOf({ year, month, day }: CalendarDate): string {
  const digits = String(Math.abs(year)).padStart(4, '0');
  const monthAndDay = [month, day].map((part) => String(part).padStart(2, '0')).join('-');
  return `${year < 0 ? '-' : ''}${digits}-${monthAndDay}`;
}
