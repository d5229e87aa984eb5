import { z } from 'zod';
import { CLARITIES, SKYLINE_RULES, THRESHOLD_SETS } from '../sky/vocabulary.js';
import { id, line, listOf, queryNumber, rowVersion } from './common.js';
import { defineEndpoint, member, signedIn } from './endpoint.js';
import { ROLES } from './people.js';

export const SKYLINE_POINTS_MAX = 361;
export const SKYLINE_ALTITUDE_MIN_DEG = -5;
export const SKYLINE_ALTITUDE_MAX_DEG = 60;

export const latitudeDeg = z.number('not-a-number').min(-90, 'latitude-range').max(90, 'latitude-range');
export const longitudeDeg = z.number('not-a-number').min(-180, 'longitude-range').max(180, 'longitude-range');

export const skylinePoint = z.strictObject({
  azimuthDeg: z.number('not-a-number').min(0, 'azimuth-range').max(360, 'azimuth-range'),
  altitudeDeg: z
    .number('not-a-number')
    .min(SKYLINE_ALTITUDE_MIN_DEG, 'altitude-range')
    .max(SKYLINE_ALTITUDE_MAX_DEG, 'altitude-range'),
});
export type SkylinePoint = z.infer<typeof skylinePoint>;

/** Sorted by azimuth. Where both are given, 0° and 360° are the same point and must agree. */
export const skyline = z
  .array(skylinePoint)
  .max(SKYLINE_POINTS_MAX, 'too-many-points')
  .superRefine((points, context) => {
    const firstAt = new Map<number, number>();
    points.forEach((point, index) => {
      if (firstAt.has(point.azimuthDeg)) {
        context.addIssue({ code: 'custom', path: [index, 'azimuthDeg'], message: 'duplicate-azimuth' });
      } else {
        firstAt.set(point.azimuthDeg, index);
      }
    });
    const north = points.find((point) => point.azimuthDeg === 0);
    const fullTurn = points.findIndex((point) => point.azimuthDeg === 360);
    if (north && fullTurn >= 0 && points[fullTurn]?.altitudeDeg !== north.altitudeDeg) {
      context.addIssue({ code: 'custom', path: [fullTurn, 'altitudeDeg'], message: 'full-turn-differs' });
    }
  })
  .transform((points) => [...points].sort((a, b) => a.azimuthDeg - b.azimuthDeg));

export const clarity = z.enum(CLARITIES);
const shiftDeg = z.number('not-a-number').min(-6, 'shift-range').max(6, 'shift-range');

export const placeInput = z.strictObject({
  name: line(120, 1),
  latitudeDeg,
  longitudeDeg,
  elevationM: z.number('not-a-number').min(-500, 'elevation-range').max(9000, 'elevation-range'),
  timeZone: z.string().max(64).refine(isTimeZone, 'unknown-time-zone'),
  skyline,
  clarityByMonth: z.array(clarity).length(12),
  /** Months in which rain and cloud usually hide the sky; they move no date. */
  rainMonths: z.array(z.boolean()).length(12),
  thresholdSet: z.enum(THRESHOLD_SETS),
  sameSideShiftDeg: shiftDeg,
  oppositeSideShiftDeg: shiftDeg,
  skylineRule: z.enum(SKYLINE_RULES),
});
export type PlaceInput = z.infer<typeof placeInput>;

export const placeUpdate = placeInput.extend({ version: rowVersion });
export type PlaceUpdate = z.infer<typeof placeUpdate>;

export const place = placeInput.extend({ id, communityId: id, version: rowVersion });
export type Place = z.infer<typeof place>;

export const timeZoneAnswer = z.strictObject({ timeZone: z.string().nullable() });

/** Zones that were found to be known; making a clock for each place in every answer would take longer than the rest. */
const knownZones = new Set<string>();
const ZONES_MAX = 1000;

function isTimeZone(name: string): boolean {
  if (knownZones.has(name)) return true;
  try {
    new Intl.DateTimeFormat('en', { timeZone: name });
    if (name.length > 0 && knownZones.size < ZONES_MAX) knownZones.add(name);
    return name.length > 0;
  } catch {
    return false;
  }
}

const communityParams = z.strictObject({ communityId: id });
const placeParams = z.strictObject({ placeId: id });

export const placesEndpoints = {
  list: defineEndpoint({
    id: 'listPlaces',
    method: 'GET',
    path: '/api/communities/:communityId/places',
    summary: 'The places where people of the community watch',
    access: member('community', ...ROLES),
    params: communityParams,
    response: listOf(place),
  }),
  create: defineEndpoint({
    id: 'createPlace',
    method: 'POST',
    path: '/api/communities/:communityId/places',
    summary: 'Add a place',
    access: member('community', 'officer'),
    params: communityParams,
    body: placeInput,
    response: place,
    status: 201,
  }),
  read: defineEndpoint({
    id: 'readPlace',
    method: 'GET',
    path: '/api/places/:placeId',
    summary: 'One place with its skyline and clarity',
    access: member('place', ...ROLES),
    params: placeParams,
    response: place,
  }),
  update: defineEndpoint({
    id: 'updatePlace',
    method: 'PUT',
    path: '/api/places/:placeId',
    summary: 'Change a place; published versions keep what they were computed with',
    access: member('place', 'officer'),
    params: placeParams,
    body: placeUpdate,
    response: place,
  }),
  findTimeZone: defineEndpoint({
    id: 'findTimeZone',
    method: 'GET',
    path: '/api/time-zone',
    summary: 'The IANA time zone at given coordinates',
    access: signedIn,
    query: z.strictObject({
      latitudeDeg: queryNumber((number) => number.min(-90).max(90)),
      longitudeDeg: queryNumber((number) => number.min(-180).max(180)),
    }),
    response: timeZoneAnswer,
  }),
} as const;
