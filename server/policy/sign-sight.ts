import { keepingSigns } from '#shared/calendar/signs-in.js';
import type { EntryInput } from '#shared/contracts/calendars.js';
import type { EntityManager } from 'typeorm';
import { mayHangOn } from './anchor-sight.js';
import { sharedById } from './sharing.repository.js';

interface Told {
  entryId: string;
  content: EntryInput;
}

/** Signs of the village's list to which contents refer. */
export function sharedSignIds(contents: readonly Pick<EntryInput, 'record'>[]): string[] {
  return contents.flatMap(({ record }) =>
    (record?.signs.list ?? []).flatMap(({ sharedId }) => (sharedId === undefined ? [] : [sharedId])),
  );
}

/**
 * May an entry tell of a sign? Only where everybody who sees the entry may see the sign. Asked anew whenever entries are
 * read: where the sign becomes narrower, is paused or taken back, it is not in its entries either.
 */
export async function signSight(
  manager: EntityManager,
  entries: readonly Told[],
): Promise<(entryId: string, signId: string) => boolean> {
  const signs = await sharedById(manager, 'sign', sharedSignIds(entries.map(({ content }) => content)));
  if (signs.size === 0) return () => false;
  const shared = await sharedById(
    manager,
    'entry',
    entries.map(({ entryId }) => entryId),
  );
  return (entryId, signId) => mayHangOn(shared.get(entryId), signs.get(signId));
}

/** Entries without signs of the list that they may not tell of. */
export async function withTellableSigns<E extends Told>(
  manager: EntityManager,
  entries: readonly E[],
): Promise<E[]> {
  if (sharedSignIds(entries.map(({ content }) => content)).length === 0) return [...entries];
  const mayTell = await signSight(manager, entries);
  return entries.map((entry) => ({
    ...entry,
    content: keepingShared(entry.content, (signId) => mayTell(entry.entryId, signId)),
  }));
}

/** A content with those signs of the list alone that may stay; its own signs always do. */
export function keepingShared<C extends Pick<EntryInput, 'record'>>(
  content: C,
  stays: (signId: string) => boolean,
): C {
  const { record } = content;
  if (sharedSignIds([content]).every(stays) || record === undefined) return content;
  const signs = keepingSigns(record.signs, ({ sharedId }) => sharedId === undefined || stays(sharedId));
  return { ...content, record: { ...record, signs } };
}
