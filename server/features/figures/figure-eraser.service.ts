import type { EntityManager } from 'typeorm';
import { FigureEntity } from '../../db/entities/figure.entity.js';
import type { EntryEntity } from '../../db/entities/entry.entity.js';
import { markerKeyOfFigure } from './figures.mapper.js';
import { draftEntriesThatGoBy } from './figures.repository.js';

export interface ErasedFigure {
  markerKey: string;
  indicatorHr: number | null;
  /** Draft entries, also those that were taken out, that went by it. */
  entries: EntryEntity[];
}

/** Takes a figure with its names, story and tellings out of the tables; null where it is gone already. */
export async function eraseFigureRow(
  manager: EntityManager,
  communityId: string,
  figureId: string,
): Promise<ErasedFigure> {
  const row = await manager.findOneBy(FigureEntity, { id: figureId });
  const markerKey = markerKeyOfFigure(figureId);
  const entries = await draftEntriesThatGoBy(manager, communityId, markerKey);
  await manager.delete(FigureEntity, { id: figureId });
  return { markerKey, indicatorHr: row?.indicatorHr ?? null, entries };
}

/** Story and tellings alone; the figure keeps its names and its stars. */
export async function eraseStory(manager: EntityManager, figureId: string): Promise<void> {
  await manager.update(FigureEntity, { id: figureId }, { story: '', variants: [] });
}

/** Who told a telling goes; what was told stays. */
export async function takeNamesOffTellings(manager: EntityManager, figureId: string): Promise<void> {
  const row = await manager.findOneBy(FigureEntity, { id: figureId });
  if (row === null) return;
  const variants = row.variants.map((telling) => ({ ...telling, toldBy: '' }));
  await manager.update(FigureEntity, { id: figureId }, { variants });
}
