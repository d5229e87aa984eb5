import { z } from 'zod';
import {
  CLARITIES,
  CRESCENT_NOTES,
  CRESCENT_OUTCOMES,
  CRESCENT_WORDS,
  MOON_EVENTS,
  PHENOMENON_OUTCOMES,
  STAR_OUTCOMES,
  VENUS_APPEARANCES,
} from '../sky/vocabulary.js';
import { id, queryNumber } from './common.js';
import { defineEndpoint, member } from './endpoint.js';
import { ROLES } from './people.js';
import { civilDay, engineYear, markerKey, markerNames, occurrenceDays, phenomenon } from './stars.js';

/** `HH:MM` on the clock of the place. */
const clockTime = z.string().regex(/^\d{2}:\d{2}$/u);

const moonInstant = civilDay.extend({ localTime: clockTime });

const crescentDay = civilDay.extend({
  word: z.enum(CRESCENT_WORDS),
  /** When to look and where; null where the evening has no such moment. */
  bestAt: clockTime.nullable(),
  compass: z.string().nullable(),
  altitudeDeg: z.number().nullable(),
  sunsetAt: clockTime.nullable(),
  moonsetAt: clockTime.nullable(),
});
export type CrescentDay = z.infer<typeof crescentDay>;

export const firstCrescent = z.strictObject({
  outcome: z.enum(CRESCENT_OUTCOMES),
  expected: crescentDay.nullable(),
  early: civilDay.nullable(),
  late: civilDay.nullable(),
  clarity: z.enum(CLARITIES),
  notes: z.array(z.enum(CRESCENT_NOTES)),
});
export type FirstCrescent = z.infer<typeof firstCrescent>;

/** A month's place in the local year. */
export const moonMonth = z.strictObject({
  /** 1…12, and 13 for the one that was put in. */
  number: z.number().int().min(1).max(13),
  thirteenth: z.boolean(),
  localYear: z.number().int(),
  holdsSign: z.boolean(),
  signNearEdge: z.boolean(),
  /** The day on whose evening it begins, and by which Moon: the new one stands in where the crescent is not seen. */
  begins: civilDay,
  beginsBy: z.enum(MOON_EVENTS),
});
export type MoonMonth = z.infer<typeof moonMonth>;

export const moonRow = z.strictObject({
  newMoon: moonInstant,
  firstCrescent,
  fullMoon: moonInstant,
  /** Null without a sign, or where no rule names the month. */
  month: moonMonth.nullable(),
});
export type MoonRow = z.infer<typeof moonRow>;

/** The rule by which months are kept to the seasons, and what the sign does here. */
export const moonRule = z.strictObject({
  marker: markerNames,
  phenomenon,
  signMonth: z.number().int(),
  begins: z.enum(MOON_EVENTS),
  starOutcome: z.enum(STAR_OUTCOMES),
  /** The sign in the year that was asked for; empty where it has none. */
  signs: z.array(occurrenceDays),
});
export type MoonRule = z.infer<typeof moonRule>;

export const moonTable = z.strictObject({
  year: z.number().int(),
  firstDayNumber: z.number().int(),
  lastDayNumber: z.number().int(),
  moons: z.array(moonRow),
  rule: moonRule.nullable(),
  /** Stars and figures that are offered as signs, the brightest and the figures. */
  markers: z.array(markerNames),
  venus: z.array(
    z.strictObject({
      appearance: z.enum(VENUS_APPEARANCES),
      outcome: z.enum(PHENOMENON_OUTCOMES),
      occurrences: z.array(occurrenceDays),
    }),
  ),
  sourceKeys: z.array(z.string()),
  engineVersion: z.string(),
});
export type MoonTable = z.infer<typeof moonTable>;

const placeParams = z.strictObject({ placeId: id });

/** Without a marker the Moons are not numbered. */
export const moonQuestion = z.strictObject({
  year: engineYear,
  marker: markerKey.optional(),
  phenomenon: phenomenon.optional(),
  /** Which month must hold the sign; the first where none is given. */
  month: queryNumber((number) => number.int().min(1, 'moon-month').max(12, 'moon-month')).optional(),
  begins: z.enum(MOON_EVENTS).optional(),
});
export type MoonQuestion = z.infer<typeof moonQuestion>;

export const moonsEndpoints = {
  read: defineEndpoint({
    id: 'readMoons',
    method: 'GET',
    path: '/api/places/:placeId/moons',
    summary:
      'The Moons of a year at a place: new, first crescent, full; numbered by a star’s sign; and Venus',
    access: member('place', ...ROLES),
    params: placeParams,
    query: moonQuestion,
    response: moonTable,
  }),
  csv: defineEndpoint({
    id: 'exportMoonsCsv',
    method: 'GET',
    path: '/api/places/:placeId/moons.csv',
    summary: 'The same Moons as CSV, with what they rest on',
    access: member('place', ...ROLES),
    params: placeParams,
    query: moonQuestion,
    fileType: 'text/csv',
  }),
} as const;
