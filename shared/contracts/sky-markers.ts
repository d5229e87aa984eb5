import { z } from 'zod';
import {
  CLOCK_MINUTES,
  DARK_NIGHT_ENDS,
  FACINGS,
  NIGHT_DEPTHS_DEG,
  MOON_COUNT,
  MOON_EVENTS,
  NOON_SUN_PASSAGES,
  POINT_NAME_MAX,
  POLE_POSITIONS,
  SKY_MARKER_OUTCOMES,
  SKY_MARKER_REASONS,
  SKY_MARKER_TIMES,
  SKY_SIDES,
  SOLAR_HOUR,
  STAR_ALTITUDE_DEG,
  SUN_EVENTS,
  SUN_SEASONS,
  TWILIGHT_DEPTHS_DEG,
  TWILIGHTS,
  VENUS_APPEARANCES,
} from '../sky/vocabulary.js';
import { id, line, listOf } from './common.js';
import { defineEndpoint, member } from './endpoint.js';
import { ROLES } from './people.js';
import { engineYear, markerKey, occurrenceDays, phenomenon } from './stars.js';

const solarHour = z
  .number('not-a-number')
  .min(SOLAR_HOUR.min, 'sky-hour')
  .max(SOLAR_HOUR.max, 'sky-hour')
  .multipleOf(SOLAR_HOUR.step, 'sky-hour');

const skyHour = z.discriminatedUnion('clock', [
  z.strictObject({
    clock: z.enum(['after-sunset', 'before-sunrise']),
    minutes: z
      .number('not-a-number')
      .int('sky-minutes')
      .min(CLOCK_MINUTES.min, 'sky-minutes')
      .max(CLOCK_MINUTES.max, 'sky-minutes'),
  }),
  z.strictObject({ clock: z.literal('solar-hour'), solarHour }),
]);

/** A marker beyond a star's first and last days. One member for each kind of the core; a test holds the two together. */
export const skyMarkerSpec = z.discriminatedUnion('kind', [
  z.strictObject({
    kind: z.literal('culmination'),
    markerKey,
    twilight: z.enum(TWILIGHTS),
    depthDeg: z.literal(TWILIGHT_DEPTHS_DEG),
  }),
  z.strictObject({
    kind: z.literal('star-altitude'),
    markerKey,
    altitudeDeg: z
      .number('not-a-number')
      .min(STAR_ALTITUDE_DEG.min, 'star-altitude')
      .max(STAR_ALTITUDE_DEG.max, 'star-altitude'),
    side: z.enum(SKY_SIDES),
    at: skyHour,
  }),
  z.strictObject({
    kind: z.literal('due-meridian'),
    markerKey,
    facing: z.enum(FACINGS),
    solarHour,
  }),
  z.strictObject({
    kind: z.literal('about-pole'),
    markerKey,
    position: z.enum(POLE_POSITIONS),
    solarHour,
  }),
  z.strictObject({ kind: z.literal('sun-season'), season: z.enum(SUN_SEASONS) }),
  z.strictObject({
    kind: z.literal('sun-azimuth'),
    event: z.enum(SUN_EVENTS),
    azimuthDeg: z.number('not-a-number').min(0, 'azimuth-range').max(360, 'azimuth-range'),
    pointName: line(POINT_NAME_MAX),
  }),
  z.strictObject({
    kind: z.literal('noon-sun'),
    passage: z.enum(NOON_SUN_PASSAGES),
    ridgeName: line(POINT_NAME_MAX),
  }),
  z.strictObject({ kind: z.literal('zenith-sun') }),
  z.strictObject({
    kind: z.literal('dark-night'),
    end: z.enum(DARK_NIGHT_ENDS),
    depthDeg: z.literal(NIGHT_DEPTHS_DEG),
  }),
  z.strictObject({ kind: z.literal('moon-phase'), event: z.enum(MOON_EVENTS) }),
  z.strictObject({
    kind: z.literal('moon-counted'),
    markerKey,
    phenomenon,
    event: z.enum(MOON_EVENTS),
    count: z
      .number('not-a-number')
      .int('moon-count')
      .min(MOON_COUNT.min, 'moon-count')
      .max(MOON_COUNT.max, 'moon-count'),
  }),
  z.strictObject({ kind: z.literal('venus-appearance'), appearance: z.enum(VENUS_APPEARANCES) }),
]);
export type SkyMarkerSpec = z.infer<typeof skyMarkerSpec>;

export const skyMarkerOccurrence = occurrenceDays.extend({
  /** Where star or Sun stands on the expected day; null where there is no one direction. */
  azimuthDeg: z.number().nullable(),
  altitudeDeg: z.number().nullable(),
  /** One of sixteen compass words' codes. */
  compass: z.string().nullable(),
  /** Civil time of the place on the expected day, `HH:MM`; null where the day as a whole is meant. */
  localTime: z.string().nullable(),
});
export type SkyMarkerOccurrence = z.infer<typeof skyMarkerOccurrence>;

/** A marker's year at a place: days with ranges, or why there are none, and what they rest on. */
export const skyMarkerYear = z.strictObject({
  spec: skyMarkerSpec,
  year: z.number().int(),
  outcome: z.enum(SKY_MARKER_OUTCOMES),
  reason: z.enum(SKY_MARKER_REASONS).nullable(),
  occurrences: z.array(skyMarkerOccurrence),
  time: z.enum(SKY_MARKER_TIMES),
  sourceKey: z.string(),
  basis: z.strictObject({ range: z.string(), toleranceDeg: z.number(), engineVersion: z.string() }),
});
export type SkyMarkerYear = z.infer<typeof skyMarkerYear>;

export const skyMarkerQuestion = z.strictObject({ year: engineYear, spec: skyMarkerSpec });
export type SkyMarkerQuestion = z.infer<typeof skyMarkerQuestion>;

const placeParams = z.strictObject({ placeId: id });

export const skyMarkersEndpoints = {
  list: defineEndpoint({
    id: 'listSkyMarkers',
    method: 'GET',
    path: '/api/places/:placeId/sky-markers',
    summary:
      'Signs of the Sun, the nights and the stars that make sense at a place, with their dates in a year',
    access: member('place', ...ROLES),
    params: placeParams,
    query: z.strictObject({ year: engineYear }),
    response: listOf(skyMarkerYear),
  }),
  compute: defineEndpoint({
    id: 'computeSkyMarker',
    method: 'POST',
    path: '/api/places/:placeId/sky-markers',
    summary: 'The dates of one sign of the sky at a place in a year; nothing is kept',
    access: member('place', ...ROLES),
    params: placeParams,
    body: skyMarkerQuestion,
    response: skyMarkerYear,
  }),
} as const;
