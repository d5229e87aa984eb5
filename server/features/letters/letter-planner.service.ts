import { addDays, differenceInHours } from 'date-fns';
import { randomUUID } from 'node:crypto';
import { Like, type DataSource } from 'typeorm';
import { LetterEntity, type LetterKind, type LetterState } from '../../db/entities/letter.entity.js';
import type { Clock } from '../../http/context.js';
import { letterChoicesOf } from './letter-choices.service.js';
import { USUAL_CHOICE } from './letters.mapper.js';
import { afterQuietHours, localDay, nextDigestAt } from './quiet-hours.js';
import { stillWaiting, topicOf, villageTimeZone, type StillWaiting } from './still-waiting.service.js';

/** Days after the first letter. Later than that nobody writes any more: the officer visits. */
const REMINDER_DAYS = [0, 3, 10];
const GIVE_UP_DAYS = 3;
const HOURS_PER_DAY = 24;

/** Puts a letter into the outbox for everything that waits; running again adds nothing. */
export class LetterPlannerService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
  ) {}

  async plan(): Promise<void> {
    const { manager } = this.dataSource;
    const waiting = await stillWaiting(manager, this.clock.now());
    const choices = await letterChoicesOf(
      manager,
      waiting.map(({ personId }) => personId),
    );
    for (const one of waiting) {
      const choice = choices.get(one.personId) ?? USUAL_CHOICE;
      if (choice.channel === 'none' || !one.hasAddress) continue;
      const stage = await this.dueStage(one);
      if (stage === null) continue;
      const timeZone = await villageTimeZone(manager, one.communityId);
      const now = this.clock.now();
      const key = `${topicOf(one)}:${stage}`;
      if (choice.rhythm === 'daily') {
        const at = nextDigestAt(now, timeZone, choice.quietHours);
        const day = localDay(at, timeZone);
        await this.add(one, 'review', key, 'in-digest', at);
        await this.add(one, 'digest', `digest:${one.communityId}:${one.personId}:${day}`, 'waiting', at);
      } else {
        const at = afterQuietHours(now, timeZone, choice.quietHours);
        await this.add(one, stage === 0 ? 'review' : 'reminder', key, 'waiting', at);
      }
    }
  }

  /** Which letter about this is due and not written yet; counted from the first one. */
  private async dueStage(one: StillWaiting): Promise<number | null> {
    const written = await this.dataSource
      .getRepository(LetterEntity)
      .find({ where: { onceKey: Like(`${topicOf(one)}:%`) }, order: { createdAt: 'ASC' } });
    const first = written[0];
    if (first === undefined) return 0;
    const days = differenceInHours(this.clock.now(), first.createdAt) / HOURS_PER_DAY;
    const due = REMINDER_DAYS.findLastIndex((after) => days >= after);
    const last = Math.max(...written.map(({ onceKey }) => Number(onceKey.split(':').at(-1))));
    return due > last ? due : null;
  }

  private async add(
    { personId, communityId, version }: StillWaiting,
    kind: LetterKind,
    onceKey: string,
    state: LetterState,
    at: Date,
  ): Promise<void> {
    const row = {
      id: randomUUID(),
      kind,
      onceKey,
      personId,
      email: null,
      communityId,
      versionId: kind === 'digest' ? null : version.id,
      state,
      reason: null,
      nextAt: at,
      giveUpAt: addDays(at, GIVE_UP_DAYS),
      createdAt: this.clock.now(),
      sentAt: null,
    };
    await this.dataSource
      .createQueryBuilder()
      .insert()
      .into(LetterEntity)
      .values(row)
      .orIgnore()
      .updateEntity(false)
      .execute();
  }
}
