import { describe, expect, it } from 'vitest';

import { computeMarkerYear, findStar, markerKeyOf, type Phenomenon } from '#shared/sky/index.js';
import { civilYearOf } from '#shared/sky/time/civil-year.js';
import { EXTINCTION_OF_CLARITY, plainAir } from '#shared/sky/visibility/air.js';
import {
  ALTITUDE_STEP_DEG,
  depthsByAltitude,
  leastDifferences,
} from '#shared/sky/visibility/model-depths.js';
import { PROPERTY_TIMEOUT_MS } from '#tests/support/sky/arbitraries.js';
import { settingsWith, siteAt } from '#tests/support/sky/builders.js';
import { minuteScanYear } from '#tests/support/sky/minute-scan.js';

/**
 * The rule for hills against the model of visibility itself, looked through minute by minute. The place's threshold is
 * set to the model's own value on flat ground, so that nothing but the hill is left to differ.
 */
const YEAR = 2027;
const air = plainAir(EXTINCTION_OF_CLARITY.ordinary);
/** A star climbs about so far in a minute. */
const CLIMB_DEG = 0.25;

interface Case {
  name: string;
  hr: number;
  latitudeDeg: number;
}

function compare({ hr, latitudeDeg }: Case, skylineDeg: number) {
  const vMag = findStar(hr)?.vMag ?? Number.NaN;
  const depths = (side: 'same' | 'opposite'): Float64Array =>
    depthsByAltitude(air, side, [vMag])[0] ?? new Float64Array();
  const site = siteAt(latitudeDeg, 0, { skyline: [{ azimuthDeg: 0, altitudeDeg: skylineDeg }] });
  const { basis } = computeMarkerYear(markerKeyOf(hr), site, settingsWith(), YEAR);
  const sameSideShiftDeg = (leastDifferences(depths('same'))[0] ?? NaN) - basis.sameSideDeg;
  // Where the threshold's depth on flat ground lets a rising star show: the Sun sinks as fast as the star climbs.
  const showsAtDeg =
    ALTITUDE_STEP_DEG *
    depths('opposite').findIndex(
      (depthDeg, column) => depthDeg - column * ALTITUDE_STEP_DEG <= basis.oppositeSideDeg,
    );
  const engine = computeMarkerYear(markerKeyOf(hr), site, settingsWith({ sameSideShiftDeg }), YEAR);
  const scan = minuteScanYear({
    hr,
    latitudeDeg,
    longitudeDeg: 0,
    year: civilYearOf(YEAR),
    skylineDeg,
    nearSkylineDeg: Math.max(skylineDeg, showsAtDeg) + CLIMB_DEG,
    airOf: () => air,
  });
  const engineDay = (phenomenon: Phenomenon): number =>
    engine.phenomena[phenomenon].occurrences[0]?.expected.dayNumber ?? Number.NaN;
  const scanDay = (phenomenon: Phenomenon): number => scan[phenomenon][0] ?? Number.NaN;
  return { engineDay, scanDay, showsAtDeg };
}

const apart = (
  { engineDay, scanDay }: ReturnType<typeof compare>,
  phenomena: readonly Phenomenon[],
): number => Math.max(...phenomena.map((one) => Math.abs(engineDay(one) - scanDay(one))));

const SAME = ['heliacal-rising', 'heliacal-setting'] as const;
const OPPOSITE = ['acronychal-rising', 'cosmical-setting'] as const;

const ordinary: Case[] = [
  { name: 'Sirius', hr: 2491, latitudeDeg: 30 },
  { name: 'Aldebaran', hr: 1457, latitudeDeg: 30 },
  { name: 'Regulus', hr: 3982, latitudeDeg: 12 },
  { name: 'Antares', hr: 6134, latitudeDeg: -14 },
  { name: 'Alcyone', hr: 1165, latitudeDeg: 12 },
  { name: 'Alnilam', hr: 1903, latitudeDeg: 12 },
  { name: 'Fomalhaut', hr: 8728, latitudeDeg: -14 },
];
/** Rises at a slant, and stands further from the Sun in azimuth than the rule supposes. */
const canopus: Case = { name: 'Canopus', hr: 2326, latitudeDeg: 20 };

describe(
  'the altitude difference over hills and a minute-by-minute look through the model',
  { timeout: PROPERTY_TIMEOUT_MS },
  () => {
    it.each(ordinary)('$name: first mornings and last evenings within a day, on 3° and on 8°', (star) => {
      for (const skylineDeg of [3, 8]) expect(apart(compare(star, skylineDeg), SAME)).toBeLessThanOrEqual(1);
    });

    it.each([...ordinary, canopus])(
      '$name: last risings at dusk and first settings at dawn within a day on a hill of 8°, where the hill decides',
      (star) => {
        expect(apart(compare(star, 8), OPPOSITE)).toBeLessThanOrEqual(1);
      },
    );

    it.each(ordinary.filter(({ name }) => name !== 'Sirius'))(
      '$name: a hill of 3° moves no rising at dusk and no setting at dawn by more than a day, because the air hides the star so low',
      (star) => {
        const [flat, hill] = [compare(star, 0), compare(star, 3)];
        expect(flat.showsAtDeg).toBeGreaterThanOrEqual(3);
        for (const phenomenon of OPPOSITE) {
          expect(Math.abs(hill.scanDay(phenomenon) - flat.scanDay(phenomenon))).toBeLessThanOrEqual(1);
          expect(Math.abs(hill.engineDay(phenomenon) - flat.engineDay(phenomenon))).toBeLessThanOrEqual(1);
          // A whole minute and the one azimuth that stands for a side are worth up to three days where light changes slowly.
          expect(apart(flat, [phenomenon])).toBeLessThanOrEqual(3);
        }
      },
    );

    it('Canopus, which climbs at a slant: first morning and last evening within two days', () => {
      for (const skylineDeg of [3, 8])
        expect(apart(compare(canopus, skylineDeg), SAME)).toBeLessThanOrEqual(2);
    });
  },
);
