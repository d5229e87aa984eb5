import type { SkyFigure } from '#shared/contracts/stars.js';
import type { EntityManager } from 'typeorm';
import { toSkyFigure } from './figures.mapper.js';
import { figureRows } from './figures.repository.js';

/** The village's own figures as lists of stars offer them. */
export async function villageFigures(manager: EntityManager, communityId: string): Promise<SkyFigure[]> {
  return (await figureRows(manager, communityId, false)).map(toSkyFigure);
}

/** Those and the ones that were taken out: an entry that still goes by one keeps its dates. */
export async function everyVillageFigure(manager: EntityManager, communityId: string): Promise<SkyFigure[]> {
  return (await figureRows(manager, communityId, true)).map(toSkyFigure);
}
