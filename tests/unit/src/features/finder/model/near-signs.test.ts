import { describe, expect, it } from 'vitest';
import type { SkyMarkerYear } from '#shared/contracts/sky-markers.js';
import { nearSigns } from '#src/features/finder/model/near-signs.js';

const WANTED = { from: 100, to: 110 };

/** A sign with its days and the half width of its range. */
function sign(spec: SkyMarkerYear['spec'], days: readonly number[], half = 2): SkyMarkerYear {
  const day = (dayNumber: number) => ({ dayNumber, gregorian: '', julian: '' });
  return {
    spec,
    year: 2027,
    outcome: 'dated',
    reason: null,
    time: 'day',
    sourceKey: 'made up',
    basis: { range: 'made up', toleranceDeg: 0, engineVersion: 'made up' },
    occurrences: days.map((each) => ({
      expected: day(each),
      early: day(each - half),
      late: day(each + half),
      notes: [],
      azimuthDeg: null,
      altitudeDeg: null,
      compass: null,
      localTime: null,
    })),
  };
}
const solstice = { kind: 'sun-season', season: 'june-solstice' } as const;
const equinox = { kind: 'sun-season', season: 'march-equinox' } as const;
const zenith = { kind: 'zenith-sun' } as const;
const found = (years: readonly SkyMarkerYear[]) =>
  nearSigns(years, WANTED).map(({ spec, daysAway }) => [spec.kind, daysAway]);

describe('signs of the sky near wanted days', () => {
  it('come nearest first, counted from the nearer end, and among equally near ones the sharper first', () => {
    expect(found([sign(equinox, [92]), sign(solstice, [112], 5), sign(zenith, [112], 1)])).toEqual([
      ['zenith-sun', 2],
      ['sun-season', 2],
      ['sun-season', -8],
    ]);
  });

  it('say which of the year’s days it is', () => {
    expect(nearSigns([sign(zenith, [20, 105])], WANTED)).toMatchObject([{ occurrence: 2, daysAway: 0 }]);
  });

  it('leave out what falls near every day or keeps no year: Moons and Venus', () => {
    const moon = { kind: 'moon-phase', event: 'full' } as const;
    const venus = { kind: 'venus-appearance', appearance: 'evening-first' } as const;
    expect(found([sign(moon, [105]), sign(venus, [105])])).toEqual([]);
  });

  it('are the last before and the next after where none lies within twenty days', () => {
    expect(found([sign(equinox, [10, 40]), sign(solstice, [150, 200])])).toEqual([
      ['sun-season', -60],
      ['sun-season', 40],
    ]);
  });
});
