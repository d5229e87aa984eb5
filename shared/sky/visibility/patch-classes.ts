import type { PatchClass } from '../vocabulary.js';
import type { DepthPair } from './threshold-sets.js';

/**
 * Needed depths of patches of sky, which have no magnitude of their own. Convention as in threshold-sets.ts. They hold
 * whatever threshold set a place has chosen, because those go by the magnitude of a single star.
 */
export interface PatchClassFacts extends DepthPair {
  /** The magnitude of a single star that would need about as much: for range widths and for the order of lists. */
  vMag: number;
  /** Where the depths come from; keys of SOURCES.md. */
  source: string;
}

export const PATCH_CLASS_FACTS: Readonly<Record<PatchClass, PatchClassFacts>> = {
  // A bright cluster: as the Pleiades.
  'third-magnitude': {
    vMag: 3,
    sameSideDeg: 16,
    oppositeSideDeg: 10,
    source: 'class of the figure, third magnitude: Ideler 1819 after Ptolemy, in Vogt 1920 p. 17',
  },
  // A faint cluster: the classes continued to magnitude 4.5 by 1.4° a magnitude, as for single faint stars.
  faint: {
    vMag: 4.5,
    sameSideDeg: 17.4,
    oppositeSideDeg: 11.4,
    source: 'class of the figure, magnitude 4.5: continued from Ideler 1819, in Vogt 1920 p. 17',
  },
  // The Milky Way and its dark clouds: not before twilight is over, on either side of the sky.
  'full-night': {
    vMag: 5.5,
    sameSideDeg: 18,
    oppositeSideDeg: 18,
    source: 'class of the figure, full night: the Sun 18° deep, end of astronomical twilight',
  },
};
