import type { EntryLead } from '#shared/calendar/entry-model.js';
import type { IconKey } from './icons.js';

/** Figures that have a drawing of their own. */
const FIGURE_ICONS: Readonly<Record<string, IconKey>> = { pleiades: 'cluster', 'orion-belt': 'row' };

/** The drawn sign of a star or figure: a cluster, three in a row, a star. */
export function markerIconKey(markerKey: string): IconKey {
  const isStar = /^hr\d+$/u.test(markerKey);
  return isStar ? 'star' : (FIGURE_ICONS[markerKey] ?? 'cluster');
}

/** The drawn sign of what a sign of the sky is about: the star that it goes by, the Sun, the Moon, the stars of a dark night. */
export function skySignIconKey(spec: Extract<EntryLead, { type: 'sky' }>['spec']): IconKey {
  if (spec.kind === 'moon-phase' || spec.kind === 'moon-counted') return 'moon';
  if ('markerKey' in spec) return markerIconKey(spec.markerKey);
  return spec.kind === 'dark-night' || spec.kind === 'venus-appearance' ? 'star' : 'sun';
}
