import { describe, expect, it } from 'vitest';
import { signOfPhrase, type SignFacts } from '#shared/calendar/import-signs.js';

const FACTS: SignFacts = {
  markerKeyOf: (name) => (name === 'Belt' ? 'orion-belt' : undefined),
  phenomenonOf: (name) => (name === 'first morning' ? 'heliacal-rising' : undefined),
  latitudeDeg: 60,
};
const sign = (path: readonly string[], holes: object = {}, latitudeDeg = 60) =>
  signOfPhrase({ path, holes }, { ...FACTS, latitudeDeg });

describe('a sign that a phrase names', () => {
  it('has its hour in parts of an hour and its figures as numbers', () => {
    expect(sign(['due-meridian', 'south'], { star: 'Belt', hour: '21:45' })).toEqual({
      ...{ type: 'sky', occurrence: 1 },
      spec: { kind: 'due-meridian', markerKey: 'orion-belt', facing: 'south', solarHour: 21.75 },
    });
    expect(sign(['dark-night', 'last', 'depth'], { depth: '12' })).toMatchObject({
      spec: { end: 'last', depthDeg: 12 },
    });
  });

  it('says which star is not known', () => {
    expect(sign(['due-meridian', 'south'], { star: 'Nail', hour: '21' })).toEqual({
      problem: 'unknown-star-name',
    });
  });

  it('is a Moon by its number in the year, or counted from a star', () => {
    expect(sign(['moon-phase', 'full'], { number: '3' })).toMatchObject({ occurrence: 3 });
    const counted = { star: 'Belt', phenomenon: 'first morning', number: '2' };
    expect(sign(['moon-counted', 'new'], counted)).toMatchObject({
      spec: { kind: 'moon-counted', event: 'new', phenomenon: 'heliacal-rising', count: 2 },
    });
    expect(sign(['moon-counted', 'new'], { ...counted, phenomenon: 'at noon' })).toEqual({
      problem: 'unknown-sign-words',
    });
  });

  it('is asked about where it may be either: a season between the tropics, a point without a direction', () => {
    expect(sign(['season', 'winter'], {}, -23.5)).toMatchObject({ spec: { season: 'june-solstice' } });
    expect(sign(['season', 'winter'], {}, -23.4)).toEqual({ problem: 'which-season' });
    expect(sign(['sun-azimuth', 'sunrise', 'named'], { point: 'the notch' })).toEqual({
      problem: 'direction-missing',
    });
  });
});
