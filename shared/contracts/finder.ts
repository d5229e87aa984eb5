import { z } from 'zod';
import { CLARITIES, PHENOMENON_OUTCOMES, SKY_NOTES, STAR_OUTCOMES } from '../sky/vocabulary.js';
import { CALENDAR_FIRST_YEAR, CALENDAR_LAST_YEAR } from './calendars.js';
import { occurrence } from './entry-lead.js';
import { id, listOf } from './common.js';
import { defineEndpoint, member } from './endpoint.js';
import { ROLES } from './people.js';
import { civilDay, engineYear, markerKey, markerNames, occurrenceDays, phenomenon } from './stars.js';

export const NEARNESS = ['on-the-day', 'close', 'near', 'far'] as const;
export const EXACTNESS = ['sharp', 'fair', 'wide', 'weak', 'open'] as const;
export const EASE = ['very-easy', 'easy', 'middling', 'hard'] as const;
/** How much of a marker's range falls into the place's months of rain and cloud. */
export const RAIN_CLASHES = ['none', 'partly', 'whole'] as const;
export const CAUTIONS = ['never-disappears', 'lost-in-light-nights', 'weak-marker', 'open-range'] as const;

/** The longest stretch of wanted days; the work of a whole season has no single marker. */
export const WANTED_DAYS_MAX = 92;
/** How many markers an answer holds at most. */
export const FOUND_MAX = 120;
/** Years after the year asked for in which a marker's day is looked up again. */
export const LATER_YEARS = [25, 50] as const;
/** The most years, and the most markers, that one call compares. */
export const COMPARED_YEARS_MAX = 10;
export const COMPARED_MARKERS_MAX = 24;

/** Month and day without a year, `06-07`. 29 February has no place in other years. */
const wantedMonthDay = z
  .string()
  .regex(/^(0[1-9]|1[0-2])-(0[1-9]|[12]\d|3[01])$/u, 'month-day')
  .refine((text) => Number(text.slice(3)) <= daysInMonth(Number(text.slice(0, 2))), 'no-such-day');

function daysInMonth(month: number): number {
  return [31, 28, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31][month - 1] ?? 31;
}

/** Markers are sought for calendars, so in the years for which calendars are made. */
const calendarYear = z.coerce
  .number()
  .int()
  .min(CALENDAR_FIRST_YEAR, 'calendar-year')
  .max(CALENDAR_LAST_YEAR, 'calendar-year');

/** A marker as people have always gone by it, and since when. */
const oldMarker = {
  oldMarker: markerKey.optional(),
  oldPhenomenon: phenomenon.optional(),
  since: engineYear.optional(),
};

export const finderQuery = z
  .strictObject({
    year: calendarYear,
    /** First wanted day; without it the old marker's day of old is wanted. */
    from: wantedMonthDay.optional(),
    /** Last wanted day; before `from` in the year it belongs to the next one. */
    to: wantedMonthDay.optional(),
    show: z.enum(['easy', 'all']).default('easy'),
    ...oldMarker,
  })
  .superRefine((query, context) => {
    const refuse = (field: string, message: string) => {
      context.addIssue({ code: 'custom', path: [field], message });
    };
    const hasOld = query.oldMarker !== undefined;
    if (hasOld && query.since === undefined) refuse('since', 'required');
    if (hasOld && query.since !== undefined && query.since >= query.year) refuse('since', 'not-before-year');
    if (!hasOld && query.from === undefined) refuse('from', 'required');
  });
export type FinderQuery = z.infer<typeof finderQuery>;

/** What the Moon does at the moment when the star is looked for, in the year asked for. */
const moonlight = z.strictObject({ litShare: z.number(), isUp: z.boolean() });

