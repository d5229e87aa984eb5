import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import type { NightSegment } from '#shared/contracts/stars.js';
import { useDateWords } from './date-words.js';
import { listWords } from './list-words.js';

/** A lane of the year as a sentence: the picture for ears. Needs the texts `calendars` and `sky`. */
export function useLaneWords(): (marker: string, strip: readonly NightSegment[]) => string {
  const { t, i18n } = useTranslation(['calendars', 'sky']);
  const dates = useDateWords();
  return useMemo(
    () => (marker, strip) => {
      const states = strip.map(({ state, fromDayNumber, toDayNumber }) =>
        t('strip.laneState', {
          state: t(`sky:night.${state}`),
          from: dates.day(fromDayNumber),
          to: dates.day(toDayNumber),
        }),
      );
      return t('strip.lane', { marker, states: listWords(states, i18n.language) });
    },
    [t, i18n.language, dates],
  );
}
