import type { Site, VisibilitySettings } from '#shared/sky/index.js';

/** A place on a flat horizon in local mean solar time. */
export function siteAt(latitudeDeg: number, longitudeDeg = 0, more: Partial<Site> = {}): Site {
  return { latitudeDeg, longitudeDeg, elevationM: 0, timeZone: null, skyline: [], ...more };
}

/** The product's defaults: three classes, no shifts, ordinary air all year. */
export function settingsWith(more: Partial<VisibilitySettings> = {}): VisibilitySettings {
  return {
    thresholdSet: 'three-class',
    sameSideShiftDeg: 0,
    oppositeSideShiftDeg: 0,
    clarityByMonth: new Array<'ordinary'>(12).fill('ordinary'),
    skylineRule: 'altitude-difference',
    ...more,
  };
}
