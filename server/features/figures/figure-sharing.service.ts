import type { FigureInput } from '#shared/contracts/figures.js';
import { PLAIN_DETAILS } from '#shared/contracts/sharing.js';
import { sameJson } from '#shared/kernel/canonical-json.js';
import type { EntityManager } from 'typeorm';
import { GroupMemberEntity } from '../../db/entities/group-member.entity.js';
import { ItemSharingEntity } from '../../db/entities/item-sharing.entity.js';
import type { Actor } from '../../http/actor.js';
import { invalidField, notFound } from '../../http/app-error.js';
import { insertSharing, lockSharing } from '../../policy/sharing.repository.js';
import { isTighterOrSame, type Sharing } from '#shared/contracts/sharing-tightness.js';

type Levels = Pick<FigureInput, 'sharingLevel' | 'sharing' | 'storyLevel'>;

/** A figure and its story are two things: the name may be the village's while the story is the elders'. */
export async function shareNewFigure(
  manager: EntityManager,
  { communityId, person }: Actor,
  itemId: string,
  input: FigureInput,
): Promise<void> {
  const groupId = input.sharing?.groupId ?? null;
  if (groupId !== null) {
    const inGroup = { groupId, personId: person.id, group: { communityId } };
    if (!(await manager.existsBy(GroupMemberEntity, inGroup))) {
      throw invalidField('sharing.groupId', 'group-of-giver');
    }
  }
  const giverId = person.id;
  await insertSharing(manager, { itemType: 'figure', itemId, communityId, giverId, ...figureSharing(input) });
  await insertSharing(manager, { itemType: 'story', itemId, communityId, giverId, ...storySharing(input) });
}

/** Tells whether anything about it changed. Wider than it was is for the giver and the steward together. */
export async function shareChangedFigure(
  manager: EntityManager,
  itemId: string,
  input: FigureInput,
  storyShown: boolean,
): Promise<boolean> {
  const figure = await changeTo(manager, 'figure', itemId, figureSharing(input), 'sharingLevel');
  if (!storyShown) return figure;
  const story = await changeTo(manager, 'story', itemId, storySharing(input), 'storyLevel');
  return figure || story;
}

async function changeTo(
  manager: EntityManager,
  itemType: 'figure' | 'story',
  itemId: string,
  after: Sharing,
  field: string,
): Promise<boolean> {
  const row = await lockSharing(manager, itemType, itemId);
  if (row === null) throw notFound();
  if (row.level === after.level && sameJson(row.details, after.details)) return false;
  if (!isTighterOrSame(row, after)) throw invalidField(field, 'wider-needs-two');
  await manager.update(
    ItemSharingEntity,
    { itemType, itemId },
    { level: after.level, details: after.details },
  );
  return true;
}

function figureSharing({ sharingLevel, sharing = PLAIN_DETAILS }: Levels): Sharing {
  return { level: sharingLevel, details: fitting(sharingLevel, sharing) };
}

function storySharing({ sharingLevel, storyLevel = sharingLevel, sharing = PLAIN_DETAILS }: Levels): Sharing {
  return { level: storyLevel, details: fitting(storyLevel, sharing) };
}

/** Only a group level has a group. */
function fitting(level: Sharing['level'], details: Sharing['details']): Sharing['details'] {
  return level === 'group' ? details : { ...details, groupId: null };
}
