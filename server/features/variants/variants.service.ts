import {
  VARIANTS_MAX,
  type Variant,
  type VariantInput,
  type VariantUpdate,
} from '#shared/contracts/variants.js';
import { PLAIN_DETAILS } from '#shared/contracts/sharing.js';
import { sameJson } from '#shared/kernel/canonical-json.js';
import { randomUUID } from 'node:crypto';
import type { DataSource, EntityManager } from 'typeorm';
import { CalendarEntity } from '../../db/entities/calendar.entity.js';
import { EntryEntity } from '../../db/entities/entry.entity.js';
import { EntryVariantEntity } from '../../db/entities/entry-variant.entity.js';
import { ItemSharingEntity } from '../../db/entities/item-sharing.entity.js';
import { MembershipEntity } from '../../db/entities/membership.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import { hasRole, type Actor } from '../../http/actor.js';
import { conflict, invalidField, notFound, stale } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { entrySight } from '../../policy/entry-sight.js';
import { withKeptGiver, withNaming } from '../../policy/giver-naming.js';
import { isKept, maySee, type Shared } from '../../policy/policy.js';
import { insertSharing, lockSharing, sharedById } from '../../policy/sharing.repository.js';
import { isTighterOrSame } from '#shared/contracts/sharing-tightness.js';
import { viewerOf, type Viewer } from '../../policy/viewer.js';
import { recordAudit } from '../audit/audit.service.js';
import { countOnce } from '../calendars/count-once.service.js';
import { expectOpen, lockCalendar, readDraft, recordContribution } from '../calendars/draft.service.js';
import { knowsMarker, markerKeyOfLead, type SkyDatesService } from '../calendars/sky-dates.service.js';
import { figuresSeenBy } from '../figures/village-figures.service.js';
import { personNames } from '../people/person-names.service.js';
import { tightenOtherYears } from '../rollovers/tighter-years.service.js';
import { draftVariants } from './draft-variants.service.js';
import { toVariant } from './variants.mapper.js';

type Action = 'variant-added' | 'variant-changed' | 'variant-removed';

