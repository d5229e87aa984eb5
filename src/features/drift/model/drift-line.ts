import type { DriftDay, DriftEpoch } from '#shared/contracts/drift.js';
import type { Phenomenon } from '#shared/sky/vocabulary.js';
import { dateOfDayNumber, dayNumberOf, readDate, type PlainDate } from '#src/lib/days.js';

/**
 * A day of one year as a place in the seasons: days since 1 January in the mean of the Gregorian calendar, whose leap days
 * push single dates to and fro by up to a day. It goes on beyond 0 and 365 where a marker slips over New Year, so
 * that its line never jumps.
 */
export interface DriftPoint {
  year: number;
  /** The date itself, as it is told in words. */
  date: PlainDate;
  early: number | null;
  expected: number;
  late: number | null;
}

/** The year that lends its months to the scale: one without a 29 February. */
const PLAIN_YEAR = 2027;
const PLAIN_YEAR_DAYS = 365;
const FIRST_DAY = dayNumberOf({ year: PLAIN_YEAR, month: 1, day: 1 });
/** Mean length of the Gregorian year. */
const GREGORIAN_YEAR_DAYS = 365.2425;
/** Where 1 January of the year 2000 would stand without leap days: the mean of the four centuries round it. */
const MEAN_NEW_YEAR = meanNewYear();

/** The dated years of a phenomenon in runs: a run ends where a year has no date. */
export function driftRuns(epochs: readonly DriftEpoch[], phenomenon: Phenomenon): DriftPoint[][] {
  const runs: DriftPoint[][] = [];
  let before: DriftPoint | null = null;
  let isOpen = false;
  for (const { year, outcome, phenomena } of epochs) {
    const { occurrences } = phenomena[phenomenon];
    const [day] = occurrences;
    if (day === undefined) {
      // A year that the day has slipped past is no gap in the sky.
      const slipped = outcome === 'rises-and-sets' && phenomena[phenomenon].outcome === 'none-in-this-year';
      if (!slipped) isOpen = false;
      continue;
    }
    const point: DriftPoint = pointOf(year, day, before);
    const run = runs.at(-1);
    if (isOpen && run) run.push(point);
    else runs.push([point]);
    isOpen = true;
    before = point;
  }
  return runs;
}

/** A day's place in the seasons, within half a year of the point before it. */
function pointOf(year: number, day: DriftDay, before: DriftPoint | null): DriftPoint {
  const date = readDate(day.expected.gregorian);
  if (date === null) throw new TypeError(`Not a date: ${day.expected.gregorian}`);
  const sinceMeanNewYear = day.expected.dayNumber - MEAN_NEW_YEAR;
  const about = before?.expected ?? GREGORIAN_YEAR_DAYS / 2;
  const expected =
    sinceMeanNewYear - Math.round((sinceMeanNewYear - about) / GREGORIAN_YEAR_DAYS) * GREGORIAN_YEAR_DAYS;
  const beside = (end: { dayNumber: number } | null) =>
    end && expected + end.dayNumber - day.expected.dayNumber;
  return { year, date, early: beside(day.early), expected, late: beside(day.late) };
}

/** The date that a place in the seasons has in a plain year. */
export function plainDate(season: number): PlainDate {
  const inYear = ((Math.round(season) % PLAIN_YEAR_DAYS) + PLAIN_YEAR_DAYS) % PLAIN_YEAR_DAYS;
  return dateOfDayNumber(FIRST_DAY + inYear);
}

export interface DriftScale {
  fromYear: number;
  toYear: number;
  /** Places in the seasons at the upper and the lower edge. */
  top: number;
  bottom: number;
  /** Where lines of the scale lie: firsts of months, or days between them. */
  days: number[];
  years: number[];
}

/** At least this many days fit, so that a marker that keeps its day does not look restless. */
const LEAST_DAYS = 40;
const MARGIN_DAYS = 4;
const YEAR_STEPS = [10, 20, 50, 100, 200, 500, 1000, 2000] as const;
const MOST_DAY_LINES = 7;

/** The frame that holds all runs. */
export function driftScale(
  runs: readonly (readonly DriftPoint[])[],
  years: { from: number; to: number },
  mostYearLines: number,
): DriftScale {
  const points = runs.flat();
  const low = Math.min(...points.map(({ early, expected }) => early ?? expected)) - MARGIN_DAYS;
  const high = Math.max(...points.map(({ late, expected }) => late ?? expected)) + MARGIN_DAYS;
  const spare = Math.max(0, LEAST_DAYS - (high - low)) / 2;
  const [top, bottom] = [Math.floor(low - spare), Math.ceil(high + spare)];
  const step = YEAR_STEPS.find((each) => (years.to - years.from) / each <= mostYearLines) ?? 2000;
  const lines: number[] = [];
  for (let year = Math.ceil(years.from / step) * step; year <= years.to; year += step) lines.push(year + 0);
  return { fromYear: years.from, toYear: years.to, top, bottom, days: dayLines(top, bottom), years: lines };
}

/** Firsts of months; where there are too few of them, also the 11th and 21st; where too many, every other month. */
function dayLines(top: number, bottom: number): number[] {
  const within = (fits: (date: PlainDate) => boolean) => {
    const days: number[] = [];
    for (let day = top; day <= bottom; day += 1) if (fits(plainDate(day))) days.push(day);
    return days;
  };
  const firsts = within(({ day }) => day === 1);
  if (firsts.length > MOST_DAY_LINES) return within(({ day, month }) => day === 1 && month % 2 === 1);
  return firsts.length >= 3 ? firsts : within(({ day }) => day === 1 || day === 11 || day === 21);
}

function meanNewYear(): number {
  let sum = 0;
  for (let year = 1800; year < 2200; year += 1) {
    sum += dayNumberOf({ year, month: 1, day: 1 }) - (year - 2000) * GREGORIAN_YEAR_DAYS;
  }
  return sum / 400;
}
