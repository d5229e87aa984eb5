import { createContext, useContext } from 'react';
import type { StarDates } from './star-dates.js';

/** What every row of the table needs besides its star. */
export interface StarTableFacts {
  year: number;
  firstDayNumber: number;
  lastDayNumber: number;
  placeId: string;
  latitudeDeg: number;
  dates: StarDates;
}

export const StarTableContext = createContext<StarTableFacts | null>(null);

export function useStarTableFacts(): StarTableFacts {
  const facts = useContext(StarTableContext);
  if (facts === null) throw new Error('A row of stars needs its table above it');
  return facts;
}
