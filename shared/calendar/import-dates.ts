import { daysInMonth } from '#shared/kernel/iso-date.js';
import type { Phenomenon } from '#shared/sky/index.js';
import type { MonthDay } from './entry-model.js';
import { saidBy, type ImportPhrase } from './import-phrases.js';
import { signOfPhrase, type ImportSignProblem, type NamedSign } from './import-signs.js';

/** Words of one language by which a table may name days; all of them are compared without case. */
export interface ImportWords {
  /** Twelve lists, January first: full names and short ones. */
  months: readonly (readonly string[])[];
  /** How each day of a star may be called. */
  phenomena: Readonly<Record<Phenomenon, readonly string[]>>;
  /** Before a day of the civil year, such as `Fixed date: 07-05`. */
  fixedDate: readonly string[];
  /** Other ways to write a day of a month, and its parts of ten days: `day`, `tenDays` `first`, `second`, `third`. */
  days: readonly ImportPhrase[];
  /** Ways to say days `before` and `after` a sign. */
  offsets: readonly ImportPhrase[];
  /** Ways to name signs beyond a star's first and last days, and days of other entries. */
  phrases: readonly ImportPhrase[];
}

/** How `6/7` is meant; null while nobody has said so. */
export type DayOrder = 'day-first' | 'month-first' | null;

export type ImportDateProblem =
  | 'date-not-read'
  /** With the month, whose length is told. */
  | `no-such-day-${(typeof MONTH_NUMBERS)[number]}`
  | 'no-such-month'
  | 'no-such-ten-days'
  | 'day-or-ten-days'
  | 'other-year'
  | 'which-first'
  | ImportSignProblem;

/** Months as their numbers stand in codes. */
const MONTH_NUMBERS = [1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12] as const;

/** What one cell says. A ten-day part has a first and a last day; every other day is both. */
export type DateCell =
  | { kind: 'empty' }
  /** `year` is null where none is named. */
  | { kind: 'day'; first: MonthDay; last: MonthDay; year: number | null }
  | { kind: 'sign'; sign: NamedSign; offsetDays: number }
  | { kind: 'problem'; problem: ImportDateProblem };

export interface ImportDateFacts {
  words: ImportWords;
  dayOrder: DayOrder;
  /** The calendar's year: a day with another year belongs to another calendar, save for the end of a window. */
  calendarYear: number;
  /** Stars and figures by their names as `plainWords` writes them. */
  markerKeyOf: ReadonlyMap<string, string>;
  /** Signs of nature by their names as `plainWords` writes them: the village's own, and what somebody said is one. */
  natureSigns: ReadonlyMap<string, string>;
  latitudeDeg: number;
}

const ISO = /^(\d{4})-(\d{1,2})-(\d{1,2})$/u;
const MONTH_DAY = /^(\d{2})-(\d{2})$/u;
const DOTTED = /^(\d{1,2})\.\s*(\d{1,2})\.?(?:\s*(\d{4}))?$/u;
const SLASHED = /^(\d{1,2})\/(\d{1,2})(?:\/(\d{4}))?$/u;
const DAY_THEN_WORD = /^(\d{1,2})\.?\s+(\p{L}+)\.?(?:\s+(\d{4}))?$/u;
const WORD_THEN_DAY = /^(\p{L}+)\.?\s+(\d{1,2})(?:,?\s+(\d{4}))?$/u;
const TEN_DAYS_OF_YEAR = /^d\s?(\d{1,2})$/u;
const OFFSET = /^(.*?)\s*([+\-−])\s*(\d{1,3})$/u;
/** With a space before it: `A-04` is a number of a line. */
const OFFSET_APART = /^(.*\S)\s+([+\-−])\s*(\d{1,3})$/u;
/** Longer than any sign is called; what is longer is not held against all that a sign may be called. */
const SIGN_WORDS_MAX = 300;
const TEN_DAY_NAMES: readonly string[] = ['first', 'second', 'third'];
const TEN_DAY_PARTS = TEN_DAY_NAMES.length;
const MONTHS = 12;
const TEN_DAY_PARTS_OF_YEAR = TEN_DAY_PARTS * MONTHS;

