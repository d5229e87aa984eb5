import { z } from 'zod';
import { daysInMonth } from '../kernel/iso-date.js';
import {
  CLARITIES,
  LOOK_OUTCOMES,
  MOON_SHAPES,
  MOONLIGHTS,
  NAKED_EYE_PLANETS,
  SIGHT_FALLBACKS,
  SIGHT_RULES,
  PHENOMENON_OUTCOMES,
  SKY_NOTES,
  STAR_OUTCOME_DETAILS,
  STAR_OUTCOMES,
  SUN_COURSES,
  WATCH_SIDES,
} from '../sky/vocabulary.js';
import { CALENDAR_FIRST_YEAR, CALENDAR_LAST_YEAR } from './calendars.js';
import { id, isoDate } from './common.js';
import { defineEndpoint, member } from './endpoint.js';
import { ROLES } from './people.js';
import { skyline } from './places.js';
import { markerKey, markerNames, occurrenceDays, phenomenon } from './stars.js';

/** `HH:MM` on the place's clock. */
const localTime = z.string().regex(/^\d{2}:\d{2}$/u);

const direction = {
  azimuthDeg: z.number(),
  /** True altitude, without refraction. */
  altitudeDeg: z.number(),
  aboveSkylineDeg: z.number(),
};

export const lookMoment = z.strictObject({
  localTime,
  ...direction,
  sunDepressionDeg: z.number(),
  isUp: z.boolean(),
  isSeen: z.boolean(),
});
export type LookMoment = z.infer<typeof lookMoment>;

/** A crossing of the skyline, and whether people are still, already or no longer out then. */
export const lookCrossing = z.strictObject({
  localTime,
  when: z.enum(['before-watch', 'in-watch', 'after-watch']),
});
export type LookCrossing = z.infer<typeof lookCrossing>;

export const lookPointer = z.strictObject({
  hr: z.number().int(),
  name: z.string(),
  ...direction,
  separationDeg: z.number(),
  /** From the pointer to the star looked for: 0° up, 90° to the right. */
  bearingDeg: z.number(),
});
export type LookPointer = z.infer<typeof lookPointer>;

export const lookPlanet = z.strictObject({
  planet: z.enum(NAKED_EYE_PLANETS),
  localTime,
  vMag: z.number(),
  ...direction,
  separationDeg: z.number(),
  /** From the star to the planet: 0° up, 90° to the right. */
  bearingDeg: z.number(),
  isBrighter: z.boolean(),
});
export type LookPlanet = z.infer<typeof lookPlanet>;

export const lookMoon = z.strictObject({
  shape: z.enum(MOON_SHAPES),
  litShare: z.number().min(0).max(1),
  ...direction,
  isUp: z.boolean(),
  separationDeg: z.number().nullable(),
  moonlight: z.enum(MOONLIGHTS),
});
export type LookMoon = z.infer<typeof lookMoon>;

/** Where the day stands to the days of the phenomenon. */
export const LOOK_SEASONS = ['within', 'before', 'after', 'never'] as const;

export const lookSeason = z.strictObject({
  season: z.enum(LOOK_SEASONS),
  /** What the star does at the place, and why it has no such day where it has none. */
  starOutcome: z.enum(STAR_OUTCOMES),
  phenomenonOutcome: z.enum(PHENOMENON_OUTCOMES),
  /** The days that the date belongs to, else the next ones; null where there are none. */
  days: occurrenceDays.nullable(),
  notes: z.array(z.enum(SKY_NOTES)),
});
export type LookSeason = z.infer<typeof lookSeason>;

/** Another star that has such a day, where this one never serves. */
export const lookAlternative = z.strictObject({ marker: markerNames, days: occurrenceDays });
export type LookAlternative = z.infer<typeof lookAlternative>;

