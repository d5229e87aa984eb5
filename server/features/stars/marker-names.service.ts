import type { MarkerNames } from '#shared/contracts/stars.js';
import { FIGURES, findStar, markerKeyOf, resolveMarker, STARS } from '#shared/sky/index.js';
import type { Figure, ResolvedMarker, Star } from '#shared/sky/index.js';

const BUILT_IN_KEYS: readonly string[] = [
  ...FIGURES.map((figure) => figure.key),
  ...STARS.map((star) => markerKeyOf(star.hr)),
];

const WELL_KNOWN_BRIGHTER_THAN_V = 2;
/** Built-in figures and bright stars: what nobody has to be taught to find. */
export const WELL_KNOWN_KEYS: readonly string[] = [
  ...FIGURES.map((figure) => figure.key),
  ...STARS.filter((star) => star.vMag < WELL_KNOWN_BRIGHTER_THAN_V).map((star) => markerKeyOf(star.hr)),
];

/** Every marker that a village knows: its own figures, the built-in ones, then the stars of the table by HR number. */
export function allMarkerKeys(figures: readonly Figure[]): readonly string[] {
  return [...figures.map((figure) => figure.key), ...BUILT_IN_KEYS];
}

/** How screens and files call a marker. Throws a RangeError for a key that names none. */
export function markerNamesOf(markerKey: string, figures: readonly Figure[] = []): MarkerNames {
  const { star, figure, vMag } = markerOf(markerKey, figures);
  const designation = star ? designationOf(star) : '';
  return {
    markerKey,
    kind: figure ? (figures.includes(figure) ? 'own-figure' : 'figure') : 'star',
    // The table calls a star without a name by its letter; here the letter stands in a field of its own.
    name: figure?.name ?? (star === null || star.name === designation ? '' : star.name),
    designation,
    hr: star?.hr ?? null,
    vMag,
  };
}

/** A figure's stars, each by its best name; empty for a single star. */
export function membersOf(
  markerKey: string,
  figures: readonly Figure[] = [],
): { hr: number; name: string }[] {
  const { figure } = markerOf(markerKey, figures);
  return (figure?.memberHrs ?? []).map((hr) => ({ hr, name: findStar(hr)?.name ?? `HR ${hr}` }));
}

function markerOf(markerKey: string, figures: readonly Figure[]): ResolvedMarker {
  const marker = resolveMarker(markerKey, figures);
  if (!marker) throw new RangeError(`${markerKey} is no marker.`);
  return marker;
}

/** Greek letter, else Flamsteed number, with the constellation: `α CMa`, `27 Tau`. */
function designationOf({ bayer, flamsteed, constellation }: Star): string {
  return `${bayer === '' ? flamsteed : bayer} ${constellation}`;
}
