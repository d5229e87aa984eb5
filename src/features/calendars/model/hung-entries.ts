import { anchoredDates, anchorOf, circleFrom } from '#shared/calendar/anchors.js';
import { entryOffsets } from '#shared/contracts/calendars.js';
import type { ShownEntry } from './preview-dates.js';

/** Adds the days of entries that are counted from other ones, by the same rules as on the server. */
export function withAnchors(entries: readonly ShownEntry[], year: number): ShownEntry[] {
  if (entries.every(({ content }) => anchorOf(content.lead) === null)) return [...entries];
  const actual = new Map(entries.map(({ id, saved }) => [id, saved?.actual ?? null]));
  const timed = entries.filter(({ content }) => entryOffsets.safeParse(content.offsets).success);
  const found = anchoredDates(
    timed.map(({ id, content, dates }) => ({ id, lead: content.lead, timing: timingOf(content), dates })),
    year,
    { actualOf: (id) => actual.get(id) ?? null, mayHang: () => true },
  );
  return entries.map((entry) =>
    anchorOf(entry.content.lead) === null ? entry : { ...entry, dates: found.get(entry.id) ?? null },
  );
}

/** A last date that is not whole yet cuts nothing. */
function timingOf(content: ShownEntry['content']): ShownEntry['content'] {
  return content.lastDate === null ? { ...content, hasLastDate: false } : content;
}

/** Titles along the circle in which an entry would wait for itself; null where there is none. */
export function circleTitles(id: string, entries: readonly ShownEntry[]): string[] | null {
  const circle = circleFrom(
    id,
    entries.map((entry) => ({ id: entry.id, lead: entry.content.lead })),
  );
  const titles = new Map(entries.map((entry) => [entry.id, entry.content.titleOfficer]));
  return circle && circle.map((one) => titles.get(one) ?? '');
}
