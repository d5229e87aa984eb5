import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { horizontalOf, latitudeOf } from '#shared/sky/horizon/horizontal.js';
import { prepareSkyline } from '#shared/sky/horizon/skyline.js';
import { tableCrossings } from '#shared/sky/horizon/table-crossings.js';
import { anyLatitudeDeg, anySkyline, PROPERTY_TIMEOUT_MS, SEED } from '#tests/support/sky/arbitraries.js';

const DEG = Math.PI / 180;
const star = (decDeg: number) => ({
  rightAscensionRad: 0,
  sinDeclination: Math.sin(decDeg * DEG),
  cosDeclination: Math.cos(decDeg * DEG),
});
const points = (...pairs: [number, number][]) =>
  prepareSkyline(pairs.map(([azimuthDeg, altitudeDeg]) => ({ azimuthDeg, altitudeDeg })));

describe('crossings of a skyline table', () => {
  it('lie on the skyline', () => {
    const latitude = latitudeOf(28 * DEG);
    const skyline = points([0, 2], [60, 9], [120, 1], [240, 6], [300, 12]);
    const found = tableCrossings(latitude, star(24), skyline);
    if (typeof found === 'string') throw new Error(found);
    for (const hourAngle of [found.riseHourAngleRad, found.setHourAngleRad]) {
      const { sinDeclination, cosDeclination } = star(24);
      const place = horizontalOf(latitude, sinDeclination, cosDeclination, hourAngle);
      expect(place.altitudeRad / DEG).toBeCloseTo(skyline.altitudeRad(place.azimuthRad) / DEG, 4);
    }
  });

  it('are the first upward and the last downward one, where a star shows between two peaks', () => {
    // Peaks in the south-east and the south-west; the star shows in the gap before the first and after the second.
    const skyline = points([0, 0], [110, 0], [130, 30], [150, 0], [210, 0], [230, 30], [250, 0]);
    const found = tableCrossings(latitudeOf(50 * DEG), star(-10), skyline);
    if (typeof found === 'string') throw new Error(found);
    const azimuthDeg = (hourAngle: number): number => {
      const { sinDeclination, cosDeclination } = star(-10);
      return horizontalOf(latitudeOf(50 * DEG), sinDeclination, cosDeclination, hourAngle).azimuthRad / DEG;
    };
    expect(azimuthDeg(found.riseHourAngleRad)).toBeLessThan(110);
    expect(azimuthDeg(found.setHourAngleRad)).toBeGreaterThan(250);
  });

  it('let a star that never sets dip behind a hill in the north', () => {
    const skyline = points([340, 0], [0, 25], [20, 0]);
    const found = tableCrossings(latitudeOf(40 * DEG), star(65), skyline);
    if (typeof found === 'string') throw new Error(found);
    // It stands at 15° in the north, behind the hill, and comes out on the hill's eastern side.
    expect(found.riseHourAngleRad).toBeLessThan(-2);
    expect(found.setHourAngleRad).toBeGreaterThan(2);
  });

  it('are found where only a notch of one degree lets the star through', () => {
    const skyline = points([0, 12], [179.5, 12], [180, 1], [180.5, 12]);
    const found = tableCrossings(latitudeOf(40 * DEG), star(-44), skyline);
    if (typeof found === 'string') throw new Error(found);
    expect(found.riseHourAngleRad).toBeLessThan(0);
    expect(found.riseHourAngleRad).toBeGreaterThan(-1 * DEG);
    expect(found.setHourAngleRad).toBeCloseTo(-found.riseHourAngleRad, 6);
  });

  it(
    'are those of a walk in small steps, for any table, latitude and declination',
    { timeout: PROPERTY_TIMEOUT_MS },
    () => {
      fc.assert(
        fc.property(
          anyLatitudeDeg,
          fc.integer({ min: -80, max: 80 }),
          anySkyline,
          (latitudeDeg, decDeg, table) => {
            const skyline = prepareSkyline(table);
            fc.pre(!skyline.level);
            const latitude = latitudeOf(latitudeDeg * DEG);
            const { sinDeclination, cosDeclination } = star(decDeg);
            const above = (hourAngle: number): boolean => {
              const place = horizontalOf(latitude, sinDeclination, cosDeclination, hourAngle);
              return place.altitudeRad >= skyline.altitudeRad(place.azimuthRad);
            };
            const steps = 20_000;
            let rise: number | null = null;
            let set: number | null = null;
            for (let step = 1; step <= steps; step += 1) {
              const [from, to] = [step - 1, step].map((count) => -Math.PI + (count * 2 * Math.PI) / steps);
              if (from === undefined || to === undefined || above(from) === above(to)) continue;
              if (above(to)) rise ??= to;
              else set = to;
            }
            const found = tableCrossings(latitude, star(decDeg), skyline);
            if (rise === null || set === null) {
              expect(found).toBe(above(0) ? 'always-above' : 'always-below');
            } else {
              if (typeof found === 'string') throw new Error(found);
              // One step of the walk.
              expect(Math.abs(found.riseHourAngleRad - rise)).toBeLessThan((2.1 * Math.PI) / steps);
              expect(Math.abs(found.setHourAngleRad - set)).toBeLessThan((2.1 * Math.PI) / steps);
            }
          },
        ),
        { seed: SEED, numRuns: 60 },
      );
    },
  );
});
