import { describe, expect, it } from 'vitest';

import {
  type DepthAtCrossingCase,
  depthAtCrossingYear,
  type Phenomenon,
  PHENOMENA,
} from '#shared/sky/index.js';
import { jsonFixture } from '#tests/support/sky/fixtures.js';

interface ReferenceCase extends DepthAtCrossingCase {
  id: string;
  outcome: string;
  dayNumbers?: Record<Phenomenon, number[]>;
}

/** Two ephemerides that differ by 0.01° may put a crossing on either side of a threshold: one day. */
const TOLERANCE_DAYS = 1;

const { cases } = jsonFixture('reference-dates.json') as { cases: ReferenceCase[] };

describe('60 cases of an independent scan with ERFA and PyEphem', () => {
  it.each(cases)('$id: HR $hr at $latitudeDeg° in $year', ({ outcome, dayNumbers, ...question }) => {
    const answer = depthAtCrossingYear(question);
    expect(answer.outcome).toBe(outcome);
    for (const phenomenon of PHENOMENA) {
      const expected = dayNumbers?.[phenomenon] ?? [];
      const days = answer.dayNumbers?.[phenomenon] ?? [];
      expect(days, phenomenon).toHaveLength(expected.length);
      expected.forEach((day, index) => {
        expect(Math.abs((days[index] ?? 0) - day), phenomenon).toBeLessThanOrEqual(TOLERANCE_DAYS);
      });
    }
  });

  it('agree to the day in at least 205 of 208 phenomena', () => {
    const exact = cases.flatMap(({ dayNumbers, ...question }) => {
      const answer = depthAtCrossingYear(question);
      return PHENOMENA.flatMap((phenomenon) =>
        (dayNumbers?.[phenomenon] ?? []).map((day) => answer.dayNumbers?.[phenomenon].includes(day) === true),
      );
    });
    expect(exact.length).toBeGreaterThanOrEqual(200);
    expect(exact.filter((same) => !same).length).toBeLessThanOrEqual(3);
  });
});
