/**
 * Civil dates of the (proleptic) Gregorian calendar as `YYYY-MM-DD`, reckoned by day number. No clock, no time
 * zone and no `Date`: a civil date is not an instant. A day number is the Julian Day Number of the civil day (the
 * Julian Day at its noon), the same count that the sky's results carry.
 */
export type IsoDate = string;

export interface CivilDate {
  year: number;
  /** 1…12 */
  month: number;
  /** 1…31 */
  day: number;
}

const MONTH_DAYS = [31, 28, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31] as const;
const ISO_DATE = /^(\d{4})-(\d{2})-(\d{2})$/u;
const LAST_YEAR = 9999;

const DAYS_PER_400_YEARS = 146_097;
/** Day number of 1 March of year 0, from which whole 400-year rounds are counted. */
const ROUND_ORIGIN = 1_721_120;

export function isLeapYear(year: number): boolean {
  return year % 4 === 0 && (year % 100 !== 0 || year % 400 === 0);
}

export function daysInYear(year: number): number {
  return isLeapYear(year) ? 366 : 365;
}

export function daysInMonth(year: number, month: number): number {
  const days = MONTH_DAYS[month - 1];
  if (days === undefined) throw new RangeError(`There is no month ${month}.`);
  return month === 2 && isLeapYear(year) ? 29 : days;
}

/** Day number of a date that exists; throws a RangeError for one that does not, such as 29 February 2027. */
export function dayNumberOf(year: number, month: number, day: number): number {
  if (!Number.isInteger(year) || year < 0 || year > LAST_YEAR) {
    throw new RangeError(`The year ${year} cannot be written with four digits.`);
  }
  if (!Number.isInteger(day) || day < 1 || day > daysInMonth(year, month)) {
    throw new RangeError(`There is no day ${day} in month ${month} of ${year}.`);
  }
  // Years are counted from March, so that the leap day is the last day of its year.
  const marchYear = month > 2 ? year : year - 1;
  const marchMonth = (month + 9) % 12;
  const leapDays = Math.floor(marchYear / 4) - Math.floor(marchYear / 100) + Math.floor(marchYear / 400);
  return ROUND_ORIGIN + 365 * marchYear + leapDays + Math.floor((153 * marchMonth + 2) / 5) + (day - 1);
}

/** The date of a day number, years 0…9999. */
export function civilDateOf(dayNumber: number): CivilDate {
  if (!Number.isInteger(dayNumber)) throw new RangeError(`${dayNumber} is not a whole day number.`);
  const sinceOrigin = dayNumber - ROUND_ORIGIN;
  const round = Math.floor(sinceOrigin / DAYS_PER_400_YEARS);
  const dayOfRound = sinceOrigin - round * DAYS_PER_400_YEARS;
  // Take the leap days out, so that every year of the round has 365 days.
  const yearOfRound = Math.floor(
    (dayOfRound -
      Math.floor(dayOfRound / 1_460) +
      Math.floor(dayOfRound / 36_524) -
      Math.floor(dayOfRound / (DAYS_PER_400_YEARS - 1))) /
      365,
  );
  const dayOfMarchYear =
    dayOfRound - (365 * yearOfRound + Math.floor(yearOfRound / 4) - Math.floor(yearOfRound / 100));
  const marchMonth = Math.floor((5 * dayOfMarchYear + 2) / 153);
  const month = marchMonth < 10 ? marchMonth + 3 : marchMonth - 9;
  const year = round * 400 + yearOfRound + (month <= 2 ? 1 : 0);
  if (year < 0 || year > LAST_YEAR)
    throw new RangeError(`Day ${dayNumber} lies outside the years 0 to 9999.`);
  return { year, month, day: dayOfMarchYear - Math.floor((153 * marchMonth + 2) / 5) + 1 };
}

export function isoDateOf(dayNumber: number): IsoDate {
  const { year, month, day } = civilDateOf(dayNumber);
  return `${String(year).padStart(4, '0')}-${twoDigits(month)}-${twoDigits(day)}`;
}

export function civilDateFromIso(iso: IsoDate): CivilDate {
  const parts = ISO_DATE.exec(iso);
  if (!parts) throw new RangeError(`"${iso}" is not a date of the form YYYY-MM-DD.`);
  return { year: Number(parts[1]), month: Number(parts[2]), day: Number(parts[3]) };
}

export function dayNumberFromIso(iso: IsoDate): number {
  const { year, month, day } = civilDateFromIso(iso);
  return dayNumberOf(year, month, day);
}

export function addDays(iso: IsoDate, days: number): IsoDate {
  return isoDateOf(dayNumberFromIso(iso) + days);
}

/** Days from `from` to `to`; negative where `to` is earlier. */
export function daysBetween(from: IsoDate, to: IsoDate): number {
  return dayNumberFromIso(to) - dayNumberFromIso(from);
}

/** 1 for 1 January, 365 or 366 for 31 December. */
export function dayOfYear(iso: IsoDate): number {
  const { year } = civilDateFromIso(iso);
  return dayNumberFromIso(iso) - dayNumberOf(year, 1, 1) + 1;
}

/** Ascending through the months and days of a year. */
export function monthDayKey({ month, day }: Pick<CivilDate, 'month' | 'day'>): number {
  return month * 100 + day;
}

function twoDigits(value: number): string {
  return String(value).padStart(2, '0');
}
