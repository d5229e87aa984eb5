import { unnamedMoons } from '#shared/contracts/local-months.js';
import type {
  ChangePasswordInput,
  FirstStewardInput,
  RedeemCodeInput,
  ResetPasswordInput,
} from '#shared/contracts/session.js';
import { randomUUID, timingSafeEqual } from 'node:crypto';
import { IsNull, MoreThan, type DataSource, type EntityManager } from 'typeorm';
import { CommunityEntity } from '../../db/entities/community.entity.js';
import { MembershipEntity } from '../../db/entities/membership.entity.js';
import { OneTimeCodeEntity } from '../../db/entities/one-time-code.entity.js';
import { PersonEntity } from '../../db/entities/person.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import { membershipsHere, type Person } from '../../http/actor.js';
import { AppError, conflict, invalidField } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { recordAudit } from '../audit/audit.service.js';
import { endSessionsOf } from './end-sessions.service.js';
import { CODE_TRIES, codeHash } from './one-time-codes.service.js';
import { hashPassword, passwordMatches } from './passwords.service.js';

export class SessionService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
  ) {}

  /** The person whose password this is; null otherwise, after the same time. */
  async findByPassword(email: string, password: string): Promise<Person | null> {
    const row = await this.dataSource.getRepository(PersonEntity).findOne({ where: { email } });
    return (await passwordMatches(row?.passwordHash ?? null, password)) ? row : null;
  }

  async findPerson(id: string): Promise<Person | null> {
    return this.dataSource.getRepository(PersonEntity).findOne({ where: { id } });
  }

  async membershipsOf(person: Person | null): Promise<MembershipEntity[]> {
    if (person === null) return [];
    return this.dataSource.getRepository(MembershipEntity).find({
      where: membershipsHere(person),
      relations: { community: true },
      order: { community: { name: 'ASC' } },
    });
  }

  /** Sets a new password and ends every session of the person; the caller signs the present one in again. */
  async changePassword(person: Person, input: ChangePasswordInput): Promise<void> {
    const newHash = await hashPassword(input.newPassword);
    await inTransaction(this.dataSource, async (manager) => {
      const row = await manager.findOneOrFail(PersonEntity, {
        where: { id: person.id },
        lock: { mode: 'pessimistic_write' },
      });
      if (!(await passwordMatches(row.passwordHash, input.currentPassword))) {
        throw invalidField('currentPassword', 'wrong-current-password');
      }
      await this.setPassword(manager, row.id, newHash);
    });
  }

  /** Uses a one-time code up. Wrong tries are counted on the code, so that it cannot be guessed slowly. */
  async redeemCode(input: RedeemCodeInput): Promise<Person> {
    const newHash = await hashPassword(input.newPassword);
    const person = await inTransaction(this.dataSource, async (manager) => {
      const row = await manager.findOne(PersonEntity, { where: { email: input.email } });
      const code = row && (await this.openCode(manager, 'join', row.id));
      if (!row || !code) return null;
      if (!sameHash(code.codeHash, codeHash(input.code))) {
        await manager.update(OneTimeCodeEntity, { id: code.id }, { failedTries: code.failedTries + 1 });
        return null;
      }
      await manager.update(OneTimeCodeEntity, { id: code.id }, { usedAt: this.clock.now() });
      await this.setPassword(manager, row.id, newHash);
      return row;
    });
    if (person === null) throw new AppError('code-not-valid');
    return person;
  }

  /** The link of a letter. It works once, and every other such link of the person is void with it. */
  async resetPassword({ token, newPassword }: ResetPasswordInput): Promise<Person> {
    const newHash = await hashPassword(newPassword);
    const now = this.clock.now();
    return inTransaction(this.dataSource, async (manager) => {
      const code = await manager.findOne(OneTimeCodeEntity, {
        where: {
          id: token.split('.')[0] ?? '',
          purpose: 'reset',
          usedAt: IsNull(),
          expiresAt: MoreThan(now),
        },
        lock: { mode: 'pessimistic_write' },
      });
      if (!code?.personId || !sameHash(code.codeHash, codeHash(token))) {
        throw new AppError('link-not-valid');
      }
      const { personId } = code;
      await manager.update(OneTimeCodeEntity, { personId, usedAt: IsNull() }, { usedAt: now });
      await this.setPassword(manager, personId, newHash);
      return manager.findOneByOrFail(PersonEntity, { id: personId });
    });
  }

  /** Founds the first community. The link works once. */
  async setUpFirstSteward(input: FirstStewardInput): Promise<Person> {
    const passwordHash = await hashPassword(input.newPassword);
    const now = this.clock.now();
    return inTransaction(this.dataSource, async (manager) => {
      const code = await this.openCode(manager, 'first-steward', null);
      if (!code) throw conflict('set-up-done');
      if (!sameHash(code.codeHash, codeHash(input.token))) throw new AppError('code-not-valid');
      await manager.update(OneTimeCodeEntity, { id: code.id }, { usedAt: now });

      const personId = randomUUID();
      const communityId = randomUUID();
      await manager.insert(PersonEntity, {
        id: personId,
        email: input.email,
        displayName: input.displayName,
        passwordHash,
        isDemo: false,
        createdAt: now,
      });
      await manager.insert(CommunityEntity, {
        ...EMPTY_SETTINGS,
        id: communityId,
        name: input.communityName,
        createdAt: now,
      });
      await manager.insert(MembershipEntity, { id: randomUUID(), personId, communityId, roles: ['steward'] });
      const about = { at: now, communityId, actorId: personId, subjectId: communityId } as const;
      await recordAudit(manager, { ...about, action: 'community-founded', subjectType: 'community' });
      return manager.findOneOrFail(PersonEntity, { where: { id: personId } });
    });
  }

  private async setPassword(manager: EntityManager, personId: string, passwordHash: string): Promise<void> {
    await manager.update(PersonEntity, { id: personId }, { passwordHash });
    await endSessionsOf(manager, personId);
    const about = {
      at: this.clock.now(),
      communityId: null,
      actorId: personId,
      subjectId: personId,
    } as const;
    await recordAudit(manager, { ...about, action: 'password-set', subjectType: 'person' });
  }

  private openCode(
    manager: EntityManager,
    purpose: OneTimeCodeEntity['purpose'],
    personId: string | null,
  ): Promise<OneTimeCodeEntity | null> {
    return manager
      .findOne(OneTimeCodeEntity, {
        where: {
          purpose,
          personId: personId ?? IsNull(),
          usedAt: IsNull(),
          expiresAt: MoreThan(this.clock.now()),
        },
        order: { expiresAt: 'DESC' },
        lock: { mode: 'pessimistic_write' },
      })
      .then((code) => (code && code.failedTries < CODE_TRIES ? code : null));
  }
}

/** What a steward fills in first; the rule asks for one elder and the steward until the village decides. */
const EMPTY_SETTINGS = {
  villageLanguageTag: 'und',
  villageLanguageName: '–',
  officerLanguageTag: 'en',
  officerLanguageName: 'English',
  yearStartMonth: 1,
  yearStartDay: 1,
  yearStartNote: '',
  localMonths: [],
  moonNames: unnamedMoons(),
  weatherContact: '',
  agricultureContact: '',
  signOffRule: { minElders: 1, mustSign: [], oneOf: [], steward: true },
};

function sameHash(a: string, b: string): boolean {
  return timingSafeEqual(Buffer.from(a), Buffer.from(b));
}
