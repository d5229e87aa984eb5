import type { MoonMonth, MoonRow, MoonRule } from '#shared/contracts/moons.js';
import type { CivilDay } from '#shared/contracts/stars.js';
import { isoDateOf } from '#shared/kernel/iso-date.js';

/** Moons in the shape of the API for tests of screens: new on a day, seen two days later, full after fifteen. */

function civil(dayNumber: number): CivilDay {
  return { dayNumber, gregorian: isoDateOf(dayNumber), julian: isoDateOf(dayNumber - 13) };
}

export function moonRow(newDay: number, month: MoonMonth | null): MoonRow {
  const crescent = civil(newDay + 2);
  return {
    newMoon: { ...civil(newDay), localTime: '06:30' },
    firstCrescent: {
      outcome: 'dated',
      expected: {
        ...crescent,
        word: 'easy',
        bestAt: '18:40',
        compass: 'wsw',
        altitudeDeg: 7,
        sunsetAt: '18:15',
        moonsetAt: '19:10',
      },
      early: civil(newDay + 1),
      late: crescent,
      clarity: 'ordinary',
      notes: [],
    },
    fullMoon: { ...civil(newDay + 15), localTime: '21:05' },
    month,
  };
}

export function moonMonth(beginDay: number, more: Partial<MoonMonth>): MoonMonth {
  return {
    number: 1,
    thirteenth: false,
    localYear: 2027,
    holdsSign: false,
    signNearEdge: false,
    begins: civil(beginDay),
    beginsBy: 'first-crescent',
    ...more,
  };
}

export function moonRule(signDay: number, reachDays: number): MoonRule {
  return {
    marker: {
      markerKey: 'pleiades',
      kind: 'figure',
      name: 'Pleiades',
      designation: 'η Tau',
      hr: 1165,
      vMag: 2.87,
    },
    phenomenon: 'heliacal-rising',
    signMonth: 1,
    begins: 'first-crescent',
    starOutcome: 'rises-and-sets',
    signs: [
      {
        expected: civil(signDay),
        early: civil(signDay - reachDays),
        late: civil(signDay + reachDays),
        notes: [],
      },
    ],
  };
}
