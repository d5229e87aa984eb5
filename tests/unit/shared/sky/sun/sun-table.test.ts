import { describe, expect, it } from 'vitest';

import { sunLongitudeRad } from '#shared/sky/sun/sun-longitude.js';
import { prepareSunTable } from '#shared/sky/sun/sun-table.js';

const DEG = Math.PI / 180;
const EPOCHS = [626_000.5, 1_721_200, 2_461_407, 2_816_600];

describe('the table of the Sun', () => {
  it.each(EPOCHS)('is within 0.0001° of the exact longitude between its nodes, around JD %d', (epoch) => {
    const table = prepareSunTable(epoch);
    for (let days = -400; days <= 400; days += 3.7) {
      const difference = table.longitudeRad(epoch + days) - sunLongitudeRad(epoch + days);
      expect(Math.abs(Math.sin(difference)) / DEG).toBeLessThan(0.0001);
    }
  });

  it.each(EPOCHS)(
    'grows without jumps and can be turned around to a minute and a half, around JD %d',
    (epoch) => {
      const table = prepareSunTable(epoch);
      let last = table.longitudeRad(epoch - 700);
      for (let days = -699; days <= 700; days += 1) {
        const here = table.longitudeRad(epoch + days);
        expect(here - last).toBeGreaterThan(0.9 * DEG);
        expect(here - last).toBeLessThan(1.1 * DEG);
        expect(Math.abs(table.instantOf(here) - (epoch + days))).toBeLessThan(0.001);
        last = here;
      }
    },
  );

  it('refuses to answer far from its years instead of answering wrongly', () => {
    expect(() => prepareSunTable(2_451_545).longitudeRad(2_455_000)).toThrow(RangeError);
  });
});
