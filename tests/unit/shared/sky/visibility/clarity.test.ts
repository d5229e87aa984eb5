import { describe, expect, it } from 'vitest';

import { CLARITY_SHIFT_DEG, clarityOfMonth } from '#shared/sky/visibility/clarity.js';

describe('clarity', () => {
  it('asks for less depth in clear air and for more in haze', () => {
    expect(CLARITY_SHIFT_DEG).toEqual({ clear: -1, ordinary: 0, hazy: 1 });
  });

  it('is that of the month, January first', () => {
    const months = ['hazy', ...new Array<'ordinary'>(10).fill('ordinary'), 'clear'] as const;
    expect([1, 6, 12].map((month) => clarityOfMonth(months, month))).toEqual(['hazy', 'ordinary', 'clear']);
  });
});
