import { In, LessThan, type EntityManager } from 'typeorm';
import { AttachmentEntity } from '../../db/entities/attachment.entity.js';
import { AuditEventEntity } from '../../db/entities/audit-event.entity.js';
import { CalendarVersionEntity } from '../../db/entities/calendar-version.entity.js';
import { CalendarEntity } from '../../db/entities/calendar.entity.js';
import { CommunityEntity } from '../../db/entities/community.entity.js';
import { EntryEntity } from '../../db/entities/entry.entity.js';
import { SignEntity } from '../../db/entities/sign.entity.js';
import { FigureEntity } from '../../db/entities/figure.entity.js';
import { PlaceEntity } from '../../db/entities/place.entity.js';
import { VillageGroupEntity } from '../../db/entities/village-group.entity.js';
import { appearance, maySeeByLevel, type Appearance } from '../../policy/policy.js';
import { sharedById } from '../../policy/sharing.repository.js';
import { withinSight } from '../sharing/within-sight.service.js';
import type { Viewer } from '../../policy/viewer.js';
import { personNames } from '../people/person-names.service.js';

type SubjectType = AuditEventEntity['subjectType'];

/** Newest first, from before the given sequence on. */
export async function auditPage(
  manager: EntityManager,
  communityId: string,
  before: string | null,
  limit: number,
): Promise<AuditEventEntity[]> {
  return manager.find(AuditEventEntity, {
    where: before === null ? { communityId } : { communityId, sequence: LessThan(before) },
    order: { sequence: 'DESC' },
    take: limit,
  });
}

/** How each kind of subject is called today, by id. A calendar is called by its place and year. */
const NAMES: Readonly<
  Record<SubjectType, (manager: EntityManager, ids: string[]) => Promise<Map<string, string>>>
> = {
  person: (manager, ids) => personNames(manager, ids),
  community: async (manager, ids) =>
    new Map((await manager.findBy(CommunityEntity, { id: In(ids) })).map(({ id, name }) => [id, name])),
  place: async (manager, ids) =>
    new Map((await manager.findBy(PlaceEntity, { id: In(ids) })).map(({ id, name }) => [id, name])),
  figure: async (manager, ids) =>
    new Map(
      (await manager.findBy(FigureEntity, { id: In(ids) })).map(({ id, names }) => [
        id,
        names[0]?.name ?? '',
      ]),
    ),
  sign: async (manager, ids) =>
    new Map((await manager.findBy(SignEntity, { id: In(ids) })).map(({ id, words }) => [id, words.name])),
  entry: async (manager, ids) =>
    new Map(
      (await manager.findBy(EntryEntity, { id: In(ids) })).map(({ id, content }) => [
        id,
        content.titleOfficer,
      ]),
    ),
  group: async (manager, ids) =>
    new Map((await manager.findBy(VillageGroupEntity, { id: In(ids) })).map(({ id, name }) => [id, name])),
  /** A note has no name of its own. */
  note: () => Promise.resolve(new Map<string, string>()),
  calendar: async (manager, ids) =>
    new Map(
      (await manager.find(CalendarEntity, { where: { id: In(ids) }, relations: { place: true } })).map(
        ({ id, place, year }) => [id, `${place.name} ${year}`],
      ),
    ),
  attachment: async (manager, ids) =>
    new Map(
      (await manager.findBy(AttachmentEntity, { id: In(ids) })).flatMap(({ id, title }) =>
        title === '' ? [] : [[id, title] as const],
      ),
    ),
  version: async (manager, ids) =>
    new Map(
      (
        await manager.find(CalendarVersionEntity, {
          where: { id: In(ids) },
          select: { id: true, calendar: { id: true, year: true, place: { id: true, name: true } } },
          relations: { calendar: { place: true } },
        })
      ).map(({ id, calendar }) => [id, `${calendar.place.name} ${calendar.year}`]),
    ),
};

/** Names of all subjects of the rows, by id; what is gone has none. */
export async function subjectNames(
  manager: EntityManager,
  rows: readonly AuditEventEntity[],
): Promise<Map<string, string>> {
  const names = new Map<string, string>();
  for (const type of new Set(rows.map(({ subjectType }) => subjectType))) {
    const ids = rows.flatMap((row) => (row.subjectType === type && row.subjectId ? [row.subjectId] : []));
    if (ids.length === 0) continue;
    for (const [id, name] of await NAMES[type](manager, [...new Set(ids)])) names.set(id, name);
  }
  return names;
}

/** Subjects that have a level of their own. */
const LEVELLED = ['entry', 'figure', 'note', 'attachment', 'sign'] as const;

/** How each row's subject appears to a person: what leaves no trace for them leaves none in the records either. */
export async function subjectAppearances(
  manager: EntityManager,
  viewer: Viewer,
  rows: readonly AuditEventEntity[],
): Promise<(row: AuditEventEntity) => Appearance> {
  const found = new Map<string, Appearance>();
  for (const type of LEVELLED) {
    const ids = rows.flatMap((row) => (row.subjectType === type && row.subjectId ? [row.subjectId] : []));
    const shared = await sharedById(manager, type, ids);
    const full = ids.filter((id) => appearance(viewer, shared.get(id)) === 'full');
    const within = await withinSight(manager, viewer, type, [...new Set(full)]);
    for (const id of ids) {
      const thing = shared.get(id);
      const own = appearance(viewer, thing);
      const seen = own !== 'full' || within.has(id) ? own : 'none';
      // What only a missing yes hides leaves its records, without its name, to those who may see it by its level.
      found.set(`${type} ${id}`, seen === 'none' && maySeeByLevel(viewer, thing) ? 'blank' : seen);
    }
  }
  return ({ subjectType, subjectId }) =>
    LEVELLED.some((type) => type === subjectType)
      ? (found.get(`${subjectType} ${subjectId}`) ?? 'none')
      : 'full';
}
