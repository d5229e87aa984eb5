import { type OpenPage, type OpenPageState, type PlaceShown } from '#shared/contracts/open-page.js';
import { In, type DataSource, type EntityManager } from 'typeorm';
import { OpenPageEntity } from '../../db/entities/open-page.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import type { Actor } from '../../http/actor.js';
import { notFound } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { recordAudit } from '../audit/audit.service.js';
import type { FrozenContentService } from '../versions/frozen-content.service.js';
import { namesFoundIn } from './names-found.service.js';
import { newestPublished } from './newest-published.service.js';
import { keysMeant, newPageKey } from './page-key.js';
import { toOpenEntry, toOpenPageState, toOpenPlace, withoutNames } from './open-page.mapper.js';

/** What a village shows to everybody who has the address: open entries of what it published last. */
export class OpenPageService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly contents: FrozenContentService,
  ) {}

  async state({ communityId }: Actor): Promise<OpenPageState> {
    return toOpenPageState(await this.dataSource.manager.findOneBy(OpenPageEntity, { communityId }));
  }

  /** One that is on keeps its address: it may hang on walls. */
  async switchOn({ communityId, person }: Actor, placeShown: PlaceShown): Promise<OpenPageState> {
    const at = this.clock.now();
    await inTransaction(this.dataSource, async (manager) => {
      const known = await manager.findOne(OpenPageEntity, {
        where: { communityId },
        lock: { mode: 'pessimistic_write' },
      });
      if (known?.placeShown === placeShown) return;
      if (known !== null) await manager.update(OpenPageEntity, { communityId }, { placeShown });
      else {
        const pageKey = newPageKey();
        const row = { communityId, pageKey, placeShown, switchedBy: person.id, switchedOnAt: at };
        await manager.insert(OpenPageEntity, row);
      }
      await this.record(manager, { communityId, actorId: person.id, action: 'open-page-on' }, at);
    });
    return toOpenPageState(await this.dataSource.manager.findOneByOrFail(OpenPageEntity, { communityId }));
  }

  /** One that is off already stays so. */
  async switchOff({ communityId, person }: Actor): Promise<void> {
    await inTransaction(this.dataSource, async (manager) => {
      const { affected } = await manager.delete(OpenPageEntity, { communityId });
      if (affected !== 1) return;
      const off = { communityId, actorId: person.id, action: 'open-page-off' } as const;
      await this.record(manager, off, this.clock.now());
    });
  }

  /** Decided anew at every reading: levels, seasons, consents, and whether the page is on. */
  async read(key: string): Promise<OpenPage> {
    const { manager } = this.dataSource;
    const row = await manager.findOne(OpenPageEntity, {
      where: { pageKey: In(keysMeant(key)) },
      relations: { community: true },
    });
    if (row === null) throw notFound();
    const { communityId, community, placeShown } = row;
    const newest = await newestPublished(manager, communityId);
    const about = { communityName: community.name };
    if (newest === null) {
      return { ...about, placeName: null, place: null, version: null, markers: [], entries: [] };
    }
    const content = await this.contents.readForEverybody(communityId, newest);
    const { header } = content;
    const foundIn = await namesFoundIn(manager, communityId, content);
    const entries = content.entries.map(toOpenEntry).flatMap((entry) => {
      const named = foundIn(entry).filter(({ noName }) => noName === null);
      return (
        withoutNames(
          entry,
          named.map(({ word }) => word),
        ) ?? []
      );
    });
    return {
      ...about,
      ...toOpenPlace(placeShown, header.place),
      version: {
        year: header.year,
        label: newest.label ?? '',
        publishedAt: (newest.publishedAt ?? newest.submittedAt).toISOString(),
      },
      markers: header.markers.map(({ strip: _nights, ...names }) => names),
      entries,
    };
  }

  private record(
    manager: EntityManager,
    facts: { communityId: string; actorId: string; action: 'open-page-on' | 'open-page-off' },
    at: Date,
  ): Promise<void> {
    return recordAudit(manager, {
      ...{ at, ...facts, subjectType: 'community', subjectId: facts.communityId },
    });
  }
}
