import { describe, expect, it } from 'vitest';
import type { SkyMarkerSpec, SkyMarkerYear } from '#shared/contracts/sky-markers.js';
import { canonicalJson } from '#shared/kernel/canonical-json.js';
import { signOf, specsOf } from '#src/features/calendars/model/signs.js';

const ridge = (ridgeName: string): SkyMarkerSpec => ({ kind: 'noon-sun', passage: 'back', ridgeName });
const led = (spec: SkyMarkerSpec) => ({ lead: { type: 'sky', spec, occurrence: 1 } as const });

describe('signs that are asked for', () => {
  it('are asked once, whatever the village calls the ridge: a name moves no date', () => {
    expect(specsOf([led(ridge('the south ridge')), led(ridge('Old Tooth'))])).toEqual([ridge('')]);
  });

  it('are not asked for before they can be', () => {
    const noStar: SkyMarkerSpec = { kind: 'due-meridian', markerKey: '', facing: 'south', solarHour: 21 };
    expect(specsOf([led(noStar)])).toEqual([]);
  });

  it('answer under the name that was written', () => {
    const found: SkyMarkerYear = {
      spec: ridge(''),
      year: 2027,
      outcome: 'never-here',
      reason: 'noon-sun-always-clears',
      occurrences: [],
      time: 'noon',
      sourceKey: 'Bennett1982',
      basis: { range: 'noon-sun-edge', toleranceDeg: 0.25, engineVersion: '1' },
    };
    const signs = new Map([[canonicalJson(ridge('')), found]]);
    expect(signOf(signs, ridge('Old Tooth'))?.spec).toEqual(ridge('Old Tooth'));
    expect(signOf(signs, { ...ridge(''), kind: 'noon-sun', passage: 'gone' } as SkyMarkerSpec)).toBeNull();
  });
});
