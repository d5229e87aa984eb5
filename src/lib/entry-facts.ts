import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import type { EntryDates, EntryInput } from '#shared/contracts/calendars.js';
import { useDateWords } from './date-words.js';
import { useGiverWords } from './giver-words.js';
import { useSharingWords } from './sharing-words.js';
import { useEntryWords, type NamesByKey } from './entry-words.js';
import { useMarkerDayWords } from './marker-day-words.js';
import { useCountedWords } from './counted-words.js';
import { useRecordFacts } from './record-facts.js';

export type FactGroup = 'what' | 'when' | 'signs' | 'work' | 'trust' | 'whose';

export interface Fact {
  key: string;
  label: string;
  value: string;
}

export interface EntryFacts {
  /** Everything that an entry says, in six groups; what is empty is left out. */
  groups: (
    content: EntryInput,
    dates: EntryDates | null,
    year: number,
    markers: NamesByKey,
  ) => Record<FactGroup, Fact[]>;
}

/** An entry to be read. Needs the texts `calendars` and `sky`. */
export function useEntryFacts(): EntryFacts {
  const { t } = useTranslation(['calendars', 'anchors']);
  const sharing = useSharingWords();
  const giverWords = useGiverWords();
  const dateWords = useDateWords();
  const entryWords = useEntryWords();
  const markerDays = useMarkerDayWords();
  const recordFacts = useRecordFacts();
  const counted = useCountedWords();
  return useMemo(() => {
    const told = (facts: Fact[]) => facts.filter(({ value }) => value !== '');
    const when = (content: EntryInput, dates: EntryDates | null, year: number, markers: NamesByKey) => [
      { key: 'lead', label: t('form.goesBy'), value: entryWords.leadAlone(content, markers) },
      { key: 'sign', label: t('form.theSign'), value: dates?.marker ? markerDays.about(dates.marker) : '' },
      {
        key: 'counted',
        label: t('anchors:countedFrom'),
        value: dates?.counted ? counted(dates.counted) : '',
      },
      {
        key: 'days',
        label: t('form.fourDays'),
        value: dates?.window
          ? entryWords.windowSentence(dates.window)
          : entryWords.window(content, null, year),
      },
      {
        key: 'lastDate',
        label: t('form.lastDate'),
        value: content.lastDate
          ? t('stale.lastDateIs', {
              day: dateWords.day({ year, ...content.lastDate.date }),
              source: content.lastDate.source,
            })
          : '',
      },
      {
        key: 'watch',
        label: t('form.protectiveWatch'),
        value: content.protectiveWatch ? t('form.protectiveWatchHint') : '',
      },
    ];
    return {
      groups: (content, dates, year, markers) => {
        const record = recordFacts(content.record);
        return {
          what: told([
            {
              key: 'kind',
              label: t('form.kind'),
              value: content.kindWord?.word ?? t(`kind.${content.kind}`),
            },
            { key: 'crop', label: t('form.crop'), value: content.crop },
            ...record.what,
            { key: 'notes', label: t('form.notes'), value: content.notes },
            { key: 'caution', label: t('form.caution'), value: content.caution },
          ]),
          when: told([...when(content, dates, year, markers), ...record.when]),
          signs: told([
            { key: 'signs', label: t('form.otherSigns'), value: content.otherSigns },
            ...record.signs,
          ]),
          work: told([{ key: 'late', label: t('form.ifLate'), value: content.ifLate }, ...record.work]),
          trust: record.trust,
          whose: told([
            { key: 'giver', label: t('form.giver'), value: giverWords(content.giver) },
            ...record.whose,
            {
              key: 'level',
              label: t('form.sharingLevel'),
              value: sharing(content.sharingLevel, content.sharing),
            },
          ]),
        };
      },
    };
  }, [t, sharing, giverWords, dateWords, entryWords, markerDays, recordFacts, counted]);
}
