import { describe, expect, it } from 'vitest';
import {
  computeMarkerYear,
  computeSkyMarker,
  ENGINE_VERSION,
  type Site,
  type SkyMarkerSpec,
  type SkyMarkerYear,
} from '#shared/sky/index.js';
import { SKY_MARKER_KINDS } from '#shared/sky/vocabulary.js';
import { settingsWith, siteAt } from '#tests/support/sky/builders.js';

const settings = settingsWith();
const north = siteAt(66, 23, {
  timeZone: 'Europe/Stockholm',
  skyline: [
    { azimuthDeg: 0, altitudeDeg: 3 },
    { azimuthDeg: 180, altitudeDeg: 2 },
  ],
});
const yearOf = (spec: SkyMarkerSpec, site: Site, year = 2027): SkyMarkerYear =>
  computeSkyMarker(spec, site, settings, year);
const monthDay = ({ gregorian: { month, day } }: SkyMarkerYear['occurrences'][number]['expected']) =>
  `${month}-${day}`;
const daysOf = (spec: SkyMarkerSpec, site: Site, year = 2027) =>
  yearOf(spec, site, year).occurrences.map(({ expected }) => monthDay(expected));
const reasonOf = (spec: SkyMarkerSpec, site: Site) => {
  const { outcome, reason, occurrences } = yearOf(spec, site);
  expect(occurrences).toEqual([]);
  return [outcome, reason];
};

const ONE_OF_EACH: readonly SkyMarkerSpec[] = [
  { kind: 'culmination', markerKey: 'hr2491', twilight: 'dusk', depthDeg: 12 },
  {
    kind: 'star-altitude',
    markerKey: 'pleiades',
    altitudeDeg: 45,
    side: 'east',
    at: { clock: 'after-sunset', minutes: 60 },
  },
  { kind: 'due-meridian', markerKey: 'orion-belt', facing: 'south', solarHour: 21 },
  { kind: 'about-pole', markerKey: 'hr5191', position: 'highest', solarHour: 21 },
  { kind: 'sun-season', season: 'june-solstice' },
  { kind: 'sun-azimuth', event: 'sunrise', azimuthDeg: 85, pointName: 'the notch' },
  { kind: 'noon-sun', passage: 'back', ridgeName: '' },
  { kind: 'zenith-sun' },
  { kind: 'dark-night', end: 'last', depthDeg: 6 },
  { kind: 'moon-phase', event: 'full' },
  { kind: 'moon-counted', markerKey: 'hr2491', phenomenon: 'heliacal-setting', event: 'new', count: 2 },
  { kind: 'venus-appearance', appearance: 'evening-first' },
];

describe('every kind of sign', () => {
  it('stands in these tests', () => {
    expect(ONE_OF_EACH.map(({ kind }) => kind)).toEqual(SKY_MARKER_KINDS);
  });

  it('gives days in the civil year with an ordered range and a basis, or a reason', () => {
    for (const latitudeDeg of [-66, -35, -14, 0, 14.92, 38, 52, 66, 78]) {
      for (const spec of ONE_OF_EACH) {
        const found = yearOf(spec, { ...north, latitudeDeg });
        expect(found.reason === null).toBe(found.outcome === 'dated');
        expect(found.occurrences.length > 0).toBe(found.outcome === 'dated');
        expect(found.sourceKey).not.toBe('');
        expect(found.basis).toMatchObject({ engineVersion: ENGINE_VERSION });
        for (const { expected, early, late } of found.occurrences) {
          expect(expected.gregorian.year).toBe(2027);
          expect(early?.dayNumber ?? expected.dayNumber - 1).toBeLessThan(expected.dayNumber);
          expect(late?.dayNumber ?? expected.dayNumber + 1).toBeGreaterThan(expected.dayNumber);
          expect(Number.isFinite(expected.jdUt)).toBe(true);
        }
      }
    }
  });

  it('answers at the poles and in far years without a number that is none', () => {
    for (const latitudeDeg of [-90, 90]) {
      for (const year of [-3000, 3000]) {
        for (const spec of ONE_OF_EACH) {
          const { occurrences } = yearOf(spec, siteAt(latitudeDeg), year);
          for (const { expected } of occurrences) expect(Number.isFinite(expected.jdUt)).toBe(true);
        }
      }
    }
  });
});

