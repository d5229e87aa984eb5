import { THRESHOLD_DEG } from '../argument-checks.js';
import { findStar } from '../stars/star-table.js';
import type { Figure } from '../types.js';
import { SkyRangeError } from '../units/sky-range-error.js';
import { PATCH_CLASSES } from '../vocabulary.js';
import { findFigure } from './figures.js';

function within(value: number, min: number, max: number): boolean {
  return Number.isFinite(value) && value >= min && value <= max;
}

function assertKey(key: string, at: string, seen: ReadonlySet<string>): void {
  if (seen.has(key) || findFigure(key) || /^hr\d+$/.test(key))
    throw new SkyRangeError(`${at}.key`, `"${key}" is taken; give each figure a key of its own.`);
}

function assertPatch({ patch }: Figure, at: string): void {
  if (!patch) return;
  if (!within(patch.rightAscensionDeg, 0, 360))
    throw new SkyRangeError(`${at}.patch.rightAscensionDeg`, 'Give a number from 0 to 360 degrees.');
  if (!within(patch.declinationDeg, -90, 90))
    throw new SkyRangeError(`${at}.patch.declinationDeg`, 'Give a number from -90 to 90 degrees.');
  if (!PATCH_CLASSES.includes(patch.patchClass))
    throw new SkyRangeError(
      `${at}.patch.patchClass`,
      `Give one of these words: ${PATCH_CLASSES.join(', ')}.`,
    );
}

/** The check of a community's own figures at the core's door; throws a SkyRangeError that names the field. */
export function assertFigures(figures: readonly Figure[]): void {
  const seen = new Set<string>();
  figures.forEach((figure, index) => {
    const at = `figures.${index}`;
    const { key, indicatorHr, memberHrs, patch, thresholdOverride } = figure;
    assertKey(key, at, seen);
    seen.add(key);
    if ((indicatorHr === null) === (patch === null))
      throw new SkyRangeError(`${at}.indicatorHr`, 'Give either an indicator star or a patch of sky.');
    if (indicatorHr !== null && !findStar(indicatorHr))
      throw new SkyRangeError(`${at}.indicatorHr`, 'Give an HR number of the star table.');
    if (memberHrs.some((hr) => !findStar(hr)))
      throw new SkyRangeError(`${at}.memberHrs`, 'Give HR numbers of the star table.');
    assertPatch(figure, at);
    for (const side of ['sameSideDeg', 'oppositeSideDeg'] as const) {
      if (thresholdOverride && !within(thresholdOverride[side], THRESHOLD_DEG.min, THRESHOLD_DEG.max))
        throw new SkyRangeError(
          `${at}.thresholdOverride.${side}`,
          `Give a number from ${THRESHOLD_DEG.min} to ${THRESHOLD_DEG.max} degrees.`,
        );
    }
  });
}
