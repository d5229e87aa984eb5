import { describe, expect, it } from 'vitest';

import { latitudeOf } from '#shared/sky/horizon/horizontal.js';
import { levelSkyline, prepareSkyline } from '#shared/sky/horizon/skyline.js';
import { starPathOf } from '#shared/sky/horizon/star-path.js';

const DEG = Math.PI / 180;
const star = (decDeg: number) => ({
  rightAscensionRad: 0,
  sinDeclination: Math.sin(decDeg * DEG),
  cosDeclination: Math.cos(decDeg * DEG),
});
const path = (latitudeDeg: number, decDeg: number, skylineDeg = 0) =>
  starPathOf(latitudeOf(latitudeDeg * DEG), star(decDeg), levelSkyline(skylineDeg * DEG));

describe('a star’s path', () => {
  it('lasts twelve hours on the equator of the sky, wherever one stands', () => {
    for (const latitudeDeg of [-60, 0, 35]) {
      expect(path(latitudeDeg, 0)).toMatchObject({ outcome: 'rises-and-sets' });
      expect(path(latitudeDeg, 0).setHourAngleRad / DEG).toBeCloseTo(90, 9);
      expect(path(latitudeDeg, 0).riseHourAngleRad / DEG).toBeCloseTo(-90, 9);
    }
  });

  it('never sets within the latitude’s distance of the pole, never rises on the other side', () => {
    expect(path(40, 51).outcome).toBe('never-sets');
    expect(path(-40, -51).outcome).toBe('never-sets');
    expect(path(40, -51)).toMatchObject({ outcome: 'never-clears-skyline', detail: 'never-rises' });
  });

  it('stays below a skyline that is higher than its culmination, though it rises', () => {
    expect(path(40, -45, 6)).toMatchObject({ outcome: 'never-clears-skyline', detail: 'below-skyline' });
    expect(path(40, -45, 4).outcome).toBe('rises-and-sets');
  });

  it('sets behind a level hill where a flat horizon would not hide it', () => {
    expect(path(40, 52).outcome).toBe('never-sets');
    expect(path(40, 52, 5).outcome).toBe('rises-and-sets');
  });

  it('is a circle at the poles: above for ever, or below', () => {
    expect(path(90, 10).outcome).toBe('never-sets');
    expect(path(90, -10)).toMatchObject({ outcome: 'never-clears-skyline', detail: 'never-rises' });
    expect(path(-90, -10, 12)).toMatchObject({ outcome: 'never-clears-skyline', detail: 'below-skyline' });
  });

  it('may rise at a pole too, over a hill that stands on one side', () => {
    const hill = prepareSkyline([
      { azimuthDeg: 80, altitudeDeg: 0 },
      { azimuthDeg: 90, altitudeDeg: 20 },
      { azimuthDeg: 100, altitudeDeg: 0 },
    ]);
    const found = starPathOf(latitudeOf(90 * DEG), star(10), hill);
    expect(found.outcome).toBe('rises-and-sets');
    // Hidden for ten degrees of azimuth, which are ten degrees of hour angle at a pole.
    expect((found.riseHourAngleRad - found.setHourAngleRad) / DEG).toBeCloseTo(10, 2);
  });
});
