import { describe, expect, it } from 'vitest';
import { skyMarkerTimeOf } from '#shared/sky/vocabulary.js';

describe('the part of the day of a sign', () => {
  it('is the morning for hours before noon, else the evening', () => {
    const due = { kind: 'due-meridian', markerKey: 'hr2491', facing: 'south' } as const;
    expect(skyMarkerTimeOf({ ...due, solarHour: 4.5 })).toBe('morning');
    expect(skyMarkerTimeOf({ ...due, solarHour: 21 })).toBe('evening');
    const low = { kind: 'star-altitude', markerKey: 'hr2491', altitudeDeg: 30, side: 'east' } as const;
    expect(skyMarkerTimeOf({ ...low, at: { clock: 'before-sunrise', minutes: 30 } })).toBe('morning');
    expect(skyMarkerTimeOf({ ...low, at: { clock: 'solar-hour', solarHour: 20 } })).toBe('evening');
  });

  it('is noon, the night or the day as a whole for the Sun and the nights', () => {
    expect(skyMarkerTimeOf({ kind: 'zenith-sun' })).toBe('noon');
    expect(skyMarkerTimeOf({ kind: 'dark-night', end: 'first', depthDeg: 6 })).toBe('night');
    expect(skyMarkerTimeOf({ kind: 'sun-season', season: 'june-solstice' })).toBe('day');
    expect(skyMarkerTimeOf({ kind: 'sun-azimuth', event: 'sunset', azimuthDeg: 250, pointName: '' })).toBe(
      'evening',
    );
  });
});
