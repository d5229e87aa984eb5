import type { MarkerNames } from '#shared/contracts/stars.js';
import { FIGURES, findStar, markerKeyOf, resolveMarker, STARS } from '#shared/sky/index.js';
import type { ResolvedMarker, Star } from '#shared/sky/index.js';

/** Every marker that the product knows: figures first, then the stars of the table by HR number. */
export const ALL_MARKER_KEYS: readonly string[] = [
  ...FIGURES.map((figure) => figure.key),
  ...STARS.map((star) => markerKeyOf(star.hr)),
];

/** How screens and files call a marker. Throws a RangeError for a key that names none. */
export function markerNamesOf(markerKey: string): MarkerNames {
  const { star, figure } = markerOf(markerKey);
  const designation = designationOf(star);
  return {
    markerKey,
    kind: figure ? 'figure' : 'star',
    // The table calls a star without a name by its letter; here the letter stands in a field of its own.
    name: figure?.name ?? (star.name === designation ? '' : star.name),
    designation,
    hr: star.hr,
    vMag: star.vMag,
  };
}

/** A figure's stars, each by its best name; empty for a single star. */
export function membersOf(markerKey: string): { hr: number; name: string }[] {
  const { figure } = markerOf(markerKey);
  return (figure?.memberHrs ?? []).map((hr) => ({ hr, name: findStar(hr)?.name ?? `HR ${hr}` }));
}

function markerOf(markerKey: string): ResolvedMarker {
  const marker = resolveMarker(markerKey);
  if (!marker) throw new RangeError(`${markerKey} is no marker.`);
  return marker;
}

/** Greek letter, else Flamsteed number, with the constellation: `α CMa`, `27 Tau`. */
function designationOf({ bayer, flamsteed, constellation }: Star): string {
  return `${bayer === '' ? flamsteed : bayer} ${constellation}`;
}
