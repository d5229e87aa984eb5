import { goesAsSeen } from '#shared/calendar/as-seen.js';
import { leadForAnotherYear } from '#shared/calendar/anchors.js';
import type { EntryTiming } from '#shared/calendar/entry-model.js';
import { wordlessTiming } from '#shared/calendar/wordless-timing.js';
import type { EntryInput } from '#shared/contracts/calendars.js';
import { randomUUID } from 'node:crypto';
import { In, type EntityManager } from 'typeorm';
import { EntryVariantEntity } from '../../db/entities/entry-variant.entity.js';
import { EntryEntity } from '../../db/entities/entry.entity.js';
import { RolledItemEntity } from '../../db/entities/rolled-item.entity.js';
import { copySharing } from '../../policy/sharing.repository.js';
import type { DraftEntry } from '../calendars/draft.service.js';

/**
 * Puts every entry of a draft, with the timings beside it, into the draft of another year: in their order, with their
 * givers, levels and consents. Whoever rolls over need not see them; nothing tells how many there were. Answers stay
 * behind, for they belong to a version.
 */
export async function carryOver(
  manager: EntityManager,
  entries: readonly DraftEntry[],
  calendarId: string,
  at: Date,
): Promise<void> {
  const fromIds = entries.map(({ row }) => row.id);
  const variants =
    fromIds.length === 0 ? [] : await manager.findBy(EntryVariantEntity, { entryId: In(fromIds) });
  const newIdOf = new Map([...fromIds, ...variants.map(({ id }) => id)].map((id) => [id, randomUUID()]));
  const newId = (id: string) => newIdOf.get(id) ?? id;
  for (const { row, dates } of entries) {
    await manager.insert(EntryEntity, {
      id: newId(row.id),
      calendarId,
      position: row.position,
      content: nextYears(row.content, newIdOf),
      isOlder: row.isOlder,
      deletedAt: null,
      updatedBy: row.updatedBy,
      updatedAt: at,
    });
    await copySharing(manager, 'entry', row.id, newId(row.id));
    await manager.insert(RolledItemEntity, {
      ...{ itemId: newId(row.id), itemType: 'entry', fromId: row.id, calendarId, before: dates },
      timing: timingBefore(row.content, newIdOf),
    });
  }
  for (const { id, entryId, content, addedAt, updatedBy } of variants) {
    await manager.insert(EntryVariantEntity, {
      ...{ id: newId(id), entryId: newId(entryId), addedAt, updatedBy, updatedAt: at },
      content: { ...content, lead: leadForAnotherYear(content.lead, newIdOf) },
    });
    await copySharing(manager, 'variant', id, newId(id));
    await manager.insert(RolledItemEntity, {
      ...{ itemId: newId(id), itemType: 'variant', fromId: id, calendarId, before: null, timing: null },
    });
  }
}

/** The same words; what points at another thing of the draft points at that thing's own next year. */
function nextYears(content: EntryInput, newIdOf: ReadonlyMap<string, string>): EntryInput {
  const { board } = content;
  const moved = { ...content, lead: leadForAnotherYear(content.lead, newIdOf) };
  if (board === undefined || board.variantId === null) return moved;
  return { ...moved, board: { ...board, variantId: newIdOf.get(board.variantId) ?? board.variantId } };
}

/** On what the days of the old year rest, told by the things of the new draft. */
function timingBefore(content: EntryInput, newIdOf: ReadonlyMap<string, string>): EntryTiming {
  const { lead } = content;
  const known = goesAsSeen(lead) ? lead : leadForAnotherYear(lead, newIdOf);
  return wordlessTiming({ ...content, lead: known });
}
