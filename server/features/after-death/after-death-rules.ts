import { SHARING_LEVELS } from '#shared/contracts/sharing.js';
import type { SharedAs } from '../../db/entities/death.entity.js';
import type { MembershipEntity } from '../../db/entities/membership.entity.js';

/** Told among the elders at most, and its giver named by role at most. */
export function tightened({ level, details, giverId }: SharedAs): SharedAs {
  const naming = details.naming === 'named' ? 'role' : details.naming;
  const isWide = SHARING_LEVELS.indexOf(level) < SHARING_LEVELS.indexOf('elders');
  return {
    level: isWide ? 'elders' : level,
    details: { ...details, naming, groupId: isWide ? null : details.groupId },
    giverId,
  };
}

/** Whoever is meant by a name, where exactly one of the village's people is called so; else null: the steward chooses. */
export function heirOf(
  passTo: string,
  members: readonly Pick<MembershipEntity, 'personId' | 'person'>[],
): string | null {
  const called = members.filter(({ person }) => person.displayName === passTo.trim());
  return called.length === 1 ? (called[0]?.personId ?? null) : null;
}

/** Given by the heir from now on, who is no successor of their own. */
export function passedTo(before: SharedAs, heirId: string): SharedAs {
  const { successorId } = before.details;
  return {
    ...before,
    details: { ...before.details, successorId: successorId === heirId ? null : successorId },
    giverId: heirId,
  };
}
