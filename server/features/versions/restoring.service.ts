import { circleFrom } from '#shared/calendar/anchors.js';
import { ENTRIES_MAX, type EntryInput } from '#shared/contracts/calendars.js';
import type { RestoredDraft, RestoredEntry } from '#shared/contracts/restored-draft.js';
import { sameJson } from '#shared/kernel/canonical-json.js';
import type { DataSource, EntityManager } from 'typeorm';
import type { CalendarVersionEntity } from '../../db/entities/calendar-version.entity.js';
import { EntryEntity } from '../../db/entities/entry.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import type { Actor } from '../../http/actor.js';
import { conflict } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { entrySight, type EntrySight } from '../../policy/entry-sight.js';
import { isKept } from '../../policy/policy.js';
import { viewerOf } from '../../policy/viewer.js';
import { recordAudit } from '../audit/audit.service.js';
import { orderAmongOthers } from '../calendars/draft-order.service.js';
import { lockOpenDraft, recordContribution } from '../calendars/draft.service.js';
import { mayWrite } from '../calendars/entry-sharing.service.js';
import { knowsMarker, markerKeyOfLead } from '../calendars/sky-dates.service.js';
import { figuresSeenBy } from '../figures/village-figures.service.js';
import { frozenContent, visibleVersion } from './frozen-content.service.js';
import { restoredContent, sharedOtherwise } from './restored-content.js';
import { seenOfVersion, thingOf } from './seen-content.service.js';

interface Planned extends RestoredEntry {
  row: EntryEntity;
  /** What it says from now on; null where it is taken out. */
  content: EntryInput | null;
}

