import type { StarRef } from '../stars/star-frame.js';
import { fixedDirection } from '../stars/space-motion.js';
import { findStar, starIndexOf } from '../stars/star-table.js';
import type { Figure, MarkerKey, SkyPatch, Star } from '../types.js';
import { PATCH_CLASS_FACTS } from '../visibility/patch-classes.js';
import { findFigure } from './figures.js';

/** A marker as the engine needs it: a place among the stars, a brightness and perhaps depths of its own. */
export interface ResolvedMarker {
  key: MarkerKey;
  /** The star that carries the dates: the star itself or the figure's indicator; null for a patch of sky. */
  star: Star | null;
  figure: Figure | null;
  starRef: StarRef;
  /** Visual magnitude of the star; of a patch the one that its class stands for. */
  vMag: number;
  override: { sameSideDeg: number; oppositeSideDeg: number; source: string } | null;
}

const STAR_KEY = /^hr([1-9]\d{0,3})$/;

/** The key of a star: `hr1165`. */
export function markerKeyOf(hr: number): MarkerKey {
  return `hr${hr}`;
}

/**
 * The star or figure behind a key, or null.
 * @param figures a community's own figures, beside the built-in ones
 */
export function resolveMarker(key: MarkerKey, figures: readonly Figure[] = []): ResolvedMarker | null {
  const figure = figures.find((own) => own.key === key) ?? findFigure(key);
  if (figure?.patch) return resolvePatch(figure, figure.patch);
  const match = STAR_KEY.exec(key);
  const hr = figure ? figure.indicatorHr : match ? Number(match[1]) : null;
  const starRef = hr === null ? null : starIndexOf(hr);
  const star = hr === null ? null : findStar(hr);
  if (star === null || starRef === null) return null;
  return { key, star, figure, starRef, vMag: star.vMag, override: figure?.thresholdOverride ?? null };
}

function resolvePatch(figure: Figure, patch: SkyPatch): ResolvedMarker {
  const { vMag, ...depths } = PATCH_CLASS_FACTS[patch.patchClass];
  return {
    key: figure.key,
    star: null,
    figure,
    starRef: fixedDirection(patch.rightAscensionDeg, patch.declinationDeg),
    vMag,
    override: figure.thresholdOverride ?? depths,
  };
}
