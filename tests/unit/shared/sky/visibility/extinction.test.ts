import { describe, expect, it } from 'vitest';

import { extinctionOf } from '#shared/sky/visibility/extinction.js';

const july = {
  latitudeDeg: 30,
  elevationM: 20,
  month: 7,
  relativeHumidityPercent: 40,
  temperatureC: 15,
  aerosolShare: 1,
};
function total(air: typeof july): number {
  const { gasMag, aerosolMag, ozoneMag, waterMag } = extinctionOf(air);
  return gasMag + aerosolMag + ozoneMag + waterMag;
}

describe('extinction of a place and month', () => {
  it('adds up as an independent implementation has it: 0.106 + 0.189 + 0.030 + 0.032 = 0.357 [C]', () => {
    const { gasMag, aerosolMag, ozoneMag, waterMag } = extinctionOf(july);
    expect(gasMag).toBeCloseTo(0.106, 3);
    expect(aerosolMag).toBeCloseTo(0.189, 3);
    expect(ozoneMag).toBeCloseTo(0.03, 3);
    expect(waterMag).toBeCloseTo(0.032, 3);
    expect(total(july)).toBeCloseTo(0.357, 3);
  });

  it('is less on a mountain, and a high desert comes to 0.15–0.20 [Schaefer 1993]', () => {
    const desert = { ...july, elevationM: 2400, relativeHumidityPercent: 20 };
    expect(total(desert)).toBeGreaterThan(0.13);
    expect(total(desert)).toBeLessThan(0.2);
  });

  it('is more in humid air, without a pole at saturation', () => {
    expect(total({ ...july, relativeHumidityPercent: 80 })).toBeGreaterThan(total(july) + 0.1);
    expect(total({ ...july, relativeHumidityPercent: 100 })).toBeLessThan(Number.POSITIVE_INFINITY);
    expect(total({ ...july, relativeHumidityPercent: 0 })).toBeGreaterThan(0);
  });

  it('has its haze in the summer of each hemisphere and no season at the equator', () => {
    const haze = (latitudeDeg: number, month: number): number =>
      extinctionOf({ ...july, latitudeDeg, month }).aerosolMag;
    expect(haze(30, 6)).toBeGreaterThan(haze(30, 12));
    expect(haze(-30, 6)).toBeLessThan(haze(-30, 12));
    expect(haze(0, 6)).toBe(haze(0, 12));
  });
});
