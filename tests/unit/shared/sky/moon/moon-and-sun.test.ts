import { AstroTime, Observer, SearchLocalSolarEclipse } from 'astronomy-engine';
import { describe, expect, it } from 'vitest';

import { moonAndSunAt } from '#shared/sky/moon/moon-and-sun.js';
import { dayNumberOf, JD_J2000 } from '#shared/sky/time/julian-day.js';

describe('Moon and Sun at a place', () => {
  it('stand in one place while the Moon covers the Sun', () => {
    // Luxor, 2 August 2027, by astronomy-engine's own search for eclipses.
    const site = { latitudeDeg: 25.7, longitudeDeg: 32.6 };
    const from = dayNumberOf({ year: 2027, month: 7, day: 20 }, 'gregorian') - JD_J2000;
    const eclipse = SearchLocalSolarEclipse(
      new AstroTime(from),
      new Observer(site.latitudeDeg, site.longitudeDeg, 0),
    );
    const at = moonAndSunAt(eclipse.peak.time.ut + JD_J2000, site);
    expect(Math.abs(at.topocentricArcOfVisionDeg)).toBeLessThan(0.02);
    expect(at.widthByOdehArcmin).toBeLessThan(0.001);
    expect(at.sun.altitudeRad).toBeGreaterThan(1);
  });
});
