import { z } from 'zod';
import { id, line, monthDay } from './common.js';
import { skyMarkerSpec } from './sky-markers.js';
import { markerKey, phenomenon } from './stars.js';
import { MOON_COUNT } from '../sky/vocabulary.js';

/** Which of the year's occurrences, where there are two. */
export const occurrence = z.union([z.literal(1), z.literal(2)]);
/** A year has up to thirteen Moons of a kind. */
const signOccurrence = z
  .number('not-a-number')
  .int('moon-count')
  .min(1, 'moon-count')
  .max(MOON_COUNT.max, 'moon-count');

/** The day of a star or a sign as people saw it this year: who saw it, and which elder agrees. */
export const seenDay = z.strictObject({
  date: z.iso.date('date-form'),
  by: line(120, 1),
  agreedBy: line(120, 1),
});
export type SeenDay = z.infer<typeof seenDay>;

export const PLANNED_DAYS = ['earliest', 'bestFrom', 'bestTo', 'lastAdvised'] as const;
export type PlannedDay = (typeof PLANNED_DAYS)[number];

/** Ways in which an entry can be led; picked before anything is chosen there. */
export const LEAD_WAYS = [
  'marker',
  'sky',
  'fixed-date',
  'marker-as-seen',
  'nature-sign',
  'entry-planned',
  'entry-actual',
] as const;
export type LeadWay = (typeof LEAD_WAYS)[number];

/** From what the days of an entry are counted. */
export const entryLead = z.discriminatedUnion('type', [
  z.strictObject({ type: z.literal('marker'), markerKey, phenomenon, occurrence }),
  /**
   * A marker beyond a star's first and last days: Sun, Moon, nights, culminations. `seen` is left out where its computed day
   * leads; null until people have seen it, where the day on which they do leads.
   */
  z.strictObject({
    type: z.literal('sky'),
    ...{ spec: skyMarkerSpec, occurrence: signOccurrence },
    seen: seenDay.nullable().optional(),
  }),
  z.strictObject({ type: z.literal('fixed-date'), date: monthDay, source: line(200, 1) }),
  /** The computed day until the star was seen, then the day on which it was. */
  z.strictObject({
    type: z.literal('marker-as-seen'),
    ...{ markerKey, phenomenon, occurrence },
    seen: seenDay.nullable(),
  }),
  z.strictObject({
    type: z.literal('nature-sign'),
    name: line(120, 1),
    usual: z.strictObject({ from: monthDay, to: monthDay }),
    /** Who says that these are its usual days. */
    source: line(200, 1),
  }),
  /** A planned day of another entry of the same calendar. */
  z.strictObject({ type: z.literal('entry-planned'), entryId: id, day: z.enum(PLANNED_DAYS) }),
  /** The day on which another entry was really done; see `actual-days.ts`. */
  z.strictObject({ type: z.literal('entry-actual'), entryId: id }),
  /** Nothing yet, and in which way it will be: a draft may wait for that, elders are not asked about it. */
  z.strictObject({ type: z.literal('none'), way: z.enum(LEAD_WAYS) }),
]);
export type EntryLead = z.infer<typeof entryLead>;
