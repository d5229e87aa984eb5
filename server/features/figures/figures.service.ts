import {
  FIGURES_MAX,
  type Figure,
  type FigureDetail,
  type FigureInput,
  type FigureUpdate,
} from '#shared/contracts/figures.js';
import { sameJson } from '#shared/kernel/canonical-json.js';
import { findStar } from '#shared/sky/index.js';
import { randomUUID } from 'node:crypto';
import type { DataSource, EntityManager } from 'typeorm';
import { FigureEntity } from '../../db/entities/figure.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import { seesDrafts, type Actor } from '../../http/actor.js';
import { conflict, invalidField, notFound, stale } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { maySee } from '../../policy/policy.js';
import { sharedById } from '../../policy/sharing.repository.js';
import { viewerOf, type Viewer } from '../../policy/viewer.js';
import { recordAudit } from '../audit/audit.service.js';
import { recordKeptReads } from '../audit/kept-reads.service.js';
import { shareChangedFigure, shareNewFigure } from './figure-sharing.service.js';
import { fromFigureInput, markerKeyOfFigure, toFigureUse, withKeptTellers } from './figures.mapper.js';
import { seenFigures, seenUses } from './seen-figures.service.js';
import { entriesThatGoBy, figureRows } from './figures.repository.js';

type Action = 'figure-added' | 'figure-changed' | 'figure-taken-out' | 'figure-put-back';