describe('a star at its height', () => {
  it('comes on the same evening every year but for the leap days, and where the village looks', () => {
    const [spec] = ONE_OF_EACH as [SkyMarkerSpec];
    const [day] = yearOf(spec, siteAt(14.92, -92)).occurrences;
    expect(day?.expected.azimuthDeg).toBeCloseTo(180, 0);
    // Sirius stands 90° − 14.92° − 16.74° high.
    expect(day?.expected.altitudeDeg).toBeCloseTo(58.3, 0);
  });

  it('moves through an hour of the clock by a day for 4 minutes: one hour later is 15 days earlier', () => {
    const at = (solarHour: number) =>
      yearOf({ kind: 'due-meridian', markerKey: 'orion-belt', facing: 'south', solarHour }, north)
        .occurrences[0]?.expected.dayNumber ?? 0;
    expect([15, 16]).toContain(at(20) - at(21));
  });

  it('does not care for haze', () => {
    const [spec] = ONE_OF_EACH as [SkyMarkerSpec];
    const hazy = settingsWith({ clarityByMonth: new Array<'hazy'>(12).fill('hazy') });
    const site = siteAt(38, 23);
    expect(computeSkyMarker(spec, site, hazy, 2027)).toEqual(yearOf(spec, site));
  });

  it('is one long spell where dusk comes earlier as fast as the stars do', () => {
    const vega: SkyMarkerSpec = { kind: 'culmination', markerKey: 'hr7001', twilight: 'dusk', depthDeg: 6 };
    const { occurrences } = yearOf(vega, siteAt(60, 10));
    expect(occurrences).toHaveLength(1);
    expect(occurrences[0]?.notes).toContain('weak-marker');
  });

  it('says why there is none: behind the skyline, on the other side, in light nights', () => {
    const due = { kind: 'due-meridian', solarHour: 21 } as const;
    expect(reasonOf({ ...due, markerKey: 'hr2326', facing: 'south' }, north)).toEqual([
      'never-here',
      'star-below-skyline',
    ]);
    expect(reasonOf({ ...due, markerKey: 'orion-belt', facing: 'north' }, north)).toEqual([
      'never-here',
      'star-passes-other-side',
    ]);
    expect(reasonOf({ ...due, markerKey: 'hr2491', facing: 'south', solarHour: 12 }, siteAt(38))).toEqual([
      'never-here',
      'too-light',
    ]);
  });

  it('stands twice a year at a height, once in the east and once in the west', () => {
    const at = { clock: 'after-sunset', minutes: 60 } as const;
    const spec = { kind: 'star-altitude', markerKey: 'pleiades', altitudeDeg: 45, at } as const;
    const east = yearOf({ ...spec, side: 'east' }, siteAt(14.92, -92)).occurrences[0];
    const west = yearOf({ ...spec, side: 'west' }, siteAt(14.92, -92)).occurrences[0];
    expect(east?.expected.azimuthDeg).toBeLessThan(180);
    expect(west?.expected.azimuthDeg).toBeGreaterThan(180);
    for (const one of [east, west]) expect(Math.abs((one?.expected.altitudeDeg ?? 0) - 45)).toBeLessThan(0.6);
    expect(reasonOf({ ...spec, side: 'east', altitudeDeg: 85 }, north)).toEqual([
      'never-here',
      'altitude-not-reached',
    ]);
  });
});

