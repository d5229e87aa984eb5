import { AstroTime, SiderealTime } from 'astronomy-engine';
import { describe, expect, it } from 'vitest';

import { instantNearEpoch, localSiderealRad, prepareSiderealClock } from '#shared/sky/time/sidereal-clock.js';

const ARCSEC = Math.PI / 648_000;
const EPOCHS = [626_000, 1_721_000, 2_451_545, 2_816_000];

describe('the sidereal clock', () => {
  it.each(EPOCHS)(
    'is a straight line that leaves the exact value by less than 4″ in a year, at JD %i',
    (epoch) => {
      const clock = prepareSiderealClock(epoch);
      for (const days of [-370, -100.3, 0, 55.7, 370]) {
        const exact = SiderealTime(new AstroTime(epoch + days - 2_451_545)) * (Math.PI / 12);
        const difference = localSiderealRad(clock, epoch + days, 0) - exact;
        expect(Math.abs(Math.sin(difference / 2)) * 2).toBeLessThan(4 * ARCSEC);
      }
    },
  );

  it('finds the instant of a local sidereal time within half a turn of the epoch', () => {
    const clock = prepareSiderealClock(2_461_500);
    for (const sidereal of [-3, 0.1, 2, 6]) {
      const jdUt = instantNearEpoch(clock, sidereal, 1.5);
      expect(Math.abs(jdUt - 2_461_500)).toBeLessThanOrEqual(0.5);
      expect(Math.cos(localSiderealRad(clock, jdUt, 1.5) - sidereal)).toBeCloseTo(1, 12);
    }
  });

  it('returns after 23 h 56 min 4.09 s [Aoki1982]', () => {
    expect(prepareSiderealClock(2_451_545).periodDays * 86_400).toBeCloseTo(86_164.09, 2);
  });
});
