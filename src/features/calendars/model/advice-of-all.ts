import { draftAdvice, ENTRY_ADVICE, markerRange, type EntryAdvice } from '#shared/calendar/advice.js';
import { sameJson } from '#shared/kernel/canonical-json.js';
import type { ShownEntry } from './preview-dates.js';

/** What rests on the sky: the server says it of what is saved. */
const OF_THE_SKY: readonly EntryAdvice[] = ['moonlit', 'drifted'];

/** What to look at besides their days, of all entries as they look now. */
export function adviceOfAll(
  entries: readonly ShownEntry[],
  rainMonths: readonly boolean[],
): Map<string, EntryAdvice[]> {
  const fromDraft = draftAdvice(
    entries.map(({ id, content, dates }) => ({
      ...{ id, content, window: dates?.window ?? null },
      markerRange: markerRange(dates?.marker ?? null),
    })),
    rainMonths,
  );
  return new Map(
    entries.map((entry) => {
      const told = new Set([...(fromDraft.get(entry.id) ?? []), ...savedOfSky(entry)]);
      return [entry.id, ENTRY_ADVICE.filter((one) => told.has(one))];
    }),
  );
}

/** While somebody lets an entry go by another sign, nothing is known of the sky until it is saved. */
export function savedOfSky({ saved, content }: ShownEntry): EntryAdvice[] {
  const isSame =
    saved !== null &&
    sameJson(saved.content.lead, content.lead) &&
    saved.content.record?.trust.sinceYear === content.record?.trust.sinceYear;
  return isSame ? (saved.advice ?? []).filter((one) => OF_THE_SKY.includes(one)) : [];
}

/** How many things there are to look at in an entry. */
export function thingsToLookAt({ dates }: ShownEntry, advice: readonly EntryAdvice[] = []): number {
  return (dates?.warnings.length ?? 0) + advice.length;
}
