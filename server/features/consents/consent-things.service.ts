import type { ConsentItemType } from '#shared/contracts/consents.js';
import { In, type EntityManager } from 'typeorm';
import { MembershipEntity } from '../../db/entities/membership.entity.js';
import { EntryEntity } from '../../db/entities/entry.entity.js';
import { FigureEntity } from '../../db/entities/figure.entity.js';
import { figureIdOf } from '../../policy/entry-sight.js';
import { maySee, maySeeByLevel, type Shared } from '../../policy/policy.js';
import { sharedById } from '../../policy/sharing.repository.js';
import type { Viewer } from '../../policy/viewer.js';
import { markerKeyOfLead } from '../calendars/sky-dates.service.js';

export interface ThingRef {
  itemType: ConsentItemType;
  itemId: string;
}

/** What a consent is about, for one person. */
export interface ConsentThing {
  shared: Shared;
  /** By its level: a thing that only its consent hides is still known to those who ask for it again. */
  isSeen: boolean;
  /** Also by what was agreed: for everybody else a thing that a consent hides is not there. */
  isShown: boolean;
  /** Null where it is not theirs to see, or has no name. */
  title: string | null;
  /**
   * The giver, where they are one of the village's people: not whoever wrote down what somebody else gave. An officer
   * who compiles is a giver only where they are named as one.
   */
  giverId: string | null;
  /** As the thing itself calls them; empty where it does not. */
  giverName: string;
}

export async function consentThings(
  manager: EntityManager,
  viewer: Viewer,
  refs: readonly ThingRef[],
): Promise<(ref: ThingRef) => ConsentThing | undefined> {
  const idsOf = (type: ConsentItemType) =>
    refs.filter(({ itemType }) => itemType === type).map(({ itemId }) => itemId);
  const entries = new Map(
    (await manager.findBy(EntryEntity, { id: In(idsOf('entry')) })).map((row) => [row.id, row.content]),
  );
  const ledBy = (entryId: string) => {
    const content = entries.get(entryId);
    return content === undefined ? null : figureIdOf(markerKeyOfLead(content.lead));
  };
  const figureIds = [
    ...[...entries.keys()].flatMap((entryId) => ledBy(entryId) ?? []),
    ...idsOf('figure'),
    ...idsOf('story'),
  ];
  const names = new Map(
    (await manager.findBy(FigureEntity, { id: In(figureIds) })).map(({ id, names: [first] }) => [
      id,
      first?.name ?? '',
    ]),
  );
  const shared = {
    entry: await sharedById(manager, 'entry', idsOf('entry')),
    figure: await sharedById(manager, 'figure', figureIds),
    story: await sharedById(manager, 'story', idsOf('story')),
    attachment: await sharedById(manager, 'attachment', idsOf('attachment')),
  };
  const officerIds = await officersOf(manager, viewer.communityId);
  return ({ itemType, itemId }) => {
    const own = shared[itemType].get(itemId);
    if (own?.communityId !== viewer.communityId) return undefined;
    // An entry is never wider than the village's own figure that it goes by, nor a story than its figure.
    const figureId = { entry: ledBy, story: (id: string) => id, figure: none, attachment: none }[itemType](
      itemId,
    );
    const both = figureId === null ? [own] : [own, shared.figure.get(figureId)];
    const isSeen = both.every((one) => maySeeByLevel(viewer, one));
    const isShown = both.every((one) => maySee(viewer, one));
    const title = itemType === 'entry' ? entries.get(itemId)?.titleOfficer : names.get(itemId);
    const content = itemType === 'entry' ? entries.get(itemId) : undefined;
    const giverName = content?.giver ?? '';
    const silent = own.giverId !== null && officerIds.has(own.giverId) ? null : own.giverId;
    const giverId = content?.giverId ?? (giverName === '' ? silent : null);
    return { shared: own, isSeen, isShown, title: isSeen ? (title ?? null) : null, giverId, giverName };
  };
}

function none(): null {
  return null;
}

async function officersOf(manager: EntityManager, communityId: string): Promise<ReadonlySet<string>> {
  const members = await manager.findBy(MembershipEntity, { communityId });
  return new Set(members.filter(({ roles }) => roles.includes('officer')).map(({ personId }) => personId));
}
