import { createContext, useContext } from 'react';
import type { FinderAnswer, FoundMarker } from '#shared/contracts/finder.js';
import type { SkyMarkerSpec } from '#shared/contracts/sky-markers.js';
import type { FoundWords } from './use-found-words.js';

/** What an entry can go by: a star's day, or a sign of the sky. */
export type Sign =
  Pick<FoundMarker, 'markerKey' | 'phenomenon' | 'occurrence'> | { spec: SkyMarkerSpec; occurrence: number };

/** What cards, table and notes share. */
export interface FinderFacts {
  answer: FinderAnswer;
  wanted: NonNullable<FinderAnswer['wanted']>;
  placeId: string;
  words: FoundWords;
  /** Where a marker is taken to: the entry that asked, or the choice of a calendar. Null for who may not write. */
  takePath: ((sign: Sign) => string) | null;
  /** True where an entry of a calendar waits for the answer. */
  isForEntry: boolean;
}

export const FinderContext = createContext<FinderFacts | null>(null);

export function useFinderFacts(): FinderFacts {
  const facts = useContext(FinderContext);
  if (facts === null) throw new Error('useFinderFacts needs a FinderContext above it');
  return facts;
}
