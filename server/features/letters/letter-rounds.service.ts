import { KEPT_DAYS } from '#shared/contracts/privacy.js';
import { subDays } from 'date-fns';
import { In, LessThan, type EntityManager } from 'typeorm';
import { LetterEntity } from '../../db/entities/letter.entity.js';
import type { LetterPlannerService } from './letter-planner.service.js';
import type { LetterSenderService } from './letter-sender.service.js';

/** One round looks what waits and sends what is due. Rounds of one process never overlap. */
export class LetterRounds {
  private timer: NodeJS.Timeout | null = null;
  private running: Promise<void> | null = null;

  constructor(
    private readonly planner: LetterPlannerService,
    private readonly sender: LetterSenderService,
  ) {}

  /** By hand, for tests; one that is under way is waited for. */
  async run(): Promise<void> {
    await this.running;
    this.running = this.planner.plan().then(() => this.sender.sendDue());
    try {
      await this.running;
    } finally {
      this.running = null;
    }
  }

  start(everyMs: number, onTrouble: (error: unknown) => void): void {
    this.timer = setInterval(() => {
      if (this.running === null) this.run().catch(onTrouble);
    }, everyMs);
    this.timer.unref();
  }

  /** Begins no further round and waits for the one under way. */
  async close(): Promise<void> {
    if (this.timer !== null) clearInterval(this.timer);
    await this.running?.catch(() => undefined);
  }
}

/** Old letters go; by then nothing that they were about is in review any more. */
export async function removeOldLetters(manager: EntityManager, now: Date): Promise<void> {
  await manager.delete(LetterEntity, { createdAt: LessThan(subDays(now, KEPT_DAYS.letter)) });
}

/** After older tables came back: what waits in them may have gone since, and nobody gets a letter twice. */
export async function holdLettersBack(manager: EntityManager): Promise<void> {
  await manager.update(LetterEntity, { state: In(['waiting', 'sending']) }, { state: 'unsure' });
}