/** The village's own figures. What was frozen keeps the names and dates that it was frozen with. */
export class FiguresService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
  ) {}

  /** By name. */
  async list(actor: Actor): Promise<Figure[]> {
    const { manager } = this.dataSource;
    const rows = await figureRows(manager, actor.communityId, false);
    const viewer = await this.viewer(manager, actor);
    const figures = await seenFigures(manager, viewer, rows);
    const ids = figures.map(({ id }) => id);
    await recordKeptReads(manager, viewer, this.clock.now(), 'figure', ids);
    return figures;
  }

  private viewer(manager: EntityManager, actor: Actor): Promise<Viewer> {
    return viewerOf(manager, actor, this.clock.now());
  }

  async read(actor: Actor, figureId: string): Promise<FigureDetail> {
    return this.describe(this.dataSource.manager, actor, figureId);
  }

  async create(actor: Actor, input: FigureInput): Promise<FigureDetail> {
    expectKnownStars(input);
    const id = randomUUID();
    return inTransaction(this.dataSource, async (manager) => {
      await this.expectRoom(manager, actor);
      await manager.insert(FigureEntity, {
        id,
        communityId: actor.communityId,
        ...fromFigureInput(input),
        takenOutAt: null,
        ...this.touchedBy(actor),
      });
      await shareNewFigure(manager, actor, id, input);
      await this.record(manager, actor, 'figure-added', id);
      return this.describe(manager, actor, id);
    });
  }

  /** Saving what is stored already changes nothing, so it makes nobody else's open form stale. */
  async update(actor: Actor, figureId: string, input: FigureUpdate): Promise<FigureDetail> {
    expectKnownStars(input);
    const { version } = input;
    return inTransaction(this.dataSource, async (manager) => {
      const row = await this.find(manager, actor, figureId, { mode: 'pessimistic_write' });
      if (row.version !== version) throw stale(await this.describe(manager, actor, figureId), input);
      const { storyShown } = await this.describe(manager, actor, figureId);
      const viewer = await this.viewer(manager, actor);
      const story = (await sharedById(manager, 'story', [figureId])).get(figureId);
      // A story that somebody does not see is not theirs to overwrite with the nothing that they were shown.
      const changes = fromFigureInput(
        storyShown
          ? { ...input, variants: withKeptTellers(viewer, story, row.variants, input.variants) }
          : { ...input, story: row.story, variants: row.variants },
      );
      const shared = await shareChangedFigure(manager, figureId, input, storyShown);
      const fields = [...changedFields(fromFigureInput(row), changes), ...(shared ? ['sharingLevel'] : [])];
      if (fields.length > 0) {
        await manager.update(
          FigureEntity,
          { id: figureId, version },
          { ...changes, ...this.touchedBy(actor) },
        );
        await this.record(manager, actor, 'figure-changed', figureId, { fields });
      }
      return this.describe(manager, actor, figureId);
    });
  }

  /** Refused while an entry of a draft goes by it, with those entries named. */
  async remove(actor: Actor, figureId: string): Promise<void> {
    await inTransaction(this.dataSource, async (manager) => {
      await this.find(manager, actor, figureId, { mode: 'pessimistic_write' });
      const uses = await entriesThatGoBy(manager, actor.communityId, markerKeyOfFigure(figureId));
      if (uses.length > 0) {
        const seen = await seenUses(manager, await this.viewer(manager, actor), uses);
        throw conflict(
          'figure-in-use',
          seen.map((entry) => toFigureUse(entry).title),
        );
      }
      await manager.update(
        FigureEntity,
        { id: figureId },
        { takenOutAt: this.clock.now(), ...this.touchedBy(actor) },
      );
      await this.record(manager, actor, 'figure-taken-out', figureId);
    });
  }

  async restore(actor: Actor, figureId: string): Promise<FigureDetail> {
    const { communityId } = actor;
    return inTransaction(this.dataSource, async (manager) => {
      const row = await manager.findOne(FigureEntity, {
        where: { id: figureId, communityId },
        lock: { mode: 'pessimistic_write' },
      });
      if (row === null) throw notFound();
      await this.expectSeen(manager, actor, figureId);
      if (row.takenOutAt === null) throw conflict('figure-is-there');
      await this.expectRoom(manager, actor);
      await manager.update(FigureEntity, { id: figureId }, { takenOutAt: null, ...this.touchedBy(actor) });
      await this.record(manager, actor, 'figure-put-back', figureId);
      return this.describe(manager, actor, figureId);
    });
  }

  private async find(
    manager: EntityManager,
    actor: Actor,
    figureId: string,
    lock?: { mode: 'pessimistic_write' },
  ): Promise<FigureEntity> {
    const row = await manager.findOne(FigureEntity, {
      where: { id: figureId, communityId: actor.communityId },
      ...(lock ? { lock } : {}),
    });
    if (row === null || row.takenOutAt !== null) throw notFound();
    await this.expectSeen(manager, actor, figureId);
    return row;
  }

  private async expectSeen(manager: EntityManager, actor: Actor, figureId: string): Promise<void> {
    const shared = await sharedById(manager, 'figure', [figureId]);
    if (!maySee(await this.viewer(manager, actor), shared.get(figureId))) throw notFound();
  }

  /** Which draft entries go by it is for those who see drafts, and those entries. */
  private async describe(manager: EntityManager, actor: Actor, figureId: string): Promise<FigureDetail> {
    const row = await this.find(manager, actor, figureId);
    const viewer = await this.viewer(manager, actor);
    const [figure] = await seenFigures(manager, viewer, [row]);
    if (!figure) throw notFound();
    const uses = seesDrafts(actor)
      ? await entriesThatGoBy(manager, actor.communityId, markerKeyOfFigure(figureId))
      : [];
    return { ...figure, usedBy: (await seenUses(manager, viewer, uses)).map(toFigureUse) };
  }

  private async expectRoom(manager: EntityManager, actor: Actor): Promise<void> {
    const rows = await figureRows(manager, actor.communityId, false);
    if (rows.length >= FIGURES_MAX) throw conflict('too-many-figures');
  }

  private touchedBy(actor: Actor) {
    return { updatedBy: actor.person.id, updatedAt: this.clock.now() };
  }

  private async record(
    manager: EntityManager,
    actor: Actor,
    action: Action,
    figureId: string,
    details: { fields?: string[] } = {},
  ): Promise<void> {
    await recordAudit(manager, {
      at: this.clock.now(),
      communityId: actor.communityId,
      actorId: actor.person.id,
      action,
      subjectType: 'figure',
      subjectId: figureId,
      details,
    });
  }
}

function expectKnownStars({ memberHrs }: FigureInput): void {
  if (memberHrs.some((hr) => findStar(hr) === null)) throw invalidField('memberHrs', 'unknown-star');
}

/** Names of the fields that differ; stories and names stay out of the record. */
function changedFields<F extends object>(before: F, after: F): string[] {
  return Object.entries(after)
    .filter(([field, value]) => !sameJson(before[field as keyof F], value))
    .map(([field]) => field)
    .sort();
}
