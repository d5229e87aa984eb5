import type { Site, SkylinePoint, VisibilitySettings } from '#shared/sky/index.js';

/** The place that is measured: an invented village in the hills. */
export const benchSite: Site = {
  latitudeDeg: 28.24,
  longitudeDeg: 84.02,
  elevationM: 1400,
  timeZone: 'Asia/Kathmandu',
  skyline: [],
};

/** A ridge between 1° and 9° that no two directions share. */
const ridge: SkylinePoint[] = Array.from({ length: 36 }, (_, index) => ({
  azimuthDeg: 10 * index,
  altitudeDeg: 5 + 4 * Math.sin(2.3 * index),
}));

export const hillSite: Site = { ...benchSite, skyline: ridge };

export const benchSettings: VisibilitySettings = {
  thresholdSet: 'three-class',
  sameSideShiftDeg: 0,
  oppositeSideShiftDeg: 0,
  clarityByMonth: new Array<'ordinary'>(12).fill('ordinary'),
  skylineRule: 'altitude-difference',
};
