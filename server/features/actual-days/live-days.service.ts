import { anchoredDates } from '#shared/calendar/anchors.js';
import type { VersionEntryBody } from '#shared/contracts/versions.js';
import type { EntityManager } from 'typeorm';
import { actualRows } from './known-days.service.js';

/**
 * Entries of a version as far as somebody sees them, with the days that work which is done since has given to those
 * counted from it. What was frozen stays frozen: this is for pages that speak of today. Nothing is told of an entry
 * that the person does not see, for only those at hand are counted from.
 */
export async function withDaysSince<B extends VersionEntryBody>(
  manager: EntityManager,
  year: number,
  entries: readonly B[],
): Promise<B[]> {
  if (!entries.some(({ content }) => content.lead.type === 'entry-actual')) return [...entries];
  const actual = await actualRows(
    manager,
    entries.map(({ entryId }) => entryId),
  );
  const found = anchoredDates(
    entries.map(({ entryId, content, dates }) => ({
      ...{ id: entryId, lead: content.lead, timing: content, dates },
    })),
    year,
    {
      mayHang: () => true,
      actualOf: (entryId) => {
        const row = actual.get(entryId);
        return row ? { from: row.firstDay, to: row.lastDay } : null;
      },
    },
  );
  return entries.map((entry) => {
    const dates = found.get(entry.entryId);
    return dates?.window ? { ...entry, dates } : entry;
  });
}
