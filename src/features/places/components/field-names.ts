import type { PlaceField } from '../model/place-draft.js';

/** Key of each field's name among the texts. */
export const FIELD_NAMES = {
  name: 'field.name',
  latitudeDeg: 'field.latitude',
  longitudeDeg: 'field.longitude',
  elevationM: 'field.elevation',
  timeZone: 'field.timeZone',
  skyline: 'field.skyline',
  clarityByMonth: 'field.clarityByMonth',
  rainMonths: 'field.rainMonths',
  thresholdSet: 'field.thresholdSet',
  sameSideShiftDeg: 'field.sameSideShift',
  oppositeSideShiftDeg: 'field.oppositeSideShift',
  skylineRule: 'field.skylineRule',
} as const satisfies Record<PlaceField, string>;
