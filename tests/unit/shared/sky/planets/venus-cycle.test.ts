import { AstroTime, Body, Elongation, SearchMaxElongation } from 'astronomy-engine';
import { describe, expect, it } from 'vitest';

import { venusCyclesBetween } from '#shared/sky/planets/venus-cycle.js';
import { JD_J2000 } from '#shared/sky/time/julian-day.js';

const FROM = 2_460_311;
const TO = FROM + 8 * 365.25;
const elongationDeg = (jdUt: number): number =>
  Elongation(Body.Venus, new AstroTime(jdUt - JD_J2000)).elongation;

describe('the cycles of Venus', () => {
  it('follow each other every 584 days in the mean, five in eight years', () => {
    const cycles = venusCyclesBetween(FROM, TO);
    for (const [index, cycle] of cycles.entries()) {
      expect(cycle.inferiorJdUt).toBeLessThan(cycle.superiorJdUt);
      expect(cycle.superiorJdUt).toBeLessThan(cycle.nextInferiorJdUt);
      expect(cycles[index + 1]?.inferiorJdUt ?? cycle.nextInferiorJdUt).toBeCloseTo(
        cycle.nextInferiorJdUt,
        3,
      );
    }
    const [first, sixth] = [cycles[0], cycles[5]];
    expect(((sixth?.inferiorJdUt ?? 0) - (first?.inferiorJdUt ?? 0)) / 5).toBeCloseTo(583.92, 0);
  });

  it('hold one greatest elongation of the morning and one of the evening', () => {
    for (const { inferiorJdUt, superiorJdUt, nextInferiorJdUt } of venusCyclesBetween(FROM, TO)) {
      const morning = SearchMaxElongation(Body.Venus, new AstroTime(inferiorJdUt - JD_J2000));
      expect(morning.visibility).toBe('morning');
      expect(morning.time.ut + JD_J2000).toBeLessThan(superiorJdUt);
      const evening = SearchMaxElongation(Body.Venus, new AstroTime(superiorJdUt - JD_J2000));
      expect(evening.visibility).toBe('evening');
      expect(evening.time.ut + JD_J2000).toBeLessThan(nextInferiorJdUt);
      // Venus passes the Sun by at most 8.7° (its tilt seen from near) at the inferior conjunction.
      expect(elongationDeg(inferiorJdUt)).toBeLessThan(9.5);
      expect(elongationDeg(superiorJdUt)).toBeLessThan(2);
    }
  });

  it('answer the cycle that a single instant falls in', () => {
    expect(venusCyclesBetween(FROM, FROM)).toHaveLength(1);
  });
});
