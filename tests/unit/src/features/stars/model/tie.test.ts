import { beforeAll, describe, expect, it } from 'vitest';
import type { MarkerRow } from '#shared/contracts/stars.js';
import { phenomenonToTie } from '#src/features/stars/model/tie.js';
import { starTable } from '#tests/support/stars-of-tazimel.js';

let rows: MarkerRow[];
beforeAll(async () => {
  rows = (await starTable(2027)).items;
}, 30_000);

describe('the day to tie work to', () => {
  it('is the return, where the star returns', () => {
    const pleiades = rows.find((row) => row.markerKey === 'pleiades');
    expect(pleiades && phenomenonToTie(pleiades)).toBe('heliacal-rising');
  });

  it('always is a day that the star has in this year', () => {
    for (const row of rows) {
      const phenomenon = phenomenonToTie(row);
      if (phenomenon !== null) expect(row.phenomena[phenomenon].occurrences.length).toBeGreaterThan(0);
    }
  });

  it('is none for a star without days', () => {
    const polaris = rows.find((row) => row.hr === 424);
    expect(polaris && phenomenonToTie(polaris)).toBeNull();
  });
});
