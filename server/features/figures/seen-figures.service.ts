import type { Figure } from '#shared/contracts/figures.js';
import type { EntityManager } from 'typeorm';
import type { EntryEntity } from '../../db/entities/entry.entity.js';
import type { FigureEntity } from '../../db/entities/figure.entity.js';
import { entrySight } from '../../policy/entry-sight.js';
import { maySee } from '../../policy/policy.js';
import { sharedById } from '../../policy/sharing.repository.js';
import type { Viewer } from '../../policy/viewer.js';
import { personNames } from '../people/person-names.service.js';
import { toFigure } from './figures.mapper.js';

/** Figures as one person sees them, without stories that are not for them. */
export async function seenFigures(
  manager: EntityManager,
  viewer: Viewer,
  rows: readonly FigureEntity[],
): Promise<Figure[]> {
  const ids = rows.map(({ id }) => id);
  const figures = await sharedById(manager, 'figure', ids);
  const stories = await sharedById(manager, 'story', ids);
  const names = await personNames(
    manager,
    rows.map(({ updatedBy }) => updatedBy),
  );
  return rows.flatMap((row) => {
    const shared = figures.get(row.id);
    if (shared === undefined || !maySee(viewer, shared)) return [];
    const story = stories.get(row.id);
    const seenStory = story !== undefined && maySee(viewer, story) ? story : null;
    return [
      toFigure({ row, shared, story: seenStory, updatedByName: names.get(row.updatedBy) ?? '', viewer }),
    ];
  });
}

/** Entries that go by a figure, as far as the person sees them. */
export async function seenUses(
  manager: EntityManager,
  viewer: Viewer,
  uses: readonly EntryEntity[],
): Promise<EntryEntity[]> {
  const sight = await entrySight(
    manager,
    viewer,
    uses.map(({ id }) => ({ entryId: id, markerKey: null })),
  );
  return uses.filter(({ id }) => sight.appearance({ entryId: id, markerKey: null }) === 'full');
}
