import { describe, expect, it } from 'vitest';

import { preparedYearOf } from '#shared/sky/phenomena/year-cache.js';

describe('kept years', () => {
  it('are prepared once while they are in use', () => {
    expect(preparedYearOf(1234)).toBe(preparedYearOf(1234));
  });

  it('make room for others, the one asked for longest ago first', () => {
    const kept = preparedYearOf(1300);
    const old = preparedYearOf(1200);
    preparedYearOf(1300);
    for (let year = 1400; year < 1411; year += 1) preparedYearOf(year);
    expect(preparedYearOf(1300)).toBe(kept);
    expect(preparedYearOf(1200)).not.toBe(old);
  });
});