export const foundMarker = markerNames.extend({
  phenomenon,
  days: occurrenceDays,
  occurrence,
  /** Negative before the wanted days, positive after, 0 within. */
  daysAway: z.number().int(),
  nearness: z.enum(NEARNESS),
  rangeDays: z.number().int().nullable(),
  exactness: z.enum(EXACTNESS),
  ease: z.enum(EASE),
  /** Why it stands behind the others. */
  caution: z.enum(CAUTIONS).nullable(),
  notes: z.array(z.enum(SKY_NOTES)),
  /** Air of the month at the place. */
  clarity: z.enum(CLARITIES),
  rain: z.enum(RAIN_CLASHES),
  azimuthDeg: z.number(),
  /** Altitude of the skyline where the star crosses it. */
  skylineAltitudeDeg: z.number(),
  moonlight,
  /** Days by which the day moves in the Gregorian year until each of LATER_YEARS; null where it has no date then. */
  laterDays: z.array(z.number().nullable()).length(LATER_YEARS.length),
});
export type FoundMarker = z.infer<typeof foundMarker>;

/** A marker in the next season in which one serves. */
export const nearestMarker = markerNames.extend({
  phenomenon,
  days: occurrenceDays,
  occurrence,
  daysAway: z.number().int(),
});
export type NearestMarker = z.infer<typeof nearestMarker>;

const dayThen = z.strictObject({
  year: z.number().int(),
  outcome: z.enum(STAR_OUTCOMES),
  phenomenonOutcome: z.enum(PHENOMENON_OUTCOMES),
  days: occurrenceDays.nullable(),
});

export const oldMarkerNow = markerNames.extend({
  phenomenon,
  then: dayThen,
  now: dayThen,
  /** Days later in the Gregorian year than it was; null where one of the two has no date. */
  movedDays: z.number().int().nullable(),
});
export type OldMarkerNow = z.infer<typeof oldMarkerNow>;

export const finderAnswer = z.strictObject({
  year: z.number().int(),
  /** Null where only an old marker was given and it had no date of old. */
  wanted: z.strictObject({ from: civilDay, to: civilDay }).nullable(),
  old: oldMarkerNow.nullable(),
  items: z.array(foundMarker),
  /** All within reach, also those that are not listed. */
  total: z.number().int(),
  /** Stars and figures that were looked through. */
  searched: z.number().int(),
  nearest: z.strictObject({ before: nearestMarker.nullable(), after: nearestMarker.nullable() }),
  /** Markers that are easy to find and offer no day here, by the reason. */
  without: z.strictObject({
    neverSets: z.number().int(),
    neverClearsSkyline: z.number().int(),
    neverDarkEnough: z.number().int(),
  }),
  /** How deep the Sun sinks at most in the middle night of the wanted days; negative where it stays up. */
  darkestDeg: z.number().nullable(),
});
export type FinderAnswer = z.infer<typeof finderAnswer>;

const comparedMarker = z.strictObject({ markerKey, phenomenon });
export const comparisonInput = z.strictObject({
  years: z.array(calendarYear).min(1).max(COMPARED_YEARS_MAX, 'too-many'),
  markers: z.array(comparedMarker).min(1).max(COMPARED_MARKERS_MAX, 'too-many'),
});
export type ComparisonInput = z.infer<typeof comparisonInput>;

export const yearsAnswer = z.strictObject({
  items: z.array(comparedMarker.extend({ year: z.number().int(), days: occurrenceDays.nullable() })),
});
export type YearsAnswer = z.infer<typeof yearsAnswer>;

const placeParams = z.strictObject({ placeId: id });

export const finderEndpoints = {
  find: defineEndpoint({
    id: 'findMarkers',
    method: 'GET',
    path: '/api/places/:placeId/finder',
    summary: 'Stars and figures whose days fall near a wanted day, best first',
    access: member('place', ...ROLES),
    params: placeParams,
    query: finderQuery,
    response: finderAnswer,
  }),
  names: defineEndpoint({
    id: 'listMarkerNames',
    method: 'GET',
    path: '/api/places/:placeId/finder/names',
    summary: 'Every star and figure by its names, to choose an old sign from',
    access: member('place', ...ROLES),
    params: placeParams,
    response: listOf(markerNames),
  }),
  compareYears: defineEndpoint({
    id: 'compareMarkerYears',
    method: 'POST',
    path: '/api/places/:placeId/finder/years',
    summary: 'Days of some markers in some years, to see which keeps its day; nothing is kept',
    access: member('place', ...ROLES),
    params: placeParams,
    body: comparisonInput,
    response: yearsAnswer,
  }),
} as const;
