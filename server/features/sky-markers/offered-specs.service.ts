import {
  DARK_NIGHT_ENDS,
  FIGURES,
  markerKeyOf,
  NIGHT_DEPTHS_DEG,
  NOON_SUN_PASSAGES,
  MOON_EVENTS,
  type SkyMarkerSpec,
  STARS,
  SUN_SEASONS,
  type TwilightDepthDeg,
  VENUS_APPEARANCES,
} from '#shared/sky/index.js';
import { figuresOf, type WatchedPlace } from '../places/watched-place.service.js';

/** Stars that everybody knows. */
const BRIGHTER_THAN_V = 1.3;
/** Nine in the evening by the Sun: dark in most of the year, and people are still up. */
const EVENING_HOUR = 21;
const DUSK_DEPTH_DEG: TwilightDepthDeg = 12;
/** The sign from which most peoples count their Moons. */
const COUNTED_FROM = 'pleiades';

const KNOWN_KEYS: readonly string[] = [
  ...FIGURES.map(({ key }) => key),
  ...STARS.filter(({ vMag }) => vMag < BRIGHTER_THAN_V)
    .sort((a, b) => a.vMag - b.vMag)
    .map(({ hr }) => markerKeyOf(hr)),
];

/**
 * What an officer may be offered at a place, the Sun first. Every kind stands among it with parameters that people use;
 * what the place never has falls away when its year is computed; the village's own figures come before the stars. Points
 * of the skyline have names that only the village knows, so sunrise over a point is asked for and not offered.
 */
export function offeredSpecs(place: WatchedPlace): SkyMarkerSpec[] {
  const facings = place.latitudeDeg >= 0 ? (['south', 'north'] as const) : (['north', 'south'] as const);
  const keys = [...figuresOf(place).map(({ key }) => key), ...KNOWN_KEYS];
  return [
    ...SUN_SEASONS.map((season) => ({ kind: 'sun-season' as const, season })),
    { kind: 'zenith-sun' as const },
    ...NOON_SUN_PASSAGES.map((passage) => ({ kind: 'noon-sun' as const, passage, ridgeName: '' })),
    ...NIGHT_DEPTHS_DEG.flatMap((depthDeg) =>
      DARK_NIGHT_ENDS.map((end) => ({ kind: 'dark-night' as const, end, depthDeg })),
    ),
    ...MOON_EVENTS.map((event) => ({ kind: 'moon-phase' as const, event })),
    ...MOON_EVENTS.map((event) => ({
      kind: 'moon-counted' as const,
      markerKey: COUNTED_FROM,
      phenomenon: 'heliacal-rising' as const,
      event,
      count: 1,
    })),
    ...VENUS_APPEARANCES.map((appearance) => ({ kind: 'venus-appearance' as const, appearance })),
    // Most stars are highest on the side of the equator; those near the other pole on the other one.
    ...keys.flatMap((markerKey) =>
      facings.map((facing) => ({
        kind: 'due-meridian' as const,
        markerKey,
        facing,
        solarHour: EVENING_HOUR,
      })),
    ),
    ...keys.map((markerKey) => ({
      kind: 'culmination' as const,
      markerKey,
      twilight: 'dusk' as const,
      depthDeg: DUSK_DEPTH_DEG,
    })),
  ];
}
