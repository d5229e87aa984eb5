import { describe, expect, it } from 'vitest';

import { markerKeyOf, resolveMarker } from '#shared/sky/markers/marker-key.js';

describe('marker keys', () => {
  it('name a star by its HR number', () => {
    expect(markerKeyOf(1165)).toBe('hr1165');
    expect(resolveMarker('hr1165')).toMatchObject({
      star: { hr: 1165 },
      vMag: 2.87,
      figure: null,
      override: null,
    });
  });

  it('name a figure, whose indicator carries the dates', () => {
    expect(resolveMarker('pleiades')).toMatchObject({
      key: 'pleiades',
      star: { hr: 1165, name: 'Alcyone' },
      override: { sameSideDeg: 16, oppositeSideDeg: 10 },
    });
  });

  it('name a community’s own figure only beside its figures', () => {
    const patch = { rightAscensionDeg: 0, declinationDeg: 60, patchClass: 'faint' } as const;
    const own = { key: 'f-own', name: '', indicatorHr: null, memberHrs: [], patch, thresholdOverride: null };
    expect(resolveMarker('f-own', [own])).toMatchObject({ star: null, figure: own, vMag: 4.5 });
    expect(resolveMarker('f-own')).toBeNull();
  });

  it.each(['', 'hr', 'hr9999', 'hr01165', 'HR1165', 'hr1165 ', 'hr-1', 'my-own', 'constructor'])(
    '"%s" is none',
    (key) => expect(resolveMarker(key)).toBeNull(),
  );
});
