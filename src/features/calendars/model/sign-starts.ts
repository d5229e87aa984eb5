import type { SkyMarkerSpec, SkyMarkerYear } from '#shared/contracts/sky-markers.js';
import type { Facing } from '#shared/sky/vocabulary.js';
import { textFits } from '#src/ui/combo-field.js';

/** Kinds whose parameters only the village knows: they are set up, not picked from a list. */
export const OWN_KINDS = [
  'due-meridian',
  'culmination',
  'star-altitude',
  'about-pole',
  'sun-azimuth',
  'moon-counted',
] as const;
export type OwnKind = (typeof OWN_KINDS)[number];

const DUE_EAST_DEG = 90;

/** How a sign of one's own begins; its parameters are stepped in the form. */
export function startOf(
  kind: OwnKind,
  markerKey: string,
  offered: readonly Pick<SkyMarkerYear, 'spec'>[],
): SkyMarkerSpec {
  switch (kind) {
    case 'due-meridian':
      return { kind, markerKey, facing: facingOf(markerKey, offered), solarHour: 21 };
    case 'culmination':
      return { kind, markerKey, twilight: 'dusk', depthDeg: 12 };
    case 'star-altitude':
      return {
        kind,
        markerKey,
        altitudeDeg: 30,
        side: 'east',
        at: { clock: 'after-sunset', minutes: 60 },
      };
    case 'about-pole':
      return { kind, markerKey, position: 'lowest', solarHour: 21 };
    case 'moon-counted':
      return { kind, markerKey, phenomenon: 'heliacal-rising', event: 'first-crescent', count: 1 };
    case 'sun-azimuth':
      return { kind, event: 'sunrise', azimuthDeg: DUE_EAST_DEG, pointName: '' };
  }
}

/** The side on which the star is highest here by the place's own list; for one that is not in it, that of most stars. */
function facingOf(markerKey: string, offered: readonly Pick<SkyMarkerYear, 'spec'>[]): Facing {
  const known = offered.map(({ spec }) => spec).filter((spec) => spec.kind === 'due-meridian');
  const own = known.find((spec) => spec.markerKey === markerKey);
  if (own) return own.facing;
  const northern = known.filter(({ facing }) => facing === 'north').length;
  return northern > known.length - northern ? 'north' : 'south';
}

/** Offered signs whose name holds what was typed; those that the calendar goes by come first. */
export function findSigns<T extends { name: string; isInUse: boolean }>(
  signs: readonly T[],
  typed: string,
): T[] {
  const fitting = signs.filter(({ name }) => typed.trim() === '' || textFits(name, typed.trim()));
  return [...fitting.filter(({ isInUse }) => isInUse), ...fitting.filter(({ isInUse }) => !isInUse)];
}
