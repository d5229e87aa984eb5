import { EMPTY_RECORD, RECORD_SIGNS_MAX, type RecordSign } from '#shared/contracts/event-record.js';
import type { EntryInput } from '#shared/contracts/calendars.js';
import { randomUUID } from 'node:crypto';
import { In, type EntityManager } from 'typeorm';
import { SignEntity } from '../../db/entities/sign.entity.js';
import { invalidField } from '../../http/app-error.js';
import { maySee } from '../../policy/policy.js';
import { sharedById } from '../../policy/sharing.repository.js';
import { sharedSignIds, signSight } from '../../policy/sign-sight.js';
import type { Viewer } from '../../policy/viewer.js';

/** A content whose own signs can be told from others, and so be marked as seen, from now on. */
export function withOwnSignIds(content: EntryInput): EntryInput {
  const { record } = content;
  if (record === undefined) return content;
  const list = record.signs.list.map((sign) =>
    sign.sharedId === undefined && sign.ownId === undefined ? { ...sign, ownId: randomUUID() } : sign,
  );
  return { ...content, record: { ...record, signs: { ...record.signs, list } } };
}

interface Writing {
  /** Null for a new entry. */
  entryId: string | null;
  /** What stands there before; null for a new entry. */
  stored: EntryInput | null;
  written: EntryInput;
  /** Where the content stands in the request: `content.`, or nothing. */
  prefix: string;
}

/**
 * A content as it is stored: signs of the village's list say what the list says, whatever was typed. What the writer was
 * not shown stays, because it was not theirs to leave out.
 */
export async function withListedSigns(
  manager: EntityManager,
  viewer: Viewer,
  { entryId, stored, written, prefix }: Writing,
): Promise<EntryInput> {
  const before = new Set(stored === null ? [] : sharedSignIds([stored]));
  const ids = sharedSignIds([written]);
  if (before.size + ids.length === 0) return written;
  const rows = await manager.findBy(SignEntity, { id: In(ids), communityId: viewer.communityId });
  const byId = new Map(rows.map((row) => [row.id, row]));
  const shared = await sharedById(manager, 'sign', ids);
  const list = (written.record?.signs.list ?? []).map((sign, index): RecordSign => {
    const { sharedId } = sign;
    if (sharedId === undefined) return sign;
    const row = byId.get(sharedId);
    const isOffered = row?.takenOutAt === null && maySee(viewer, shared.get(sharedId));
    if (row === undefined || !(isOffered || before.has(sharedId))) {
      throw invalidField(`${prefix}record.signs.list.${index}.sharedId`, 'unknown-sign');
    }
    return { ...row.words, sharedId };
  });
  const hidden = entryId === null || stored === null ? [] : await hiddenSigns(manager, entryId, stored);
  const kept = hidden.filter(({ sharedId }) => sharedId !== undefined && !ids.includes(sharedId));
  if (written.record === undefined && kept.length === 0) return written;
  const record = written.record ?? EMPTY_RECORD;
  const whole = [...list, ...kept].slice(0, RECORD_SIGNS_MAX);
  return { ...written, record: { ...record, signs: { ...record.signs, list: whole } } };
}

/**
 * A content from elsewhere: it refers to signs of this village's list that the person sees; all other signs are its own
 * words from then on.
 */
export async function withSignsOfThisVillage(
  manager: EntityManager,
  viewer: Viewer,
  content: EntryInput,
): Promise<EntryInput> {
  const { record } = content;
  const ids = sharedSignIds([content]);
  if (record === undefined || ids.length === 0) return content;
  const rows = await manager.findBy(SignEntity, { id: In(ids), communityId: viewer.communityId });
  const shared = await sharedById(manager, 'sign', ids);
  const offered = new Set(
    rows.filter((row) => row.takenOutAt === null && maySee(viewer, shared.get(row.id))).map(({ id }) => id),
  );
  const list = record.signs.list.map(({ sharedId, ...words }): RecordSign => {
    return sharedId !== undefined && offered.has(sharedId) ? { ...words, sharedId } : words;
  });
  return { ...content, record: { ...record, signs: { ...record.signs, list } } };
}

/** After the entry and its level are written: it refers to nothing that fewer people see. A refusal takes both back. */
export async function expectTellableSigns(
  manager: EntityManager,
  entryId: string,
  { stored, written, prefix }: Omit<Writing, 'entryId'>,
): Promise<void> {
  const before = new Set(stored === null ? [] : sharedSignIds([stored]));
  const mayTell = await signSight(manager, [{ entryId, content: written }]);
  (written.record?.signs.list ?? []).forEach(({ sharedId }, index) => {
    if (sharedId === undefined || before.has(sharedId) || mayTell(entryId, sharedId)) return;
    throw invalidField(`${prefix}record.signs.list.${index}.sharedId`, 'sign-kept');
  });
}

async function hiddenSigns(
  manager: EntityManager,
  entryId: string,
  content: EntryInput,
): Promise<RecordSign[]> {
  const mayTell = await signSight(manager, [{ entryId, content }]);
  return (content.record?.signs.list ?? []).filter(
    ({ sharedId }) => sharedId !== undefined && !mayTell(entryId, sharedId),
  );
}
