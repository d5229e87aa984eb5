import { CARD_CODE_LENGTH, type CardHolder, type MadeCard } from '#shared/contracts/cards.js';
import { randomUUID } from 'node:crypto';
import { In, type DataSource, type EntityManager } from 'typeorm';
import { CommunityEntity } from '../../db/entities/community.entity.js';
import { MembershipEntity } from '../../db/entities/membership.entity.js';
import { SignInCardEntity } from '../../db/entities/sign-in-card.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import { hasRole, type Actor } from '../../http/actor.js';
import { AppError, conflict, notFound } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { recordAudit } from '../audit/audit.service.js';
import { personNames } from '../people/person-names.service.js';
import { codeHash, newCode } from '../session/one-time-codes.service.js';
import { endCardOf, mayHaveCard } from './card-ends.service.js';
import { toCardHolder } from './cards.mapper.js';

/** Letters between two hyphens: short enough to keep in mind from the card to the screen. */
const GROUP = 3;

/** The steward makes cards and ends them; whoever has one may end it, too. */
export class CardsService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
  ) {}

  async list(actor: Actor): Promise<CardHolder[]> {
    const { manager } = this.dataSource;
    const { communityId, person } = actor;
    const memberships = await manager.find(MembershipEntity, {
      where: hasRole(actor, 'steward') ? { communityId } : { communityId, personId: person.id },
      relations: { person: true },
      order: { person: { displayName: 'ASC' } },
    });
    return this.describe(manager, memberships);
  }

  /** The code leaves the server with this answer and never again. */
  async make(actor: Actor, personId: string): Promise<MadeCard> {
    const code = newCode(CARD_CODE_LENGTH, GROUP);
    return inTransaction(this.dataSource, async (manager) => {
      const membership = await this.lockedMembership(manager, actor, personId);
      if (!mayHaveCard(membership.roles)) throw conflict('card-too-weak');
      const at = this.clock.now();
      const { communityId } = actor;
      await endCardOf(manager, membership, { at, actorId: actor.person.id, why: 'replaced' });
      await manager.insert(SignInCardEntity, {
        id: randomUUID(),
        ...{ communityId, personId, liveFor: personId, codeHash: codeHash(code) },
        ...{ pinHash: null, failedTries: 0, lockedUntil: null },
        ...{ madeBy: actor.person.id, madeAt: at, lastUsedAt: null, endedAt: null, endedWhy: null },
      });
      await recordAudit(manager, {
        at,
        communityId,
        actorId: actor.person.id,
        action: 'card-made',
        subjectType: 'person',
        subjectId: personId,
      });
      const [holder] = await this.describe(manager, [membership]);
      if (holder === undefined) throw notFound();
      return { holder, code };
    });
  }

  async end(actor: Actor, personId: string): Promise<void> {
    if (personId !== actor.person.id && !hasRole(actor, 'steward')) throw conflict('card-not-yours');
    await inTransaction(this.dataSource, async (manager) => {
      const membership = await this.lockedMembership(manager, actor, personId);
      const ending = { at: this.clock.now(), actorId: actor.person.id, why: 'revoked' as const };
      await endCardOf(manager, membership, ending);
    });
  }

  /** Whose card may be printed: the living one that this code opens. */
  async printable(actor: Actor, personId: string, code: string): Promise<{ villageName: string }> {
    const { manager } = this.dataSource;
    const { communityId } = actor;
    const whose = { communityId, liveFor: personId, codeHash: codeHash(code) };
    if (!(await manager.existsBy(SignInCardEntity, whose))) throw new AppError('code-not-valid');
    const { name } = await manager.findOneByOrFail(CommunityEntity, { id: communityId });
    return { villageName: name };
  }

  private async describe(
    manager: EntityManager,
    memberships: readonly MembershipEntity[],
  ): Promise<CardHolder[]> {
    const [first] = memberships;
    if (first === undefined) return [];
    const rows = await manager.find(SignInCardEntity, {
      where: {
        communityId: first.communityId,
        personId: In(memberships.map(({ personId }) => personId)),
      },
      order: { madeAt: 'ASC' },
    });
    // The living one counts; without one, the latest.
    const latest = new Map<string, SignInCardEntity>();
    for (const row of rows) {
      const before = latest.get(row.personId);
      if (before === undefined || before.liveFor === null) latest.set(row.personId, row);
    }
    const names = await personNames(
      manager,
      rows.map(({ madeBy }) => madeBy),
    );
    const now = this.clock.now();
    return memberships.map((one) => toCardHolder(one, latest.get(one.personId) ?? null, names, now));
  }

  /** Two stewards who make a card for the same person come one after the other. */
  private async lockedMembership(
    manager: EntityManager,
    { communityId }: Actor,
    personId: string,
  ): Promise<MembershipEntity> {
    await manager.findOne(MembershipEntity, {
      where: { communityId, personId },
      lock: { mode: 'pessimistic_write' },
    });
    const row = await manager.findOne(MembershipEntity, {
      where: { communityId, personId },
      relations: { person: true },
    });
    if (row === null) throw notFound();
    return row;
  }
}
