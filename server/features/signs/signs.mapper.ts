import type { Sighting, Sign, SignInput } from '#shared/contracts/signs.js';
import type { SignSightingEntity } from '../../db/entities/sign-sighting.entity.js';
import type { SignEntity, SignWords } from '../../db/entities/sign.entity.js';
import type { Shared } from '../../policy/policy.js';

export interface SignFacts {
  row: SignEntity;
  shared: Shared;
  sightings: readonly SignSightingEntity[];
  names: ReadonlyMap<string, string>;
  /** Who asks. */
  personId: string;
  mine: boolean;
}

export function toSign({ row, shared, sightings, names, personId, mine }: SignFacts): Sign {
  return {
    ...row.words,
    sharingLevel: shared.level,
    sharing: shared.details,
    id: row.id,
    communityId: row.communityId,
    seen: sightings.map((sighting) => toSighting(sighting, names, personId)),
    updatedBy: names.get(row.updatedBy) ?? '',
    updatedAt: row.updatedAt.toISOString(),
    version: row.version,
    mine,
  };
}

export function toSighting(
  { id, day, who, markedBy, markedAt }: Omit<SignSightingEntity, 'sign' | 'signId'>,
  names: ReadonlyMap<string, string>,
  personId: string,
): Sighting {
  const mine = markedBy === personId;
  return { id, day, who, markedBy: names.get(markedBy) ?? '', markedAt: markedAt.toISOString(), mine };
}

/** What is said of it, without how it is shared. */
export function wordsOf({ type, name, look, where, usual, stillSeen }: SignInput): SignWords {
  return { type, name, look, where, usual, stillSeen };
}
