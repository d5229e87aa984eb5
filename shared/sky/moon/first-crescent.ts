import { labelledDay } from '../time/civil-day.js';
import { FIRST_GREGORIAN_YEAR, monthOfDay } from '../time/civil-year.js';
import type { CivilDay } from '../types.js';
import { clarityOfMonth } from '../visibility/clarity.js';
import type { Clarity, CrescentNote, CrescentOutcome } from '../vocabulary.js';
import { wordByYallop } from './crescent-criteria.js';
import { crescentEveningOf, type EveningSky, type MoonGround } from './crescent-evening.js';
import type { CrescentEvening, FirstCrescent } from './moon-types.js';

/** A week after the new Moon the Moon is half lit: nobody calls that a first crescent. */
const EVENINGS_LOOKED_AT = 7;

function bare({ sun: _sun, ...evening }: EveningSky): CrescentEvening {
  return evening;
}

/** The evenings from the new Moon on, up to the first that is easy. */
function eveningsFrom(ground: MoonGround, newMoonJdUt: number): EveningSky[] {
  const evenings: EveningSky[] = [];
  const firstDay = Math.floor(newMoonJdUt + ground.longitudeDeg / 360);
  for (let day = firstDay; evenings.length < EVENINGS_LOOKED_AT; day += 1) {
    const evening = crescentEveningOf(ground, day);
    const momentJdUt = evening.sunsetJdUt ?? evening.bestJdUt;
    if (momentJdUt !== null && momentJdUt < newMoonJdUt) continue;
    evenings.push(evening);
    if (evening.word === 'easy') break;
  }
  return evenings;
}

/** The crescent was wide and high enough over a flat horizon, and hills stood before it. */
function hiddenByHills({ skyline, moonAltitudeDeg, yallopQ }: EveningSky): boolean {
  if (skyline === null || skyline === 'over' || moonAltitudeDeg === null || moonAltitudeDeg <= 0)
    return false;
  return yallopQ !== null && wordByYallop(yallopQ) !== 'not-by-eye';
}

function whyNone(evenings: readonly EveningSky[]): CrescentOutcome {
  if (evenings.every(({ sun }) => sun === 'never-sets')) return 'sun-never-sets';
  return evenings.some(hiddenByHills) ? 'behind-skyline' : 'stays-too-low';
}

/** The month whose air counts, in the calendar that its civil year is counted in. */
function monthOf({ dayNumber, gregorian }: CivilDay): number {
  return monthOfDay(dayNumber, gregorian.year >= FIRST_GREGORIAN_YEAR ? 'gregorian' : 'julian');
}

function notesOf(
  evenings: readonly EveningSky[],
  expected: EveningSky,
  onlyIfClear: boolean,
): CrescentNote[] {
  const upTo = evenings.slice(0, evenings.indexOf(expected) + 1);
  const notes: CrescentNote[] = [];
  if (onlyIfClear) notes.push('only-if-air-is-clear');
  if (upTo.some(hiddenByHills)) notes.push('skyline-hides-it-longer');
  if (expected.sun === 'sets' && expected.moonsetJdUt === null) notes.push('moon-does-not-set');
  if (expected.sun === 'never-rises') notes.push('sun-does-not-rise');
  return notes;
}

/**
 * The first evening of a lunation on which the crescent is seen at a place, by two published tests together
 * [Yallop1997; Odeh2004]. Expected is the first easy evening, early the first on which it may be seen if the air is
 * clear; where a month's air is usually clear that one is expected, and where it is hazy it may become a day later.
 * @param newMoonJdUt instant of the new Moon, Julian Day (UT)
 */
export function firstCrescentOf(
  ground: MoonGround,
  newMoonJdUt: number,
  clarityByMonth: readonly Clarity[],
): FirstCrescent {
  const evenings = eveningsFrom(ground, newMoonJdUt);
  const easy = evenings.find(({ word }) => word === 'easy') ?? null;
  const possible = evenings.find(({ word }) => word !== 'not-by-eye') ?? null;
  const looked = evenings.map(bare);
  if (!possible) {
    const none = { expected: null, early: null, late: null, clarity: 'ordinary', notes: [] } as const;
    return { outcome: whyNone(evenings), ...none, evenings: looked };
  }
  const usual = easy ?? possible;
  const clarity = clarityOfMonth(clarityByMonth, monthOf(usual));
  const expected = clarity === 'clear' ? possible : usual;
  const lateDay = usual.dayNumber + (clarity === 'hazy' ? 1 : 0);
  const late: CivilDay = labelledDay(lateDay);
  return {
    outcome: 'dated',
    expected: bare(expected),
    early: bare(possible),
    late,
    clarity,
    notes: notesOf(evenings, expected, easy === null),
    evenings: looked,
  };
}
