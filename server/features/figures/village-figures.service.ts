import type { SkyFigure } from '#shared/contracts/stars.js';
import type { EntityManager } from 'typeorm';
import { maySee } from '../../policy/policy.js';
import { sharedById } from '../../policy/sharing.repository.js';
import type { Viewer } from '../../policy/viewer.js';
import { markerKeyOfFigure, toSkyFigure } from './figures.mapper.js';
import { figureRows } from './figures.repository.js';

/** The village's own figures as lists of stars offer them to one person. */
export async function figuresSeenBy(manager: EntityManager, viewer: Viewer): Promise<SkyFigure[]> {
  const rows = await figureRows(manager, viewer.communityId, false);
  const shared = await sharedById(
    manager,
    'figure',
    rows.map(({ id }) => id),
  );
  return rows.filter(({ id }) => maySee(viewer, shared.get(id))).map(toSkyFigure);
}

/** Keys of the same by all their names, in whichever language of the village. */
export async function figureKeysByName(manager: EntityManager, viewer: Viewer): Promise<Map<string, string>> {
  const seen = new Set((await figuresSeenBy(manager, viewer)).map(({ key }) => key));
  const rows = await figureRows(manager, viewer.communityId, false);
  return new Map(
    rows
      .map(({ id, names }) => ({ key: markerKeyOfFigure(id), names }))
      .filter(({ key }) => seen.has(key))
      .flatMap(({ key, names }) => names.map(({ name }) => [name, key] as const)),
  );
}

/** All of them and those that were taken out, for computing alone: an entry that goes by one keeps its dates. */
export async function everyVillageFigure(manager: EntityManager, communityId: string): Promise<SkyFigure[]> {
  return (await figureRows(manager, communityId, true)).map(toSkyFigure);
}
