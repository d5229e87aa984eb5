/** The part of the core's door that belongs to the Moon and Venus; `index.ts` hands it on. */
import { assertDayNumber, assertSettings, assertSite, assertWhole, assertYear } from './argument-checks.js';
import { countedMoons as countMoons, type CountedMoon, type MoonSign } from './moon/counted-moons.js';
import { localMonthsOf, type LocalMonth, type MonthSign } from './moon/local-months.js';
import type { Lunation, MoonDay, MoonYear } from './moon/moon-types.js';
import { lunationsAt, moonDayOf as dayOfMoon, moonYearOf } from './moon/moon-year.js';
import { preparedYearOf } from './phenomena/year-cache.js';
import { type VenusYear, venusYearOf } from './planets/venus-year.js';
import type { Site, VisibilitySettings } from './types.js';
import type { MoonEvent } from './vocabulary.js';

export type { CountedMoon, MoonSign } from './moon/counted-moons.js';
export { reachOfCountDays } from './moon/counted-moons.js';
export type { LocalMonth, MonthSign } from './moon/local-months.js';
export type * from './moon/moon-types.js';
export type { VenusAppearanceYear, VenusYear } from './planets/venus-year.js';

/**
 * The Moons of a civil year at a place: new Moon, first crescent with its range, full Moon, each with its civil day. A
 * lunation belongs to the year when one of the three days does. The crescent by [Yallop1997] and [Odeh2004] together.
 */
export function moonYear(site: Site, settings: VisibilitySettings, year: number): MoonYear {
  assertSite(site);
  assertSettings(settings);
  assertYear(year);
  return moonYearOf(site, settings, year);
}

/** The same between two civil days, both included, for counts that run over the end of a year. */
export function moonsBetween(
  site: Site,
  settings: VisibilitySettings,
  fromDay: number,
  toDay: number,
): Lunation[] {
  assertSite(site);
  assertSettings(settings);
  assertDayNumber(fromDay, 'fromDay');
  assertDayNumber(toDay, 'toDay');
  return lunationsAt(site, settings, fromDay, toDay);
}

/** One of a lunation's three days with its range; null where the crescent is not seen. */
export function moonDayOf(lunation: Lunation, event: MoonEvent): MoonDay | null {
  return dayOfMoon(lunation, event);
}

/**
 * The n-th Moon of a kind on or after each sign.
 * @param lunations all of them from the first sign to `reachOfCountDays(count)` after the last
 * @param count 1…13
 */
export function countedMoons(
  signs: readonly MoonSign[],
  lunations: readonly Lunation[],
  event: MoonEvent,
  count: number,
): CountedMoon[] {
  assertWhole('count', count, 1, 13);
  return countMoons(signs, lunations, event, count);
}

/**
 * Numbers the months that begin with given Moons so that month `signMonth` holds the star's sign; a thirteenth month is
 * put in where the Moons have run ahead. Months that no two signs enclose stay out.
 */
export function localMonths(
  begins: readonly MoonDay[],
  signs: readonly MonthSign[],
  signMonth: number,
): LocalMonth[] {
  assertWhole('signMonth', signMonth, 1, 12);
  return localMonthsOf(begins, signs, signMonth);
}

/** The four appearances of Venus in a civil year at a place, by the depth at the crossing [Ptolemy]. */
export function venusYear(site: Site, settings: VisibilitySettings, year: number): VenusYear {
  assertSite(site);
  assertSettings(settings);
  assertYear(year);
  return venusYearOf(preparedYearOf(year), site, settings);
}
