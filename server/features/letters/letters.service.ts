import type { StillToAsk } from '#shared/contracts/letters.js';
import { addDays, addHours } from 'date-fns';
import { createHash, randomUUID } from 'node:crypto';
import { In, IsNull, type DataSource } from 'typeorm';
import { LetterEntity } from '../../db/entities/letter.entity.js';
import { MembershipEntity } from '../../db/entities/membership.entity.js';
import { OneTimeCodeEntity } from '../../db/entities/one-time-code.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import type { Actor } from '../../http/actor.js';
import { conflict, notFound } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { recordAudit } from '../audit/audit.service.js';
import { CODE_LIFETIME_DAYS, codeHash } from '../session/one-time-codes.service.js';
import { letterChoicesOf } from './letter-choices.service.js';
import { invitationCode } from './letter-secrets.js';
import { RESET_HOURS } from './letter-writer.service.js';
import { toStillToAsk, USUAL_CHOICE } from './letters.mapper.js';
import { isTold, stillWaiting, topicOf } from './still-waiting.service.js';

const INVITATION_DAYS = 3;
/** Asking again within it makes no second letter. */
const RESET_PAUSE_MS = 5 * 60_000;

/** What people start by hand: an invitation, a new password; and the list of who is still to be asked. */
export class LettersService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly serverSecret: string,
    readonly on: boolean,
  ) {}

  /** One row for every address, known or not; whose it is, is looked up later. So asking tells nothing. */
  async askForReset(email: string): Promise<void> {
    if (!this.on) return;
    const now = this.clock.now();
    const window = Math.floor(now.getTime() / RESET_PAUSE_MS);
    const address = createHash('sha256').update(email).digest('hex');
    await this.dataSource
      .createQueryBuilder()
      .insert()
      .into(LetterEntity)
      .values({
        ...this.fresh(now),
        kind: 'password-reset',
        onceKey: `reset:${address}:${window}`,
        email,
        giveUpAt: addHours(now, RESET_HOURS),
      })
      .orIgnore()
      .updateEntity(false)
      .execute();
  }

  async invite(actor: Actor, personId: string): Promise<void> {
    const { communityId } = actor;
    await inTransaction(this.dataSource, async (manager) => {
      const membership = await manager.findOne(MembershipEntity, {
        where: { communityId, personId },
        relations: { person: true },
      });
      if (membership === null) throw notFound();
      if (!this.on) throw conflict('letters-off');
      if (membership.person.passwordHash !== null) throw conflict('already-active');
      if (membership.person.email === null) throw conflict('no-address');
      const now = this.clock.now();
      const letter = { ...this.fresh(now), personId, communityId };
      await manager.update(OneTimeCodeEntity, { personId, usedAt: IsNull() }, { usedAt: now });
      await manager.insert(OneTimeCodeEntity, {
        id: letter.id,
        purpose: 'join',
        personId,
        codeHash: codeHash(invitationCode(this.serverSecret, letter.id)),
        failedTries: 0,
        expiresAt: addDays(now, CODE_LIFETIME_DAYS),
        usedAt: null,
      });
      await manager.insert(LetterEntity, {
        ...letter,
        kind: 'invitation',
        onceKey: `invitation:${letter.id}`,
        giveUpAt: addDays(now, INVITATION_DAYS),
      });
      await recordAudit(manager, {
        at: now,
        communityId,
        actorId: actor.person.id,
        action: 'invitation-sent',
        subjectType: 'person',
        subjectId: personId,
      });
    });
  }

  async stillToAsk({ communityId }: Actor): Promise<StillToAsk[]> {
    const { manager } = this.dataSource;
    const all = await stillWaiting(manager, this.clock.now(), { communityId });
    // Who keeps what with whom is not told to those who ask.
    const waiting = all.filter(isTold);
    const ids = waiting.map(({ personId }) => personId);
    const choices = await letterChoicesOf(manager, ids);
    const letters = await manager.find(LetterEntity, {
      where: { communityId, versionId: In(waiting.map(({ version }) => version.id)) },
      order: { createdAt: 'DESC' },
    });
    return waiting.map((one) => {
      const letter = letters.find(({ onceKey }) => onceKey.startsWith(`${topicOf(one)}:`));
      return toStillToAsk(one, choices.get(one.personId) ?? USUAL_CHOICE, letter ?? null);
    });
  }

  private fresh(now: Date) {
    return {
      id: randomUUID(),
      personId: null,
      email: null,
      communityId: null,
      versionId: null,
      state: 'waiting',
      reason: null,
      nextAt: now,
      createdAt: now,
      sentAt: null,
    } as const;
  }
}
