import type { Place, PlaceInput } from '#shared/contracts/places.js';
import type { PlaceEntity } from '../../db/entities/place.entity.js';

export function toPlace(row: PlaceEntity): Place {
  return {
    id: row.id,
    communityId: row.communityId,
    name: row.name,
    latitudeDeg: row.latitudeDeg,
    longitudeDeg: row.longitudeDeg,
    elevationM: row.elevationM,
    timeZone: row.timeZone,
    skyline: row.skyline,
    clarityByMonth: row.clarityByMonth,
    rainMonths: row.rainMonths,
    thresholdSet: row.thresholdSet,
    sameSideShiftDeg: row.sameSideShiftDeg,
    oppositeSideShiftDeg: row.oppositeSideShiftDeg,
    skylineRule: row.skylineRule,
    version: row.version,
  };
}

/** The columns have the names of the fields; written out, so that nothing else ever reaches the table. */
export function fromPlaceInput(input: PlaceInput): PlaceInput {
  return {
    name: input.name,
    latitudeDeg: input.latitudeDeg,
    longitudeDeg: input.longitudeDeg,
    elevationM: input.elevationM,
    timeZone: input.timeZone,
    skyline: input.skyline,
    clarityByMonth: input.clarityByMonth,
    rainMonths: input.rainMonths,
    thresholdSet: input.thresholdSet,
    sameSideShiftDeg: input.sameSideShiftDeg,
    oppositeSideShiftDeg: input.oppositeSideShiftDeg,
    skylineRule: input.skylineRule,
  };
}
