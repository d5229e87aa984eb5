import { z } from 'zod';
import {
  CLARITIES,
  PHENOMENON_OUTCOMES,
  STAR_OUTCOME_DETAILS,
  STAR_OUTCOMES,
  THRESHOLD_SETS,
} from '../sky/vocabulary.js';
import { id } from './common.js';
import { defineEndpoint, member } from './endpoint.js';
import { ROLES } from './people.js';
import { basis, civilDay, engineYear, markerKey, markerNames, occurrenceDays, phenomenon } from './stars.js';

const clarity = z.enum(CLARITIES);
const minutes = z.number().int().nonnegative();

/** The day by the model of visibility, with the minutes in which the star shows then. */
export const modelDay = civilDay.extend({ minutes });
export type ModelDay = z.infer<typeof modelDay>;

export const nightMinutes = z.strictObject({
  dayNumber: z.number().int(),
  /** Without a Moon. */
  byClarity: z.record(clarity, minutes),
  /** In the place's own air of the month, with the Moon of that night. */
  underMoon: minutes,
});
export type NightMinutes = z.infer<typeof nightMinutes>;

/** How far the ends of a range stand from what the day needs, degrees of the Sun's depth. */
export const rangeWidth = z.strictObject({
  /** What the range is computed with: the larger of the two below. */
  halfWidthDeg: z.number().positive(),
  /** From published scatter. */
  byScatterDeg: z.number().positive(),
  /** From the model: clearer and hazier air around that of the month, half a magnitude of eyesight. */
  byModelDeg: z.number().nonnegative(),
});
export type RangeWidth = z.infer<typeof rangeWidth>;

/** One occurrence; all its days are of the same disappearance and may fall into a neighbouring year. */
export const airOccurrence = z.strictObject({
  /** By the place's own rule; null where that has no date. */
  rule: occurrenceDays.nullable(),
  /** How clear the air of that month usually is; null without a date. */
  ruleClarity: clarity.nullable(),
  /** Where the width of the rule's range comes from; null without a date. */
  ruleWidth: rangeWidth.nullable(),
  bySet: z.record(z.enum(THRESHOLD_SETS), occurrenceDays.nullable()),
  /** Null where that air never shows the star in this turn of the year. */
  byModel: z.record(clarity, modelDay.nullable()),
  /** In order of days; empty for last risings at dusk and first settings at dawn, where minutes say nothing. */
  nights: z.array(nightMinutes),
});
export type AirOccurrence = z.infer<typeof airOccurrence>;

export const airPhenomenon = z.strictObject({
  /** By the place's own rule. */
  outcome: z.enum(PHENOMENON_OUTCOMES),
  occurrences: z.array(airOccurrence),
});
export type AirPhenomenon = z.infer<typeof airPhenomenon>;

export const airAnswer = markerNames.extend({
  placeId: id,
  year: z.number().int(),
  outcome: z.enum(STAR_OUTCOMES),
  outcomeDetail: z.enum(STAR_OUTCOME_DETAILS).nullable(),
  phenomena: z.record(phenomenon, airPhenomenon),
  /** What the place's air takes overhead in the mean of the year, magnitudes per airmass. */
  extinctionMag: z.record(clarity, z.number().nonnegative()),
  basis,
});
export type AirAnswer = z.infer<typeof airAnswer>;

export const airEndpoints = {
  read: defineEndpoint({
    id: 'readStarAir',
    method: 'GET',
    path: '/api/places/:placeId/stars/:markerKey/air',
    summary:
      'A second opinion on a star’s or figure’s days: a model of visibility in clear, ordinary and hazy air, all published rules, and the minutes of seeing around each date',
    access: member('place', ...ROLES),
    params: z.strictObject({ placeId: id, markerKey }),
    query: z.strictObject({ year: engineYear }),
    response: airAnswer,
  }),
} as const;
