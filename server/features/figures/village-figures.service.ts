import type { SkyFigure } from '#shared/contracts/stars.js';
import type { EntityManager } from 'typeorm';
import { maySee } from '../../policy/policy.js';
import { sharedById } from '../../policy/sharing.repository.js';
import type { Viewer } from '../../policy/viewer.js';
import { toSkyFigure } from './figures.mapper.js';
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

/** All of them and those that were taken out, for computing alone: an entry that goes by one keeps its dates. */
export async function everyVillageFigure(manager: EntityManager, communityId: string): Promise<SkyFigure[]> {
  return (await figureRows(manager, communityId, true)).map(toSkyFigure);
}
