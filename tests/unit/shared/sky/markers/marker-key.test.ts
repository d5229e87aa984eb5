import { describe, expect, it } from 'vitest';

import { markerKeyOf, resolveMarker } from '#shared/sky/markers/marker-key.js';

describe('marker keys', () => {
  it('name a star by its HR number', () => {
    expect(markerKeyOf(1165)).toBe('hr1165');
    expect(resolveMarker('hr1165')).toMatchObject({ hr: 1165, vMag: 2.87, figure: null, override: null });
  });

  it('name a figure, whose indicator carries the dates', () => {
    expect(resolveMarker('pleiades')).toMatchObject({
      key: 'pleiades',
      hr: 1165,
      star: { name: 'Alcyone' },
      override: { sameSideDeg: 16, oppositeSideDeg: 10 },
    });
  });

  it.each(['', 'hr', 'hr9999', 'hr01165', 'HR1165', 'hr1165 ', 'hr-1', 'hyades', 'constructor'])(
    '"%s" is none',
    (key) => expect(resolveMarker(key)).toBeNull(),
  );
});
