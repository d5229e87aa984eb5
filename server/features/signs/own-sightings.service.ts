import { wasPublished } from '#shared/calendar/version-state.js';
import type { EntryInput } from '#shared/contracts/calendars.js';
import { SIGHTINGS_MAX, type OwnSeen, type SightingInput } from '#shared/contracts/signs.js';
import { randomUUID } from 'node:crypto';
import { In, MoreThanOrEqual, type DataSource, type EntityManager } from 'typeorm';
import { EntryEntity } from '../../db/entities/entry.entity.js';
import { OwnSightingEntity } from '../../db/entities/own-sighting.entity.js';
import { VersionEntryEntity } from '../../db/entities/version-entry.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import { seesDrafts, type Actor } from '../../http/actor.js';
import { conflict, notFound } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { entrySight } from '../../policy/entry-sight.js';
import { viewerOf } from '../../policy/viewer.js';
import { recordAudit } from '../audit/audit.service.js';
import { markerKeyOfLead } from '../calendars/sky-dates.service.js';
import { personNames } from '../people/person-names.service.js';
import { toSighting } from './signs.mapper.js';
import { expectDayTold, firstDayTold } from './signs.repository.js';

interface OwnSign {
  calendarId: string;
  entryId: string;
  ownId: string;
}

/**
 * When signs in the own words of entries were seen. Whoever sees the sign in its entry may say so, and reads what others
 * said: a sighting is never seen by more people than its entry.
 */
