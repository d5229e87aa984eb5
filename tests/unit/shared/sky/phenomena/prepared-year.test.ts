import { describe, expect, it } from 'vitest';

import { prepareYear } from '#shared/sky/phenomena/prepared-year.js';
import { jsonFixture } from '#tests/support/sky/fixtures.js';

const { cases } = jsonFixture('erfa-stars.json') as {
  cases: { year: number; trueObliquityDeg: number }[];
};

describe('a prepared year', () => {
  it.each(cases)('has the obliquity of ERFA’s long-term model in $year', ({ year, trueObliquityDeg }) => {
    const prepared = prepareYear(year);
    const obliquityDeg = (Math.atan2(prepared.sinObliquity, prepared.cosObliquity) * 180) / Math.PI;
    // The fixture's instant is up to half a year away: nutation moves by a few seconds of arc. At −3000 the engine's
    // polynomial is 0.003° off.
    expect(Math.abs(obliquityDeg - trueObliquityDeg)).toBeLessThan(year < -1000 ? 0.006 : 0.002);
  });

  it('is centred on its civil year', () => {
    const { civil, sidereal } = prepareYear(2027);
    expect(sidereal.epochJdUt).toBe((civil.firstDay + civil.lastDay) / 2);
  });
});
