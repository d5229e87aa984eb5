import {
  BUILT_IN_WORDS,
  LIKE_CODES,
  OWN_WORDS_MAX,
  plainWord,
  type ListedWord,
  type WordList,
  type WordListInput,
  type WordListName,
  type WordLists,
} from '#shared/contracts/word-lists.js';
import { sameJson } from '#shared/kernel/canonical-json.js';
import { texts as calendarTexts } from '#shared/locales/en/calendars.js';
import { texts as recordTexts } from '#shared/locales/en/record.js';
import { randomUUID } from 'node:crypto';
import type { DataSource, EntityManager } from 'typeorm';
import { WordListEntity } from '../../db/entities/word-list.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import type { Actor } from '../../http/actor.js';
import { conflict, invalidField, stale } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { recordAudit } from '../audit/audit.service.js';
import { lockCommunity } from '../people/people.service.js';
import { renameCropsInDrafts, renamedCrops } from './draft-crops.service.js';

/** What a village calls kinds of events, kinds of work, and crops. Entries ask `known-words.service.ts`. */
export class WordListsService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
  ) {}

  async read({ communityId }: Actor): Promise<WordLists> {
    const { manager } = this.dataSource;
    const rows = await manager.findBy(WordListEntity, { communityId });
    const listOf = (name: WordListName) => whole(name, rows.find(({ list }) => list === name) ?? null);
    return { kinds: listOf('kinds'), operations: listOf('operations'), crops: listOf('crops') };
  }

  /** The whole list, which names each of its words once. Saving what is stored already changes nothing. */
  async save(actor: Actor, list: WordListName, input: WordListInput): Promise<WordList> {
    const { communityId, person } = actor;
    return inTransaction(this.dataSource, async (manager) => {
      await lockCommunity(manager, communityId);
      const row = await manager.findOneBy(WordListEntity, { communityId, list });
      const current = whole(list, row);
      if (current.version !== input.version) throw stale(current, input);
      const items = written(list, current.items, input.items);
      if (sameJson(items, current.items)) return current;
      const at = this.clock.now();
      const version = current.version + 1;
      await manager.upsert(
        WordListEntity,
        { communityId, list, items, version, updatedBy: person.id, updatedAt: at },
        ['communityId', 'list'],
      );
      if (list === 'crops') {
        await renameCropsInDrafts(manager, communityId, renamedCrops(current.items, items));
      }
      await this.record(manager, actor, list, at);
      return { version, items };
    });
  }

  private async record(manager: EntityManager, actor: Actor, list: WordListName, at: Date): Promise<void> {
    await recordAudit(manager, {
      at,
      communityId: actor.communityId,
      actorId: actor.person.id,
      action: 'words-changed',
      subjectType: 'community',
      subjectId: actor.communityId,
      details: { list },
    });
  }
}

/** What is stored, and whatever is built in and does not stand there yet. */
function whole(list: WordListName, row: Pick<WordListEntity, 'items' | 'version'> | null): WordList {
  const items = row?.items ?? [];
  const missing = BUILT_IN_WORDS[list].filter((code) => items.every(({ key }) => key !== code));
  return { version: row?.version ?? 0, items: [...items, ...missing.map(builtIn)] };
}

function builtIn(code: string): ListedWord {
  return { key: code, like: code as ListedWord['like'], word: '', isHidden: false, ...NO_DAYS };
}

/** The items as they are stored: words of the village's own have ids and keep what they behave like. */
function written(
  list: WordListName,
  known: readonly ListedWord[],
  items: readonly ListedWord[],
): ListedWord[] {
  const byKey = new Map(known.map((item) => [item.key, item]));
  const named = items.filter(({ key }) => key !== '');
  const isWhole =
    named.length === known.length &&
    new Set(named.map(({ key }) => key)).size === known.length &&
    named.every(({ key }) => byKey.has(key));
  if (!isWhole) throw conflict('words-differ');
  if (items.length - BUILT_IN_WORDS[list].length > OWN_WORDS_MAX) throw conflict('too-many-words');
  if (list === 'kinds' && items.every(({ isHidden }) => isHidden)) throw conflict('one-kind-stays');
  return items.map((item, index) => {
    const { key, word, isHidden } = item;
    const isOwn = !BUILT_IN_WORDS[list].includes(key);
    const like = isOwn && list !== 'crops' ? (byKey.get(key)?.like ?? item.like) : isOwn ? null : key;
    if (isOwn && word === '') throw invalidField(`items.${String(index)}.word`, 'required');
    if (isOwn && list !== 'crops' && !LIKE_CODES[list].includes(like ?? '')) {
      throw invalidField(`items.${String(index)}.like`, 'not-in-list');
    }
    if (usualNames(list, key, items).has(plainWord(word))) {
      throw invalidField(`items.${String(index)}.word`, 'word-taken');
    }
    const days = list === 'crops' ? { fromDays: item.fromDays, toDays: item.toDays } : NO_DAYS;
    return {
      key: key === '' ? randomUUID() : key,
      like: like as ListedWord['like'],
      word,
      isHidden,
      ...days,
    };
  });
}

const NO_DAYS = { fromDays: null, toDays: null };

/** What the other built-in ones are called in tables and on screens: a word that means one thing means no other. */
function usualNames(list: WordListName, ownKey: string, items: readonly ListedWord[]): Set<string> {
  const names: Readonly<Record<string, string>> =
    list === 'kinds' ? calendarTexts.kind : recordTexts.operation;
  const renamed = new Set(items.flatMap(({ key, word }) => (word === '' ? [] : [key])));
  const others = BUILT_IN_WORDS[list].filter((code) => code !== ownKey);
  return new Set(
    others.flatMap((code) => [
      plainWord(code),
      ...(renamed.has(code) ? [] : [plainWord(names[code] ?? code)]),
    ]),
  );
}
