import type { Figure, FigureInput, FigureUse, FigureVariant } from '#shared/contracts/figures.js';
import { GIVER_BY_ROLE } from '#shared/contracts/sharing.js';
import type { SkyFigure } from '#shared/contracts/stars.js';
import type { EntryEntity } from '../../db/entities/entry.entity.js';
import { givenName, hidesGiver } from '../../policy/giver-naming.js';
import type { Shared } from '../../policy/policy.js';
import type { Viewer } from '../../policy/viewer.js';
import type { FigureEntity } from '../../db/entities/figure.entity.js';

const OWN_DEPTHS_SOURCE = 'depths that the village set for this figure';

/** A figure's key among the markers; no built-in figure begins like it. */
export function markerKeyOfFigure(figureId: string): string {
  return `f-${figureId}`;
}

export interface FigureFacts {
  row: FigureEntity;
  shared: Shared;
  /** Null where story and variants are not for this person. */
  story: Shared | null;
  updatedByName: string;
  viewer: Viewer;
}

export function toFigure({ row, shared, story, updatedByName, viewer }: FigureFacts): Figure {
  return {
    ...fromFigureInput(row),
    ...(story === null
      ? { story: '', variants: [] }
      : { storyLevel: story.level, variants: tellings(viewer, story, row.variants) }),
    storyShown: story !== null,
    sharingLevel: shared.level,
    sharing: shared.details,
    id: row.id,
    communityId: row.communityId,
    markerKey: markerKeyOfFigure(row.id),
    updatedBy: updatedByName,
    updatedAt: row.updatedAt.toISOString(),
    version: row.version,
  };
}

type FigureColumns = Omit<FigureInput, 'sharingLevel' | 'sharing' | 'storyLevel'>;

/** Who told each is said as the story's giver wishes. */
function tellings(viewer: Viewer, story: Shared, variants: FigureVariant[]): FigureVariant[] {
  return variants.map(({ toldBy, text }) => ({ toldBy: givenName(viewer, story, toldBy), text }));
}

/** What somebody writes over tellings whose tellers were kept from them: the names stay with what was told. */
export function withKeptTellers(
  viewer: Viewer,
  story: Shared | undefined,
  stored: readonly FigureVariant[],
  written: FigureVariant[],
): FigureVariant[] {
  if (!hidesGiver(viewer, story)) return written;
  return written.map(({ toldBy, text }, index) => {
    const wasHidden = toldBy === '' || toldBy === GIVER_BY_ROLE;
    const before = stored.find((one) => one.text === text) ?? stored[index];
    return { toldBy: wasHidden ? (before?.toldBy ?? '') : toldBy, text };
  });
}

/** The columns have the names of the fields; written out, so that nothing else ever passes. */
export function fromFigureInput(input: FigureColumns): FigureColumns {
  return {
    names: input.names,
    story: input.story,
    variants: input.variants,
    memberHrs: input.memberHrs,
    indicatorHr: input.indicatorHr,
    patch: input.patch,
    ownDepths: input.ownDepths,
  };
}

/** What of a figure moves its dates, and the name under which the village knows it. */
export function toSkyFigure(row: FigureEntity): SkyFigure {
  return {
    key: markerKeyOfFigure(row.id),
    name: row.names[0]?.name ?? '',
    indicatorHr: row.indicatorHr,
    memberHrs: row.memberHrs,
    patch: row.patch,
    thresholdOverride: row.ownDepths && { ...row.ownDepths, source: OWN_DEPTHS_SOURCE },
  };
}

/** @param entry with its calendar and that one's place */
export function toFigureUse({ id, calendarId, calendar, content }: EntryEntity): FigureUse {
  return {
    calendarId,
    entryId: id,
    placeName: calendar.place.name,
    year: calendar.year,
    title: content.titleOfficer === '' ? content.titleVillage : content.titleOfficer,
  };
}
