import {
  SIGHTINGS_MAX,
  SIGNS_MAX,
  type SightingInput,
  type Sign,
  type SignInput,
  type SignUpdate,
} from '#shared/contracts/signs.js';
import { PLAIN_DETAILS } from '#shared/contracts/sharing.js';
import { isTighterOrSame } from '#shared/contracts/sharing-tightness.js';
import { sameJson } from '#shared/kernel/canonical-json.js';
import { randomUUID } from 'node:crypto';
import type { DataSource, EntityManager } from 'typeorm';
import { ItemSharingEntity } from '../../db/entities/item-sharing.entity.js';
import { SignSightingEntity } from '../../db/entities/sign-sighting.entity.js';
import { SignEntity } from '../../db/entities/sign.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import type { Actor } from '../../http/actor.js';
import { conflict, invalidField, notFound, stale } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { maySee, type Shared } from '../../policy/policy.js';
import { insertSharing, lockSharing, sharedById } from '../../policy/sharing.repository.js';
import { viewerOf, type Viewer } from '../../policy/viewer.js';
import { recordAudit } from '../audit/audit.service.js';
import { recordKeptReads } from '../audit/kept-reads.service.js';
import { personNames } from '../people/person-names.service.js';
import { expectKnownPeople } from '../sharing/known-people.service.js';
import { seenUses } from '../figures/seen-figures.service.js';
import { entriesThatWaitFor, writeWordsIntoDrafts } from './sign-uses.service.js';
import { toSign, wordsOf } from './signs.mapper.js';
import { expectDayTold, lateSightings, signRows } from './signs.repository.js';

type Action =
  'sign-added' | 'sign-changed' | 'sign-taken-out' | 'sign-put-back' | 'sign-seen' | 'sign-seen-taken-back';

