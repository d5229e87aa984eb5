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

/** Whoever it passes to, where exactly one of the village's people is called so; else it stays for the steward to see to. */
export function passedTo(
  before: SharedAs,
  passTo: string,
  members: readonly Pick<MembershipEntity, 'personId' | 'person'>[],
): SharedAs {
  const called = members.filter(({ person }) => person.displayName === passTo.trim());
  const [heir] = called;
  if (heir === undefined || called.length > 1) return before;
  const { successorId } = before.details;
  return {
    ...before,
    details: { ...before.details, successorId: successorId === heir.personId ? null : successorId },
    giverId: heir.personId,
  };
}
