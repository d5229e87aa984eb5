import { beforeAll, describe, expect, it } from 'vitest';
import type { MarkerRow } from '#shared/contracts/stars.js';
import { dayOf, hiddenOf } from '#src/features/stars/model/star-rows.js';
import { starTable } from '#tests/support/stars-of-tazimel.js';

let rows: MarkerRow[];
beforeAll(async () => {
  rows = (await starTable(2027)).items;
}, 30_000);

describe('what a column sorts by', () => {
  it('is the expected day, and nothing where there is no date', () => {
    const pleiades = rows.find((row) => row.markerKey === 'pleiades');
    const expected = pleiades?.phenomena['heliacal-rising'].occurrences[0]?.expected.dayNumber;
    expect(pleiades && dayOf(pleiades, 'heliacal-rising')).toBe(expected);
    const polaris = rows.find((row) => row.hr === 424);
    expect(polaris && dayOf(polaris, 'heliacal-rising')).toBeUndefined();
  });

  it('is no number of nights for a star that is never hidden', () => {
    for (const row of rows) {
      if (row.notes.includes('never-disappears')) expect(hiddenOf(row), row.markerKey).toBeUndefined();
    }
  });
});