/** Sets the draft back to what a version says, for the officer who asks, as far as they see and may write it. */
export class RestoringService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
  ) {}

  /**
   * Entries keep their ids. What was withdrawn since is in no version any more; what the person does not see stays in
   * the draft as it is. Whatever changes by it is sealed anew, so that no answer of old counts for it by itself.
   */
  async restore(actor: Actor, calendarId: string, number: number): Promise<RestoredDraft> {
    return inTransaction(this.dataSource, async (manager) => {
      await lockOpenDraft(manager, calendarId);
      const version = await visibleVersion(manager, actor, calendarId, number);
      const { rows, sight, planned } = await this.plan(manager, actor, version);
      const changes = planned.filter(({ outcome }) => outcome !== 'left' && outcome !== 'as-it-was');
      const live = rows.filter(({ deletedAt }) => deletedAt === null).length;
      const grows = planned.filter(({ outcome }) => outcome === 'brought-back').length;
      const shrinks = planned.filter(({ outcome }) => outcome === 'taken-out').length;
      if (live + grows - shrinks > ENTRIES_MAX) throw conflict('too-many-entries');
      const at = this.clock.now();
      for (const { row, content } of changes) {
        await manager.update(
          EntryEntity,
          { id: row.id },
          {
            ...{ updatedBy: actor.person.id, updatedAt: at },
            ...(content === null ? { deletedAt: at } : { content, deletedAt: null, restoredAt: at }),
          },
        );
      }
      await orderAmongOthers(
        manager,
        calendarId,
        planned.flatMap(({ entryId, outcome }) => (outcome === 'taken-out' ? [] : [entryId])),
      );
      if (changes.some(({ entryId }) => isVillages(sight, entryId))) {
        await recordContribution(manager, calendarId, actor.person.id, at);
      }
      if (changes.length > 0) await this.record(manager, actor, version, at);
      return {
        ...{ number, label: version.label, withdrawnCount: version.withdrawnTraces },
        entries: planned.map(({ row: _row, content: _content, ...entry }) => entry),
      };
    });
  }

  private async plan(manager: EntityManager, actor: Actor, version: CalendarVersionEntity) {
    const viewer = await viewerOf(manager, actor, this.clock.now());
    const frozen = await frozenContent(manager, version);
    const whole = new Map(frozen.entries.map((entry) => [entry.entryId, entry.content]));
    const seen = await seenOfVersion(manager, viewer, version, frozen.header, frozen.entries);
    const { calendarId } = version;
    const rows = await manager.find(EntryEntity, { where: { calendarId }, order: { position: 'ASC' } });
    const things = rows.map(({ id, content }) => thingOf({ entryId: id, content }));
    const sight = await entrySight(manager, viewer, things);
    const figures = await figuresSeenBy(manager, viewer);
    const byId = new Map(rows.map((row) => [row.id, row]));
    const back = seen.entries.flatMap(({ entryId }): Planned[] => {
      const row = byId.get(entryId);
      const old = whole.get(entryId);
      if (!row || !old || sight.appearance(thingOf({ entryId, content: row.content })) !== 'full') return [];
      const base = {
        entryId,
        row,
        titleOfficer: old.titleOfficer,
        sharingStays: sharedOtherwise(old, row.content),
      };
      const left = (leftBecause: RestoredEntry['leftBecause']): Planned[] =>
        // What was taken out of the draft and cannot come back is no news about the draft.
        row.deletedAt === null ? [{ ...base, outcome: 'left', leftBecause, content: row.content }] : [];
      if (!mayWrite(viewer, sight.sharedOf(entryId))) return left('not-yours');
      const content = restoredContent(old, row.content);
      const markerKey = markerKeyOfLead(content.lead);
      const isKnown = markerKey === null || knowsMarker(markerKey, figures);
      if (!isKnown && !sameJson(content.lead, row.content.lead)) return left('sign-gone');
      const isSame = row.deletedAt === null && sameJson(content, row.content);
      const outcome = row.deletedAt !== null ? 'brought-back' : isSame ? 'as-it-was' : 'set-back';
      return [{ ...base, outcome, leftBecause: null, content }];
    });
    const kept = new Set(back.map(({ entryId }) => entryId));
    const out = rows.flatMap((row): Planned[] => {
      const { id: entryId, content, deletedAt } = row;
      if (deletedAt !== null || kept.has(entryId)) return [];
      if (sight.appearance(thingOf({ entryId, content })) !== 'full') return [];
      const base = { entryId, row, titleOfficer: content.titleOfficer, sharingStays: false };
      return mayWrite(viewer, sight.sharedOf(entryId))
        ? [{ ...base, outcome: 'taken-out', leftBecause: null, content: null }]
        : [{ ...base, outcome: 'left', leftBecause: 'not-yours', content }];
    });
    return { rows, sight, planned: withoutCircles([...back, ...out], rows) };
  }

  private async record(
    manager: EntityManager,
    actor: Actor,
    { calendarId, number, label }: CalendarVersionEntity,
    at: Date,
  ): Promise<void> {
    await recordAudit(manager, {
      ...{ at, communityId: actor.communityId, actorId: actor.person.id, action: 'draft-restored' },
      ...{ subjectType: 'calendar', subjectId: calendarId, details: { number, label } },
    });
  }
}

/** Entries that would hang on themselves by way of what is not set back stay as they are today. */
function withoutCircles(planned: readonly Planned[], rows: readonly EntryEntity[]): Planned[] {
  const next = new Map(planned.map(({ entryId, content }) => [entryId, content]));
  const hung = rows.flatMap(({ id, deletedAt, content }) => {
    const says = next.has(id) ? next.get(id) : deletedAt === null ? content : null;
    return says ? [{ id, lead: says.lead }] : [];
  });
  return planned.map((entry) =>
    entry.outcome === 'set-back' && circleFrom(entry.entryId, hung) !== null
      ? { ...entry, outcome: 'left', leftBecause: 'circle', content: entry.row.content }
      : entry,
  );
}

function isVillages(sight: EntrySight, entryId: string): boolean {
  const shared = sight.sharedOf(entryId);
  return shared !== undefined && !isKept(shared);
}
