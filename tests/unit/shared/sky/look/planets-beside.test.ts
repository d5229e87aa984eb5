import { describe, expect, it } from 'vitest';

import { bodyPlaceAt } from '#shared/sky/look/body-places.js';
import { planetsBeside } from '#shared/sky/look/planets-beside.js';
import { skyAt } from '#shared/sky/look/sky-at.js';
import { siteAt } from '#tests/support/sky/builders.js';
import { markerAt } from '#tests/support/sky/marker.js';

/** 8 June 2027, 05:07 at 12° N 39° E: Venus stands 3.6° high in the east-north-east (PyEphem: tests/reference). */
const DAWN_JD_UT = 2_461_564.5887;
const DEG = Math.PI / 180;
const site = siteAt(12, 39);
const { year, ground } = markerAt('pleiades', site, 2027);

function starBesideVenus(rightDeg: number, jdUt = DAWN_JD_UT) {
  const sky = skyAt(year, ground, jdUt);
  const venus = bodyPlaceAt('venus', site, jdUt);
  return { sky, star: { ...venus, azimuthRad: venus.azimuthRad - rightDeg * DEG } };
}

describe('planets that could be taken for the star', () => {
  it('are those within three hands, told by how far and which way from the star', () => {
    const [venus, ...others] = planetsBeside(site, 1, [starBesideVenus(8)]);
    expect(others).toEqual([]);
    expect(venus).toMatchObject({ planet: 'venus', isBrighter: true, jdUt: DAWN_JD_UT });
    expect(venus?.separationDeg).toBeCloseTo(8, 1);
    expect(venus?.bearingDeg).toBeCloseTo(90, 0);
    expect(planetsBeside(site, 1, [starBesideVenus(31)])).toEqual([]);
  });

  it('count only while they stand over the skyline, at the first moment at which they do', () => {
    const before = starBesideVenus(8, DAWN_JD_UT - 30 / 1440);
    expect(planetsBeside(site, 1, [before])).toEqual([]);
    expect(planetsBeside(site, 1, [before, starBesideVenus(8)])[0]?.jdUt).toBe(DAWN_JD_UT);
    const hills = markerAt(
      'pleiades',
      siteAt(12, 39, { skyline: [{ azimuthDeg: 0, altitudeDeg: 6 }] }),
      2027,
    );
    const behindHill = { ...starBesideVenus(8), sky: skyAt(hills.year, hills.ground, DAWN_JD_UT) };
    expect(planetsBeside(site, 1, [behindHill])).toEqual([]);
  });

  it('are left out where they are much fainter than the star and not near it', () => {
    // Venus has −3.8 then; for a star as bright as −6 it would be no likeness unless close by.
    expect(planetsBeside(site, -6, [starBesideVenus(20)])).toEqual([]);
    expect(planetsBeside(site, -6, [starBesideVenus(9)])).toHaveLength(1);
    expect(planetsBeside(site, -4.5, [starBesideVenus(20)])[0]?.isBrighter).toBe(false);
  });
});
