import { seenOf } from '#shared/calendar/as-seen.js';
import { entryDatesFromDays, inOrder } from '#shared/calendar/entry-dates.js';
import { overlappingEntryIds } from '#shared/calendar/overlap.js';
import { isStarLead } from '#shared/calendar/entry-model.js';
import { seenDay } from '#shared/contracts/entry-lead.js';
import type { Entry, EntryDates, EntryInput } from '#shared/contracts/calendars.js';
import { entryOffsets, fixedLastDate } from '#shared/contracts/calendars.js';
import { monthDay } from '#shared/contracts/common.js';
import type { MarkerRow } from '#shared/contracts/stars.js';
import { signOf, type Signs } from './signs.js';

/** The markers of a place and year by key. */
export type Markers = ReadonlyMap<string, MarkerRow>;

/**
 * The dates of an entry while it is being written, by the same rules as on the server. Null while it cannot have
 * any: nothing chosen yet, days out of order, markers still on their way.
 */
export function previewDates(
  content: EntryInput,
  year: number,
  markers: Markers | null,
  signs: Signs = new Map(),
): EntryDates | null {
  const { lead, offsets, hasLastDate, lastDate } = content;
  if (!entryOffsets.safeParse(offsets).success) return null;
  const timing = hasLastDate && fixedLastDate.shape.date.safeParse(lastDate?.date).success;
  const known: EntryInput = { ...content, hasLastDate: timing };
  if (lead.type === 'fixed-date') {
    return monthDay.safeParse(lead.date).success ? entryDatesFromDays(known, year, null) : null;
  }
  if (seenOf(lead) !== null && !seenDay.shape.date.safeParse(seenOf(lead)?.date).success) return null;
  if (lead.type === 'sky') {
    const sign = signOf(signs, lead.spec);
    return sign && entryDatesFromDays(known, year, sign);
  }
  if (lead.type === 'nature-sign') {
    const { from, to } = lead.usual;
    const isWhole = monthDay.safeParse(from).success && monthDay.safeParse(to).success;
    return isWhole ? entryDatesFromDays(known, year, null) : null;
  }
  // What is counted from another entry waits until all of them are at hand; see `shown-entries.ts`.
  if (!isStarLead(lead)) return null;
  const row = markers?.get(lead.markerKey);
  return row ? entryDatesFromDays(known, year, { ...row, year }) : null;
}

export interface ShownEntry {
  id: string;
  /** Null for an entry that is not saved yet. */
  saved: Entry | null;
  content: EntryInput;
  dates: EntryDates | null;
  unsaved: boolean;
}

/** What follows from a thing, made once for as long as the thing is the same. */
export function remembered<K extends object, V>(made: WeakMap<K, V>, from: K, make: () => V): V {
  const before = made.get(from);
  if (before !== undefined) return before;
  const value = make();
  made.set(from, value);
  return value;
}

const withTheOther = new WeakMap<ShownEntry, ShownEntry>();

/** Adds the warning that two entries share, as the server does: it needs all of them at hand. */
export function withOverlaps(entries: readonly ShownEntry[]): ShownEntry[] {
  const colliding = overlappingEntryIds(
    entries.map(({ id, content, dates }) => ({ id, timing: content, window: dates?.window ?? null })),
  );
  return entries.map((entry) => {
    const { dates } = entry;
    if (dates === null || dates.warnings.includes('windows-overlap') === colliding.has(entry.id))
      return entry;
    return remembered(withTheOther, entry, () => {
      const own = dates.warnings.filter((warning) => warning !== 'windows-overlap');
      const warnings = colliding.has(entry.id) ? inOrder(new Set([...own, 'windows-overlap' as const])) : own;
      return { ...entry, dates: { ...dates, warnings } };
    });
  });
}