export class OwnSightingsService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
  ) {}

  async list(actor: Actor): Promise<OwnSeen[]> {
    const { manager } = this.dataSource;
    const { today } = await viewerOf(manager, actor, this.clock.now());
    const rows = await manager.find(OwnSightingEntity, {
      where: {
        entry: { calendar: { communityId: actor.communityId } },
        day: MoreThanOrEqual(firstDayTold(today)),
      },
      order: { day: 'DESC', markedAt: 'DESC', id: 'ASC' },
    });
    const seen = await this.signsSeenBy(manager, actor, [...new Set(rows.map(({ entryId }) => entryId))]);
    return this.toOwnSeen(
      manager,
      actor,
      rows.filter(({ entryId, ownId }) => seen.has(keyOf(entryId, ownId))),
    );
  }

  async mark(actor: Actor, sign: OwnSign, { day, who }: SightingInput): Promise<OwnSeen> {
    const { entryId, ownId } = sign;
    return inTransaction(this.dataSource, async (manager) => {
      await this.expectSeen(manager, actor, sign);
      const { today } = await viewerOf(manager, actor, this.clock.now());
      expectDayTold(day, today);
      const since = MoreThanOrEqual(firstDayTold(today));
      const count = await manager.countBy(OwnSightingEntity, { entryId, ownId, day: since });
      if (count >= SIGHTINGS_MAX) throw conflict('seen-often-enough');
      const by = { markedBy: actor.person.id, markedAt: this.clock.now() };
      await manager.insert(OwnSightingEntity, { id: randomUUID(), entryId, ownId, day, who, ...by });
      await this.record(manager, actor, sign, 'own-sign-seen');
      return this.describe(manager, actor, sign, today);
    });
  }

  async takeBack(actor: Actor, sign: OwnSign, seenId: string): Promise<OwnSeen> {
    const { entryId, ownId } = sign;
    return inTransaction(this.dataSource, async (manager) => {
      await this.expectSeen(manager, actor, sign);
      const row = await manager.findOneBy(OwnSightingEntity, { id: seenId, entryId, ownId });
      if (row === null) throw notFound();
      if (row.markedBy !== actor.person.id) throw conflict('not-the-marker');
      await manager.delete(OwnSightingEntity, { id: seenId });
      await this.record(manager, actor, sign, 'own-sign-seen-taken-back');
      const { today } = await viewerOf(manager, actor, this.clock.now());
      return this.describe(manager, actor, sign, today);
    });
  }

  private async expectSeen(
    manager: EntityManager,
    actor: Actor,
    { calendarId, entryId, ownId }: OwnSign,
  ): Promise<void> {
    const isThere = await manager.existsBy(EntryEntity, { id: entryId, calendarId });
    const seen = await this.signsSeenBy(manager, actor, isThere ? [entryId] : []);
    if (!seen.has(keyOf(entryId, ownId))) throw notFound();
  }

  /** Own signs of entries that somebody sees: of drafts for whoever reads drafts, of published versions for everybody. */
  private async signsSeenBy(
    manager: EntityManager,
    actor: Actor,
    entryIds: readonly string[],
  ): Promise<Set<string>> {
    const rows = await manager.findBy(EntryEntity, { id: In([...entryIds]) });
    const things = rows.map(({ id, content }) => ({
      entryId: id,
      markerKey: markerKeyOfLead(content.lead),
      content,
    }));
    const sight = await entrySight(manager, await viewerOf(manager, actor, this.clock.now()), things);
    const seen = things.filter((thing) => sight.appearance(thing) === 'full');
    const drafted = seesDrafts(actor) ? seen : [];
    const published = await publishedContents(
      manager,
      seen.map(({ entryId }) => entryId),
    );
    return new Set(
      [...drafted, ...published].flatMap(({ entryId, content }) =>
        ownIdsOf(content).map((ownId) => keyOf(entryId, ownId)),
      ),
    );
  }

  private async describe(
    manager: EntityManager,
    actor: Actor,
    { entryId, ownId }: OwnSign,
    today: string,
  ): Promise<OwnSeen> {
    const rows = await manager.find(OwnSightingEntity, {
      where: { entryId, ownId, day: MoreThanOrEqual(firstDayTold(today)) },
      order: { day: 'DESC', markedAt: 'DESC', id: 'ASC' },
    });
    const [said] = await this.toOwnSeen(manager, actor, rows);
    return said ?? { entryId, ownId, seen: [] };
  }

  private async toOwnSeen(
    manager: EntityManager,
    actor: Actor,
    rows: readonly OwnSightingEntity[],
  ): Promise<OwnSeen[]> {
    const names = await personNames(
      manager,
      rows.map(({ markedBy }) => markedBy),
    );
    const bySign = new Map<string, OwnSeen>();
    for (const row of rows) {
      const { entryId, ownId } = row;
      const key = keyOf(entryId, ownId);
      const said = bySign.get(key) ?? { entryId, ownId, seen: [] };
      said.seen.push(toSighting(row, names, actor.person.id));
      bySign.set(key, said);
    }
    return [...bySign.values()];
  }

  private async record(
    manager: EntityManager,
    actor: Actor,
    { calendarId, entryId }: OwnSign,
    action: 'own-sign-seen' | 'own-sign-seen-taken-back',
  ): Promise<void> {
    await recordAudit(manager, {
      at: this.clock.now(),
      communityId: actor.communityId,
      actorId: actor.person.id,
      action,
      subjectType: 'entry',
      subjectId: entryId,
      details: { calendarId },
    });
  }
}

function keyOf(entryId: string, ownId: string): string {
  return `${entryId} ${ownId}`;
}

function ownIdsOf({ record }: Pick<EntryInput, 'record'>): string[] {
  return (record?.signs.list ?? []).flatMap(({ ownId }) => ownId ?? []);
}

/** Whatever was published of entries, also in versions that were replaced since. */
async function publishedContents(
  manager: EntityManager,
  entryIds: readonly string[],
): Promise<{ entryId: string; content: EntryInput }[]> {
  const rows = await manager.find(VersionEntryEntity, {
    where: { entryId: In([...entryIds]), stands: true },
    relations: { calendarVersion: true },
  });
  return rows
    .filter(({ calendarVersion }) => wasPublished(calendarVersion.state))
    .map(({ entryId, bodyText }) => ({
      entryId,
      content: (JSON.parse(bodyText) as { content: EntryInput }).content,
    }));
}
