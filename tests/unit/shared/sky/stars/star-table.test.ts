import { describe, expect, it } from 'vitest';

import { findStar, starIndexOf, STARS } from '#shared/sky/stars/star-table.js';
import { csvFixture } from '#tests/support/sky/fixtures.js';

describe('the star table', () => {
  it('holds the 831 stars of the catalogue file, number for number', () => {
    const rows = csvFixture('bright-stars.csv');
    expect(STARS).toHaveLength(831);
    expect(STARS.map(({ hr, vMag }) => [hr, vMag])).toEqual(
      rows.map((row) => [Number(row['hr']), Number(row['v_mag'])]),
    );
  });

  it('finds a star by its HR number and answers null for another', () => {
    expect(findStar(2491)).toMatchObject({
      name: 'Sirius',
      bayer: 'α',
      constellation: 'CMa',
      vMag: -1.46,
      hip: 32349,
    });
    expect(findStar(9999)).toBeNull();
    expect(starIndexOf(1.5)).toBeNull();
  });

  it('calls a star without a traditional name by its letter or number', () => {
    expect(findStar(130)?.name).toBe('κ Cas');
    expect(findStar(580)?.name).toBe('50 Cas');
    expect(STARS.filter(({ name }) => name.trim().length < 2)).toEqual([]);
  });
});
