import type { IconKey } from '#shared/sheet/icons.js';
import { SignIcon, type DrawnProps } from './drawn-icon.js';

const FIGURE_SIGNS: Readonly<Record<string, IconKey>> = { pleiades: 'cluster', 'orion-belt': 'row' };

/** The sign of a star or a figure: a cluster, three in a row, a star. */
export function MarkerIcon({ markerKey, ...icon }: DrawnProps & { markerKey: string }) {
  const isStar = /^hr\d+$/u.test(markerKey);
  return <SignIcon sign={isStar ? 'star' : (FIGURE_SIGNS[markerKey] ?? 'cluster')} {...icon} />;
}
