import { findStar } from '../stars/star-table.js';
import type { Figure, MarkerKey, Star } from '../types.js';
import type { DepthPair } from '../visibility/threshold-sets.js';
import { findFigure } from './figures.js';

/** A marker as the engine needs it: one star of the table and perhaps depths of its own. */
export interface ResolvedMarker {
  key: MarkerKey;
  /** The star that carries the dates: the star itself or the figure's indicator. */
  star: Star;
  figure: Figure | null;
  hr: number;
  vMag: number;
  override: DepthPair | null;
}

const STAR_KEY = /^hr([1-9]\d{0,3})$/;

/** The key of a star: `hr1165`. */
export function markerKeyOf(hr: number): MarkerKey {
  return `hr${hr}`;
}

/** The star or figure behind a key, or null. */
export function resolveMarker(key: MarkerKey): ResolvedMarker | null {
  const figure = findFigure(key);
  const match = STAR_KEY.exec(key);
  const hr = figure ? figure.indicatorHr : match ? Number(match[1]) : 0;
  const star = findStar(hr);
  if (!star) return null;
  return { key, star, figure, hr, vMag: star.vMag, override: figure?.thresholdOverride ?? null };
}
