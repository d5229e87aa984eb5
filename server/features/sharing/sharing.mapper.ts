import type { Group, ItemSharing } from '#shared/contracts/sharing.js';
import type { GroupMemberEntity } from '../../db/entities/group-member.entity.js';
import type { ItemSharingEntity } from '../../db/entities/item-sharing.entity.js';
import type { VillageGroupEntity } from '../../db/entities/village-group.entity.js';

/** @param members with their people */
export function toGroup(
  group: VillageGroupEntity,
  members: readonly GroupMemberEntity[],
  askingId: string,
): Group {
  const isMember = members.some(({ personId }) => personId === askingId);
  return {
    id: group.id,
    name: group.name,
    memberCount: members.length,
    members: isMember
      ? members.map(({ personId, person }) => ({ id: personId, displayName: person.displayName }))
      : null,
    isMember,
    version: group.version,
  };
}

export interface ItemSharingFacts {
  row: ItemSharingEntity;
  names: ReadonlyMap<string, string>;
  groupName: string | null;
  may: ItemSharing['may'];
  /** False where the giver wishes not to be named to this person. */
  namesGiver: boolean;
}

export function toItemSharing({ row, names, groupName, may, namesGiver }: ItemSharingFacts): ItemSharing {
  const nameOf = (id: string | null) => (id === null ? '' : (names.get(id) ?? ''));
  return {
    itemType: row.itemType,
    itemId: row.itemId,
    sharing: { level: row.level, ...row.details },
    groupName,
    giverId: namesGiver ? row.giverId : null,
    giverName: namesGiver ? nameOf(row.giverId) : '',
    successorName: nameOf(row.details.successorId),
    asked: row.asked && {
      sharing: { level: row.asked.level, ...row.asked.details },
      askedByName: nameOf(row.asked.askedBy),
      giverAgreed: row.asked.giverAgreed,
      stewardAgreed: row.asked.stewardAgreed,
    },
    may,
    version: row.version,
  };
}
