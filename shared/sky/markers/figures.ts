import type { Figure } from '../types.js';
import { PATCH_CLASS_FACTS } from '../visibility/patch-classes.js';

const THIRD_MAGNITUDE = PATCH_CLASS_FACTS['third-magnitude'];

function group(
  key: string,
  name: string,
  indicatorHr: number,
  memberHrs: readonly number[],
  thresholdOverride: Figure['thresholdOverride'] = null,
): Figure {
  return Object.freeze({ key, name, indicatorHr, memberHrs, patch: null, thresholdOverride });
}

/** Groups of stars that people in many lands watch as one; a community adds its own. */
export const FIGURES: readonly Figure[] = Object.freeze([
  group('pleiades', 'Pleiades', 1165, [1142, 1145, 1149, 1156, 1165, 1178], {
    // Near the horizon the cluster behaves like a third-magnitude star, not like its combined light [Vogt1920 p. 17].
    sameSideDeg: THIRD_MAGNITUDE.sameSideDeg,
    oppositeSideDeg: THIRD_MAGNITUDE.oppositeSideDeg,
    source: THIRD_MAGNITUDE.source,
  }),
  // The cluster without Aldebaran, which only stands before it. θ² leads: with θ¹ it is one light to most eyes.
  group('hyades', 'Hyades', 1412, [1346, 1373, 1389, 1409, 1411, 1412]),
  // Alnilam: the brightest of the three and the middle one, so the other two are never more than minutes away.
  group('orion-belt', 'Belt of Orion', 1903, [1852, 1903, 1948]),
  group('ursa-major-seven', 'Seven stars of Ursa Major', 4905, [4295, 4301, 4554, 4660, 4905, 5054, 5191]),
  // The foot star leads: it is the brightest.
  group('southern-cross', 'Southern Cross', 4730, [4656, 4700, 4730, 4763, 4853]),
]);

export function findFigure(key: string): Figure | null {
  return FIGURES.find((figure) => figure.key === key) ?? null;
}
