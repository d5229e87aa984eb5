import { describe, expect, it } from 'vitest';

import { publishedDates, publishedDifferenceDays } from '#tests/support/sky/published-dates.js';

/** Scholarship, almanacs and one sighting; each row names its source and its tolerance. */
const rows = publishedDates('published-dates.csv');
const further = publishedDates('further-dates.csv');

describe('dates from the literature', () => {
  it('are all read', () => expect([rows.length, further.length]).toEqual([30, 10]));

  it.each([...rows, ...further])('$id $star, $phenomenon: within $toleranceDays d of [$source]', (row) => {
    expect(Math.abs(publishedDifferenceDays(row))).toBeLessThanOrEqual(row.toleranceDays);
  });

  it('scatter, the first 26 of them, as an independent implementation found: mean −0.5 d, standard deviation 1.0 d', () => {
    const differences = rows.slice(0, 26).map(publishedDifferenceDays);
    const mean = differences.reduce((sum, one) => sum + one, 0) / differences.length;
    const variance = differences.reduce((sum, one) => sum + (one - mean) ** 2, 0) / differences.length;
    // Half a day either way: the rounding to whole days of 26 dates moves the mean by less.
    expect(Math.abs(mean + 0.5)).toBeLessThan(0.5);
    expect(Math.sqrt(variance)).toBeLessThan(1.5);
  });
});
