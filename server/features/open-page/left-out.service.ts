import { OPEN_WORDS, type LeftOutOfOpenPage } from '#shared/contracts/open-page.js';
import type { DataSource } from 'typeorm';
import type { Actor } from '../../http/actor.js';
import { figureIdOf } from '../../policy/entry-sight.js';
import { markerKeyOfLead } from '../calendars/sky-dates.service.js';
import { personNames } from '../people/person-names.service.js';
import type { ContentForEverybody, FrozenContentService } from '../versions/frozen-content.service.js';
import { namesFoundIn, type NameFound } from './names-found.service.js';
import { newestPublished } from './newest-published.service.js';
import { toOpenEntry } from './open-page.mapper.js';

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
    const content = await this.contents.readForEverybody(communityId, newest);
    const foundIn = await namesFoundIn(manager, communityId, content);
    const about = content.open.map((each) => ({ each, found: foundIn(toOpenEntry(each.entry)) }));
    const sayers = await personNames(
      manager,
      about.flatMap(({ found }) => found.map(({ noName }) => noName?.saidBy ?? null)),
    );
    return about
      .map(({ each, found }): LeftOutOfOpenPage => ({
        ...{ entryId: each.entry.entryId, title: each.entry.content.titleOfficer },
        awaited: awaitedOf(each),
        found: byWord(found),
        noNames: found.flatMap(({ noName, word, text, name }) =>
          noName === null
            ? []
            : {
                ...{ id: noName.id, word, text, name },
                saidByName: sayers.get(noName.saidBy) ?? '',
                saidAt: noName.saidAt.toISOString(),
              },
        ),
      }))
      .filter((each) => [each.awaited, each.found, each.noNames].some((list) => list.length > 0));
  }
}

/** What nobody said to be no name, words by words. */
function byWord(found: readonly NameFound[]): LeftOutOfOpenPage['found'] {
  return OPEN_WORDS.flatMap((word) => {
    const here = found.filter((each) => each.word === word && each.noName === null);
    const [first] = here;
    return first === undefined
      ? []
      : { word, text: first.text, names: here.map(({ name, key }) => ({ name, key })) };
  });
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
