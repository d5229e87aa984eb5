import { HELPING_MINUTES, type Helpable, type HelpingInput } from '#shared/contracts/helping.js';
import { CARD_ROLES, isCardRole } from '#shared/contracts/people.js';
import type { SessionState } from '#shared/contracts/session.js';
import { addMinutes } from 'date-fns';
import { In, IsNull, Not, type DataSource } from 'typeorm';
import { MembershipEntity } from '../../db/entities/membership.entity.js';
import { PersonEntity } from '../../db/entities/person.entity.js';
import type { SessionHelping } from '../../db/entities/session.entity.js';
import { SignInCardEntity } from '../../db/entities/sign-in-card.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import { seesDrafts, type Actor, type Helped, type Person } from '../../http/actor.js';
import { AppError, notFound } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { recordAudit } from '../audit/audit.service.js';
import type { CardSignInService } from '../cards/card-sign-in.service.js';

/** What a session keeps of it. */
interface Kept {
  helping?: SessionHelping;
}

/** Somebody writes for an elder or observer, on this device, for half an hour. */
export class HelpingService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly cards: Pick<CardSignInService, 'proveCard'>,
  ) {}

  async list(actor: Actor): Promise<Helpable[]> {
    const { manager } = this.dataSource;
    const { communityId } = actor;
    const memberships = await manager.find(MembershipEntity, {
      where: { communityId, personId: Not(actor.person.id) },
      relations: { person: true },
    });
    const wanted = seesDrafts(actor) ? CARD_ROLES : (['elder'] as const);
    const found = memberships.filter(({ roles }) => wanted.some((role) => roles.includes(role)));
    const cards = await manager.findBy(SignInCardEntity, {
      communityId,
      liveFor: In(found.map(({ personId }) => personId)),
      pinHash: Not(IsNull()),
    });
    const withPin = new Set(cards.map(({ personId }) => personId));
    return found
      .map(({ personId, person }) => ({
        personId,
        displayName: person.displayName,
        hasPin: withPin.has(personId),
      }))
      .toSorted((a, b) => (a.displayName < b.displayName ? -1 : 1));
  }

  /** Without card and PIN it is for those who compile, review and sign: they see no more than before. */
  async start(actor: Actor, { personId, card: shown }: HelpingInput): Promise<SessionHelping> {
    const { communityId } = actor;
    const who = (await this.list(actor)).find((each) => each.personId === personId);
    if (who === undefined) throw notFound();
    if (shown === null && !seesDrafts(actor)) throw new AppError('not-allowed', { reason: 'pin-not-shown' });
    const cardId = shown && (await this.cards.proveCard(communityId, personId, shown));
    await this.record(actor, personId, 'helping-began', shown !== null);
    const until = addMinutes(this.clock.now(), HELPING_MINUTES).toISOString();
    return { communityId, personId, cardId, until };
  }

  async end(actor: Actor, { helping }: Kept): Promise<void> {
    if (helping?.communityId !== actor.communityId) return;
    await this.record(actor, helping.personId, 'helping-ended', helping.cardId !== null);
  }

  /** Asked anew with every call: time, both memberships, and the card whose PIN was shown. */
  async helped({ helping }: Kept, helper: Person): Promise<Helped | null> {
    if (helping === undefined || new Date(helping.until) <= this.clock.now()) return null;
    const { manager } = this.dataSource;
    const { communityId, personId, cardId } = helping;
    if (helper.byCardIn !== undefined && helper.byCardIn !== communityId) return null;
    if (!(await manager.existsBy(MembershipEntity, { communityId, personId: helper.id }))) return null;
    const membership = await manager.findOneBy(MembershipEntity, { communityId, personId });
    const roles = membership?.roles.filter(isCardRole) ?? [];
    const person = await manager.findOneBy(PersonEntity, { id: personId });
    if (roles.length === 0 || person === null) return null;
    if (cardId !== null && !(await manager.existsBy(SignInCardEntity, { id: cardId, liveFor: personId }))) {
      return null;
    }
    const { id, email, displayName } = person;
    return { person: { id, email, displayName }, communityId, roles, shownPin: cardId !== null };
  }

  /** What the session tells of it. */
  async told(session: Kept, helper: Person | null): Promise<NonNullable<SessionState['helping']> | null> {
    const helped = helper === null ? null : await this.helped(session, helper);
    if (helped === null || session.helping === undefined) return null;
    const { person, communityId, roles, shownPin } = helped;
    const { until } = session.helping;
    return {
      ...{ communityId, personId: person.id, displayName: person.displayName },
      ...{ roles: [...roles], shownPin, until },
    };
  }

  private async record(
    actor: Actor,
    personId: string,
    action: 'helping-began' | 'helping-ended',
    shownPin: boolean,
  ): Promise<void> {
    await inTransaction(this.dataSource, (manager) =>
      recordAudit(manager, {
        at: this.clock.now(),
        communityId: actor.communityId,
        actorId: actor.person.id,
        action,
        subjectType: 'person',
        subjectId: personId,
        details: { shownPin },
      }),
    );
  }
}
