import { describe, expect, it } from 'vitest';

import { phenomenonInYear } from '#shared/sky/markers/phenomenon-in-year.js';
import { civilYearOf } from '#shared/sky/time/civil-year.js';
import { siteAt } from '#tests/support/sky/builders.js';
import { markerAt } from '#tests/support/sky/marker.js';

describe('a phenomenon in a year', () => {
  it('has a range of the same disappearance around the expected day', () => {
    const { outcome, occurrences } = phenomenonInYear(
      markerAt('hr2491', siteAt(30), 2027),
      'heliacal-rising',
    );
    expect(outcome).toBe('dated');
    const [only] = occurrences;
    // 3° from end to end at a little more than a day per degree.
    expect((only?.late?.dayNumber ?? 0) - (only?.early?.dayNumber ?? 0)).toBeGreaterThanOrEqual(3);
    expect((only?.late?.dayNumber ?? 0) - (only?.early?.dayNumber ?? 0)).toBeLessThanOrEqual(4);
    expect(only?.expected.neededDepressionDeg).toBeCloseTo(11, 9);
    expect(only?.early?.neededDepressionDeg).toBeCloseTo(9.5, 9);
    expect(only?.late?.neededDepressionDeg).toBeCloseTo(12.5, 9);
    expect(only?.expected.sunDepressionDeg).toBeGreaterThanOrEqual(11);
  });

  it('asks for more depth on earlier evenings: the hard end of a dusk phenomenon comes first', () => {
    const [only] = phenomenonInYear(markerAt('hr2491', siteAt(30), 2027), 'heliacal-setting').occurrences;
    expect(only?.early?.neededDepressionDeg).toBeCloseTo(12.5, 9);
    expect(only?.late?.neededDepressionDeg).toBeCloseTo(9.5, 9);
  });

  it('names azimuths of star and Sun: Sirius rises in the east-south-east, the Sun north of it', () => {
    const [only] = phenomenonInYear(markerAt('hr2491', siteAt(30), 2027), 'heliacal-rising').occurrences;
    expect(only?.expected.starAzimuthDeg).toBeCloseTo(109, 0);
    expect(only?.expected.sunAzimuthDeg).toBeGreaterThan(55);
    expect(only?.expected.sunAzimuthDeg).toBeLessThan(75);
    expect(only?.expected.starAltitudeDeg).toBeCloseTo(0, 9);
  });

  it('may fall twice in a year, or not at all, when it comes at the turn of the year', () => {
    // Sirius' last evening rising at 11° N stands at New Year.
    const all: number[] = [];
    const counts = new Set<number>();
    for (let year = 1990; year < 2035; year += 1) {
      const { outcome, occurrences } = phenomenonInYear(
        markerAt('hr2491', siteAt(11), year),
        'acronychal-rising',
      );
      counts.add(occurrences.length);
      expect(outcome).toBe(occurrences.length === 0 ? 'none-in-this-year' : 'dated');
      const { firstDay, lastDay } = civilYearOf(year);
      for (const { expected } of occurrences) {
        expect(expected.dayNumber).toBeGreaterThanOrEqual(firstDay);
        expect(expected.dayNumber).toBeLessThanOrEqual(lastDay);
        all.push(expected.dayNumber);
      }
    }
    expect(counts).toEqual(new Set([0, 1, 2]));
    // Together the years leave none out and count none twice.
    const gaps = new Set(all.slice(1).map((day, index) => day - (all[index] ?? 0)));
    expect([...gaps].sort()).toEqual([365, 366]);
  });

  it('says when the sky is never dark enough: the Pleiades have no first morning at 55° N', () => {
    const result = phenomenonInYear(markerAt('pleiades', siteAt(55), 2000), 'heliacal-rising');
    expect(result).toEqual({ phenomenon: 'heliacal-rising', outcome: 'never-dark-enough', occurrences: [] });
  });

  it('leaves out an end of the range for which the sky is never dark enough', () => {
    // Antares at 60° N: a first morning setting with 7°, but none with 11°.
    const [only] = phenomenonInYear(markerAt('hr6134', siteAt(60), 2027), 'cosmical-setting').occurrences;
    expect(only?.early).not.toBeNull();
    expect(only?.late).toBeNull();
  });

  it('warns of a range longer than three weeks', () => {
    const [weak] = phenomenonInYear(markerAt('pleiades', siteAt(55), 2027), 'acronychal-rising').occurrences;
    expect((weak?.late?.dayNumber ?? 0) - (weak?.early?.dayNumber ?? 0)).toBeGreaterThan(21);
    expect(weak?.notes).toEqual(['weak-marker']);
    const [strong] = phenomenonInYear(markerAt('hr2491', siteAt(30), 2027), 'heliacal-rising').occurrences;
    expect(strong?.notes).toEqual([]);
  });

  it('dates by the clock of the place', () => {
    const dayAt = (timeZone: string): number =>
      phenomenonInYear(markerAt('hr2491', siteAt(1.9, -157.4, { timeZone }), 2027), 'heliacal-rising')
        .occurrences[0]?.expected.dayNumber ?? 0;
    // Kiritimati keeps the date of the other side of the date line.
    expect(dayAt('Pacific/Kiritimati') - dayAt('Pacific/Honolulu')).toBe(1);
  });
});
