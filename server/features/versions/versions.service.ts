import { signingObstacle, signOffGaps, type ReviewState } from '#shared/calendar/sign-off.js';
import { isOut } from '#shared/calendar/version-state.js';
import type { SignOffGap, Version, VersionEntry, VersionSummary } from '#shared/contracts/versions.js';
import { ENGINE_VERSION } from '#shared/sky/index.js';
import type { DataSource, EntityManager } from 'typeorm';
import { CalendarVersionEntity } from '../../db/entities/calendar-version.entity.js';
import { hasRole, type Actor } from '../../http/actor.js';
import type { Clock } from '../../http/context.js';
import { entrySight } from '../../policy/entry-sight.js';
import { viewerOf } from '../../policy/viewer.js';
import { recordKeptReads } from '../audit/kept-reads.service.js';
import { personNames } from '../people/person-names.service.js';
import { frozenContent, isVisible, visibleVersion } from './frozen-content.service.js';
import { doneSince } from './done-since.service.js';
import { frozenThings } from './frozen-things.service.js';
import { readReviewState } from './review-state.service.js';
import { seenOfVersion } from './seen-content.service.js';
import { toSignature, toSummary } from './versions.mapper.js';
import { signaturesOf } from './versions.repository.js';

/** Reading versions. What changes their state is in publishing.service.ts and in the reviews. */
export class VersionsService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
  ) {}

  /** Newest first; whoever sees no drafts sees what was published. */
  async list(actor: Actor, calendarId: string): Promise<VersionSummary[]> {
    const { manager } = this.dataSource;
    const rows = await manager.find(CalendarVersionEntity, {
      where: { calendarId },
      order: { number: 'DESC' },
    });
    const visible = rows.filter(({ state }) => isVisible(actor, state));
    const things = await frozenThings(
      manager,
      visible.map(({ id }) => id),
    );
    const viewer = await viewerOf(manager, actor, this.clock.now());
    const sight = await entrySight(manager, viewer, [...things.values()].flat());
    const countOf = (row: CalendarVersionEntity) =>
      (things.get(row.id) ?? []).filter((thing) => sight.appearance(thing) === 'full').length;
    const names = await personNames(
      manager,
      visible.map(({ submittedBy }) => submittedBy),
    );
    return visible.map((row) => toSummary(row, names.get(row.submittedBy) ?? '', countOf(row)));
  }

  /** For counting and pointing, not for reading: nothing is written down. */
  async glance(actor: Actor, calendarId: string, number: number): Promise<Version> {
    const { manager } = this.dataSource;
    return this.describe(manager, actor, await visibleVersion(manager, actor, calendarId, number));
  }

  async read(actor: Actor, calendarId: string, number: number): Promise<Version> {
    const { manager } = this.dataSource;
    const version = await this.glance(actor, calendarId, number);
    const viewer = await viewerOf(manager, actor, this.clock.now());
    const ids = version.entries.map(({ entryId }) => entryId);
    await recordKeptReads(manager, viewer, this.clock.now(), 'entry', ids);
    return version;
  }

  /** The whole version for the person who asks, with what they may do now. */
  async describe(manager: EntityManager, actor: Actor, row: CalendarVersionEntity): Promise<Version> {
    const frozen = await frozenContent(manager, row);
    const viewer = await viewerOf(manager, actor, this.clock.now());
    const { header, headerComplete, entries, keptCount } = await seenOfVersion(
      manager,
      viewer,
      row,
      frozen.header,
      frozen.entries,
    );
    const done = await doneSince(manager, header.year, entries);
    const signatures = await signaturesOf(manager, row.id);
    const review = await readReviewState(manager, row);
    const names = await personNames(manager, [
      row.submittedBy,
      ...signatures.map(({ personId }) => personId),
      ...row.signOffRule.mustSign,
      ...row.signOffRule.oneOf,
    ]);
    return {
      ...toSummary(row, names.get(row.submittedBy) ?? '', entries.length),
      stateNote: row.stateNote,
      header,
      headerHash: row.headerHash,
      headerComplete: headerComplete && !row.headerRedacted,
      scheme: row.scheme === 1 ? 1 : 2,
      ...(header.engineVersion !== ENGINE_VERSION && { todaysEngine: ENGINE_VERSION }),
      leaves: frozen.leaves,
      keptCount,
      withdrawnCount: row.withdrawnTraces,
      entries,
      ...(done.length > 0 && { doneSince: done }),
      signatures: signatures.map((signature) => toSignature(signature, names)),
      signOffRule: row.signOffRule,
      gaps: row.state === 'in-review' ? namedGaps(review, entries, names) : [],
      may: mayDo(actor, row, review),
    };
  }
}

function namedGaps(
  review: ReviewState,
  entries: readonly VersionEntry[],
  names: ReadonlyMap<string, string>,
): SignOffGap[] {
  const titles = new Map(entries.map(({ entryId, content }) => [entryId, content.titleOfficer]));
  return signOffGaps(review).map(({ code, personIds, entryIds, count }) => ({
    code,
    names: [...personIds.map((id) => names.get(id) ?? ''), ...entryIds.map((id) => titles.get(id) ?? '')],
    count,
  }));
}

function mayDo(actor: Actor, row: CalendarVersionEntity, review: ReviewState): Version['may'] {
  const inReview = row.state === 'in-review';
  const obstacles = (['elder', 'steward'] as const)
    .filter((role) => hasRole(actor, role))
    .map((role) => ({
      role,
      obstacle: signingObstacle({ personId: actor.person.id, role }, review, inReview),
    }));
  const open = new Set(obstacles.filter(({ obstacle }) => obstacle === null).map(({ role }) => role));
  const officer = hasRole(actor, 'officer');
  const hasSigned = review.signatures.some(
    ({ personId, role }) => personId === actor.person.id && role === 'elder',
  );
  return {
    answer: inReview && hasRole(actor, 'elder') && !hasSigned,
    signAsElder: open.has('elder'),
    signAsSteward: open.has('steward'),
    signClosedBy: open.size > 0 ? null : (obstacles[0]?.obstacle ?? null),
    askChanges: officer && isOut(row.state),
    publish: officer && row.state === 'signed-off',
    recall: officer && row.state === 'published',
  };
}
