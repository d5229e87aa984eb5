import { describe, expect, it } from 'vitest';

import { prepareSkyline } from '#shared/sky/horizon/skyline.js';
import type { MoonGround } from '#shared/sky/moon/crescent-evening.js';
import { firstCrescentOf } from '#shared/sky/moon/first-crescent.js';
import { lunationsBetween } from '#shared/sky/moon/lunations.js';
import { dayClockOf } from '#shared/sky/time/civil-day.js';
import { dayNumberOf } from '#shared/sky/time/julian-day.js';
import type { Clarity } from '#shared/sky/vocabulary.js';

const dayOf = (year: number, month: number, date: number): number =>
  dayNumberOf({ year, month, day: date }, 'gregorian');
const all = (clarity: Clarity): Clarity[] => new Array<Clarity>(12).fill(clarity);

function ground(latitudeDeg: number, longitudeDeg: number, skylineDeg = 0): MoonGround {
  const skyline = prepareSkyline([{ azimuthDeg: 0, altitudeDeg: skylineDeg }]);
  return { latitudeDeg, longitudeDeg, skyline, clock: dayClockOf(null, longitudeDeg) };
}

function crescentAfter(day: number, at: MoonGround, clarity: Clarity = 'ordinary') {
  const [lunation] = lunationsBetween(day, day + 31);
  if (!lunation) throw new Error('no new Moon');
  return firstCrescentOf(at, lunation.newMoonJdUt, all(clarity));
}

describe('the first crescent', () => {
  it('is not called easy where one practised man had it: Tennessee, 25 Feb 1990, 15.0 h old [record from memory]', () => {
    const record = dayOf(1990, 2, 25);
    const crescent = crescentAfter(record - 3, ground(35.6, -83.5));
    const thatEvening = crescent.evenings.find(({ dayNumber }) => dayNumber === record);
    expect(thatEvening?.word).toBe('not-by-eye');
    const [lunation] = lunationsBetween(record - 3, record + 3);
    const ageHours = ((thatEvening?.bestJdUt ?? 0) - (lunation?.newMoonJdUt ?? 0)) * 24;
    expect(Math.abs(ageHours - 15)).toBeLessThan(0.4);
    expect(crescent.expected).toMatchObject({ dayNumber: record + 1, word: 'easy' });
  });

  it('is expected on the first easy evening, with an evening before it where clear air may show it', () => {
    const crescent = crescentAfter(dayOf(2027, 2, 1), ground(12, 39));
    expect(crescent.outcome).toBe('dated');
    expect(crescent.early?.word).toBe('if-air-is-clear');
    expect(crescent.early?.dayNumber).toBe(dayOf(2027, 2, 7));
    expect(crescent.expected?.word).toBe('easy');
    expect(crescent.expected?.dayNumber).toBe(dayOf(2027, 2, 8));
    expect(crescent.late?.dayNumber).toBe(dayOf(2027, 2, 8));
  });

  it('comes an evening sooner in a month of clear air and may come one later in haze', () => {
    const clear = crescentAfter(dayOf(2027, 2, 1), ground(12, 39), 'clear');
    expect(clear.expected?.dayNumber).toBe(dayOf(2027, 2, 7));
    expect(clear.late?.dayNumber).toBe(dayOf(2027, 2, 8));
    const hazy = crescentAfter(dayOf(2027, 2, 1), ground(12, 39), 'hazy');
    expect(hazy.expected?.dayNumber).toBe(dayOf(2027, 2, 8));
    expect(hazy.late?.dayNumber).toBe(dayOf(2027, 2, 9));
  });

  it('waits behind hills, and says so', () => {
    const flat = crescentAfter(dayOf(2027, 7, 1), ground(-14, -70));
    const hill = crescentAfter(dayOf(2027, 7, 1), ground(-14, -70, 5));
    expect(flat.early?.dayNumber).toBe(dayOf(2027, 7, 4));
    expect(hill.early?.dayNumber).toBe(dayOf(2027, 7, 5));
    expect(hill.notes).toContain('skyline-hides-it-longer');
    const canyon = crescentAfter(dayOf(2027, 7, 1), ground(50, 0, 50));
    expect(canyon).toMatchObject({ outcome: 'behind-skyline', expected: null, early: null, late: null });
  });

  it('has no date in the light nights and in a far northern autumn, each with its reason', () => {
    expect(crescentAfter(dayOf(2027, 6, 1), ground(78, 15)).outcome).toBe('sun-never-sets');
    expect(crescentAfter(dayOf(2027, 8, 25), ground(66, 23)).outcome).toBe('stays-too-low');
    // Under a flat horizon nothing is blamed on hills.
    expect(crescentAfter(dayOf(2027, 11, 25), ground(78, 15)).outcome).toBe('stays-too-low');
  });

  it.each([-3000, -500, 1000, 2500])(
    'comes one to three evenings after the new Moon near the equator in %i',
    (year) => {
      const from = dayNumberOf({ year, month: 1, day: 10 }, year < 1583 ? 'julian' : 'gregorian');
      for (const { newMoonJdUt } of lunationsBetween(from, from + 340)) {
        const { expected } = firstCrescentOf(ground(10, 0), newMoonJdUt, all('ordinary'));
        const age = (expected?.bestJdUt ?? 0) - newMoonJdUt;
        expect(age).toBeGreaterThan(0.55);
        expect(age).toBeLessThan(2.6);
      }
    },
  );
});
