import { isStarLead } from '#shared/calendar/entry-model.js';
import type { EntryInput } from '#shared/contracts/calendars.js';
import { PLAIN_DETAILS } from '#shared/contracts/sharing.js';
import type { EntityManager } from 'typeorm';
import { ActualDateEntity } from '../../db/entities/actual-date.entity.js';
import { EntryEntity } from '../../db/entities/entry.entity.js';
import { withoutGiver } from '../../policy/giver-naming.js';
import { liveEntries, writeOrder } from './calendars.repository.js';
import { lockCalendar } from './draft.service.js';
import { markerKeyOfLead } from './sky-dates.service.js';

/** Takes an entry out of its draft, for good. */
export async function eraseDraftEntry(manager: EntityManager, entryId: string): Promise<void> {
  const row = await manager.findOneBy(EntryEntity, { id: entryId });
  if (row === null) return;
  await lockCalendar(manager, row.calendarId);
  await manager.delete(EntryEntity, { id: entryId });
  await writeOrder(
    manager,
    (await liveEntries(manager, row.calendarId)).map(({ id }) => id),
  );
}

export async function takeNameOffDraft(manager: EntityManager, entryId: string): Promise<void> {
  const row = await manager.findOneBy(EntryEntity, { id: entryId });
  if (row === null) return;
  const { giverId: _giver, ...content } = row.content;
  // The entry's own words about how it is shared follow, so that the next edit does not ask for a wider circle.
  const sharing = { ...(content.sharing ?? PLAIN_DETAILS), naming: 'not-named' as const };
  await manager.update(EntryEntity, { id: entryId }, { content: { ...withoutGiver(content), sharing } });
  if (content.giver !== '') {
    await manager.update(ActualDateEntity, { entryId, saidBy: content.giver }, { saidBy: '' });
  }
}

/**
 * Entries of drafts that go by a figure which is withdrawn go by its leading star from then on; where it was a patch
 * of sky, they are taken out of the draft and can be put back with another sign.
 */
export async function leadByStarInstead(
  manager: EntityManager,
  entries: readonly EntryEntity[],
  indicatorHr: number | null,
  at: Date,
): Promise<void> {
  for (const { id, content, deletedAt } of entries) {
    const changes =
      indicatorHr === null
        ? { deletedAt: deletedAt ?? at }
        : { content: { ...content, lead: ledBy(content, `hr${indicatorHr}`) } };
    await manager.update(EntryEntity, { id }, changes);
  }
}

function ledBy({ lead }: EntryInput, markerKey: string): EntryInput['lead'] {
  if (isStarLead(lead)) return { ...lead, markerKey };
  if (lead.type === 'sky' && markerKeyOfLead(lead) !== null) {
    return { ...lead, spec: { ...lead.spec, markerKey } as typeof lead.spec };
  }
  return lead;
}
