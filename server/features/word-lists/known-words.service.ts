import type { EntryInput } from '#shared/contracts/calendars.js';
import type { EventRecord } from '#shared/contracts/event-record.js';
import type { VillageWord } from '#shared/contracts/village-word.js';
import type { ListedWord } from '#shared/contracts/word-lists.js';
import type { EntityManager } from 'typeorm';
import { WordListEntity } from '../../db/entities/word-list.entity.js';
import { invalidField } from '../../http/app-error.js';

/** Words of a village by their key, as far as entries use them. */
export interface KnownWords {
  kinds: ReadonlyMap<string, ListedWord>;
  operations: ReadonlyMap<string, ListedWord>;
}

export async function knownWords(manager: EntityManager, communityId: string): Promise<KnownWords> {
  const rows = await manager.findBy(WordListEntity, { communityId });
  const byKey = (name: keyof KnownWords) => {
    const items = rows.find(({ list }) => list === name)?.items ?? [];
    return new Map(items.map((item) => [item.key, item]));
  };
  return { kinds: byKey('kinds'), operations: byKey('operations') };
}

/**
 * A content in the words of the village as they are today. Rules go by the built-in codes alone: a word that the village
 * does not have leaves the code behind, with its usual name.
 */
export function inVillageWords(content: EntryInput, { kinds, operations }: KnownWords): EntryInput {
  const { kindWord: before, ...rest } = content;
  const kindWord = wordFor(kinds, content.kind, before);
  const { record } = content;
  return {
    ...rest,
    ...(kindWord && { kindWord }),
    ...(record && { record: { ...record, what: workInWords(record.what, operations) } }),
  };
}

function workInWords(what: EventRecord['what'], operations: KnownWords['operations']): EventRecord['what'] {
  const { operationWord: before, ...rest } = what;
  if (what.operation === null) return rest;
  const operationWord = wordFor(operations, what.operation, before);
  if (operationWord === undefined) return rest;
  // "Something else" is always said in words, also where the village's own word is not at hand.
  const ownOperation = what.operation === 'other' ? operationWord.word : what.ownOperation;
  return { ...rest, ownOperation, operationWord };
}

function wordFor(
  words: ReadonlyMap<string, ListedWord>,
  code: string,
  before: VillageWord | undefined,
): VillageWord | undefined {
  const own = before?.id === undefined ? undefined : words.get(before.id);
  if (own?.like === code) return { id: own.key, word: own.word };
  const name = words.get(code)?.word ?? '';
  return name === '' ? undefined : { word: name };
}

/** A word of the village's own that is written into an entry stands in its list, and means what the entry says. */
export function expectKnownWords(
  { kind, kindWord, record }: EntryInput,
  { kinds, operations }: KnownWords,
  prefix: string,
): void {
  const expect = (
    words: KnownWords['kinds'],
    code: string | null,
    word: VillageWord | undefined,
    field: string,
  ) => {
    if (word?.id === undefined || words.get(word.id)?.like === code) return;
    throw invalidField(`${prefix}${field}`, 'unknown-word');
  };
  expect(kinds, kind, kindWord, 'kindWord.id');
  const { operation = null, operationWord } = record?.what ?? {};
  expect(operations, operation, operationWord, 'record.what.operationWord.id');
}
