import type { MoonQuestion } from '#shared/contracts/moons.js';
import { MOON_EVENTS, type MoonEvent, PHENOMENA, type Phenomenon } from '#shared/sky/vocabulary.js';

/** Years whose dates are Gregorian throughout, as this page writes them. */
export const MOONS_FIRST_YEAR = 1583;
export const MOONS_LAST_YEAR = 3000;

/** What the page of Moons shows, as it stands in its address. */
export interface MoonsChoice {
  year: number;
  /** Null: the months are not counted. */
  marker: string | null;
  phenomenon: Phenomenon;
  signMonth: number;
  begins: MoonEvent;
}

/** The oldest sign of all, and the one that most peoples count from. */
const USUAL = {
  marker: 'pleiades',
  phenomenon: 'heliacal-rising',
  signMonth: 1,
  begins: 'first-crescent',
} as const;
const NOT_COUNTED = 'none';

/** @param thisYear the year at the place, where the address names none */
export function readMoonsAddress(search: URLSearchParams, thisYear: number): MoonsChoice {
  const marker = search.get('count') ?? USUAL.marker;
  return {
    year: wholeWithin(search.get('year'), MOONS_FIRST_YEAR, MOONS_LAST_YEAR) ?? thisYear,
    marker: marker === NOT_COUNTED ? null : marker,
    phenomenon: oneOf(PHENOMENA, search.get('sign')) ?? USUAL.phenomenon,
    signMonth: wholeWithin(search.get('month'), 1, 12) ?? USUAL.signMonth,
    begins: oneOf(MOON_EVENTS, search.get('begins')) ?? USUAL.begins,
  };
}

/** The other way round; what is usual stays out of the address. Other parts of it stay as they are. */
export function writeMoonsAddress(
  before: URLSearchParams,
  choice: MoonsChoice,
  thisYear: number,
): URLSearchParams {
  const after = new URLSearchParams(before);
  const put = (key: string, value: string, usual: string): void => {
    if (value === usual) after.delete(key);
    else after.set(key, value);
  };
  put('year', String(choice.year), String(thisYear));
  put('count', choice.marker ?? NOT_COUNTED, USUAL.marker);
  put('sign', choice.phenomenon, USUAL.phenomenon);
  put('month', String(choice.signMonth), String(USUAL.signMonth));
  put('begins', choice.begins, USUAL.begins);
  return after;
}

/** What the server is asked. */
export function moonQuestionOf({ year, marker, phenomenon, signMonth, begins }: MoonsChoice): MoonQuestion {
  return marker === null ? { year } : { year, marker, phenomenon, month: signMonth, begins };
}

function oneOf<T extends string>(list: readonly T[], value: string | null): T | null {
  return list.find((each) => each === value) ?? null;
}

function wholeWithin(text: string | null, min: number, max: number): number | null {
  const number = Number(text ?? '');
  return text !== null && text.trim() !== '' && Number.isInteger(number) && number >= min && number <= max
    ? number
    : null;
}
