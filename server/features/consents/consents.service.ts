import type {
  Consent,
  ConsentInput,
  ConsentItemType,
  ConsentLine,
  ConsentUpdate,
  SpokenConsentInput,
  SpokenConsentUpdate,
  ItemConsents,
} from '#shared/contracts/consents.js';
import { randomUUID } from 'node:crypto';
import type { DataSource, EntityManager } from 'typeorm';
import { ConsentEntity } from '../../db/entities/consent.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import { hasRole, type Actor } from '../../http/actor.js';
import { conflict, notFound, stale } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { settleShownUntil } from '../../policy/consent.repository.js';
import { lockSharing } from '../../policy/sharing.repository.js';
import { viewerOf, type Viewer } from '../../policy/viewer.js';
import type { IncomingFile } from '../attachments/attachment-files.service.js';
import type { Attach, ProofsService } from '../attachments/proofs.service.js';
import { personNames } from '../people/person-names.service.js';
import { narrowNaming } from './agreed-naming.js';
import { recordConsent, type ConsentAction } from './consent-audit.js';
import { withClip } from './consent-clip.js';
import { asksByName, consentName, withKeptName } from './consent-names.js';
import {
  expectAnswerFollows,
  expectElderProof,
  expectKnown,
  expectMayAsk,
  mayAsk,
  mayOf,
  withProof,
} from './consent-rules.js';
import { holdInOtherYears } from './other-years.service.js';
import { consentThings, type ConsentThing, type ThingRef } from './consent-things.service.js';
import { toColumns, toConsent, toConsentLine, type ConsentFacts } from './consents.mapper.js';

/**
 * What people agreed to about what they gave. A consent is read by those who may read the thing; the steward keeps the
 * whole register without that. Each write waits for the thing's row and settles how long the policy shows it.
 */
