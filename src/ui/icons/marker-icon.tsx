import { markerIconKey } from '#shared/sheet/lead-icons.js';
import { SignIcon, type DrawnProps } from './drawn-icon.js';

/** The sign of a star or a figure: a cluster, three in a row, a star. */
export function MarkerIcon({ markerKey, ...icon }: DrawnProps & { markerKey: string }) {
  return <SignIcon sign={markerIconKey(markerKey)} {...icon} />;
}
