import type { Site, VisibilitySettings } from '../types.js';
import type { MoonYear } from './moon-types.js';
import { moonYearOf } from './moon-year.js';

/**
 * Keeps the years of Moons asked for last. The same question always has the same answer, so sharing it changes no
 * result; it saves the evenings when one page asks for several kinds of Moon at one place.
 */
const KEPT_YEARS = 24;
const kept = new Map<string, MoonYear>();

export function keptMoonYearOf(site: Site, settings: VisibilitySettings, year: number): MoonYear {
  const { latitudeDeg, longitudeDeg, timeZone, skyline } = site;
  const key = JSON.stringify([
    year,
    latitudeDeg,
    longitudeDeg,
    timeZone,
    skyline.map((point) => [point.azimuthDeg, point.altitudeDeg]),
    settings.clarityByMonth,
  ]);
  const found = kept.get(key) ?? moonYearOf(site, settings, year);
  kept.delete(key);
  kept.set(key, found);
  const [oldest] = kept.keys();
  if (kept.size > KEPT_YEARS && oldest !== undefined) kept.delete(oldest);
  return found;
}
