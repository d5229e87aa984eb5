import { describe, expect, it } from 'vitest';
import { markerIconKey, skySignIconKey } from '#shared/sheet/lead-icons.js';

describe('the drawn sign of a lead', () => {
  it('is a figure’s own, a star, or a cluster for a figure without a drawing', () => {
    expect(['pleiades', 'orion-belt', 'hr2491', 'hyades'].map(markerIconKey)).toEqual([
      'cluster',
      'row',
      'star',
      'cluster',
    ]);
  });

  it('is the star’s where a sign goes by a star, else the Sun’s, the Moon’s or that of a starry night', () => {
    const belt = { kind: 'due-meridian', markerKey: 'orion-belt', facing: 'south', solarHour: 21 } as const;
    expect(skySignIconKey(belt)).toBe('row');
    expect(skySignIconKey({ kind: 'zenith-sun' })).toBe('sun');
    expect(skySignIconKey({ kind: 'moon-phase', event: 'full' })).toBe('moon');
    expect(skySignIconKey({ kind: 'venus-appearance', appearance: 'morning-first' })).toBe('star');
    expect(skySignIconKey({ kind: 'dark-night', end: 'first', depthDeg: 6 })).toBe('star');
  });
});