/** The village's list of signs of nature, and when each was seen. What was frozen keeps its words. */
export class SignsService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
  ) {}

  /** By name. */
  async list(actor: Actor): Promise<Sign[]> {
    const { manager } = this.dataSource;
    const viewer = await this.viewer(manager, actor);
    const signs = await seenSigns(manager, viewer, await signRows(manager, actor.communityId));
    const ids = signs.map(({ id }) => id);
    await recordKeptReads(manager, viewer, this.clock.now(), 'sign', ids);
    return signs;
  }

  async add(actor: Actor, input: SignInput): Promise<Sign> {
    return inTransaction(this.dataSource, async (manager) => {
      const { communityId, person } = actor;
      await this.expectRoom(manager, actor);
      const id = randomUUID();
      const details = input.sharing ?? PLAIN_DETAILS;
      await expectKnownPeople(manager, actor, details, null, '');
      const row = { id, communityId, words: wordsOf(input), takenOutAt: null, ...this.touchedBy(actor) };
      await manager.insert(SignEntity, row);
      const shared = { level: input.sharingLevel, details, giverId: person.id };
      await insertSharing(manager, { itemType: 'sign', itemId: id, communityId, ...shared });
      await this.record(manager, actor, 'sign-added', id);
      return this.describe(manager, actor, id);
    });
  }

  /** Saving what is stored already changes nothing. */
  async update(actor: Actor, signId: string, input: SignUpdate): Promise<Sign> {
    return inTransaction(this.dataSource, async (manager) => {
      const row = await this.changeable(manager, actor, signId);
      const current = await this.describe(manager, actor, signId);
      if (row.version !== input.version) throw stale(current, input);
      const words = wordsOf(input);
      const shared = await this.shareAnew(manager, actor, signId, input);
      const isSaid = !sameJson(words, row.words);
      if (isSaid || shared) {
        const at = this.clock.now();
        await manager.update(SignEntity, { id: signId }, { words, ...this.touchedBy(actor) });
        if (isSaid) await writeWordsIntoDrafts(manager, signId, words, { personId: actor.person.id, at });
        await this.record(manager, actor, 'sign-changed', signId);
      }
      return this.describe(manager, actor, signId, true);
    });
  }

  /** Refused while an entry of a draft waits for it; those that the person sees are named. */
  async remove(actor: Actor, signId: string): Promise<void> {
    await inTransaction(this.dataSource, async (manager) => {
      await this.changeable(manager, actor, signId);
      const uses = (await entriesThatWaitFor(manager, signId)).filter(({ deletedAt }) => deletedAt === null);
      if (uses.length > 0) {
        const seen = await seenUses(manager, await this.viewer(manager, actor), uses);
        throw conflict(
          'sign-in-use',
          seen.map(({ content }) => content.titleOfficer),
        );
      }
      await manager.update(
        SignEntity,
        { id: signId },
        { takenOutAt: this.clock.now(), ...this.touchedBy(actor) },
      );
      await this.record(manager, actor, 'sign-taken-out', signId);
    });
  }

  async restore(actor: Actor, signId: string): Promise<Sign> {
    return inTransaction(this.dataSource, async (manager) => {
      const row = await this.changeable(manager, actor, signId, 'taken out too');
      if (row.takenOutAt === null) throw conflict('sign-is-there');
      await this.expectRoom(manager, actor);
      await manager.update(SignEntity, { id: signId }, { takenOutAt: null, ...this.touchedBy(actor) });
      await this.record(manager, actor, 'sign-put-back', signId);
      return this.describe(manager, actor, signId);
    });
  }

  /** By anybody who sees the sign: not a day that is still to come, nor one that is told no more. */
  async markSeen(actor: Actor, signId: string, { day, who }: SightingInput): Promise<Sign> {
    return inTransaction(this.dataSource, async (manager) => {
      await this.find(manager, actor, signId);
      const { today } = await this.viewer(manager, actor);
      expectDayTold(day, today);
      const late = (await lateSightings(manager, [signId], today)).get(signId) ?? [];
      if (late.length >= SIGHTINGS_MAX) throw conflict('seen-often-enough');
      const by = { markedBy: actor.person.id, markedAt: this.clock.now() };
      await manager.insert(SignSightingEntity, { id: randomUUID(), signId, day, who, ...by });
      await this.record(manager, actor, 'sign-seen', signId);
      return this.describe(manager, actor, signId);
    });
  }

  async takeBackSeen(actor: Actor, signId: string, seenId: string): Promise<Sign> {
    return inTransaction(this.dataSource, async (manager) => {
      await this.find(manager, actor, signId);
      const seen = await manager.findOneBy(SignSightingEntity, { id: seenId, signId });
      if (seen === null) throw notFound();
      if (seen.markedBy !== actor.person.id) throw conflict('not-the-marker');
      await manager.delete(SignSightingEntity, { id: seenId });
      await this.record(manager, actor, 'sign-seen-taken-back', signId);
      return this.describe(manager, actor, signId);
    });
  }

  /** Locked; one that this person does not see is not there. */
  private async find(
    manager: EntityManager,
    actor: Actor,
    signId: string,
    which: 'in the list' | 'taken out too' = 'in the list',
  ): Promise<SignEntity> {
    const row = await manager.findOne(SignEntity, {
      where: { id: signId, communityId: actor.communityId },
      lock: { mode: 'pessimistic_write' },
    });
    if (row === null || (row.takenOutAt !== null && which === 'in the list')) throw notFound();
    const shared = (await sharedById(manager, 'sign', [signId])).get(signId);
    if (!maySee(await this.viewer(manager, actor), shared)) throw notFound();
    return row;
  }

  private async changeable(
    manager: EntityManager,
    actor: Actor,
    signId: string,
    which: 'in the list' | 'taken out too' = 'in the list',
  ): Promise<SignEntity> {
    const row = await this.find(manager, actor, signId, which);
    const shared = (await sharedById(manager, 'sign', [signId])).get(signId);
    if (!mayChange(await this.viewer(manager, actor), shared)) throw conflict('not-the-giver');
    return row;
  }

  /** Tells whether it is shared otherwise than before. Wider than it was is for the giver and the steward together. */
  private async shareAnew(
    manager: EntityManager,
    actor: Actor,
    itemId: string,
    { sharingLevel: level, sharing: details = PLAIN_DETAILS }: SignUpdate,
  ): Promise<boolean> {
    const row = await lockSharing(manager, 'sign', itemId);
    if (row === null) throw notFound();
    if (row.level === level && sameJson(row.details, details)) return false;
    if (!isTighterOrSame(row, { level, details })) throw invalidField('sharingLevel', 'wider-needs-two');
    await expectKnownPeople(manager, actor, details, null, '');
    await manager.update(ItemSharingEntity, { itemType: 'sign', itemId }, { level, details });
    return true;
  }

  /** `written`: as its writer sees it, also where the level that they just gave it hides it from them. */
  private async describe(
    manager: EntityManager,
    actor: Actor,
    signId: string,
    written = false,
  ): Promise<Sign> {
    const row = await manager.findOneByOrFail(SignEntity, { id: signId });
    const [sign] = await seenSigns(manager, await this.viewer(manager, actor), [row], written);
    if (!sign) throw notFound();
    return sign;
  }

  private async expectRoom(manager: EntityManager, actor: Actor): Promise<void> {
    if ((await signRows(manager, actor.communityId)).length >= SIGNS_MAX) throw conflict('too-many-signs');
  }

  private viewer(manager: EntityManager, actor: Actor): Promise<Viewer> {
    return viewerOf(manager, actor, this.clock.now());
  }

  private touchedBy(actor: Actor) {
    return { updatedBy: actor.person.id, updatedAt: this.clock.now() };
  }

  private async record(manager: EntityManager, actor: Actor, action: Action, signId: string): Promise<void> {
    await recordAudit(manager, {
      at: this.clock.now(),
      communityId: actor.communityId,
      actorId: actor.person.id,
      action,
      subjectType: 'sign',
      subjectId: signId,
    });
  }
}

/** The list is the officers' to keep; what an elder put there is theirs to mend, too. */
function mayChange({ roles, personId }: Viewer, shared: Shared | undefined): boolean {
  return roles.includes('officer') || (roles.includes('elder') && shared?.giverId === personId);
}

/** Signs as one person sees them. */
async function seenSigns(
  manager: EntityManager,
  viewer: Viewer,
  rows: readonly SignEntity[],
  written = false,
): Promise<Sign[]> {
  const shared = await sharedById(
    manager,
    'sign',
    rows.map(({ id }) => id),
  );
  const seen = rows.filter(({ id }) => written || maySee(viewer, shared.get(id)));
  const sightings = await lateSightings(
    manager,
    seen.map(({ id }) => id),
    viewer.today,
  );
  const names = await personNames(manager, [
    ...seen.map(({ updatedBy }) => updatedBy),
    ...[...sightings.values()].flatMap((list) => list.map(({ markedBy }) => markedBy)),
  ]);
  return seen.flatMap((row) => {
    const one = shared.get(row.id);
    if (one === undefined) return [];
    const { personId } = viewer;
    const facts = { row, shared: one, sightings: sightings.get(row.id) ?? [], names, personId };
    return [toSign({ ...facts, mine: mayChange(viewer, one) })];
  });
}
