import type { CivilDay } from '../types.js';
import type { MoonEvent } from '../vocabulary.js';
import { moonDayOf } from './moon-year.js';
import type { Lunation, MoonDay } from './moon-types.js';

/** A sign from which Moons are counted; the ends of its range may be missing. */
export interface MoonSign {
  expected: CivilDay;
  early: CivilDay | null;
  late: CivilDay | null;
}

/** Which Moon a count leads to. */
export interface CountedMoon {
  sign: MoonSign;
  moon: MoonDay;
  /** The Moon's own range, widened to the neighbouring Moon where the count may lead there. */
  early: CivilDay;
  late: CivilDay;
  /** The sign's range crosses such a Moon: seen earlier or later, the count may lead to the neighbouring one. */
  countMayShift: boolean;
}

/** Longest time from a sign to the n-th Moon on or after it. */
export function reachOfCountDays(count: number): number {
  return Math.ceil(29.6 * count) + 8;
}

function moonsOn(lunations: readonly Lunation[], event: MoonEvent): MoonDay[] {
  return lunations.map((lunation) => moonDayOf(lunation, event)).filter((day) => day !== null);
}

function nthFrom(moons: readonly MoonDay[], fromDay: number, count: number): MoonDay | null {
  return moons.filter(({ expected }) => expected.dayNumber >= fromDay)[count - 1] ?? null;
}

/**
 * The n-th new, first-crescent or full Moon on or after each sign. A Moon on the very day of the sign is the first.
 * @param lunations all lunations from the first sign to `reachOfCountDays(count)` after the last one
 * @param count 1…13
 */
export function countedMoons(
  signs: readonly MoonSign[],
  lunations: readonly Lunation[],
  event: MoonEvent,
  count: number,
): CountedMoon[] {
  const moons = moonsOn(lunations, event);
  const found: CountedMoon[] = [];
  for (const sign of signs) {
    const moon = nthFrom(moons, sign.expected.dayNumber, count);
    if (!moon) continue;
    const [ifEarly, ifLate] = [sign.early, sign.late].map((end) =>
      end === null ? moon : (nthFrom(moons, end.dayNumber, count) ?? moon),
    );
    const early = ifEarly ?? moon;
    const late = ifLate ?? moon;
    const countMayShift = early.expected.dayNumber !== late.expected.dayNumber;
    found.push({ sign, moon, early: early.early, late: late.late, countMayShift });
  }
  return found;
}
