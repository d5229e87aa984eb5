import { dayNumberOf, depthAtCrossingYear, type Phenomenon } from '#shared/sky/index.js';
import { csvFixture } from './fixtures.js';

/** A date from scholarship, an almanac or a sighting, with the arcus visionis to run it with. */
export interface PublishedDate {
  id: string;
  star: string;
  source: string;
  phenomenon: Phenomenon;
  hr: number;
  latitudeDeg: number;
  longitudeDeg: number;
  year: number;
  arcusVisionisDeg: number;
  toleranceDays: number;
  dayNumber: number;
}

/** @param file of tests/fixtures/sky */
export function publishedDates(file: string): PublishedDate[] {
  return csvFixture(file).map((row) => ({
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
}

/** The engine's day minus the published one. */
export function publishedDifferenceDays(date: PublishedDate): number {
  const { hr, latitudeDeg, longitudeDeg, year, arcusVisionisDeg, phenomenon, dayNumber } = date;
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
