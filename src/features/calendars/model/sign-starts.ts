import type { SkyMarkerSpec, SkyMarkerYear } from '#shared/contracts/sky-markers.js';
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
    case 'due-meridian': {
      // The side on which stars are highest here: whatever the place's own list says.
      const known = offered.map(({ spec }) => spec).find((spec) => spec.kind === 'due-meridian');
      return { kind, markerKey, facing: known?.facing ?? 'south', solarHour: 21 };
    }
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

/** Offered signs whose name holds what was typed; those that the calendar goes by come first. */
export function findSigns<T extends { name: string; isInUse: boolean }>(
  signs: readonly T[],
  typed: string,
): T[] {
  const fitting = signs.filter(({ name }) => typed.trim() === '' || textFits(name, typed.trim()));
  return [...fitting.filter(({ isInUse }) => isInUse), ...fitting.filter(({ isInUse }) => !isInUse)];
}
