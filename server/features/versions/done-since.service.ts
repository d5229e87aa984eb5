import { anchorOf } from '#shared/calendar/anchors.js';
import { entryDatesFromDays } from '#shared/calendar/entry-dates.js';
import type { DoneSince, VersionEntryBody } from '#shared/contracts/versions.js';
import { dayNumberFromIso } from '#shared/kernel/iso-date.js';
import type { EntityManager } from 'typeorm';
import { actualRows } from '../actual-days/known-days.service.js';

/**
 * What was typed since a version was frozen about work that others of its entries are counted from, with the days that
 * follow. It stands beside the version: the frozen text still says that it waits.
 * @param entries those that the person sees
 */
export async function doneSince(
  manager: EntityManager,
  year: number,
  entries: readonly VersionEntryBody[],
): Promise<DoneSince[]> {
  const seen = new Set(entries.map(({ entryId }) => entryId));
  const hung = entries.flatMap((entry) => {
    const anchorId = entry.content.lead.type === 'entry-actual' ? anchorOf(entry.content.lead) : null;
    return anchorId !== null && seen.has(anchorId) ? [{ ...entry, anchorId }] : [];
  });
  const rows = await actualRows(
    manager,
    hung.map(({ anchorId }) => anchorId),
  );
  return hung.flatMap(({ entryId, anchorId, content, dates: { counted } }): DoneSince[] => {
    const row = rows.get(anchorId);
    if (!row || counted?.basis === 'gone') return [];
    const { firstDay: from, lastDay: to } = row;
    const last = to ?? from;
    if (counted?.basis === 'actual' && counted.from === from && counted.to === last) return [];
    const spell = { first: dayNumberFromIso(from), last: dayNumberFromIso(last) };
    const { window } = entryDatesFromDays(content, year, null, { basis: 'actual', spell, planned: null });
    return [{ entryId, anchorId, from, to, window }];
  });
}
