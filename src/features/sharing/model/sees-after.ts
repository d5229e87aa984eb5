import type { Group, ItemSharing } from '#shared/contracts/sharing.js';
import type { Role } from '#shared/contracts/people.js';
import type { SharingValue } from '#src/lib/sharing-fields.js';

interface Seer {
  personId: string;
  roles: readonly Role[];
  groups: readonly Group[];
}

/** Will this person still see the thing, in its season, once it is shared so? To warn before the step; the server decides. */
export function seesAfter(
  { personId, roles, groups }: Seer,
  { giverId }: Pick<ItemSharing, 'giverId'>,
  { level, details }: SharingValue,
): boolean {
  if (giverId === personId) return true;
  switch (level) {
    case 'open':
    case 'village':
      return true;
    case 'group':
      return groups.some(({ id, isMember }) => isMember && id === details.groupId);
    case 'elders':
      return roles.includes('elder');
    case 'sealed':
      return details.successorId === personId;
  }
}