/**
 * Reads one cell of a table as a day: `2027-06-14`, `06-14`, `14.6.`, `14/6`, `14 June`, `June 14`; as a ten-day part,
 * `second ten days of June` or `June dekad 2` for 11 to 20 June or `D17` of the year's 36; or as days from a sign,
 * `Pleiades first morning +7`, `Belt due south at 21:00`, `actual date of A04 +19`, `7 days before June solstice`. A month's
 * name with nothing but 1, 2 or 3 behind it can be a day or ten days, and is asked about.
 *
 * @returns what the cell says, or what is the matter with it; never throws
 */
export function dateCell(text: string, facts: ImportDateFacts): DateCell {
  const words = plainWords(text);
  if (words === '') return { kind: 'empty' };
  return (
    dayCell(withoutFixed(words, facts.words), facts) ?? signCell(text.replace(/\s+/gu, ' ').trim(), facts)
  );
}

/** Words as they are compared: composed, small, one space between, one kind of apostrophe, no article before. */
export function plainWords(text: string): string {
  return text
    .normalize('NFC')
    .toLowerCase()
    .replace(/['ʼ]/gu, '’')
    .replace(/\s+/gu, ' ')
    .trim()
    .replace(/^the /u, '');
}

function withoutFixed(words: string, { fixedDate }: ImportWords): string {
  const prefix = fixedDate.map((each) => `${plainWords(each)}:`).find((each) => words.startsWith(each));
  return prefix === undefined ? words : words.slice(prefix.length).trim();
}

function dayCell(
  words: string,
  { words: { months, days }, dayOrder, calendarYear }: ImportDateFacts,
): DateCell | null {
  const day = (month: string | number, dayOfMonth: string, year?: string): DateCell =>
    oneDay(Number(month), Number(dayOfMonth), year === undefined ? null : Number(year), calendarYear);
  const monthOf = (name: string) =>
    months.findIndex((names) => names.some((each) => plainWords(each) === name)) + 1;

  const iso = ISO.exec(words);
  if (iso) return day(iso[2] ?? '', iso[3] ?? '', iso[1]);
  const monthDay = MONTH_DAY.exec(words);
  if (monthDay) return day(monthDay[1] ?? '', monthDay[2] ?? '');
  const dotted = DOTTED.exec(words);
  if (dotted) return day(dotted[2] ?? '', dotted[1] ?? '', dotted[3]);
  const slashed = SLASHED.exec(words);
  if (slashed) return slashedDay(slashed, dayOrder, day);
  const tenDays = TEN_DAYS_OF_YEAR.exec(words);
  if (tenDays) return tenDayPart(Number(tenDays[1]));
  const dayFirst = DAY_THEN_WORD.exec(words);
  if (dayFirst && monthOf(dayFirst[2] ?? '') > 0) {
    return day(monthOf(dayFirst[2] ?? ''), dayFirst[1] ?? '', dayFirst[3]);
  }
  const monthFirst = WORD_THEN_DAY.exec(words);
  const month = monthFirst ? monthOf(monthFirst[1] ?? '') : 0;
  if (monthFirst && month > 0) {
    const number = Number(monthFirst[2]);
    const canBePart = number >= 1 && number <= TEN_DAY_PARTS && monthFirst[3] === undefined;
    if (canBePart) return { kind: 'problem', problem: 'day-or-ten-days' };
    return day(month, monthFirst[2] ?? '', monthFirst[3]);
  }
  const said = saidBy(words, days);
  const monthSaid = said === null ? 0 : monthOf(plainWords(said.holes.month ?? '').replace(/\.$/u, ''));
  if (said !== null && monthSaid > 0) {
    const [head = '', part = ''] = said.path;
    if (head === 'day') return day(monthSaid, said.holes.day ?? '', said.holes.year);
    return tenDayPart((monthSaid - 1) * TEN_DAY_PARTS + TEN_DAY_NAMES.indexOf(part) + 1);
  }
  // Digits alone, or nothing but digits and their marks, are no sign either.
  return /^[\d\s./-]+$/u.test(words) ? { kind: 'problem', problem: 'date-not-read' } : null;
}

function slashedDay(
  [, first = '', second = '', year]: RegExpExecArray,
  dayOrder: DayOrder,
  day: (month: string, dayOfMonth: string, year?: string) => DateCell,
): DateCell {
  if (Number(first) > MONTHS) return day(second, first, year);
  if (Number(second) > MONTHS) return day(first, second, year);
  // The same number twice is the same day both ways.
  if (Number(first) === Number(second)) return day(first, second, year);
  if (dayOrder === null) return { kind: 'problem', problem: 'which-first' };
  return dayOrder === 'day-first' ? day(second, first, year) : day(first, second, year);
}

function oneDay(month: number, day: number, year: number | null, calendarYear: number): DateCell {
  if (year !== null && year !== calendarYear && year !== calendarYear + 1) {
    return { kind: 'problem', problem: 'other-year' };
  }
  const known = MONTH_NUMBERS.find((each) => each === month);
  if (known === undefined) return { kind: 'problem', problem: 'no-such-month' };
  // A day of every year has no 29 February.
  if (day < 1 || day > daysInMonth(1, month)) return { kind: 'problem', problem: `no-such-day-${known}` };
  return { kind: 'day', first: { month, day }, last: { month, day }, year };
}

/** Three to a month: 1–10, 11–20 and the rest of it. */
function tenDayPart(number: number): DateCell {
  if (number < 1 || number > TEN_DAY_PARTS_OF_YEAR) return { kind: 'problem', problem: 'no-such-ten-days' };
  const month = Math.ceil(number / TEN_DAY_PARTS);
  const part = (number - 1) % TEN_DAY_PARTS;
  const lastDay = part === TEN_DAY_PARTS - 1 ? daysInMonth(1, month) : (part + 1) * 10;
  return { kind: 'day', first: { month, day: part * 10 + 1 }, last: { month, day: lastDay }, year: null };
}

function signCell(text: string, facts: ImportDateFacts): DateCell {
  if (text.length > SIGN_WORDS_MAX) return { kind: 'problem', problem: 'unknown-sign-words' };
  const counted = saidBy(text, facts.words.offsets);
  if (counted !== null) {
    const of = signCell(counted.holes.sign ?? '', facts);
    const days = Number(counted.holes.count) * (counted.path[0] === 'after' ? 1 : -1);
    return of.kind === 'sign' ? { ...of, offsetDays: of.offsetDays + days } : of;
  }
  const apart = offsetBehind(OFFSET_APART, text);
  for (const { name, offsetDays } of [apart, { name: text, offsetDays: 0 }]) {
    const said = saidBy(name, facts.words.phrases);
    if (said === null) continue;
    const sign = signOfPhrase(said, {
      markerKeyOf: (star) => facts.markerKeyOf.get(plainWords(star)),
      phenomenonOf: (called) => phenomenonOf(plainWords(called), facts.words),
      latitudeDeg: facts.latitudeDeg,
    });
    if ('problem' in sign) return { kind: 'problem', problem: sign.problem };
    return { kind: 'sign', sign, offsetDays };
  }
  const { name, offsetDays } = offsetBehind(OFFSET, text);
  const nature = facts.natureSigns.get(plainWords(name));
  if (nature !== undefined) return { kind: 'sign', sign: { type: 'nature', name: nature }, offsetDays };
  return starCell(plainWords(name), offsetDays, facts);
}

function offsetBehind(pattern: RegExp, text: string): { name: string; offsetDays: number } {
  const parts = pattern.exec(text);
  if (!parts) return { name: text, offsetDays: 0 };
  return { name: parts[1] ?? '', offsetDays: (parts[2] === '+' ? 1 : -1) * Number(parts[3]) };
}

function phenomenonOf(name: string, { phenomena }: ImportWords): Phenomenon | undefined {
  const found = Object.entries(phenomena).find(([, names]) =>
    names.some((each) => plainWords(each) === name),
  );
  return found?.[0] as Phenomenon | undefined;
}

function starCell(
  name: string,
  offsetDays: number,
  { words: { phenomena }, markerKeyOf }: ImportDateFacts,
): DateCell {
  // The longest ending first: "first morning setting" is not "first morning" of something called so.
  const endings = Object.entries(phenomena)
    .flatMap(([phenomenon, names]) => names.map((each) => ({ phenomenon, ending: plainWords(each) })))
    .sort((a, b) => b.ending.length - a.ending.length);
  const found = endings.find(({ ending }) => name.endsWith(` ${ending}`) || name.endsWith(`,${ending}`));
  if (!found) return { kind: 'problem', problem: 'unknown-sign-words' };
  const star = plainWords(name.slice(0, -found.ending.length).replace(/[\s,:]+$/u, ''));
  const markerKey = markerKeyOf.get(star);
  if (markerKey === undefined) return { kind: 'problem', problem: 'unknown-star-name' };
  const phenomenon = found.phenomenon as Phenomenon;
  return { kind: 'sign', sign: { type: 'star', markerKey, phenomenon }, offsetDays };
}