/** What the seen part of the path goes by. */
export const lookSight = z.strictObject({
  by: z.enum(SIGHT_RULES),
  /** Why it goes by the rule of the dates; null where it goes by the model of visibility. */
  because: z.enum(SIGHT_FALLBACKS).nullable(),
  /** Magnitudes by which eyes are taken keener than the model has them; this and what follows null by the rule of the dates. */
  offsetMag: z.number().nullable(),
  /** The day that set the model: on it the star just shows. */
  phenomenon: phenomenon.nullable(),
  expectedDate: isoDate.nullable(),
  /** When the model left to itself would show the star in this watch; both null where not at all. */
  plainFromAt: localTime.nullable(),
  plainToAt: localTime.nullable(),
});
export type LookSight = z.infer<typeof lookSight>;

export const look = z.strictObject({
  placeId: id,
  placeName: z.string(),
  latitudeDeg: z.number(),
  skyline,
  marker: markerNames,
  phenomenon,
  side: z.enum(WATCH_SIDES),
  /** Civil day of the morning or evening at the place. */
  date: isoDate,
  dayNumber: z.number().int(),
  outcome: z.enum(LOOK_OUTCOMES),
  outcomeDetail: z.enum(STAR_OUTCOME_DETAILS).nullable(),
  sunCourse: z.enum(SUN_COURSES),
  clarity: z.enum(CLARITIES),
  /** When to stop (dawn) or to begin (dusk), rounded away from the Sun; null where the Sun does not cross. */
  limitAt: localTime.nullable(),
  watchFromAt: localTime.nullable(),
  watchToAt: localTime.nullable(),
  comesUp: lookCrossing.nullable(),
  goesDown: lookCrossing.nullable(),
  seenFromAt: localTime.nullable(),
  seenToAt: localTime.nullable(),
  seenMinutes: z.number().int(),
  best: lookMoment.nullable(),
  path: z.array(lookMoment),
  sight: lookSight,
  pointers: z.array(lookPointer),
  planets: z.array(lookPlanet),
  moon: lookMoon.nullable(),
  season: lookSeason,
  alternative: lookAlternative.nullable(),
  engineVersion: z.string(),
});
export type Look = z.infer<typeof look>;

/** A day on which somebody may go out and look: in the years of calendars. */
const lookDate = z
  .string()
  .regex(/^\d{4}-\d{2}-\d{2}$/u, 'date-form')
  .refine((date) => isRealDay(date), { error: 'no-such-day', abort: true })
  .refine((date) => isCalendarYear(Number(date.slice(0, 4))), 'calendar-year');

function isCalendarYear(year: number): boolean {
  return year >= CALENDAR_FIRST_YEAR && year <= CALENDAR_LAST_YEAR;
}

function isRealDay(date: string): boolean {
  const [year = 0, month = 0, day = 0] = date.split('-').map(Number);
  return month >= 1 && month <= 12 && day >= 1 && day <= daysInMonth(year, month);
}

export const lookQuery = z.strictObject({
  marker: markerKey,
  /** Which of the four days; it also says morning or evening. */
  phenomenon: phenomenon.default('heliacal-rising'),
  /** Without one: the days that are open now, else the next ones. */
  date: lookDate.optional(),
});
export type LookQuery = z.infer<typeof lookQuery>;

const params = z.strictObject({ placeId: id });

export const lookEndpoints = {
  read: defineEndpoint({
    id: 'readLook',
    method: 'GET',
    path: '/api/places/:placeId/look',
    summary: 'Where and when to look for a star on one morning or evening, and what could be taken for it',
    access: member('place', ...ROLES),
    params,
    query: lookQuery,
    response: look,
  }),
  pdf: defineEndpoint({
    id: 'printLook',
    method: 'GET',
    path: '/api/places/:placeId/look.pdf',
    summary: 'The same as a watch card of A5 to take along',
    access: member('place', ...ROLES),
    params,
    query: lookQuery,
    fileType: 'application/pdf',
  }),
} as const;
