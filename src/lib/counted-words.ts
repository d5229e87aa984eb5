import { useCallback } from 'react';
import { useTranslation } from 'react-i18next';
import type { EntryDates } from '#shared/contracts/calendars.js';
import { useDateWords } from './date-words.js';

type Counted = NonNullable<EntryDates['counted']>;

/** From which days a window is counted, and what the other counting would say; whole sentences. */
export function useCountedWords(): (counted: Counted) => string {
  const { t } = useTranslation('anchors');
  const dates = useDateWords();
  return useCallback(
    ({ basis, from, to, beside }) => {
      const days = from === null || to === null ? '' : from === to ? dates.day(from) : dates.range(from, to);
      const key = days === '' ? 'none' : 'known';
      const other = beside === null ? '' : dates.range(beside.bestFrom, beside.bestTo);
      if (other === '' || basis === 'usual' || basis === 'planned' || basis === 'gone') {
        return t(`counted.${basis}.${key}`, { days });
      }
      return t(`counted.${basis}.beside`, { days, other });
    },
    [t, dates],
  );
}
