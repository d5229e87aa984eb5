import type { LeftOutOfOpenPage } from '#shared/contracts/open-page.js';
import type { DataSource } from 'typeorm';
import type { Actor } from '../../http/actor.js';
import type { ContentForEverybody, FrozenContentService } from '../versions/frozen-content.service.js';
import { figureIdOf } from '../../policy/entry-sight.js';
import { markerKeyOfLead } from '../calendars/sky-dates.service.js';
import { knownNames } from './known-names.service.js';
import { newestPublished } from './newest-published.service.js';
import { foundNames, toOpenEntry } from './open-page.mapper.js';

/** What is open and does not stand on the page, or not with all its words: so that nothing stays out in silence. */
export class LeftOutService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly contents: FrozenContentService,
  ) {}

  async list({ communityId }: Actor): Promise<LeftOutOfOpenPage[]> {
    const { manager } = this.dataSource;
    const newest = await newestPublished(manager, communityId);
    if (newest === null) return [];
    const { open, givers } = await this.contents.readForEverybody(communityId, newest);
    const known = await knownNames(manager, communityId, givers);
    return open
      .map((each): LeftOutOfOpenPage => {
        const { entryId, content } = each.entry;
        return {
          ...{ entryId, title: content.titleOfficer },
          awaited: awaitedOf(each),
          found: foundNames(toOpenEntry(each.entry), known),
        };
      })
      .filter(({ awaited, found }) => awaited.length > 0 || found.length > 0);
  }
}

function awaitedOf({
  entry,
  byClosedFigure,
  awaited,
}: ContentForEverybody['open'][number]): LeftOutOfOpenPage['awaited'] {
  const figureId = figureIdOf(markerKeyOfLead(entry.content.lead));
  return [
    ...(byClosedFigure && figureId !== null
      ? [{ itemType: 'figure', itemId: figureId, what: 'not-open' } as const]
      : []),
    ...awaited.map(({ missing, ...item }) => ({ ...item, what: missing })),
  ];
}
