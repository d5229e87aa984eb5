import type { PlaceSnapshot } from '#shared/contracts/stars.js';
import type { Figure, Site, VisibilitySettings } from '#shared/sky/index.js';

/** What a place hands to the sky, with the village's own figures; its name moves no date. */
export type WatchedPlace = Omit<PlaceSnapshot, 'name'>;

export function siteOf({ latitudeDeg, longitudeDeg, elevationM, timeZone, skyline }: WatchedPlace): Site {
  return { latitudeDeg, longitudeDeg, elevationM, timeZone, skyline };
}

export function settingsOf(place: WatchedPlace): VisibilitySettings {
  const { thresholdSet, sameSideShiftDeg, oppositeSideShiftDeg, clarityByMonth, skylineRule } = place;
  return { thresholdSet, sameSideShiftDeg, oppositeSideShiftDeg, clarityByMonth, skylineRule };
}

/** The village's own figures, beside the built-in ones. */
export function figuresOf(place: WatchedPlace): readonly Figure[] {
  return place.figures ?? [];
}