describe('a star about the pole', () => {
  it('turns by a quarter in a quarter of a year, highest, left, lowest, right', () => {
    const days = (['highest', 'left', 'lowest', 'right'] as const).map(
      (position) =>
        yearOf({ kind: 'about-pole', markerKey: 'hr5191', position, solarHour: 23 }, siteAt(50, 23))
          .occurrences[0]?.expected.dayNumber ?? 0,
    );
    const gaps = days.map((day, index) => ((days[(index + 1) % 4] ?? 0) - day + 730.48) % 365.24);
    for (const gap of gaps) expect(Math.abs(gap - 91.3)).toBeLessThan(2);
  });

  it('has left and right exchanged in the south, where one looks the other way', () => {
    const of = (latitudeDeg: number, markerKey: string, position: 'left' | 'right') =>
      yearOf({ kind: 'about-pole', markerKey, position, solarHour: 21 }, siteAt(latitudeDeg)).occurrences[0]
        ?.expected.azimuthDeg ?? 0;
    // Dubhe left of the northern pole stands in the west of north, Acrux left of the southern one in the east of south.
    expect(of(52, 'hr4301', 'left')).toBeGreaterThan(180);
    expect(of(-52, 'hr4730', 'left')).toBeLessThan(180);
  });
});

describe('the Sun', () => {
  it('passes a point of the skyline twice; far from the solstices to a day', () => {
    const spec: SkyMarkerSpec = {
      kind: 'sun-azimuth',
      event: 'sunrise',
      azimuthDeg: 90,
      pointName: '',
    };
    const { occurrences } = yearOf(spec, siteAt(14.92, -92));
    expect(occurrences.map(({ expected }) => monthDay(expected))).toEqual(['3-20', '9-23']);
    for (const { expected, early, late } of occurrences) {
      expect((late?.dayNumber ?? 0) - (early?.dayNumber ?? 0)).toBe(2);
      expect(Math.abs((expected.azimuthDeg ?? 0) - 90)).toBeLessThan(0.3);
    }
  });

  it('rises later over a hill, and so further along in the direction in which it climbs', () => {
    const spec: SkyMarkerSpec = { kind: 'sun-season', season: 'march-equinox' };
    const azimuth = (altitudeDeg: number) =>
      yearOf(spec, siteAt(50, 0, { skyline: [{ azimuthDeg: 90, altitudeDeg }] })).occurrences[0]?.expected
        .azimuthDeg ?? 0;
    // tan 50° for each degree of height.
    expect(azimuth(5) - azimuth(0)).toBeCloseTo(5 * Math.tan((50 * Math.PI) / 180), 0);
  });

  it('stands still near a solstice: both passages share the range', () => {
    const spec: SkyMarkerSpec = {
      kind: 'sun-azimuth',
      event: 'sunrise',
      azimuthDeg: 65.5,
      pointName: '',
    };
    const [first, second] = yearOf(spec, siteAt(14.92, -92)).occurrences;
    expect(first?.notes).toEqual(['standstill']);
    expect(first?.late).toEqual(second?.early);
  });

  it('never comes to a point outside its range', () => {
    expect(
      reasonOf({ kind: 'sun-azimuth', event: 'sunrise', azimuthDeg: 40, pointName: '' }, siteAt(15)),
    ).toEqual(['never-here', 'azimuth-not-reached']);
  });

  it('is behind the ridge at noon for as many days before the solstice as after it', () => {
    const noon = (passage: 'back' | 'gone', year: number) =>
      yearOf({ kind: 'noon-sun', passage, ridgeName: '' }, north, year).occurrences[0]?.expected.jdUt ?? 0;
    const solstice = yearOf({ kind: 'sun-season', season: 'december-solstice' }, north, 2026).occurrences[0];
    const middle = (noon('gone', 2026) + noon('back', 2027)) / 2;
    expect(Math.abs(middle - (solstice?.expected.jdUt ?? 0))).toBeLessThan(1);
  });

  it('says of a ridge that it hides the noon Sun never or always', () => {
    const back: SkyMarkerSpec = { kind: 'noon-sun', passage: 'back', ridgeName: '' };
    expect(reasonOf(back, siteAt(40))).toEqual(['never-here', 'noon-sun-always-clears']);
    const wall = siteAt(66, 0, { skyline: [{ azimuthDeg: 180, altitudeDeg: 50 }] });
    expect(reasonOf(back, wall)).toEqual(['never-here', 'noon-sun-never-clears']);
  });

  it('stands overhead twice between the tropics, near them with the solstice in the range, beyond them never', () => {
    const zenith: SkyMarkerSpec = { kind: 'zenith-sun' };
    const between = yearOf(zenith, siteAt(14.92, -92)).occurrences;
    expect(between).toHaveLength(2);
    expect(between[0]?.expected.altitudeDeg).toBeGreaterThan(89.5);
    expect(daysOf(zenith, siteAt(23.46))).toEqual(['6-21']);
    expect(yearOf(zenith, siteAt(23.46)).occurrences[0]?.notes).toContain('standstill');
    expect(reasonOf(zenith, siteAt(24))).toEqual(['never-here', 'sun-never-overhead']);
  });
});

