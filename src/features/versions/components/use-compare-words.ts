import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import { useDateWords } from '#src/lib/date-words.js';
import { useEntryWords, type NamesByKey } from '#src/lib/entry-words.js';
import { useMarkerDayWords } from '#src/lib/marker-day-words.js';
import { markerName } from '#src/lib/marker-names.js';
import { useSkySignWords } from '#src/lib/sky-sign-words.js';
import type { CompareWords } from '../model/entry-sentences.js';

/** Any year without a 29 February: a last date belongs to every year. */
const PLAIN_YEAR = 2027;

export function useCompareWords(year: number, markers: NamesByKey): CompareWords {
  const { t } = useTranslation(['calendars', 'sharing']);
  const dates = useDateWords();
  const entryWords = useEntryWords();
  const markerDays = useMarkerDayWords();
  const sign = useSkySignWords();
  return useMemo(
    () => ({
      day: (iso) => dates.day(iso),
      window: ({ content, dates: found }) => entryWords.window(content, found.window, year),
      about: markerDays.about,
      lead: (lead) => entryWords.leadAlone({ lead }, markers),
      signName: (lead) => {
        if (lead.type === 'sky') return sign(lead.spec, markers);
        const names = markers.get(lead.markerKey);
        return names ? markerName(names) : lead.markerKey;
      },
      lastDate: ({ date, source }) =>
        t('stale.lastDateIs', { day: dates.day({ year: PLAIN_YEAR, ...date }), source }),
      kind: ({ kind, kindWord }) => kindWord?.word ?? t(`kind.${kind}`),
      icon: (icon) => t(`icon.${icon}`),
      level: (level) => t(`sharing:level.${level}.name`),
    }),
    [t, dates, entryWords, markerDays, sign, markers, year],
  );
}
