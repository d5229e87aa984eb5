import { describe, expect, it } from 'vitest';

import { dayNumberOf, depthAtCrossingYear, type Phenomenon } from '#shared/sky/index.js';
import { csvFixture } from '#tests/support/sky/fixtures.js';

/** Scholarship, almanacs and one sighting; each row names its source and its tolerance. */
const rows = csvFixture('published-dates.csv').map((row) => ({
  ...row,
  id: row['id'] ?? '',
  star: row['star'] ?? '',
  source: row['source'] ?? '',
  phenomenon: row['phenomenon'] as Phenomenon,
  hr: Number(row['hr']),
  latitudeDeg: Number(row['latitude_deg']),
  longitudeDeg: Number(row['longitude_east_deg']),
  year: Number(row['year_astronomical']),
  arcusVisionisDeg: Number(row['arcus_visionis_deg']),
  toleranceDays: Number(row['tolerance_days']),
  dayNumber: dayNumberOf(
    { year: Number(row['year_astronomical']), month: Number(row['month']), day: Number(row['day']) },
    row['calendar'] === 'julian' ? 'julian' : 'gregorian',
  ),
}));

function differenceDays(row: (typeof rows)[number]): number {
  const { hr, latitudeDeg, longitudeDeg, year, arcusVisionisDeg, phenomenon, dayNumber } = row;
  const answer = depthAtCrossingYear({
    hr,
    latitudeDeg,
    longitudeDeg,
    year,
    skylineDeg: 0,
    thresholdsDeg: { sameSide: arcusVisionisDeg, oppositeSide: arcusVisionisDeg },
  });
  const differences = (answer.dayNumbers?.[phenomenon] ?? []).map((day) => day - dayNumber);
  return differences.reduce((least, one) => (Math.abs(one) < Math.abs(least) ? one : least), Infinity);
}

describe('dates from the literature', () => {
  it('are all read', () => expect(rows).toHaveLength(30));

  it.each(rows)('$id $star, $phenomenon: within $toleranceDays d of [$source]', (row) => {
    expect(Math.abs(differenceDays(row))).toBeLessThanOrEqual(row.toleranceDays);
  });

  it('scatter as an independent implementation found for the first 26: mean −0.5 d, standard deviation 1.0 d', () => {
    const differences = rows.slice(0, 26).map(differenceDays);
    const mean = differences.reduce((sum, one) => sum + one, 0) / differences.length;
    const variance = differences.reduce((sum, one) => sum + (one - mean) ** 2, 0) / differences.length;
    // Half a day either way: the rounding to whole days of 26 dates moves the mean by less.
    expect(Math.abs(mean + 0.5)).toBeLessThan(0.5);
    expect(Math.sqrt(variance)).toBeLessThan(1.5);
  });
});
