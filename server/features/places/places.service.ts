import type { Place, PlaceInput, PlaceUpdate } from '#shared/contracts/places.js';
import type { SkyFigure } from '#shared/contracts/stars.js';
import { sameJson } from '#shared/kernel/canonical-json.js';
import { randomUUID } from 'node:crypto';
import type { DataSource, EntityManager } from 'typeorm';
import { PlaceEntity } from '../../db/entities/place.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import type { Actor } from '../../http/actor.js';
import { notFound, stale } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { recordAudit } from '../audit/audit.service.js';
import { viewerOf } from '../../policy/viewer.js';
import { figuresSeenBy } from '../figures/village-figures.service.js';
import { fromPlaceInput, toPlace } from './places.mapper.js';

/** A place with the village's own figures: what dates are computed from. */
export type VillagePlace = Place & { figures: SkyFigure[] };

export class PlacesService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
  ) {}

  /** By name. */
  async list(actor: Actor): Promise<Place[]> {
    const rows = await this.dataSource.getRepository(PlaceEntity).find({
      where: { communityId: actor.communityId },
      order: { name: 'ASC', id: 'ASC' },
    });
    return rows.map(toPlace);
  }

  async read(actor: Actor, placeId: string): Promise<Place> {
    return toPlace(await findPlace(this.dataSource.manager, actor, placeId));
  }

  /** For whoever computes dates. */
  async watched(actor: Actor, placeId: string): Promise<VillagePlace> {
    return this.withFigures(actor, await this.read(actor, placeId));
  }

  async withFigures(actor: Actor, place: Place): Promise<VillagePlace> {
    const { manager } = this.dataSource;
    const viewer = await viewerOf(manager, actor, this.clock.now());
    return { ...place, figures: await figuresSeenBy(manager, viewer) };
  }

  async create(actor: Actor, input: PlaceInput): Promise<Place> {
    const id = randomUUID();
    return inTransaction(this.dataSource, async (manager) => {
      await manager.insert(PlaceEntity, {
        id,
        communityId: actor.communityId,
        ...fromPlaceInput(input),
        createdAt: this.clock.now(),
      });
      await this.record(manager, actor, 'place-added', id, {});
      return toPlace(await findPlace(manager, actor, id));
    });
  }

  /** Saving what is stored already changes nothing, so it makes nobody else's open form stale. */
  async update(actor: Actor, placeId: string, input: PlaceUpdate): Promise<Place> {
    const { version } = input;
    return inTransaction(this.dataSource, async (manager) => {
      // Locked: whoever comes second must see what the first one saved, not the state before.
      const before = toPlace(await findPlace(manager, actor, placeId, { mode: 'pessimistic_write' }));
      if (before.version !== version) throw stale(before, input);
      const changes = fromPlaceInput(input);
      const fields = changedFields(before, changes);
      if (fields.length === 0) return before;
      await manager.update(PlaceEntity, { id: placeId, version }, changes);
      await this.record(manager, actor, 'place-changed', placeId, { fields });
      return toPlace(await findPlace(manager, actor, placeId));
    });
  }

  private async record(
    manager: EntityManager,
    actor: Actor,
    action: 'place-added' | 'place-changed',
    placeId: string,
    details: { fields?: string[] },
  ): Promise<void> {
    await recordAudit(manager, {
      at: this.clock.now(),
      communityId: actor.communityId,
      actorId: actor.person.id,
      action,
      subjectType: 'place',
      subjectId: placeId,
      details,
    });
  }
}

async function findPlace(
  manager: EntityManager,
  actor: Actor,
  placeId: string,
  lock?: { mode: 'pessimistic_write' },
): Promise<PlaceEntity> {
  const row = await manager.findOne(PlaceEntity, {
    where: { id: placeId, communityId: actor.communityId },
    ...(lock ? { lock } : {}),
  });
  if (row === null) throw notFound();
  return row;
}

/** Names of the fields that differ; where somebody lives stays out of the record. */
function changedFields(before: Place, after: PlaceInput): string[] {
  return Object.entries(after)
    .filter(([field, value]) => !sameJson(before[field as keyof PlaceInput], value))
    .map(([field]) => field)
    .sort();
}
