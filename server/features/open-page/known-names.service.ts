import { nameKey, type KnownNames } from '#shared/calendar/names-in-words.js';
import type { EntryInput } from '#shared/contracts/calendars.js';
import { GIVER_BY_ROLE } from '#shared/contracts/sharing.js';
import { resources } from '#shared/locales/index.js';
import { LANGUAGES } from '#shared/locales/languages.js';
import type { EntityManager } from 'typeorm';
import { MembershipEntity } from '../../db/entities/membership.entity.js';

/** "Elder" is nobody's name, in no language, though it stands in "Elder A-1". */
const ROLE_WORDS: ReadonlySet<string> = new Set(
  LANGUAGES.flatMap((language) => Object.values(resources[language].common.role)).map((word) =>
    word.toLowerCase(),
  ),
);

/** Names with the people who are called so: an id each, or nothing but the words of who gave something. */
export interface NamesOfPeople extends KnownNames {
  peopleOf: (name: string) => readonly string[];
}

const WITHOUT_ID = 'giver';

/** Everybody of the village as they are called, and whoever gave something. */
export async function knownNames(
  manager: EntityManager,
  communityId: string,
  givers: readonly Pick<EntryInput, 'giver' | 'giverId'>[],
): Promise<NamesOfPeople> {
  const members = await manager.find(MembershipEntity, {
    where: { communityId },
    relations: { person: true },
  });
  const called = [
    ...members.map(({ person: { id, displayName } }) => ({ name: displayName, who: id })),
    ...givers
      .filter(({ giver }) => giver !== GIVER_BY_ROLE)
      .map(({ giver, giverId }) => ({ name: giver, who: giverId ?? WITHOUT_ID })),
  ].filter(({ name }) => name !== '');
  return {
    names: [...new Set(called.map(({ name }) => name))],
    notNames: ROLE_WORDS,
    peopleOf: (name) => {
      const ofName = called.filter((each) => nameKey(each.name) === nameKey(name));
      return [...new Set(ofName.map(({ who }) => who))].toSorted();
    },
  };
}