describe('dark nights', () => {
  it('end and begin again around the summer solstice of the place', () => {
    const night = (end: 'last' | 'first', site: Site) =>
      yearOf({ kind: 'dark-night', end, depthDeg: 12 }, site).occurrences[0]?.expected.gregorian.month;
    expect([night('last', north), night('first', north)]).toEqual([4, 8]);
    const south = siteAt(-66, 23);
    expect([night('last', south), night('first', south)]).toEqual([10, 2]);
  });

  it('are never missed where the Sun always sinks so deep', () => {
    expect(reasonOf({ kind: 'dark-night', end: 'last', depthDeg: 18 }, siteAt(30))).toEqual([
      'never-here',
      'nights-always-dark',
    ]);
  });

  it('carry the date of their evening, also where the clock runs a day ahead of the Sun', () => {
    const spec: SkyMarkerSpec = { kind: 'dark-night', end: 'last', depthDeg: 6 };
    const [at] = yearOf(spec, siteAt(66, -157, { timeZone: 'Pacific/Kiritimati' })).occurrences;
    const [plain] = yearOf(spec, siteAt(66, -157)).occurrences;
    expect((at?.expected.dayNumber ?? 0) - (plain?.expected.dayNumber ?? 0)).toBe(1);
  });
});

describe('the door', () => {
  it.each([
    ['spec.kind', { kind: 'comet' }],
    ['spec.kind', null],
    ['spec.markerKey', { kind: 'due-meridian', markerKey: 'hr9999', facing: 'south', solarHour: 21 }],
    ['spec.facing', { kind: 'due-meridian', markerKey: 'hr2491', facing: 'up', solarHour: 21 }],
    ['spec.solarHour', { kind: 'due-meridian', markerKey: 'hr2491', facing: 'south', solarHour: 24 }],
    ['spec.solarHour', { kind: 'about-pole', markerKey: 'hr2491', position: 'left', solarHour: 21.1 }],
    ['spec.depthDeg', { kind: 'dark-night', end: 'last', depthDeg: 7 }],
    ['spec.azimuthDeg', { kind: 'sun-azimuth', event: 'sunrise', azimuthDeg: 361, pointName: '' }],
    ['spec.pointName', { kind: 'sun-azimuth', event: 'sunrise', azimuthDeg: 90, pointName: 3 }],
    ['spec.at', { kind: 'star-altitude', markerKey: 'hr2491', altitudeDeg: 45, side: 'east' }],
    [
      'spec.at.minutes',
      {
        kind: 'star-altitude',
        markerKey: 'hr2491',
        altitudeDeg: 45,
        side: 'east',
        at: { clock: 'after-sunset', minutes: 5 },
      },
    ],
  ])('names %s where it is out of range', (field, spec) => {
    expect(() => yearOf(spec as SkyMarkerSpec, north)).toThrow(expect.objectContaining({ field }));
  });

  it('leaves the dates of first and last days as they are', () => {
    const before = computeMarkerYear('pleiades', north, settings, 2027);
    for (const spec of ONE_OF_EACH) yearOf(spec, north);
    expect(computeMarkerYear('pleiades', north, settings, 2027)).toEqual(before);
  });
});
