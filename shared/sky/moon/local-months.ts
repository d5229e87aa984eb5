import type { MoonDay } from './moon-types.js';
import type { MoonSign } from './counted-moons.js';

/**
 * Months that begin with a Moon, kept to the seasons by a star [Varisco; Nilsson1920]: one numbered month must hold the
 * star's sign. When the Moons have run ahead so far that the sign falls after it, a thirteenth month is put in before it.
 */

/** A sign of the star with the half of the day on which it is watched. */
export interface MonthSign extends MoonSign {
  /** True for a sign of the morning, which belongs to the month that began on an evening before it. */
  atDawn: boolean;
}

export interface LocalMonth {
  /** The Moon with which the month begins: on the evening of that day. */
  begins: MoonDay;
  /** 1…12, and 13 for the one that was put in. */
  number: number;
  thirteenth: boolean;
  /** Civil year of the sign that numbers the month's year; the year of its month 1 and all that follow. */
  localYear: number;
  /** This month holds the sign. */
  holdsSign: boolean;
  /** The sign's range reaches over one of the month's ends: what people see decides which month holds it. */
  signNearEdge: boolean;
}

const MONTHS = 12;

/** The evening to which a day's sign belongs, as a day number. */
function eveningOf(dayNumber: number, atDawn: boolean): number {
  return atDawn ? dayNumber - 1 : dayNumber;
}

/** Index of the month that holds an evening, or −1 before the first. */
function monthHolding(begins: readonly MoonDay[], evening: number): number {
  return begins.findLastIndex(({ expected }) => expected.dayNumber <= evening);
}

interface HeldSign {
  year: number;
  index: number;
  nearEdge: boolean;
}

function heldSign(begins: readonly MoonDay[], sign: MonthSign): HeldSign | null {
  const indexOf = (dayNumber: number): number => monthHolding(begins, eveningOf(dayNumber, sign.atDawn));
  const index = indexOf(sign.expected.dayNumber);
  if (index < 0 || index === begins.length - 1) return null;
  const ends = [sign.early, sign.late].filter((end) => end !== null);
  const nearEdge = ends.some(({ dayNumber }) => indexOf(dayNumber) !== index);
  return { year: sign.expected.gregorian.year, index, nearEdge };
}

/** Number and year of the month that comes `step` months after the one that holds the sign. */
function labelAfter(signMonth: number, year: number, step: number): { number: number; localYear: number } {
  const months = signMonth - 1 + step;
  return { number: (months % MONTHS) + 1, localYear: year + Math.floor(months / MONTHS) };
}

/**
 * Numbers the months between signs. Two signs that follow each other must be twelve or thirteen months apart; where
 * they are not (a star that failed in one year) the months between them stay out, because no rule names them.
 * @param begins the Moons with which months begin, ascending, without a gap
 * @param signs one a year, ascending
 * @param signMonth number of the month that must hold the sign, 1…12
 */
export function localMonthsOf(
  begins: readonly MoonDay[],
  signs: readonly MonthSign[],
  signMonth: number,
): LocalMonth[] {
  const held = signs.map((sign) => heldSign(begins, sign)).filter((sign) => sign !== null);
  const months: LocalMonth[] = [];
  held.forEach((sign, at) => {
    const next = held[at + 1];
    if (!next) return;
    const count = next.index - sign.index;
    if (count !== MONTHS && count !== MONTHS + 1) return;
    for (let step = 0; step < count; step += 1) {
      const moon = begins[sign.index + step];
      if (!moon) continue;
      const thirteenth = step === MONTHS;
      const label = thirteenth
        ? { number: MONTHS + 1, localYear: labelAfter(signMonth, sign.year, MONTHS - 1).localYear }
        : labelAfter(signMonth, sign.year, step);
      const holdsSign = step === 0;
      months.push({
        begins: moon,
        ...label,
        thirteenth,
        holdsSign,
        signNearEdge: holdsSign && sign.nearEdge,
      });
    }
  });
  return months;
}
