import type { Calendar, CalendarInput } from '#shared/contracts/calendars.js';
import { randomUUID } from 'node:crypto';
import { In, type DataSource } from 'typeorm';
import { CalendarEntity } from '../../db/entities/calendar.entity.js';
import { MembershipEntity } from '../../db/entities/membership.entity.js';
import { PlaceEntity } from '../../db/entities/place.entity.js';
import { isDuplicate } from '../../db/duplicate.js';
import { inTransaction } from '../../db/in-transaction.js';
import { membershipsHere, seesDrafts, type Actor, type Person } from '../../http/actor.js';
import { conflict, invalidField, notFound } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { entrySight, type SeenThing } from '../../policy/entry-sight.js';
import { viewerOf } from '../../policy/viewer.js';
import { recordAudit } from '../audit/audit.service.js';
import { toCalendar } from './calendars.mapper.js';
import { draftThings, publishedFacts, rolledFromYears } from './calendars.repository.js';

export class CalendarsService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
  ) {}

  /** Calendars of the person's communities, newest year first, then by place. */
  async listOf(person: Person, communityId: string | null): Promise<Calendar[]> {
    const memberships = await this.dataSource.getRepository(MembershipEntity).findBy(membershipsHere(person));
    const wanted = memberships.filter((row) => communityId === null || row.communityId === communityId);
    if (communityId !== null && wanted.length === 0) throw notFound();
    const actors = new Map<string, Actor>(
      wanted.map((row) => [row.communityId, { person, communityId: row.communityId, roles: row.roles }]),
    );
    const rows = await this.dataSource.getRepository(CalendarEntity).find({
      where: { communityId: In([...actors.keys()]) },
      relations: { community: true, place: true },
      order: { year: 'DESC', place: { name: 'ASC' }, id: 'ASC' },
    });
    return this.describe(rows, actors);
  }

  async read(actor: Actor, calendarId: string): Promise<Calendar> {
    const row = await this.dataSource.getRepository(CalendarEntity).findOne({
      where: { id: calendarId },
      relations: { community: true, place: true },
    });
    if (row === null) throw notFound();
    const [calendar] = await this.describe([row], new Map([[actor.communityId, actor]]));
    if (!calendar) throw notFound();
    return calendar;
  }

  async create(actor: Actor, { placeId, year }: CalendarInput): Promise<Calendar> {
    const id = randomUUID();
    const at = this.clock.now();
    await inTransaction(this.dataSource, async (manager) => {
      const { communityId } = actor;
      if (!(await manager.existsBy(PlaceEntity, { id: placeId, communityId }))) {
        throw invalidField('placeId', 'unknown-place');
      }
      try {
        await manager.insert(CalendarEntity, {
          id,
          communityId,
          placeId,
          year,
          outNumber: null,
          publishedNumber: null,
          createdAt: at,
          updatedAt: at,
        });
      } catch (error) {
        throw isDuplicate(error) ? conflict('calendar-exists') : error;
      }
      await recordAudit(manager, {
        at,
        communityId,
        actorId: actor.person.id,
        action: 'calendar-begun',
        subjectType: 'calendar',
        subjectId: id,
        details: { placeId, year },
      });
    });
    return this.read(actor, id);
  }

  private async describe(
    rows: readonly CalendarEntity[],
    actors: ReadonlyMap<string, Actor>,
  ): Promise<Calendar[]> {
    if (rows.length === 0) return [];
    const ids = rows.map(({ id }) => id);
    const { manager } = this.dataSource;
    const drafts = await draftThings(manager, ids);
    const published = await publishedFacts(manager, ids);
    const rolled = await rolledFromYears(manager, ids);
    const counted = await Promise.all(
      rows.map(async (row) => {
        const actor = actors.get(row.communityId);
        const facts = published.get(row.id) ?? null;
        const showsDraft = actor !== undefined && seesDrafts(actor);
        const things = showsDraft ? (drafts.get(row.id) ?? []) : (facts?.things ?? []);
        const entryCount = actor === undefined ? 0 : await this.countSeen(actor, things);
        return toCalendar({
          row,
          published: facts,
          entryCount,
          showsDraft,
          rolledFromYear: rolled.get(row.id) ?? null,
        });
      }),
    );
    return counted;
  }

  private async countSeen(actor: Actor, things: readonly SeenThing[]): Promise<number> {
    const { manager } = this.dataSource;
    const sight = await entrySight(manager, await viewerOf(manager, actor, this.clock.now()), things);
    return things.filter((thing) => sight.appearance(thing) === 'full').length;
  }
}
