import { z } from 'zod';
import {
  CLARITIES,
  FIRST_YEAR,
  LAST_YEAR,
  NIGHT_STATES,
  PATCH_CLASSES,
  PHENOMENA,
  PHENOMENON_OUTCOMES,
  SKY_NOTES,
  SKYLINE_RULES,
  STAR_OUTCOME_DETAILS,
  STAR_OUTCOMES,
  THRESHOLD_SETS,
} from '../sky/vocabulary.js';
import { anyDate, id, listOf, queryNumber } from './common.js';
import { defineEndpoint, member } from './endpoint.js';
import { ROLES } from './people.js';
import { place, placeInput, skyline } from './places.js';

export const phenomenon = z.enum(PHENOMENA);

/** `hr1165` for a star of the table, a word such as `pleiades` for a figure, `f-` and an id for a village's own. */
export const markerKey = z
  .string()
  .regex(/^(hr[1-9]\d{0,3}|[a-z][a-z0-9-]{1,39})$/u, 'marker-key')
  .max(40);

export const civilDay = z.strictObject({
  dayNumber: z.number().int(),
  gregorian: anyDate,
  julian: anyDate,
});
export type CivilDay = z.infer<typeof civilDay>;

export const occurrenceDays = z.strictObject({
  expected: civilDay,
  early: civilDay.nullable(),
  late: civilDay.nullable(),
  notes: z.array(z.enum(SKY_NOTES)),
});
export type OccurrenceDays = z.infer<typeof occurrenceDays>;

export const nightSegment = z.strictObject({
  state: z.enum(NIGHT_STATES),
  fromDayNumber: z.number().int(),
  toDayNumber: z.number().int(),
});
export type NightSegment = z.infer<typeof nightSegment>;

const phenomenonDays = z.strictObject({
  outcome: z.enum(PHENOMENON_OUTCOMES),
  occurrences: z.array(occurrenceDays),
});
export type PhenomenonDays = z.infer<typeof phenomenonDays>;

export const markerNames = z.strictObject({
  markerKey,
  /** `own-figure`: one of the village itself. */
  kind: z.enum(['star', 'figure', 'own-figure']),
  /** Plain name; empty where a star has none. */
  name: z.string(),
  /** Greek letter or Flamsteed number with the constellation, e.g. `α CMa`; empty for a patch of sky. */
  designation: z.string(),
  /** Null for a patch of sky. */
  hr: z.number().int().nullable(),
  /** Of the star that carries the dates; of a patch, that of a star which would need about as dark a sky. */
  vMag: z.number(),
});
export type MarkerNames = z.infer<typeof markerNames>;

/** One row of the star table. */
export const markerRow = markerNames.extend({
  outcome: z.enum(STAR_OUTCOMES),
  outcomeDetail: z.enum(STAR_OUTCOME_DETAILS).nullable(),
  nightsHidden: z.number().int().nullable(),
  notes: z.array(z.enum(SKY_NOTES)),
  phenomena: z.record(phenomenon, phenomenonDays),
  strip: z.array(nightSegment),
});
export type MarkerRow = z.infer<typeof markerRow>;

export const crossing = civilDay.extend({
  jdUt: z.number(),
  sunDepressionDeg: z.number(),
  neededDepressionDeg: z.number(),
  starAzimuthDeg: z.number(),
  starAltitudeDeg: z.number(),
  sunAzimuthDeg: z.number(),
  /** One of sixteen compass words' codes, e.g. `ene`. */
  compass: z.string(),
  /** Local time of the crossing in the civil time of the result, `HH:MM`. */
  localTime: z.string(),
});
export type CrossingDetail = z.infer<typeof crossing>;

export const occurrenceDetail = z.strictObject({
  expected: crossing,
  early: crossing.nullable(),
  late: crossing.nullable(),
  clarity: z.enum(CLARITIES),
  notes: z.array(z.enum(SKY_NOTES)),
  /** What the same phenomenon would be over a flat horizon; null without a skyline or without a date. */
  flatExpected: civilDay.nullable(),
  /** Local times `HH:MM`: stop looking (dawn) or start looking (dusk); null where the Sun does not cross. */
  stopLookingAt: z.string().nullable(),
  startLookingAt: z.string().nullable(),
});
export type OccurrenceDetail = z.infer<typeof occurrenceDetail>;

export const basis = z.strictObject({
  thresholdSet: z.enum(THRESHOLD_SETS),
  thresholdSource: z.string(),
  sameSideDeg: z.number(),
  oppositeSideDeg: z.number(),
  sameSideShiftDeg: z.number(),
  oppositeSideShiftDeg: z.number(),
  skylineRule: z.enum(SKYLINE_RULES),
  clarityByMonth: z.array(z.enum(CLARITIES)),
  year: z.number().int(),
  engineVersion: z.string(),
});
export type Basis = z.infer<typeof basis>;

