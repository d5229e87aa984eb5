import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import type { Decision, ReviewedEntry, SeasonReview } from '#shared/contracts/season-reviews.js';
import type { Phenomenon } from '#shared/sky/vocabulary.js';
import { useDateWords } from '#src/lib/date-words.js';
import { useEntryWords } from '#src/lib/entry-words.js';

const AT_DAWN: readonly Phenomenon[] = ['heliacal-rising', 'cosmical-setting'];

/** What a line of the year says, in words: on the screen and on paper alike. */
export interface SeasonWords {
  /** Below the title: by what the year is told, and how many of its entries the published calendar does not hold. */
  under: (review: Pick<SeasonReview, 'placeName' | 'label' | 'entries'>) => string;
  planned: (entry: ReviewedEntry, review: Pick<SeasonReview, 'year' | 'label'>) => string;
  /** The days on which it was done, with who said so where `withVoice`; null where nobody wrote them down. */
  done: (entry: ReviewedEntry, withVoice?: boolean) => string | null;
  star: (entry: ReviewedEntry) => string | null;
  signs: (entry: ReviewedEntry) => string[];
  decision: (decision: Pick<Decision, 'kind' | 'text'>) => string;
}

export function useSeasonWords(): SeasonWords {
  const { t } = useTranslation('season');
  const dates = useDateWords();
  const words = useEntryWords();
  return useMemo(
    () => ({
      under: ({ placeName: place, label, entries }) => {
        if (label === null) return t('underDraft', { place });
        const count = entries.filter(({ isPublished }) => !isPublished).length;
        return count === 0 ? t('under', { place, label }) : t('underWithDraft', { place, label, count });
      },
      planned: (entry, { year, label }) => {
        const { window, counted } = entry.planned;
        if (window === null && counted?.basis === 'waiting') return t('planned.waiting');
        const days = words.window(entry, window, year);
        // Where nothing is published the head of the page says so once.
        return entry.isPublished || label === null ? days : t('planned.draftOnly', { days });
      },
      done: ({ actual }, withVoice = false) => {
        if (actual === null) return null;
        const { from, to, saidBy: by } = actual;
        const days = to === null || to === from ? dates.day(from) : dates.range(from, to);
        return t(withVoice && by !== '' ? 'done.by' : 'done.days', { days, by });
      },
      star: ({ star }) => {
        if (star === null) return null;
        const { name, phenomenon, seen } = star;
        if (seen === null) return t('star.nothing', { star: name });
        const { date, by, agreedBy } = seen;
        const key = AT_DAWN.includes(phenomenon) ? 'star.morning' : 'star.evening';
        return t(key, { star: name, day: dates.day(date), by, agreedBy });
      },
      signs: ({ signs }) =>
        signs.map(({ name, mustHave, canBeMarked, cameOn }) => {
          if (!canBeMarked) return t('signs.inWords', { name });
          if (cameOn === null) return t(mustHave ? 'signs.mustNotMarked' : 'signs.notMarked', { name });
          return t(mustHave ? 'signs.mustCame' : 'signs.came', { name, day: dates.day(cameOn) });
        }),
      decision: ({ kind, text }) => (text === '' ? t(`kind.${kind}`) : t(`said.${kind}`, { text })),
    }),
    [t, dates, words],
  );
}
