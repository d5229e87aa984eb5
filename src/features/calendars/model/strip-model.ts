import { isStarLead } from '#shared/calendar/entry-model.js';
import type { EntryLead } from '#shared/contracts/calendars.js';
import type { MarkerRow } from '#shared/contracts/stars.js';
import { canonicalJson } from '#shared/kernel/canonical-json.js';
import { windowDayNumbers } from '#src/lib/entry-words.js';
import type { DaySpan } from '#src/ui/pictures/day-span.js';
import type { BoardBar, BoardPairing } from '#src/ui/pictures/year-board.js';
import type { Markers, ShownEntry } from './preview-dates.js';

/** Keys of lanes: stars by their own, signs of the sky by their text. */
export function laneKeyOf(lead: EntryLead): string | null {
  if (isStarLead(lead)) return lead.markerKey;
  return lead.type === 'sky' ? canonicalJson(lead.spec) : null;
}

/** The stars and figures that entries go by, each once, in the order in which the entries bring them. */
export function lanesOf(entries: readonly ShownEntry[], markers: Markers | null): MarkerRow[] {
  const rows = new Map<string, MarkerRow>();
  for (const { content } of entries) {
    if (!isStarLead(content.lead)) continue;
    const row = markers?.get(content.lead.markerKey);
    if (row) rows.set(row.markerKey, row);
  }
  return [...rows.values()];
}

const madeBars = new WeakMap<ShownEntry, BoardBar>();

/** The same bar for as long as its entry looks the same. */
export function barsOf(entries: readonly ShownEntry[], nameOf: (entry: ShownEntry) => string): BoardBar[] {
  return entries.flatMap((entry) => {
    const window = entry.dates?.window;
    if (!window) return [];
    const name = nameOf(entry);
    const before = madeBars.get(entry);
    if (before?.name === name) return [before];
    const kind = entry.content.protectiveWatch ? 'watch' : 'work';
    const bar: BoardBar = { key: entry.id, name, days: windowDayNumbers(window), kind };
    madeBars.set(entry, bar);
    return [bar];
  });
}

/** From the marker's expected day in its lane to the window; null for a fixed date or without one. */
export function pairingOf(entry: ShownEntry | null): BoardPairing | null {
  const laneKey = entry && laneKeyOf(entry.content.lead);
  if (laneKey === null || !entry?.dates?.marker) return null;
  return { laneKey, dayNumber: entry.dates.marker.expected.dayNumber };
}

/** Entries whose days lie wholly beside the year that the strip shows, such as what follows on work of December. */
export function besideOf(entries: readonly ShownEntry[], { first, last }: DaySpan): ShownEntry[] {
  return entries.filter(({ dates }) => {
    const days = dates?.window ? windowDayNumbers(dates.window) : null;
    return days !== null && (days.lastAdvised < first || days.earliest > last);
  });
}

/** Entries whose lead brings no day this year. One that goes by nothing yet is not among them. */
export function undatedOf(entries: readonly ShownEntry[]): ShownEntry[] {
  return entries.filter(
    ({ content, dates }) => content.lead.type !== 'none' && dates !== null && dates.window === null,
  );
}

/** Entries that go by nothing yet; of a new one only once somebody wrote to it. */
export function unledOf(entries: readonly ShownEntry[]): ShownEntry[] {
  return entries.filter(
    ({ content, saved, unsaved }) => content.lead.type === 'none' && (saved !== null || unsaved),
  );
}
