import { Seasons } from 'astronomy-engine';
import { describe, expect, it } from 'vitest';
import { computeSkyMarker, type SkyMarkerSpec } from '#shared/sky/index.js';
import { settingsWith, siteAt } from '#tests/support/sky/builders.js';
import { jsonFixture } from '#tests/support/sky/fixtures.js';

interface SignCase {
  latitudeDeg: number;
  longitudeDeg: number;
  spec: SkyMarkerSpec;
  passages: { jdUt: number; goes: 'up' | 'down' }[];
}

const YEAR = 2027;
const { cases } = jsonFixture('ephem-signs.json') as { cases: SignCase[] };
const settings = settingsWith();
const yearOf = (spec: SkyMarkerSpec, latitudeDeg: number, longitudeDeg = 0, year = YEAR) =>
  computeSkyMarker(spec, siteAt(latitudeDeg, longitudeDeg), settings, year);
const titled = cases.map((one) => ({
  ...one,
  title: `${JSON.stringify(one.spec)} at ${one.latitudeDeg}° ${one.longitudeDeg}°`,
}));

/** The nearest day lies within half a day of the passage; a tenth is left for two ephemerides and refractions. */
const HALF_DAY = 0.6;
/** The last or first night lies within a day of it, on the dark side, and is noted an hour and a half before midnight. */
const WHOLE_DAY = 1.2;

describe('PyEphem, day by day', () => {
  it.each(titled)('has the same days for $title', ({ spec, latitudeDeg, longitudeDeg, passages }) => {
    const { outcome, reason, occurrences } = yearOf(spec, latitudeDeg, longitudeDeg);
    const isNight = spec.kind === 'dark-night';
    const wanted = isNight
      ? passages.filter(({ goes }) => goes === (spec.end === 'first' ? 'up' : 'down'))
      : passages;
    if (outcome === 'never-here' && (reason === 'too-light' || reason === 'star-below-skyline')) {
      // Geometry passes there, and nobody sees it; the fixture knows no light and no skyline.
      expect(occurrences).toEqual([]);
      return;
    }
    const days = occurrences.map(({ expected }) => expected.jdUt);
    for (const { jdUt } of wanted) {
      const nearest = Math.min(...days.map((day) => Math.abs(day - jdUt)));
      expect(nearest).toBeLessThan(isNight ? WHOLE_DAY : HALF_DAY);
    }
    expect(days).toHaveLength(wanted.length);
  });

  it('sees most of the stars’ days, so that little goes unchecked', () => {
    const seen = cases.filter(
      (one) => yearOf(one.spec, one.latitudeDeg, one.longitudeDeg).outcome === 'dated',
    );
    expect(seen.length / cases.length).toBeGreaterThan(0.6);
  });
});

describe('the ephemeris package’s own seasons', () => {
  it.each([1900, 2000, 2027, 2100, 2200])('begin on the same days in %s', (year) => {
    const theirs = Seasons(year);
    const of = (season: Extract<SkyMarkerSpec, { kind: 'sun-season' }>['season']) =>
      yearOf({ kind: 'sun-season', season }, 45, 0, year).occurrences[0]?.expected.jdUt ?? 0;
    // Half an hour: the core's Sun is interpolated and inverted to a thousandth of a day.
    expect(of('march-equinox') - 2_451_545).toBeCloseTo(theirs.mar_equinox.ut, 1);
    expect(of('june-solstice') - 2_451_545).toBeCloseTo(theirs.jun_solstice.ut, 1);
    expect(of('september-equinox') - 2_451_545).toBeCloseTo(theirs.sep_equinox.ut, 1);
    expect(of('december-solstice') - 2_451_545).toBeCloseTo(theirs.dec_solstice.ut, 1);
  });
});

/** The days that the literature on the site gives for the present; leap years stand up to a day and a half earlier. */
describe('published days of the Sun overhead', () => {
  it('at Izapa, 14.92° N, are 30 April and 13 August, to a day', () => {
    const days = yearOf({ kind: 'zenith-sun' }, 14.92, -92.18).occurrences.map(({ expected }) => expected);
    const [spring, summer] = days.map(({ gregorian: { month, day } }) => month * 100 + day);
    expect(Math.abs((spring ?? 0) - 430)).toBeLessThanOrEqual(1);
    expect(Math.abs((summer ?? 0) - 813)).toBeLessThanOrEqual(1);
  });
});
