import type { PlaceSnapshot } from '#shared/contracts/stars.js';
import type { PlaceEntity } from '../../db/entities/place.entity.js';

/** A place as the sky is reckoned for it, and as versions keep it. */
export function toPlaceSnapshot(row: PlaceEntity): PlaceSnapshot {
  return {
    name: row.name,
    latitudeDeg: row.latitudeDeg,
    longitudeDeg: row.longitudeDeg,
    elevationM: row.elevationM,
    timeZone: row.timeZone,
    skyline: row.skyline,
    clarityByMonth: row.clarityByMonth,
    thresholdSet: row.thresholdSet,
    sameSideShiftDeg: row.sameSideShiftDeg,
    oppositeSideShiftDeg: row.oppositeSideShiftDeg,
    skylineRule: row.skylineRule,
  };
}
