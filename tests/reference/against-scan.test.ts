import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import {
  computeMarkerYear,
  depthAtCrossingYear,
  findStar,
  markerKeyOf,
  type Phenomenon,
  PHENOMENA,
} from '#shared/sky/index.js';
import { civilYearOf } from '#shared/sky/time/civil-year.js';
import { depthOnHillDeg, hillExcessDeg } from '#shared/sky/visibility/hill-allowance.js';
import {
  anyHr,
  anyLatitudeDeg,
  anyLongitudeDeg,
  anySkyline,
  anyThresholdDeg,
  anyYear,
  PROPERTY_TIMEOUT_MS,
  SEED,
} from '#tests/support/sky/arbitraries.js';
import { settingsWith, siteAt } from '#tests/support/sky/builders.js';
import { type ScanAnswer, type ScanQuestion, scanYear } from '#tests/support/sky/oracle-scan.js';

/**
 * The engine takes precession and sidereal rate from the middle of the year: at its ends, and between nodes of the Sun's
 * table, the depth differs from the scan's by less than this. Where a threshold is met that closely, both neighbouring
 * answers are right.
 */
const DEPTH_TOLERANCE_DEG = 0.01;

/** The scan with the needed depth a hair more or less. */
function nearby(question: ScanQuestion, hairDeg: number): ScanAnswer {
  return scanYear({
    ...question,
    neededDeg: (side, altitudeDeg) => question.neededDeg(side, altitudeDeg) + hairDeg,
  });
}

/** The engine's days must be the scan's, or those of a threshold a hair away. */
function expectAgreement(days: Record<Phenomenon, readonly number[]>, question: ScanQuestion): void {
  const answer = scanYear(question);
  const differing = PHENOMENA.filter(
    (phenomenon) => answer.days[phenomenon].join() !== days[phenomenon].join(),
  );
  if (differing.length === 0) return;
  const easier = nearby(question, -DEPTH_TOLERANCE_DEG);
  const harder = nearby(question, DEPTH_TOLERANCE_DEG);
  for (const phenomenon of differing) {
    const allowed = [answer, easier, harder].map(({ days: scanned }) => scanned[phenomenon].join());
    expect(allowed, phenomenon).toContain(days[phenomenon].join());
  }
}

const NO_DAYS: Record<Phenomenon, readonly number[]> = {
  'heliacal-rising': [],
  'cosmical-setting': [],
  'acronychal-rising': [],
  'heliacal-setting': [],
};

describe('the closed form and a plain scan over every crossing', () => {
  it(
    'agree by the depth at the crossing at any place, year, threshold and level skyline',
    { timeout: PROPERTY_TIMEOUT_MS },
    () => {
      fc.assert(
        fc.property(
          anyHr,
          anyLatitudeDeg,
          anyLongitudeDeg,
          anyYear,
          fc.integer({ min: 0, max: 9 }),
          anyThresholdDeg,
          anyThresholdDeg,
          (hr, latitudeDeg, longitudeDeg, year, skylineDeg, sameSide, oppositeSide) => {
            const answer = depthAtCrossingYear({
              hr,
              latitudeDeg,
              longitudeDeg,
              year,
              skylineDeg,
              thresholdsDeg: { sameSide, oppositeSide },
            });
            const question: ScanQuestion = {
              hr,
              latitudeDeg,
              longitudeDeg,
              year: civilYearOf(year),
              skyline: [{ azimuthDeg: 0, altitudeDeg: skylineDeg }],
              neededDeg: (side) => (side === 'same' ? sameSide : oppositeSide),
            };
            expect(answer.outcome).toBe(scanYear(question).outcome);
            expectAgreement(answer.dayNumbers ?? NO_DAYS, question);
          },
        ),
        { seed: SEED, numRuns: 60 },
      );
    },
  );

  it('agree by the altitude difference over skyline tables', { timeout: PROPERTY_TIMEOUT_MS }, () => {
    // The rule written down once more, from the model's values over hills.
    const oneThirdOrMore = (thresholdDeg: number, depthDeg: number): number =>
      Math.max(thresholdDeg / 3, depthDeg);
    const neededDeg = (side: 'same' | 'opposite', av: number, vMag: number, altitudeDeg: number): number => {
      const a = Math.max(0, altitudeDeg);
      const change =
        side === 'same'
          ? hillExcessDeg(vMag, 'ordinary', a) - a
          : Math.min(a, depthOnHillDeg(vMag, 'ordinary', a) - av);
      return oneThirdOrMore(av, av + change);
    };
    fc.assert(
      fc.property(
        anyHr,
        anyLatitudeDeg,
        anyLongitudeDeg,
        anyYear,
        anySkyline,
        (hr, latitudeDeg, longitudeDeg, year, skyline) => {
          const site = siteAt(latitudeDeg, longitudeDeg, { skyline });
          const result = computeMarkerYear(markerKeyOf(hr), site, settingsWith(), year);
          const question: ScanQuestion = {
            hr,
            latitudeDeg,
            longitudeDeg,
            year: civilYearOf(year),
            skyline,
            neededDeg: (side, altitudeDeg) => {
              const { sameSideDeg, oppositeSideDeg } = result.basis;
              const vMag = findStar(hr)?.vMag ?? Number.NaN;
              return neededDeg(side, side === 'same' ? sameSideDeg : oppositeSideDeg, vMag, altitudeDeg);
            },
          };
          expect(result.outcome).toBe(scanYear(question).outcome);
          const dayNumbers = (phenomenon: Phenomenon): number[] =>
            result.phenomena[phenomenon].occurrences.map((one) => one.expected.dayNumber);
          expectAgreement(
            {
              'heliacal-rising': dayNumbers('heliacal-rising'),
              'cosmical-setting': dayNumbers('cosmical-setting'),
              'acronychal-rising': dayNumbers('acronychal-rising'),
              'heliacal-setting': dayNumbers('heliacal-setting'),
            },
            question,
          );
        },
      ),
      { seed: SEED, numRuns: 60 },
    );
  });
});
