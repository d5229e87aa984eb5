import { describe, expect, it } from 'vitest';
import { skyMarkerSpec } from '#shared/contracts/sky-markers.js';
import { findSigns, OWN_KINDS, startOf } from '#src/features/calendars/model/sign-starts.js';

describe('a sign that one sets up oneself', () => {
  it('begins with parameters that can be saved as they are', () => {
    for (const kind of OWN_KINDS) {
      expect(skyMarkerSpec.safeParse(startOf(kind, 'pleiades', [])).success).toBe(true);
    }
  });

  it('faces the side on which stars are highest at the place', () => {
    const north = { kind: 'due-meridian', markerKey: 'hr2491', facing: 'north', solarHour: 21 } as const;
    expect(startOf('due-meridian', 'pleiades', [{ spec: north }])).toMatchObject({ facing: 'north' });
  });

  it('faces the star’s own side where the place’s list has it, else that of most stars', () => {
    const due = (markerKey: string, facing: 'south' | 'north') => ({
      spec: { kind: 'due-meridian', markerKey, facing, solarHour: 21 } as const,
    });
    const offered = [due('hr1708', 'north'), due('hr2491', 'south'), due('hr2061', 'south')];
    expect(startOf('due-meridian', 'hr1708', offered)).toMatchObject({ facing: 'north' });
    expect(startOf('due-meridian', 'pleiades', offered)).toMatchObject({ facing: 'south' });
  });
});

describe('the signs that are found', () => {
  const signs = [
    { name: 'Sirius due south', isInUse: false },
    { name: 'Première nuit', isInUse: false },
    { name: 'June solstice', isInUse: true },
  ];

  it('are those with the word in their name, whatever its marks; what is in use comes first', () => {
    expect(findSigns(signs, 'premiere').map(({ name }) => name)).toEqual(['Première nuit']);
    expect(findSigns(signs, '').map(({ name }) => name)).toEqual([
      'June solstice',
      'Sirius due south',
      'Première nuit',
    ]);
  });
});
