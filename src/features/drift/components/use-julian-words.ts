import { useCallback } from 'react';
import { useDateWords } from '#src/lib/date-words.js';

/**
 * Day and month of a Julian date in words. The browser's calendar is Gregorian throughout, so the day is laid onto a leap
 * year round 2000 to be written out; its year is never shown from here.
 */
export function useJulianWords(): (date: string) => string {
  const dates = useDateWords();
  return useCallback((date: string) => dates.day(`2000${date.slice(-6)}`), [dates]);
}
