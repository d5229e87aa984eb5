import { addMinutes, subMinutes } from 'date-fns';
import { LessThan, LessThanOrEqual, type DataSource } from 'typeorm';
import { LetterEntity } from '../../db/entities/letter.entity.js';
import type { Clock } from '../../http/context.js';
import { MailError, type Mailer, type OutgoingLetter } from '../../mail/mailer.js';
import type { LetterWriterService } from './letter-writer.service.js';

/** Pauses between attempts; the last one repeats until the letter is given up. */
const PAUSES_MINUTES = [1, 5, 30, 120, 360, 720];
const AT_ONCE = 20;
/** Longer than any attempt takes: whoever was sending has ended without a word. */
const LAPSED_MINUTES = 10;

/**
 * Sends what is due, never twice. A row is claimed by one conditional update before anything is handed over; where
 * the end of that is not known, it counts as perhaps sent and is left to people.
 */
export class LetterSenderService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly writer: LetterWriterService,
    private readonly mailer: Mailer,
  ) {}

  async sendDue(): Promise<void> {
    const now = this.clock.now();
    await this.rows.update(
      { state: 'sending', nextAt: LessThan(subMinutes(now, LAPSED_MINUTES)) },
      { state: 'unsure', reason: 'interrupted', email: null },
    );
    const due = await this.rows.find({
      where: { state: 'waiting', nextAt: LessThanOrEqual(now) },
      order: { nextAt: 'ASC' },
      take: AT_ONCE,
    });
    for (const row of due) await this.sendOne(row);
  }

  private async sendOne(row: LetterEntity): Promise<void> {
    if (row.giveUpAt <= this.clock.now()) {
      await this.settle(row, 'waiting', { state: 'given-up', reason: row.reason ?? 'too-late' });
      return;
    }
    const written = await this.writer.write(row);
    if ('dropped' in written) {
      await this.settle(row, 'waiting', { state: 'dropped', reason: written.dropped });
      return;
    }
    if ('notBefore' in written) {
      await this.rows.update({ id: row.id, state: 'waiting' }, { nextAt: written.notBefore });
      return;
    }
    const { affected } = await this.rows.update(
      { id: row.id, state: 'waiting', attempts: row.attempts },
      { state: 'sending', attempts: row.attempts + 1, nextAt: this.clock.now() },
    );
    if (affected === 1) await this.handOver(row, written.letter);
  }

  private async handOver(row: LetterEntity, letter: OutgoingLetter): Promise<void> {
    try {
      await this.mailer.send(letter);
    } catch (error) {
      if (!(error instanceof MailError)) throw error;
      await this.settleTrouble(row, error.trouble);
      return;
    }
    await this.settle(row, 'sending', { state: 'sent', reason: null, sentAt: this.clock.now() });
  }

  private async settleTrouble(row: LetterEntity, trouble: MailError['trouble']): Promise<void> {
    if (trouble === 'refused') await this.settle(row, 'sending', { state: 'given-up', reason: trouble });
    else if (trouble === 'unsure')
      await this.settle(row, 'sending', { state: 'unsure', reason: 'interrupted' });
    else {
      const pause = PAUSES_MINUTES[Math.min(row.attempts, PAUSES_MINUTES.length - 1)] ?? 1;
      const nextAt = addMinutes(this.clock.now(), pause);
      await this.rows.update({ id: row.id, state: 'sending' }, { state: 'waiting', reason: trouble, nextAt });
    }
  }

  /** The end of a letter. The address that somebody typed is not kept any longer. */
  private async settle(
    { id }: LetterEntity,
    from: LetterEntity['state'],
    change: Pick<LetterEntity, 'state' | 'reason'> & { sentAt?: Date },
  ): Promise<void> {
    await this.rows.update({ id, state: from }, { ...change, email: null });
  }

  private get rows() {
    return this.dataSource.getRepository(LetterEntity);
  }
}
