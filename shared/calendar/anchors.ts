import { withSeen } from './as-seen.js';
import { entryDatesFromDays, type AnchorDays } from './entry-dates.js';
import type { EntryDates, EntryLead, EntryTiming, EntryWindow } from './entry-model.js';
import { dayNumberFromIso } from '#shared/kernel/iso-date.js';

/** An entry as far as what hangs on what is asked. */
export interface Hung {
  id: string;
  lead: EntryLead;
}

/** The other entry from whose day this one is counted; null where none is. */
export function anchorOf(lead: EntryLead): string | null {
  return lead.type === 'entry-planned' || lead.type === 'entry-actual' ? lead.entryId : null;
}

/**
 * The chain by which an entry would hang on itself, from it and back to it; null where it does not. Every entry hangs on one
 * other at most, so there is only one way to go.
 */
export function circleFrom(id: string, entries: readonly Hung[]): string[] | null {
  const next = new Map(entries.map((entry) => [entry.id, anchorOf(entry.lead)]));
  const chain = [id];
  for (let at = next.get(id) ?? null; at !== null; at = next.get(at) ?? null) {
    if (chain.includes(at)) return at === id ? [...chain, id] : null;
    chain.push(at);
  }
  return null;
}

/** Entries that hang on this one, directly. */
export function hangingOn<E extends Hung>(id: string, entries: readonly E[]): E[] {
  return entries.filter((entry) => entry.id !== id && anchorOf(entry.lead) === id);
}

/** Every entry behind the one it hangs on. Those in a circle, or behind one, are not in it. */
export function inAnchorOrder<E extends Hung>(entries: readonly E[]): E[] {
  const known = new Set(entries.map(({ id }) => id));
  const placed = new Set<string>();
  const order: E[] = [];
  let left = [...entries];
  for (;;) {
    const free = left.filter(({ lead }) => {
      const anchor = anchorOf(lead);
      return anchor === null || !known.has(anchor) || placed.has(anchor);
    });
    if (free.length === 0) return order;
    for (const entry of free) {
      placed.add(entry.id);
      order.push(entry);
    }
    left = left.filter(({ id }) => !placed.has(id));
  }
}

/** When something was really done; one day, or a spell of them. */
export interface ActualSpell {
  from: string;
  to: string | null;
}

export interface AnchorFacts {
  actualOf: (entryId: string) => ActualSpell | null;
  /** May the one hang on the other? Not where fewer people see the other: its days would tell of it. */
  mayHang: (entryId: string, anchorId: string) => boolean;
}

export interface TimedEntry extends Hung {
  timing: EntryTiming;
  /** By what leads it, where that is no other entry; null while it is not known. */
  dates: EntryDates | null;
}

/**
 * Dates of all entries, also of those that are counted from other entries. What hangs in a circle, on nothing that is there
 * or on what fewer people see has no days and says so.
 */
export function anchoredDates(
  entries: readonly TimedEntry[],
  year: number,
  { actualOf, mayHang }: AnchorFacts,
): Map<string, EntryDates | null> {
  const found = new Map<string, EntryDates | null>();
  for (const { id, lead, timing, dates } of inAnchorOrder(entries)) {
    const anchorId = anchorOf(lead);
    if (anchorId === null) {
      found.set(id, dates);
      continue;
    }
    const anchor = mayHang(id, anchorId) ? found.get(anchorId) : undefined;
    const days: AnchorDays =
      anchor === undefined ? GONE : anchorDaysOf(lead, anchor?.window ?? null, actualOf(anchorId));
    found.set(id, entryDatesFromDays(timing, year, null, days));
  }
  for (const { id, timing } of entries) {
    if (!found.has(id)) found.set(id, entryDatesFromDays(timing, year, null, GONE));
  }
  return found;
}

const GONE: AnchorDays = { basis: 'gone', spell: null, planned: null };

function anchorDaysOf(lead: EntryLead, window: EntryWindow | null, actual: ActualSpell | null): AnchorDays {
  if (lead.type === 'entry-planned') {
    const day = window && dayNumberFromIso(window[lead.day]);
    return { basis: 'planned', spell: day === null ? null : { first: day, last: day }, planned: null };
  }
  const best = window && dayNumberFromIso(window.bestFrom);
  const planned = best === null ? null : { first: best, last: best };
  if (actual === null) return { basis: 'waiting', spell: null, planned };
  const first = dayNumberFromIso(actual.from);
  const last = actual.to === null ? first : dayNumberFromIso(actual.to);
  return { basis: 'actual', spell: { first, last }, planned };
}

/** A lead as it goes into another year's draft: on the entries of that draft, and nothing seen yet. */
export function leadForAnotherYear<L extends EntryLead>(lead: L, newIdOf: ReadonlyMap<string, string>): L {
  if (lead.type !== 'entry-planned' && lead.type !== 'entry-actual') return withSeen(lead, null);
  return { ...lead, entryId: newIdOf.get(lead.entryId) ?? lead.entryId };
}
