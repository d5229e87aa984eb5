import { z } from 'zod';
import { PHENOMENON_OUTCOMES, STAR_OUTCOME_DETAILS, STAR_OUTCOMES } from '../sky/vocabulary.js';
import { id } from './common.js';
import { defineEndpoint, member } from './endpoint.js';
import { ROLES } from './people.js';
import { basis, engineYear, markerKey, markerNames, occurrenceDays, phenomenon } from './stars.js';

/** Epochs of one answer; a shorter stretch has shorter steps, down to a year. */
export const DRIFT_EPOCHS_MAX = 101;

export const driftQuery = z
  .strictObject({
    from: engineYear,
    to: engineYear,
    /** One more year between them, such as the year on screen. */
    year: engineYear.optional(),
  })
  .refine(({ from, to }) => from < to, { path: ['to'], error: 'year-order' });
export type DriftQuery = z.infer<typeof driftQuery>;

export const driftDay = occurrenceDays.extend({
  /** Apparent longitude of the Sun on the expected day, 0…360. */
  sunLongitudeDeg: z.number(),
});
export type DriftDay = z.infer<typeof driftDay>;

export const driftEpoch = z.strictObject({
  year: z.number().int(),
  outcome: z.enum(STAR_OUTCOMES),
  outcomeDetail: z.enum(STAR_OUTCOME_DETAILS).nullable(),
  phenomena: z.record(
    phenomenon,
    z.strictObject({ outcome: z.enum(PHENOMENON_OUTCOMES), occurrences: z.array(driftDay) }),
  ),
});
export type DriftEpoch = z.infer<typeof driftEpoch>;

export const driftTurn = z.strictObject({
  phenomenon,
  change: z.enum(['begins', 'ceases']),
  /** First year of the new state. */
  year: z.number().int(),
  /** What the star does while there is no such day. */
  outcome: z.enum(STAR_OUTCOMES),
  outcomeDetail: z.enum(STAR_OUTCOME_DETAILS).nullable(),
});
export type DriftTurn = z.infer<typeof driftTurn>;

export const driftAnswer = markerNames.extend({
  from: z.number().int(),
  to: z.number().int(),
  epochs: z.array(driftEpoch),
  /** Later in the Gregorian year positive. */
  daysPerCentury: z.record(phenomenon, z.number().nullable()),
  turns: z.array(driftTurn),
  basis,
});
export type DriftAnswer = z.infer<typeof driftAnswer>;

const params = z.strictObject({ placeId: id, markerKey });

export const driftEndpoints = {
  read: defineEndpoint({
    id: 'readDrift',
    method: 'GET',
    path: '/api/places/:placeId/drift/:markerKey',
    summary:
      'The four days of a star or figure across the centuries, with ranges and the pace in days per century',
    access: member('place', ...ROLES),
    params,
    query: driftQuery,
    response: driftAnswer,
  }),
  csv: defineEndpoint({
    id: 'exportDriftCsv',
    method: 'GET',
    path: '/api/places/:placeId/drift/:markerKey/table.csv',
    summary: 'The same as CSV, with a line to cite',
    access: member('place', ...ROLES),
    params,
    query: driftQuery,
    fileType: 'text/csv',
  }),
} as const;
