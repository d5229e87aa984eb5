// npm run bench            a table for people
// npm run bench -- --json  one JSON line
import {
  DAILY_SEARCH_STAR,
  dailySearchStarYear,
  minuteScanStarYear,
  modelStarYear,
  scanStarYear,
} from './comparisons.js';
import { fastestMs } from './stopwatch.js';
import { benchSettings, benchSite, hillSite } from './subject.js';

import { measureApiReads } from './api-reads.js';
import { findEverything, FOUND_KEYS } from './marker-finder.js';

import { computeMarkerYear, driftOf, expectedDates, prepareYear, STARS } from '#shared/sky/index.js';

/** 100 epochs over all years that the engine offers. */
const EPOCHS = Array.from({ length: 100 }, (_, index) => -3000 + 60 * index);

/** Aldebaran, the star of the plain scan too. */
const DRIFTER = 'hr1457';

const wholeSkyYear = (site: typeof benchSite, year: number): void => {
  expectedDates(site, benchSettings, year, prepareYear(year));
};

const wholeSkyYearMs = fastestMs(25, () => wholeSkyYear(benchSite, 2027));
const wholeSkyYearHillsMs = fastestMs(25, () => wholeSkyYear(hillSite, 2027));
const hundredEpochsMs = fastestMs(4, () => {
  for (const year of EPOCHS) wholeSkyYear(benchSite, year);
});
const driftHundredEpochsMs = fastestMs(7, () => driftOf(DRIFTER, benchSite, benchSettings, EPOCHS));
const hundredFullYearsMs = fastestMs(4, () => {
  for (const year of EPOCHS) computeMarkerYear(DRIFTER, benchSite, benchSettings, year);
});
const markerFinderMs = fastestMs(5, () => findEverything(benchSite));
const markerFinderHillsMs = fastestMs(5, () => findEverything(hillSite));
const crossingScanStarYearMs = fastestMs(7, scanStarYear);
const dailySearchStarYearMs = fastestMs(7, dailySearchStarYear);
const modelStarYearMs = fastestMs(15, modelStarYear);
const minuteScanStarYearMs = fastestMs(3, minuteScanStarYear);

const { apiReadP95Ms, healthP95Ms } = await measureApiReads();

const rounded = (value: number): number => Number(value.toPrecision(4));
const results = {
  wholeSkyYearMs: rounded(wholeSkyYearMs),
  wholeSkyYearHillsMs: rounded(wholeSkyYearHillsMs),
  hundredEpochsMs: rounded(hundredEpochsMs),
  driftHundredEpochsMs: rounded(driftHundredEpochsMs),
  hundredFullYearsMs: rounded(hundredFullYearsMs),
  driftRatio: Math.round((EPOCHS.length * crossingScanStarYearMs) / driftHundredEpochsMs),
  markerFinderMs: rounded(markerFinderMs),
  markerFinderHillsMs: rounded(markerFinderHillsMs),
  markerFinderRatio: Math.round((FOUND_KEYS.length * crossingScanStarYearMs) / markerFinderMs),
  crossingScanStarYearMs: rounded(crossingScanStarYearMs),
  dailySearchStarYearMs: rounded(dailySearchStarYearMs),
  modelStarYearMs: rounded(modelStarYearMs),
  minuteScanStarYearMs: rounded(minuteScanStarYearMs),
  modelRatio: Math.round(minuteScanStarYearMs / modelStarYearMs),
  apiReadP95Ms: rounded(apiReadP95Ms),
  healthP95Ms: rounded(healthP95Ms),
  apiReadP95Ratio: rounded(apiReadP95Ms / healthP95Ms),
  ratio: Math.round((dailySearchStarYearMs * STARS.length) / wholeSkyYearMs),
};

const meanings: Record<keyof typeof results, string> = {
  wholeSkyYearMs: `${STARS.length} stars × 4 expected dates, one place, one year, preparation included (aim 10)`,
  wholeSkyYearHillsMs: 'the same over a skyline of 36 points',
  hundredEpochsMs: 'the same for 100 epochs from −3000 to 2940, flat horizon (aim 400)',
  driftHundredEpochsMs:
    'four phenomena with ranges of one star at the same epochs, preparation included (aim 30)',
  hundredFullYearsMs: 'the same epochs as full star-years, nights hidden included',
  driftRatio: 'plain scan of a hundred years ÷ drift',
  markerFinderMs: `${FOUND_KEYS.length} markers × 4 phenomena with ranges, ranked against a wanted day (aim 300)`,
  markerFinderHillsMs: 'the same over a skyline of 36 points',
  markerFinderRatio:
    'plain scan of the same stars (one measured, times their number) ÷ finder, ranges and ranking in the finder only',
  crossingScanStarYearMs: 'one star-year by the plain scan that the tests use as oracle',
  dailySearchStarYearMs: `one star-year by astronomy-engine’s daily rise and set search (${DAILY_SEARCH_STAR})`,
  modelStarYearMs: 'one star-year of the model of visibility: four phenomena in one air (aim 50)',
  minuteScanStarYearMs: 'the same four by looking at every minute of the year through the same model',
  modelRatio: 'minute scan ÷ model',
  apiReadP95Ms: 'everyday reads of the demo at 100 a second: 95 of 100 are answered within',
  healthP95Ms: 'the same for /api/health, in the same run',
  apiReadP95Ratio: 'reads ÷ health (aim at most 5)',
  ratio: 'daily search for the whole table ÷ whole sky (aim 5000)',
};

if (process.argv.includes('--json')) {
  process.stdout.write(`${JSON.stringify(results)}\n`);
} else {
  for (const key of Object.keys(results) as (keyof typeof results)[]) {
    process.stdout.write(`${key.padEnd(24)} ${String(results[key]).padStart(9)}  ${meanings[key]}\n`);
  }
}
