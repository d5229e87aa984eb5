import { describe, expect, it } from 'vitest';

import { type Figure, SkyRangeError } from '#shared/sky/index.js';
import { assertFigures } from '#shared/sky/markers/figure-checks.js';

const FIGURE: Figure = {
  key: 'f-net',
  name: 'The net',
  indicatorHr: 1165,
  memberHrs: [1142, 1165],
  patch: null,
  thresholdOverride: null,
};
const PATCH: Figure = {
  ...FIGURE,
  key: 'f-river',
  indicatorHr: null,
  memberHrs: [],
  patch: { rightAscensionDeg: 266, declinationDeg: -29, patchClass: 'full-night' },
};

describe('a community’s own figures at the door', () => {
  it('may be groups of stars of the table and patches of sky', () => {
    expect(() => assertFigures([FIGURE, PATCH])).not.toThrow();
  });

  it('never take the key of another figure or of a star', () => {
    for (const key of ['pleiades', 'hr1165', 'f-river']) {
      expect(() => assertFigures([PATCH, { ...FIGURE, key }]), key).toThrow(/figures\.1\.key/);
    }
  });

  it('get their dates from either an indicator star or a patch', () => {
    expect(() => assertFigures([{ ...FIGURE, indicatorHr: null }])).toThrow(SkyRangeError);
    expect(() => assertFigures([{ ...PATCH, indicatorHr: 1165 }])).toThrow(SkyRangeError);
  });

  it('name the field that is out of range', () => {
    const patch = { rightAscensionDeg: 10, declinationDeg: 10, patchClass: 'faint' } as const;
    const cases: [Partial<Figure>, RegExp][] = [
      [{ indicatorHr: 9999 }, /indicatorHr/],
      [{ memberHrs: [1165, 0] }, /memberHrs/],
      [{ indicatorHr: null, patch: { ...patch, rightAscensionDeg: 360.1 } }, /rightAscensionDeg/],
      [{ indicatorHr: null, patch: { ...patch, declinationDeg: NaN } }, /declinationDeg/],
      [{ indicatorHr: null, patch: { ...patch, patchClass: 'dim' as 'faint' } }, /patchClass/],
      [{ thresholdOverride: { sameSideDeg: 50, oppositeSideDeg: 10, source: '' } }, /sameSideDeg/],
      [{ thresholdOverride: { sameSideDeg: 15, oppositeSideDeg: -1, source: '' } }, /oppositeSideDeg/],
    ];
    for (const [change, message] of cases)
      expect(() => assertFigures([{ ...FIGURE, ...change }])).toThrow(message);
  });
});