/** Other keepers' timings beside an entry. Each is whole and its giver's; none is ever joined with another. */
export class VariantsService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly sky: SkyDatesService,
  ) {}

  async list(actor: Actor, calendarId: string, entryId: string): Promise<Variant[]> {
    const { manager } = this.dataSource;
    const calendar = await manager.findOneByOrFail(CalendarEntity, { id: calendarId });
    const entry = await this.seenEntry(manager, actor, calendarId, entryId);
    return this.describe(manager, actor, calendar, entry);
  }

  async add(actor: Actor, calendarId: string, entryId: string, content: VariantInput): Promise<Variant> {
    return this.changeOne(actor, { calendarId, entryId }, async (manager) => {
      await this.expectFits(manager, actor, content, '');
      if (content.giver === '') throw invalidField('giver', 'required');
      if ((await manager.countBy(EntryVariantEntity, { entryId })) >= VARIANTS_MAX) {
        throw conflict('too-many-variants');
      }
      const id = randomUUID();
      const at = this.clock.now();
      await manager.insert(EntryVariantEntity, {
        ...{ id, entryId, content, addedAt: at, updatedAt: at },
        updatedBy: actor.person.id,
      });
      await insertSharing(manager, {
        itemType: 'variant',
        itemId: id,
        communityId: actor.communityId,
        level: content.sharingLevel,
        details: content.sharing ?? PLAIN_DETAILS,
        giverId: content.giverId ?? actor.person.id,
      });
      await this.record(manager, actor, calendarId, entryId, 'variant-added');
      return id;
    });
  }

  async update(
    actor: Actor,
    { calendarId, entryId, variantId }: { calendarId: string; entryId: string; variantId: string },
    { content: written, version }: VariantUpdate,
  ): Promise<Variant> {
    return this.changeOne(actor, { calendarId, entryId }, async (manager, calendar, entry) => {
      const row = await this.own(manager, actor, entryId, variantId);
      if (row.version !== version) {
        throw stale(await this.one(manager, actor, calendar, entry, variantId), written);
      }
      const shared = (await sharedById(manager, 'variant', [variantId])).get(variantId);
      const content = withKeptGiver(await this.viewer(manager, actor), shared, row.content, written);
      if (content.giver === '' && row.content.giver !== '') throw invalidField('content.giver', 'required');
      if (!sameJson(row.content, content)) {
        await this.expectFits(manager, actor, content, 'content.');
        await this.reshare(manager, actor, variantId, content);
        await manager.update(
          EntryVariantEntity,
          { id: variantId, version },
          { content, updatedBy: actor.person.id, updatedAt: this.clock.now() },
        );
        await this.record(manager, actor, calendarId, entryId, 'variant-changed');
      }
      return variantId;
    });
  }

  async remove(actor: Actor, calendarId: string, entryId: string, variantId: string): Promise<void> {
    const remove = async (manager: EntityManager) => {
      await this.own(manager, actor, entryId, variantId);
      await manager.delete(EntryVariantEntity, { id: variantId });
      await this.record(manager, actor, calendarId, entryId, 'variant-removed');
      return variantId;
    };
    await this.change(actor, { calendarId, entryId }, remove, () => Promise.resolve());
  }

  /** A write that came before with the same key is not done again, also where the draft is locked by now. */
  private change<T>(
    actor: Actor,
    { calendarId, entryId }: { calendarId: string; entryId: string },
    write: (manager: EntityManager, calendar: CalendarEntity, entry: EntryEntity) => Promise<string>,
    answer: (manager: EntityManager, calendar: CalendarEntity, entry: EntryEntity, id: string) => Promise<T>,
  ): Promise<T> {
    return inTransaction(this.dataSource, async (manager) => {
      const calendar = await lockCalendar(manager, calendarId);
      const entry = await this.seenEntry(manager, actor, calendarId, entryId);
      const id = await countOnce(manager, actor, this.clock.now(), () => {
        expectOpen(calendar);
        return write(manager, calendar, entry);
      });
      return answer(manager, calendar, entry, id);
    });
  }

  private changeOne(
    actor: Actor,
    ids: { calendarId: string; entryId: string },
    write: (manager: EntityManager, calendar: CalendarEntity, entry: EntryEntity) => Promise<string>,
  ): Promise<Variant> {
    return this.change(actor, ids, write, (manager, calendar, entry, id) =>
      this.one(manager, actor, calendar, entry, id),
    );
  }

  private viewer(manager: EntityManager, actor: Actor): Promise<Viewer> {
    return viewerOf(manager, actor, this.clock.now());
  }

  private async seenEntry(
    manager: EntityManager,
    actor: Actor,
    calendarId: string,
    entryId: string,
  ): Promise<EntryEntity> {
    const row = await manager.findOneBy(EntryEntity, { id: entryId, calendarId });
    if (row === null || row.deletedAt !== null) throw notFound();
    const thing = { entryId, markerKey: markerKeyOfLead(row.content.lead) };
    const sight = await entrySight(manager, await this.viewer(manager, actor), [thing]);
    if (sight.appearance(thing) !== 'full') throw notFound();
    return row;
  }

  /** The village's variants are the officers' and their givers' to write; what is kept is its giver's. */
  private async own(
    manager: EntityManager,
    actor: Actor,
    entryId: string,
    variantId: string,
  ): Promise<EntryVariantEntity> {
    const row = await manager.findOneBy(EntryVariantEntity, { id: variantId, entryId });
    const shared = (await sharedById(manager, 'variant', [variantId])).get(variantId);
    const viewer = await this.viewer(manager, actor);
    if (row === null || !maySee(viewer, shared)) throw notFound();
    if (!isMine(viewer, shared)) throw conflict('not-the-giver');
    return row;
  }

  private async reshare(
    manager: EntityManager,
    actor: Actor,
    variantId: string,
    content: VariantInput,
  ): Promise<void> {
    const row = await lockSharing(manager, 'variant', variantId);
    if (row === null) throw notFound();
    const after = { level: content.sharingLevel, details: content.sharing ?? PLAIN_DETAILS };
    if (!isTighterOrSame(row, after)) throw invalidField('content.sharingLevel', 'wider-needs-two');
    const giverId = content.giverId ?? row.giverId;
    if (giverId !== row.giverId && row.giverId !== actor.person.id && !hasRole(actor, 'officer')) {
      throw invalidField('content.giverId', 'only-the-giver');
    }
    await manager.update(
      ItemSharingEntity,
      { itemType: 'variant', itemId: variantId },
      { ...after, giverId },
    );
    await tightenOtherYears(manager, { itemType: 'variant', itemId: variantId }, row, after);
  }

  private async expectFits(
    manager: EntityManager,
    actor: Actor,
    { lead, giverId, sharing }: VariantInput,
    prefix: string,
  ): Promise<void> {
    const viewer = await this.viewer(manager, actor);
    const markerKey = markerKeyOfLead(lead);
    if (markerKey !== null && !knowsMarker(markerKey, await figuresSeenBy(manager, viewer))) {
      throw invalidField(`${prefix}lead.${lead.type === 'sky' ? 'spec.' : ''}markerKey`, 'unknown-marker');
    }
    const { communityId } = actor;
    if (giverId !== null && !(await manager.existsBy(MembershipEntity, { communityId, personId: giverId }))) {
      throw invalidField(`${prefix}giverId`, 'not-of-this-village');
    }
    const groupId = sharing?.groupId ?? null;
    if (groupId !== null && !viewer.groupIds.has(groupId)) {
      throw invalidField(`${prefix}sharing.groupId`, 'group-of-giver');
    }
  }

  private async describe(
    manager: EntityManager,
    actor: Actor,
    calendar: CalendarEntity,
    entry: EntryEntity,
    writtenId?: string,
  ): Promise<Variant[]> {
    const { place } = await readDraft(manager, this.sky, calendar);
    const variants = await draftVariants(manager, this.sky, place, calendar.year, [entry]);
    const shared = await sharedById(
      manager,
      'variant',
      variants.map(({ row }) => row.id),
    );
    const viewer = await this.viewer(manager, actor);
    const seen = variants.filter(({ row }) => row.id === writtenId || maySee(viewer, shared.get(row.id)));
    const names = await personNames(
      manager,
      seen.map(({ row }) => row.updatedBy),
    );
    return seen.map((variant) => {
      const own = shared.get(variant.row.id);
      const content = withNaming(viewer, own, variant.row.content);
      return toVariant(variant, content, names.get(variant.row.updatedBy) ?? '', isMine(viewer, own));
    });
  }

  private async one(
    manager: EntityManager,
    actor: Actor,
    calendar: CalendarEntity,
    entry: EntryEntity,
    id: string,
  ): Promise<Variant> {
    const found = (await this.describe(manager, actor, calendar, entry, id)).find(
      ({ variantId }) => variantId === id,
    );
    if (!found) throw notFound();
    return found;
  }

  /** An elder who puts their own timing beside an entry compiles nothing: they still sign for the village. */
  private async record(
    manager: EntityManager,
    actor: Actor,
    calendarId: string,
    entryId: string,
    action: Action,
  ): Promise<void> {
    const shared = (await sharedById(manager, 'entry', [entryId])).get(entryId);
    if (hasRole(actor, 'officer') && shared !== undefined && !isKept(shared)) {
      await recordContribution(manager, calendarId, actor.person.id, this.clock.now());
    }
    await recordAudit(manager, {
      at: this.clock.now(),
      communityId: actor.communityId,
      actorId: actor.person.id,
      action,
      subjectType: 'entry',
      subjectId: entryId,
      details: { calendarId },
    });
  }
}

function isMine(viewer: Viewer, shared: Shared | undefined): boolean {
  if (shared === undefined) return false;
  return shared.giverId === viewer.personId || (!isKept(shared) && viewer.roles.includes('officer'));
}
