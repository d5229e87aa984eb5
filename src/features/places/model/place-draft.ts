import { z } from 'zod';
import {
  clarity,
  placeInput,
  skylinePoint,
  type Place,
  type PlaceInput,
  type SkylinePoint,
} from '#shared/contracts/places.js';
import { SKYLINE_RULES, THRESHOLD_SETS } from '#shared/sky/vocabulary.js';
import { readCoordinate, writeCoordinate, type CoordinateProblem } from './coordinate.js';
import { readElevationM } from './elevation.js';
import { readSkylineText, withoutFullTurn, type LineProblem } from './skyline-text.js';

/** A place as it is being written: numbers that are typed stay the text that was typed. */
const placeDraftSchema = z.object({
  name: z.string(),
  latitude: z.string(),
  longitude: z.string(),
  elevation: z.string(),
  timeZone: z.string(),
  /** True once a person chose the time zone: then coordinates no longer change it. */
  timeZoneChosen: z.boolean(),
  skyline: z.array(skylinePoint),
  /** A table that is being pasted or mended; null while the rings are in use. */
  skylineText: z.string().nullable(),
  clarityByMonth: z.array(clarity).length(12),
  rainMonths: z.array(z.boolean()).length(12),
  thresholdSet: z.enum(THRESHOLD_SETS),
  sameSideShiftDeg: z.number(),
  oppositeSideShiftDeg: z.number(),
  skylineRule: z.enum(SKYLINE_RULES),
});
export type PlaceDraft = z.infer<typeof placeDraftSchema>;

/** What is kept on the device: the draft, and the saved state that it began from. */
export interface KeptPlace {
  draft: PlaceDraft;
  base: PlaceInput | null;
}

const keptPlaceSchema = z.object({ draft: placeDraftSchema, base: placeInput.nullable() });

export function isKeptPlace(value: unknown): value is KeptPlace {
  return keptPlaceSchema.safeParse(value).success;
}

export const PLACE_FIELDS = [
  'name',
  'latitudeDeg',
  'longitudeDeg',
  'elevationM',
  'timeZone',
  'skyline',
  'clarityByMonth',
  'rainMonths',
  'thresholdSet',
  'sameSideShiftDeg',
  'oppositeSideShiftDeg',
  'skylineRule',
] as const satisfies readonly (keyof PlaceInput)[];
export type PlaceField = (typeof PLACE_FIELDS)[number];

/** What stands at a field: a reading problem of our own, or a code of the schema or the server. */
export type PlaceProblem =
  | { kind: 'coordinate'; problem: CoordinateProblem }
  | { kind: 'elevation'; value: string }
  | { kind: 'no-clock' }
  | { kind: 'skyline-lines'; problems: readonly LineProblem[] }
  | { kind: 'code'; code: string; message?: string };
export type PlaceProblems = Partial<Record<PlaceField, PlaceProblem>>;

export type PlaceReading =
  { ok: true; input: PlaceInput; problems: PlaceProblems } | { ok: false; problems: PlaceProblems };

/** A new place: clear enough air, the classes most calendars rest on, a level skyline. */
export function emptyDraft(): PlaceDraft {
  return {
    name: '',
    latitude: '',
    longitude: '',
    elevation: '',
    timeZone: '',
    timeZoneChosen: false,
    skyline: [],
    skylineText: null,
    clarityByMonth: Array.from({ length: 12 }, () => 'ordinary'),
    rainMonths: Array.from({ length: 12 }, () => false),
    thresholdSet: 'three-class',
    sameSideShiftDeg: 0,
    oppositeSideShiftDeg: 0,
    skylineRule: 'altitude-difference',
  };
}

export function draftOf(input: PlaceInput): PlaceDraft {
  return {
    name: input.name,
    latitude: writeCoordinate(input.latitudeDeg, 'latitude'),
    longitude: writeCoordinate(input.longitudeDeg, 'longitude'),
    elevation: String(input.elevationM),
    timeZone: input.timeZone,
    timeZoneChosen: true,
    skyline: withoutFullTurn(input.skyline),
    skylineText: null,
    clarityByMonth: [...input.clarityByMonth],
    rainMonths: [...input.rainMonths],
    thresholdSet: input.thresholdSet,
    sameSideShiftDeg: input.sameSideShiftDeg,
    oppositeSideShiftDeg: input.oppositeSideShiftDeg,
    skylineRule: input.skylineRule,
  };
}

/** The saved fields of a place, without its ids and version. */
export function inputOf(place: Place): PlaceInput {
  const { id: _id, communityId: _communityId, version: _version, ...input } = place;
  return input;
}

/** The skyline that the draft shows: an open table counts as soon as all of it is right. */
export function skylineOf(draft: PlaceDraft): readonly SkylinePoint[] {
  if (draft.skylineText === null) return draft.skyline;
  const reading = readSkylineText(draft.skylineText);
  return reading.ok ? reading.points : draft.skyline;
}

