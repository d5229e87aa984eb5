import { resolveMarker } from '#shared/sky/markers/marker-key.js';
import { type MarkerAtPlace, markerAtPlace, placeYearOf } from '#shared/sky/markers/place-year.js';
import { preparedYearOf } from '#shared/sky/phenomena/year-cache.js';
import type { Site, VisibilitySettings } from '#shared/sky/types.js';

import { settingsWith } from './builders.js';

/** A marker at a place as the inner parts of the engine take it. */
export function markerAt(
  key: string,
  site: Site,
  year: number,
  settings: Partial<VisibilitySettings> = {},
): MarkerAtPlace {
  const marker = resolveMarker(key);
  if (!marker) throw new Error(`no marker ${key}`);
  return markerAtPlace(placeYearOf(preparedYearOf(year), site, settingsWith(settings)), marker);
}
