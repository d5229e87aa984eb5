import type { KnownNames } from '#shared/calendar/names-in-words.js';
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

/** Everybody of the village as they are called, and whoever gave something. */
export async function knownNames(
  manager: EntityManager,
  communityId: string,
  givers: readonly string[],
): Promise<KnownNames> {
  const members = await manager.find(MembershipEntity, {
    where: { communityId },
    relations: { person: true },
  });
  const names = [
    ...members.map(({ person: { displayName } }) => displayName),
    ...givers.filter((giver) => giver !== GIVER_BY_ROLE),
  ];
  return { names: [...new Set(names.filter((name) => name !== ''))], notNames: ROLE_WORDS };
}