/** Everything that was typed as what is sent, or one problem for each field that needs a change. */
export function readDraft(draft: PlaceDraft): PlaceReading {
  const problems: PlaceProblems = {};
  const latitude = readCoordinate(draft.latitude, 'latitude');
  const longitude = readCoordinate(draft.longitude, 'longitude');
  if (!latitude.ok) problems.latitudeDeg = { kind: 'coordinate', problem: latitude.problem };
  if (!longitude.ok) problems.longitudeDeg = { kind: 'coordinate', problem: longitude.problem };
  const elevationM = readElevationM(draft.elevation);
  if (elevationM === null) problems.elevationM = { kind: 'elevation', value: draft.elevation.trim() };
  const table = draft.skylineText === null ? null : readSkylineText(draft.skylineText);
  if (table?.ok === false) problems.skyline = { kind: 'skyline-lines', problems: table.problems };
  // The clock follows from the coordinates: while these are missing, nothing is said about it.
  const clockIsDue = latitude.ok && longitude.ok;
  if (draft.timeZone === '' && clockIsDue) problems.timeZone = { kind: 'no-clock' };

  const parsed = placeInput.safeParse({
    name: draft.name,
    latitudeDeg: latitude.ok ? latitude.valueDeg : 0,
    longitudeDeg: longitude.ok ? longitude.valueDeg : 0,
    elevationM: elevationM ?? 0,
    timeZone: draft.timeZone === '' ? 'UTC' : draft.timeZone,
    skyline: table?.ok === true ? table.points : draft.skyline,
    clarityByMonth: draft.clarityByMonth,
    rainMonths: draft.rainMonths,
    thresholdSet: draft.thresholdSet,
    sameSideShiftDeg: draft.sameSideShiftDeg,
    oppositeSideShiftDeg: draft.oppositeSideShiftDeg,
    skylineRule: draft.skylineRule,
  });
  if (!parsed.success) {
    for (const issue of parsed.error.issues) {
      const field = PLACE_FIELDS.find((name) => name === issue.path[0]);
      if (field !== undefined) problems[field] ??= { kind: 'code', code: issue.message };
    }
  }
  return parsed.success && draft.timeZone !== '' && Object.keys(problems).length === 0
    ? { ok: true, input: parsed.data, problems }
    : { ok: false, problems };
}

/**
 * The draft as a whole state, also while some of it cannot be read: such a field stands as in `instead`.
 * For comparing, never for saving.
 */
export function readableOf(draft: PlaceDraft, instead: PlaceInput): PlaceInput {
  const { problems } = readDraft(draft);
  const patched = { ...draft, ...textsOf(draftOf(instead), problems) };
  const reading = readDraft(patched);
  return reading.ok ? reading.input : instead;
}

/** The draft after two states were joined. What could not be read yet stays as it was typed. */
export function joinedDraft(draft: PlaceDraft, joined: PlaceInput): PlaceDraft {
  return { ...draftOf(joined), ...textsOf(draft, readDraft(draft).problems) };
}

const DRAFT_KEYS: Record<PlaceField, readonly (keyof PlaceDraft)[]> = {
  name: ['name'],
  latitudeDeg: ['latitude'],
  longitudeDeg: ['longitude'],
  elevationM: ['elevation'],
  timeZone: ['timeZone'],
  skyline: ['skyline', 'skylineText'],
  clarityByMonth: ['clarityByMonth'],
  rainMonths: ['rainMonths'],
  thresholdSet: ['thresholdSet'],
  sameSideShiftDeg: ['sameSideShiftDeg'],
  oppositeSideShiftDeg: ['oppositeSideShiftDeg'],
  skylineRule: ['skylineRule'],
};

/** The parts of a draft that stand for the fields with a problem. */
function textsOf(draft: PlaceDraft, problems: PlaceProblems): Partial<PlaceDraft> {
  const keys = PLACE_FIELDS.filter((field) => problems[field] !== undefined).flatMap(
    (field) => DRAFT_KEYS[field],
  );
  return Object.fromEntries(keys.map((key) => [key, draft[key]]));
}

/** Fields in which two states differ. A skyline differs by its points, 0° and 360° being one. */
export function differingFields(a: PlaceInput, b: PlaceInput): PlaceField[] {
  return PLACE_FIELDS.filter(
    (field) => JSON.stringify(comparable(a, field)) !== JSON.stringify(comparable(b, field)),
  );
}

function comparable(input: PlaceInput, field: PlaceField): unknown {
  return field === 'skyline'
    ? withoutFullTurn(input.skyline).map((point) => [point.azimuthDeg, point.altitudeDeg])
    : input[field];
}

/** True where the draft says something else than the saved state, also in what cannot be read yet. */
export function isChanged(draft: PlaceDraft, base: PlaceInput | null): boolean {
  const reading = readDraft(draft);
  const start = base ?? null;
  if (start === null) return JSON.stringify(draft) !== JSON.stringify(emptyDraft());
  return reading.ok ? differingFields(reading.input, start).length > 0 : true;
}