export class ConsentsService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly proofs: Pick<ProofsService, 'keepWith'>,
  ) {}

  /** Next to be asked again first. */
  async list(actor: Actor): Promise<ConsentLine[]> {
    const { manager } = this.dataSource;
    const rows = await manager.find(ConsentEntity, {
      where: { communityId: actor.communityId },
      order: { reviewBy: 'ASC', id: 'ASC' },
    });
    const facts = await this.describe(manager, actor, rows);
    return facts
      .filter(({ may }) => may.read || may.withdraw || hasRole(actor, 'steward'))
      .map(toConsentLine)
      .toSorted((a, b) => Number(b.isDue) - Number(a.isDue));
  }

  /** How many wait to be asked again by this person: a giver's own, an officer's, all of them for the steward. */
  async countDue(actor: Actor): Promise<number> {
    const lines = await this.list(actor);
    const isTheirs = ({ isMine }: ConsentLine) => isMine || hasRole(actor, 'officer', 'steward');
    return lines.filter((line) => line.isDue && isTheirs(line)).length;
  }

  async ofItem(actor: Actor, itemType: ConsentItemType, itemId: string): Promise<ItemConsents> {
    const { manager } = this.dataSource;
    const rows = await manager.find(ConsentEntity, {
      where: { communityId: actor.communityId, itemType, itemId },
      order: { recordedAt: 'ASC', id: 'ASC' },
    });
    const thing = await this.thing(manager, actor, { itemType, itemId });
    const readable = (await this.describe(manager, actor, rows)).filter(({ may }) => may.read);
    if (thing === undefined) throw notFound();
    const asks = mayAsk(actor, thing);
    if (!thing.isShown && !(asks && thing.isSeen) && readable.length === 0) throw notFound();
    const { giverId, giverName } = thing;
    const { level } = thing.shared;
    const isNamed = asksByName(await this.viewer(manager, actor), thing);
    const names = await personNames(manager, [giverId, ...readable.map(({ row }) => row.recordedBy)]);
    const nameOf = (id: string | null) => (id === null ? '' : (names.get(id) ?? ''));
    return {
      itemType,
      itemId,
      level,
      title: thing.title,
      giverId: asks && isNamed ? giverId : null,
      giverName: asks && isNamed ? giverName || nameOf(giverId) : '',
      whomToAsk: giverId !== null ? 'giver' : giverName !== '' ? 'named' : 'nobody',
      items: readable.map((facts) => toConsent(facts, nameOf(facts.row.recordedBy))),
      mayAsk: asks,
    };
  }

  async read(actor: Actor, consentId: string): Promise<Consent> {
    const { manager } = this.dataSource;
    return this.one(manager, actor, await this.expectThere(manager, actor, consentId));
  }

  /** The clip is kept with the words that it proves, or neither is. */
  async addSpoken(actor: Actor, input: SpokenConsentInput, file: IncomingFile): Promise<Consent> {
    return this.proofs.keepWith('recording', file, (attach) =>
      this.add(actor, { ...input, proof: null }, attach),
    );
  }

  async changeSpoken(
    actor: Actor,
    consentId: string,
    { content, version }: SpokenConsentUpdate,
    file: IncomingFile,
  ): Promise<Consent> {
    return this.proofs.keepWith('recording', file, (attach) =>
      this.change(actor, consentId, { content: { ...content, proof: null }, version }, attach),
    );
  }

  async add(
    actor: Actor,
    { itemType, itemId, ...written }: ConsentInput,
    attach: Attach | null = null,
  ): Promise<Consent> {
    const id = randomUUID();
    return inTransaction(this.dataSource, async (manager) => {
      await lockSharing(manager, itemType, itemId);
      const thing = await this.thing(manager, actor, { itemType, itemId });
      if (thing === undefined || !thing.isSeen) throw notFound();
      expectMayAsk(actor, thing);
      const input = await withClip(manager, actor, id, written, attach);
      expectElderProof(actor, input);
      const content = withProof(actor, input, thing, '');
      await expectKnown(manager, actor, content, id, '');
      const { giverId } = content;
      if (giverId !== null && (await manager.existsBy(ConsentEntity, { itemType, itemId, giverId }))) {
        throw conflict('consent-there');
      }
      await manager.insert(ConsentEntity, {
        ...{ id, itemType, itemId, communityId: actor.communityId },
        ...toColumns(content, thing),
        recordedBy: actor.helper?.id ?? actor.person.id,
        recordedAt: this.clock.now(),
      });
      const row = await manager.findOneByOrFail(ConsentEntity, { id });
      await this.settle(manager, actor, row, 'consent-written', thing);
      return this.one(manager, actor, row);
    });
  }

  async change(
    actor: Actor,
    consentId: string,
    update: ConsentUpdate,
    attach: Attach | null = null,
  ): Promise<Consent> {
    return this.write(actor, consentId, async (manager, row) => {
      const thing = await this.thing(manager, actor, row);
      const viewer = await this.viewer(manager, actor);
      if (thing === undefined || !mayOf(viewer, row, thing).read) throw notFound();
      if (row.version !== update.version) throw stale(await this.one(manager, actor, row), update.content);
      const content = withProof(
        actor,
        await withClip(manager, actor, consentId, withKeptName(viewer, row, thing, update.content), attach),
        row.giverId === actor.person.id ? row : thing,
        'content.',
      );
      expectElderProof(actor, content);
      expectAnswerFollows(row.state, content);
      await expectKnown(manager, actor, content, consentId, 'content.');
      await this.update(manager, row, { ...toColumns(content, thing), ...this.writer(actor) });
      await this.settle(manager, actor, row, 'consent-changed', thing);
      return this.one(manager, actor, row);
    });
  }

  /** At once: the thing is hidden, and no channel carries it any more. */
  async withdraw(actor: Actor, consentId: string, version: number): Promise<ConsentLine> {
    return this.write(actor, consentId, async (manager, row) => {
      const thing = await this.thing(manager, actor, row);
      if (thing === undefined) throw notFound();
      const may = mayOf(await this.viewer(manager, actor), row, thing);
      if (!may.read && !may.withdraw && !hasRole(actor, 'steward')) throw notFound();
      if (row.version !== version) throw stale(await this.line(manager, actor, row), { version });
      if (!may.withdraw) throw conflict('nothing-to-withdraw');
      await this.update(manager, row, { state: 'withdrawn', uses: [], ...this.writer(actor) });
      await this.settle(manager, actor, row, 'consent-withdrawn', thing);
      return this.line(manager, actor, row);
    });
  }

  private write<T>(
    actor: Actor,
    consentId: string,
    work: (manager: EntityManager, row: ConsentEntity) => Promise<T>,
  ): Promise<T> {
    return inTransaction(this.dataSource, async (manager) => {
      const { itemType, itemId } = await this.expectOfVillage(manager, actor, consentId);
      await lockSharing(manager, itemType, itemId);
      return work(manager, await manager.findOneByOrFail(ConsentEntity, { id: consentId }));
    });
  }

  private async settle(
    manager: EntityManager,
    actor: Actor,
    row: ConsentEntity,
    action: ConsentAction,
    thing: ConsentThing,
  ): Promise<void> {
    await settleShownUntil(manager, row.itemType, row.itemId);
    if (row.uses.length > 0) await narrowNaming(manager, row, row.details.naming);
    await holdInOtherYears(manager, row);
    await recordConsent(manager, this.clock.now(), actor, action, row, thing.shared.level);
  }

  private async update(
    manager: EntityManager,
    row: ConsentEntity,
    changes: Partial<
      Pick<
        ConsentEntity,
        'state' | 'uses' | 'giverId' | 'until' | 'reviewBy' | 'details' | 'recordedBy' | 'recordedAt'
      >
    >,
  ): Promise<void> {
    await manager.update(ConsentEntity, { id: row.id, version: row.version }, changes);
    Object.assign(row, changes, { version: row.version + 1 });
  }

  private writer(actor: Actor): Pick<ConsentEntity, 'recordedBy' | 'recordedAt'> {
    return { recordedBy: actor.helper?.id ?? actor.person.id, recordedAt: this.clock.now() };
  }

  private async expectOfVillage(
    manager: EntityManager,
    { communityId }: Actor,
    id: string,
  ): Promise<ConsentEntity> {
    const row = await manager.findOneBy(ConsentEntity, { id, communityId });
    if (row === null) throw notFound();
    return row;
  }

  private async expectThere(manager: EntityManager, actor: Actor, id: string): Promise<ConsentEntity> {
    const row = await this.expectOfVillage(manager, actor, id);
    const [facts] = await this.describe(manager, actor, [row]);
    if (!facts?.may.read) throw notFound();
    return row;
  }

  private async one(manager: EntityManager, actor: Actor, row: ConsentEntity): Promise<Consent> {
    const [facts] = await this.describe(manager, actor, [row]);
    if (!facts) throw notFound();
    const names = await personNames(manager, [row.recordedBy]);
    return toConsent(facts, names.get(row.recordedBy) ?? '');
  }

  private async line(manager: EntityManager, actor: Actor, row: ConsentEntity): Promise<ConsentLine> {
    const [facts] = await this.describe(manager, actor, [row]);
    if (!facts) throw notFound();
    return toConsentLine(facts);
  }

  /** Rows whose thing is gone are left out. */
  private async describe(
    manager: EntityManager,
    actor: Actor,
    rows: readonly ConsentEntity[],
  ): Promise<ConsentFacts[]> {
    const viewer = await this.viewer(manager, actor);
    const thingOf = await consentThings(manager, viewer, rows);
    return rows.flatMap((row) => {
      const thing = thingOf(row);
      if (thing === undefined) return [];
      const isMine = row.giverId === actor.person.id;
      const nameShown = consentName(viewer, row, thing);
      return [{ row, thing, isMine, nameShown, may: mayOf(viewer, row, thing), today: viewer.today }];
    });
  }

  private async thing(
    manager: EntityManager,
    actor: Actor,
    ref: ThingRef,
  ): Promise<ConsentThing | undefined> {
    return (await consentThings(manager, await this.viewer(manager, actor), [ref]))(ref);
  }

  private viewer(manager: EntityManager, actor: Actor): Promise<Viewer> {
    return viewerOf(manager, actor, this.clock.now());
  }
}
