import { namesIn } from '#shared/calendar/names-in-words.js';
import { OPEN_WORDS, type OpenEntry, type OpenWord } from '#shared/contracts/open-page.js';
import { createHash } from 'node:crypto';
import { In, type EntityManager } from 'typeorm';
import { NoNameEntity } from '../../db/entities/no-name.entity.js';
import type { ContentForEverybody } from '../versions/frozen-content.service.js';
import { knownNames, type NamesOfPeople } from './known-names.service.js';

/** A name that stands in words of an entry, and who said that it is none there. */
export interface NameFound {
  word: OpenWord;
  text: string;
  name: string;
  /** Another one as soon as the words change, or somebody else is called so, too. */
  key: string;
  noName: NoNameEntity | null;
}

/** Where names of people stand in what everybody would read. */
export async function namesFoundIn(
  manager: EntityManager,
  communityId: string,
  { open, givers }: Pick<ContentForEverybody, 'open' | 'givers'>,
): Promise<(entry: OpenEntry) => NameFound[]> {
  const known = await knownNames(manager, communityId, givers);
  const ids = open.map(({ entry: { entryId } }) => entryId);
  const said = ids.length === 0 ? [] : await manager.findBy(NoNameEntity, { entryId: In(ids) });
  return (entry) =>
    OPEN_WORDS.flatMap((word) => {
      const text = entry[word];
      return namesIn(text, known).map((name) => {
        const key = keyOf(text, name, known);
        const noName = said.find(
          (row) => row.entryId === entry.entryId && row.word === word && row.foundKey === key,
        );
        return { word, text, name, key, noName: noName ?? null };
      });
    });
}

function keyOf(text: string, name: string, { peopleOf }: NamesOfPeople): string {
  return createHash('sha256')
    .update(JSON.stringify([text, name, ...peopleOf(name)]))
    .digest('hex');
}
