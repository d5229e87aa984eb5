import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import type { MarkerRow, OccurrenceDays } from '#shared/contracts/stars.js';
import type { Phenomenon } from '#shared/sky/vocabulary.js';
import { useDateWords } from './date-words.js';

/** Dates of stars as sentences, each with its range. Needs the texts `calendars`. */
export interface MarkerDayWords {
  /** `About 7 June, between 3 and 12 June`. */
  about: (days: OccurrenceDays) => string;
  /** The days of a year, or that there are none. */
  occurrences: (days: readonly OccurrenceDays[], year: number) => string;
  /** The days of one phenomenon, or the plain sentence why there are none. */
  phenomenon: (row: Pick<MarkerRow, 'outcome' | 'phenomena'>, phenomenon: Phenomenon, year: number) => string;
}

export function useMarkerDayWords(): MarkerDayWords {
  const { t } = useTranslation('calendars');
  const dates = useDateWords();
  return useMemo(() => {
    const about = ({ expected, early, late }: OccurrenceDays) =>
      dates.aboutBetween(expected.gregorian, early?.gregorian ?? null, late?.gregorian ?? null);
    const occurrences = (all: readonly OccurrenceDays[], year: number) => {
      const [first, second, third] = all;
      if (first && third) return t('marker.often', { count: all.length, first: about(first) });
      if (first && second) return t('marker.twice', { first: about(first), second: about(second) });
      return first ? about(first) : t('marker.notThisYear', { year });
    };
    return {
      about,
      occurrences,
      phenomenon: ({ outcome, phenomena }, phenomenon, year) => {
        if (outcome === 'never-sets') return t('marker.neverSets');
        if (outcome === 'never-clears-skyline') return t('marker.neverClears');
        const days = phenomena[phenomenon];
        return days.outcome === 'never-dark-enough'
          ? t('marker.neverDark')
          : occurrences(days.occurrences, year);
      },
    };
  }, [t, dates]);
}
