import { FEEDS_MAX, type Feed, type MadeFeed } from '#shared/contracts/exports.js';
import { createHash, randomBytes, randomUUID } from 'node:crypto';
import type { DataSource, EntityManager } from 'typeorm';
import { CalendarFeedEntity } from '../../db/entities/calendar-feed.entity.js';
import { CalendarVersionEntity } from '../../db/entities/calendar-version.entity.js';
import { MembershipEntity } from '../../db/entities/membership.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import type { Actor } from '../../http/actor.js';
import { conflict, notFound } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { villageDay } from '../../policy/viewer.js';
import { recordAudit } from '../audit/audit.service.js';
import type { CalendarContent, FrozenContentService } from '../versions/frozen-content.service.js';
import { calendarsIcs } from './calendar-ics.js';

const KEY_BYTES = 32;

/** Addresses that a person makes for their own telephone. What one serves is decided anew at every fetch. */
export class FeedsService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly contents: FrozenContentService,
  ) {}

  async list({ communityId, person }: Actor): Promise<Feed[]> {
    const rows = await this.dataSource.manager.find(CalendarFeedEntity, {
      where: { communityId, personId: person.id },
      order: { madeAt: 'ASC', id: 'ASC' },
    });
    return rows.map(toFeed);
  }

  /** The key leaves the server with this answer and never again. */
  async make({ communityId, person: { id: personId } }: Actor): Promise<MadeFeed> {
    const key = randomBytes(KEY_BYTES).toString('base64url');
    return inTransaction(this.dataSource, async (manager) => {
      await manager.findOneOrFail(MembershipEntity, {
        where: { communityId, personId },
        lock: { mode: 'pessimistic_write' },
      });
      if ((await manager.countBy(CalendarFeedEntity, { communityId, personId })) >= FEEDS_MAX) {
        throw conflict('too-many-feeds');
      }
      const row = { id: randomUUID(), communityId, personId, madeAt: this.clock.now(), fetchedOn: null };
      await manager.insert(CalendarFeedEntity, { ...row, keyHash: hashOf(key) });
      await this.record(manager, { communityId, personId }, 'feed-made');
      return { ...toFeed(row), key };
    });
  }

  /** One that is ended already stays so. */
  async end({ communityId, person: { id: personId } }: Actor, feedId: string): Promise<void> {
    await inTransaction(this.dataSource, async (manager) => {
      const { affected } = await manager.delete(CalendarFeedEntity, { id: feedId, communityId, personId });
      if (affected === 1) await this.record(manager, { communityId, personId }, 'feed-ended');
    });
  }

  /** Whoever has the key fetches what its person would be handed today; without a membership there is nothing. */
  async fetch(key: string): Promise<string> {
    const { manager } = this.dataSource;
    const feed = await manager.findOne(CalendarFeedEntity, {
      where: { keyHash: hashOf(key) },
      relations: { person: true },
    });
    if (feed === null) throw notFound();
    const { communityId, personId, person } = feed;
    const membership = await manager.findOneBy(MembershipEntity, { communityId, personId });
    if (membership === null || membership.roles.length === 0) throw notFound();
    const { email, displayName } = person;
    const actor: Actor = {
      person: { id: personId, email, displayName },
      communityId,
      roles: membership.roles,
    };
    const text = calendarsIcs(await this.published(manager, actor));
    const fetchedOn = await villageDay(manager, communityId, this.clock.now());
    if (feed.fetchedOn !== fetchedOn)
      await manager.update(CalendarFeedEntity, { id: feed.id }, { fetchedOn });
    return text;
  }

  /** What stands published now, of every calendar of the village, in the order of their years. */
  private async published(manager: EntityManager, actor: Actor): Promise<CalendarContent[]> {
    const versions = await manager.find(CalendarVersionEntity, {
      where: { state: 'published', calendar: { communityId: actor.communityId } },
      order: { calendar: { year: 'ASC' }, id: 'ASC' },
      select: { id: true, calendarId: true, number: true },
    });
    const contents: CalendarContent[] = [];
    for (const { calendarId, number } of versions) {
      contents.push(await this.contents.readForUse(actor, calendarId, String(number), 'feed'));
    }
    return contents;
  }

  private record(
    manager: EntityManager,
    { communityId, personId }: { communityId: string; personId: string },
    action: 'feed-made' | 'feed-ended',
  ): Promise<void> {
    return recordAudit(manager, {
      at: this.clock.now(),
      ...{ communityId, actorId: personId, action },
      ...{ subjectType: 'person', subjectId: personId },
    });
  }
}

function toFeed({ id, madeAt, fetchedOn }: Pick<CalendarFeedEntity, 'id' | 'madeAt' | 'fetchedOn'>): Feed {
  return { id, madeAt: madeAt.toISOString(), fetchedOn };
}

function hashOf(key: string): string {
  return createHash('sha256').update(key, 'utf8').digest('hex');
}
