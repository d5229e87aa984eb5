import {
  NOTICE_DAYS_MAX,
  NOTICES_MAX,
  RAIN_DAYS_SHOWN,
  type Notice,
  type NoticeInput,
  type RainDay,
  type RainInput,
  type Weather,
} from '#shared/contracts/weather.js';
import type { AuditAction } from '#shared/contracts/audit.js';
import { addDays, daysBetween } from '#shared/kernel/iso-date.js';
import { randomUUID } from 'node:crypto';
import { LessThanOrEqual, MoreThanOrEqual, type DataSource, type EntityManager } from 'typeorm';
import { RainDayEntity } from '../../db/entities/rain-day.entity.js';
import { WeatherNoticeEntity } from '../../db/entities/weather-notice.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import { hasRole, type Actor } from '../../http/actor.js';
import { conflict, invalidField, notFound } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { villageDay } from '../../policy/viewer.js';
import { recordAudit } from '../audit/audit.service.js';
import { personNames } from '../people/person-names.service.js';

type Action = Extract<AuditAction, 'notice-added' | 'notice-removed' | 'rain-written' | 'rain-removed'>;

/** What the weather service says and what rain there was. Both are the village's: all its people read them. */
export class WeatherService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
  ) {}

  async read(actor: Actor): Promise<Weather> {
    const { manager } = this.dataSource;
    const { communityId } = actor;
    const today = await this.today(manager, actor);
    const rain = await manager.find(RainDayEntity, {
      where: { communityId, day: MoreThanOrEqual(addDays(today, -RAIN_DAYS_SHOWN)) },
      order: { day: 'DESC', writtenAt: 'DESC' },
    });
    const notices = await holdingRows(manager, communityId, today);
    return {
      today,
      notices: await toNotices(manager, notices),
      rain: await toRainDays(manager, actor, rain),
    };
  }

  /** Also those that hold no more. */
  async allNotices(actor: Actor): Promise<Notice[]> {
    const { manager } = this.dataSource;
    const rows = await manager.find(WeatherNoticeEntity, {
      where: { communityId: actor.communityId },
      order: { issuedOn: 'DESC', writtenAt: 'DESC' },
    });
    return toNotices(manager, rows);
  }

  /** What holds on a day, for whoever prints. */
  async noticesOn(communityId: string, day: string): Promise<Notice[]> {
    const { manager } = this.dataSource;
    return toNotices(manager, await holdingRows(manager, communityId, day));
  }

  async addNotice(actor: Actor, input: NoticeInput): Promise<Notice> {
    return inTransaction(this.dataSource, async (manager) => {
      const { communityId } = actor;
      const today = await this.today(manager, actor);
      if (input.issuedOn > today) throw invalidField('issuedOn', 'still-to-come');
      if (input.expiresOn < today) throw invalidField('expiresOn', 'expired-already');
      if (daysBetween(today, input.expiresOn) > NOTICE_DAYS_MAX) {
        throw invalidField('expiresOn', 'holds-too-long');
      }
      if ((await holdingRows(manager, communityId, today)).length >= NOTICES_MAX) {
        throw conflict('too-many-notices');
      }
      const row = { id: randomUUID(), communityId, ...input, ...this.writtenBy(actor) };
      await manager.insert(WeatherNoticeEntity, row);
      await this.record(manager, actor, 'notice-added', row.id);
      const [added] = await toNotices(manager, [row]);
      if (!added) throw notFound();
      return added;
    });
  }

  /** One that is down already stays so. */
  async removeNotice(actor: Actor, id: string): Promise<void> {
    await inTransaction(this.dataSource, async (manager) => {
      const { affected } = await manager.delete(WeatherNoticeEntity, { id, communityId: actor.communityId });
      if ((affected ?? 0) > 0) await this.record(manager, actor, 'notice-removed', id);
    });
  }

  async addRain(actor: Actor, input: RainInput): Promise<RainDay> {
    return inTransaction(this.dataSource, async (manager) => {
      const { communityId } = actor;
      const today = await this.today(manager, actor);
      if (input.day > today) throw invalidField('day', 'still-to-come');
      if (input.day < addDays(today, -RAIN_DAYS_SHOWN)) throw invalidField('day', 'too-long-ago');
      const by = { writtenBy: actor.person.id };
      if (await manager.existsBy(RainDayEntity, { communityId, day: input.day, ...by })) {
        throw invalidField('day', 'rain-of-day-there');
      }
      const row = { id: randomUUID(), communityId, ...input, ...this.writtenBy(actor) };
      await manager.insert(RainDayEntity, row);
      await this.record(manager, actor, 'rain-written', row.id);
      const [added] = await toRainDays(manager, actor, [row]);
      if (!added) throw notFound();
      return added;
    });
  }

  /** What is out already stays so. */
  async removeRain(actor: Actor, id: string): Promise<void> {
    await inTransaction(this.dataSource, async (manager) => {
      const row = await manager.findOneBy(RainDayEntity, { id, communityId: actor.communityId });
      if (row === null) return;
      if (!isTheirs(actor, row)) throw conflict('not-the-marker');
      await manager.delete(RainDayEntity, { id });
      await this.record(manager, actor, 'rain-removed', id);
    });
  }

  private today(manager: EntityManager, { communityId }: Actor): Promise<string> {
    return villageDay(manager, communityId, this.clock.now());
  }

  private writtenBy(actor: Actor) {
    return { writtenBy: actor.person.id, writtenAt: this.clock.now() };
  }

  private async record(
    manager: EntityManager,
    actor: Actor,
    action: Action,
    weatherId: string,
  ): Promise<void> {
    const { communityId } = actor;
    await recordAudit(manager, {
      ...{ at: this.clock.now(), communityId, actorId: actor.person.id, action },
      ...{ subjectType: 'community', subjectId: communityId, details: { weatherId } },
    });
  }
}

function holdingRows(
  manager: EntityManager,
  communityId: string,
  day: string,
): Promise<WeatherNoticeEntity[]> {
  return manager.find(WeatherNoticeEntity, {
    where: { communityId, issuedOn: LessThanOrEqual(day), expiresOn: MoreThanOrEqual(day) },
    order: { issuedOn: 'DESC', writtenAt: 'DESC' },
  });
}

type NoticeRow = Omit<WeatherNoticeEntity, 'community'>;
type RainRow = Omit<RainDayEntity, 'community'>;

function isTheirs(actor: Actor, { writtenBy }: Pick<RainRow, 'writtenBy'>): boolean {
  return writtenBy === actor.person.id || hasRole(actor, 'officer');
}

async function toNotices(manager: EntityManager, rows: readonly NoticeRow[]): Promise<Notice[]> {
  const names = await personNames(
    manager,
    rows.map(({ writtenBy }) => writtenBy),
  );
  return rows.map(({ id, text, issuer, issuedOn, expiresOn, writtenBy, writtenAt }) => ({
    ...{ id, text, issuer, issuedOn, expiresOn },
    ...{ writtenBy: names.get(writtenBy) ?? '', writtenAt: writtenAt.toISOString() },
  }));
}

async function toRainDays(
  manager: EntityManager,
  actor: Actor,
  rows: readonly RainRow[],
): Promise<RainDay[]> {
  const names = await personNames(
    manager,
    rows.map(({ writtenBy }) => writtenBy),
  );
  return rows.map(({ id, day, mm, words, writtenBy }) => {
    const mine = isTheirs(actor, { writtenBy });
    return { id, day, mm, words, writtenBy: names.get(writtenBy) ?? '', mine };
  });
}
