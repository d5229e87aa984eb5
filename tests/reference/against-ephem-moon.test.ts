import { describe, expect, it } from 'vitest';

import { moonYear, venusYear, VENUS_APPEARANCES, type VenusAppearance } from '#shared/sky/index.js';
import { crescentEveningOf } from '#shared/sky/moon/crescent-evening.js';
import { moonAndSunAt } from '#shared/sky/moon/moon-and-sun.js';
import { levelSkyline } from '#shared/sky/horizon/skyline.js';
import { dayClockOf } from '#shared/sky/time/civil-day.js';
import { gregorianOf } from '#shared/sky/time/julian-day.js';
import { settingsWith, siteAt } from '#tests/support/sky/builders.js';
import { jsonFixture } from '#tests/support/sky/fixtures.js';

interface EveningCase {
  latitudeDeg: number;
  longitudeDeg: number;
  sunsetJdUt: number;
  moonsetJdUt: number;
  bestJdUt: number;
  moonAltitudeDeg: number;
  moonAzimuthDeg: number;
  sunAltitudeDeg: number;
  geocentricArcOfVisionDeg: number;
  moonDiameterArcmin: number;
  elongationDeg: number;
}
type VenusCase = { latitudeDeg: number; longitudeDeg: number; skylineDeg: number } & Record<
  VenusAppearance,
  number[]
>;

const { phases, evenings, venus } = jsonFixture('ephem-moon.json') as {
  phases: { newJdUt: number; fullJdUt: number }[];
  evenings: EveningCase[];
  venus: VenusCase[];
};
const DEG = Math.PI / 180;
const MINUTE = 1 / 1440;
/** Two theories of the Moon; astronomy-engine promises an arcminute. */
const PLACE_DEG = 0.02;

describe('PyEphem: new and full Moons', () => {
  it('fall within two minutes of it, in the same lunation', () => {
    for (const { newJdUt, fullJdUt } of phases) {
      const { year } = gregorianOf(Math.round(newJdUt));
      const found = moonYear(siteAt(12, 39), settingsWith(), year).lunations.find(
        ({ newMoon }) => Math.abs(newMoon.jdUt - newJdUt) < 2 * MINUTE,
      );
      expect(found, `new Moon of ${newJdUt}`).toBeDefined();
      expect(Math.abs((found?.fullMoon.jdUt ?? 0) - fullJdUt)).toBeLessThan(2 * MINUTE);
    }
  });
});

describe('PyEphem: the young Moon', () => {
  it.each(evenings)('stands where it has it at $latitudeDeg° on $bestJdUt', (known) => {
    const at = moonAndSunAt(known.bestJdUt, known);
    expect(Math.abs(at.moon.altitudeRad / DEG - known.moonAltitudeDeg)).toBeLessThan(PLACE_DEG);
    expect(Math.abs(at.moon.azimuthRad / DEG - known.moonAzimuthDeg)).toBeLessThan(PLACE_DEG);
    expect(Math.abs(at.sun.altitudeRad / DEG - known.sunAltitudeDeg)).toBeLessThan(PLACE_DEG);
    expect(Math.abs(at.geocentricArcOfVisionDeg - known.geocentricArcOfVisionDeg)).toBeLessThan(PLACE_DEG);
    // The place sees the Moon lower than the Earth's centre does: the trap between the two tests.
    expect(at.geocentricArcOfVisionDeg - at.topocentricArcOfVisionDeg).toBeGreaterThan(0.75);
    // Width by hand from PyEphem's diameter and separation. The tests' arc of light takes the two altitudes as flat, which
    // is a hundredth for a wide crescent and nothing for a thin one.
    const width = (known.moonDiameterArcmin / 2) * (1 - Math.cos(known.elongationDeg * DEG));
    expect(Math.abs(at.widthByOdehArcmin - width)).toBeLessThan(0.003 + 0.015 * width);
  });

  it.each(evenings)('has the same evening at $latitudeDeg° on $sunsetJdUt', (known) => {
    const clock = dayClockOf(null, known.longitudeDeg);
    const ground = { ...known, skyline: levelSkyline(0), clock };
    const evening = crescentEveningOf(ground, Math.round(known.sunsetJdUt + known.longitudeDeg / 360 - 0.25));
    expect(Math.abs((evening.sunsetJdUt ?? 0) - known.sunsetJdUt)).toBeLessThan(MINUTE);
    expect(Math.abs((evening.moonsetJdUt ?? 0) - known.moonsetJdUt)).toBeLessThan(MINUTE);
    expect(Math.abs((evening.bestJdUt ?? 0) - known.bestJdUt)).toBeLessThan(MINUTE);
  });
});

describe('PyEphem: a walk through every day of Venus', () => {
  it.each(venus)('finds the same appearances at $latitudeDeg° with a skyline of $skylineDeg°', (known) => {
    const skyline = known.skylineDeg === 0 ? [] : [{ azimuthDeg: 0, altitudeDeg: known.skylineDeg }];
    const site = siteAt(known.latitudeDeg, known.longitudeDeg, { skyline });
    const settings = settingsWith({ skylineRule: 'depth-at-crossing' });
    const years = [2024, 2025, 2026, 2027].map((year) => venusYear(site, settings, year));
    for (const appearance of VENUS_APPEARANCES) {
      const days = years.flatMap(({ appearances }) =>
        appearances[appearance].occurrences.map(({ expected }) => expected.dayNumber),
      );
      expect(days, appearance).toHaveLength(known[appearance].length);
      days.forEach((day, index) => {
        expect(Math.abs(day - (known[appearance][index] ?? 0)), `${appearance} ${day}`).toBeLessThanOrEqual(
          1,
        );
      });
    }
  });
});