export const markerDetail = markerRow.extend({
  placeId: id,
  year: z.number().int(),
  firstDayNumber: z.number().int(),
  lastDayNumber: z.number().int(),
  details: z.record(phenomenon, z.array(occurrenceDetail)),
  basis,
  /** Stars of a figure, with their names. */
  members: z.array(z.strictObject({ hr: z.number().int(), name: z.string() })),
  skyline,
});
export type MarkerDetail = z.infer<typeof markerDetail>;

export const engineYear = queryNumber((number) =>
  number.int().min(FIRST_YEAR, 'year-range').max(LAST_YEAR, 'year-range'),
);
const yearQuery = z.strictObject({ year: engineYear });
const placeParams = z.strictObject({ placeId: id });

/** A day with its range; the ends are null where the sky never gets dark enough for them. */
const rangedDay = civilDay.extend({ early: civilDay.nullable(), late: civilDay.nullable() });
export type RangedDay = z.infer<typeof rangedDay>;

/** Bright stars over the skyline and over a flat horizon, for the place's page. */
export const skylineEffect = z.strictObject({
  markerKey,
  name: z.string(),
  phenomenon,
  flat: rangedDay.nullable(),
  hill: rangedDay.nullable(),
  /** Hill minus flat in days; null where one of them has no date. */
  differenceDays: z.number().int().nullable(),
  /** What stands in place of a hill date that is null. */
  hillOutcome: z.enum(STAR_OUTCOMES),
  hillPhenomenonOutcome: z.enum(PHENOMENON_OUTCOMES),
});
export type SkylineEffect = z.infer<typeof skylineEffect>;

export const skylinePreviewInput = z.strictObject({
  place: placeInput,
  year: z.number('not-a-number').int().min(FIRST_YEAR, 'year-range').max(LAST_YEAR, 'year-range'),
});
export type SkylinePreviewInput = z.infer<typeof skylinePreviewInput>;

export const starsEndpoints = {
  list: defineEndpoint({
    id: 'listStars',
    method: 'GET',
    path: '/api/places/:placeId/stars',
    summary: 'Every star and figure with its four dates at a place in a year',
    access: member('place', ...ROLES),
    params: placeParams,
    query: yearQuery,
    response: listOf(markerRow).extend({
      year: z.number().int(),
      firstDayNumber: z.number().int(),
      lastDayNumber: z.number().int(),
    }),
  }),
  csv: defineEndpoint({
    id: 'exportStarsCsv',
    method: 'GET',
    path: '/api/places/:placeId/stars.csv',
    summary: 'The same table as CSV',
    access: member('place', ...ROLES),
    params: placeParams,
    query: yearQuery,
    fileType: 'text/csv',
  }),
  read: defineEndpoint({
    id: 'readStar',
    method: 'GET',
    path: '/api/places/:placeId/stars/:markerKey',
    summary: 'One star or figure: the year night by night, each date with range and basis',
    access: member('place', ...ROLES),
    params: z.strictObject({ placeId: id, markerKey }),
    query: yearQuery,
    response: markerDetail,
  }),
  skylineEffects: defineEndpoint({
    id: 'listSkylineEffects',
    method: 'GET',
    path: '/api/places/:placeId/skyline-effects',
    summary: 'What the skyline does to the dates of the brightest stars and figures',
    access: member('place', ...ROLES),
    params: placeParams,
    query: yearQuery,
    response: listOf(skylineEffect),
  }),
  previewSkylineEffects: defineEndpoint({
    id: 'previewSkylineEffects',
    method: 'POST',
    path: '/api/communities/:communityId/skyline-effects',
    summary: 'The same for a place that is not saved yet; nothing is kept',
    access: member('community', 'officer'),
    params: z.strictObject({ communityId: id }),
    body: skylinePreviewInput,
    response: listOf(skylineEffect),
  }),
} as const;

export const skyPatch = z.strictObject({
  rightAscensionDeg: z.number(),
  declinationDeg: z.number(),
  patchClass: z.enum(PATCH_CLASSES),
});

/** A figure of the village as the engine needs it. */
export const skyFigure = z.strictObject({
  key: markerKey,
  name: z.string(),
  indicatorHr: z.number().int().nullable(),
  memberHrs: z.array(z.number().int()),
  patch: skyPatch.nullable(),
  thresholdOverride: z
    .strictObject({ sameSideDeg: z.number(), oppositeSideDeg: z.number(), source: z.string() })
    .nullable(),
});
export type SkyFigure = z.infer<typeof skyFigure>;

/** Place as the engine needs it; kept with a version so that its dates can be explained later. Rain moves no date. */
export const placeSnapshot = place
  .omit({ id: true, communityId: true, version: true, rainMonths: true })
  .extend({
    /** The village's own figures that the entries go by; absent where there are none. */
    figures: z.array(skyFigure).optional(),
  });
export type PlaceSnapshot = z.infer<typeof placeSnapshot>;
