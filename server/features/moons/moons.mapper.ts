import { labelled, occurrenceDaysOf } from '#shared/calendar/entry-dates.js';
import type { CrescentDay, MoonMonth, MoonRow, MoonTable } from '#shared/contracts/moons.js';
import {
  compassPoint,
  type CrescentEvening,
  type LocalMonth,
  type Lunation,
  type MoonInstant,
  VENUS_APPEARANCES,
  type VenusYear,
} from '#shared/sky/index.js';
import { localTimeOf, type PlaceClock } from '../stars/local-time.service.js';

function toInstant(instant: MoonInstant, clock: PlaceClock): MoonRow['newMoon'] {
  return { ...labelled(instant), localTime: localTimeOf(instant.jdUt, clock) };
}

function toCrescentDay(evening: CrescentEvening, clock: PlaceClock): CrescentDay {
  const timeOf = (jdUt: number | null): string | null => (jdUt === null ? null : localTimeOf(jdUt, clock));
  return {
    ...labelled(evening),
    word: evening.word,
    bestAt: timeOf(evening.bestJdUt),
    compass: evening.moonAzimuthDeg === null ? null : compassPoint(evening.moonAzimuthDeg),
    altitudeDeg: evening.moonAltitudeDeg,
    sunsetAt: timeOf(evening.sunsetJdUt),
    moonsetAt: timeOf(evening.moonsetJdUt),
  };
}

function toMonth(month: LocalMonth): MoonMonth {
  const { begins, number, thirteenth, localYear, holdsSign, signNearEdge } = month;
  return {
    number,
    thirteenth,
    localYear,
    holdsSign,
    signNearEdge,
    begins: labelled(begins.expected),
    beginsBy: begins.event,
  };
}

export function toMoonRow(lunation: Lunation, month: LocalMonth | null, clock: PlaceClock): MoonRow {
  const { outcome, expected, early, late, clarity, notes } = lunation.firstCrescent;
  return {
    newMoon: toInstant(lunation.newMoon, clock),
    firstCrescent: {
      outcome,
      expected: expected && toCrescentDay(expected, clock),
      early: early && labelled(early),
      late: late && labelled(late),
      clarity,
      notes: [...notes],
    },
    fullMoon: toInstant(lunation.fullMoon, clock),
    month: month && toMonth(month),
  };
}

export function toVenus({ appearances }: VenusYear): MoonTable['venus'] {
  return VENUS_APPEARANCES.map((appearance) => ({
    appearance,
    outcome: appearances[appearance].outcome,
    occurrences: appearances[appearance].occurrences.map(occurrenceDaysOf),
  }));
}
