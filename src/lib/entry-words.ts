import { goesAsSeen } from '#shared/calendar/as-seen.js';
import { useCallback, useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import type { EntryInput, EntryLead, EntryWarning, EntryWindow } from '#shared/contracts/calendars.js';
import { dayNumberFromIso } from '#shared/kernel/iso-date.js';
import { useDateWords } from './date-words.js';
import { useEntryTitles } from './entry-titles.js';
import { markerName, type NamesByKey } from './marker-names.js';
import { useSkySignWords } from './sky-sign-words.js';

/** Day numbers of a window, for pictures. */
export interface WindowDayNumbers {
  earliest: number;
  bestFrom: number;
  bestTo: number;
  lastAdvised: number;
}

export function windowDayNumbers(window: EntryWindow): WindowDayNumbers {
  return {
    earliest: dayNumberFromIso(window.earliest),
    bestFrom: dayNumberFromIso(window.bestFrom),
    bestTo: dayNumberFromIso(window.bestTo),
    lastAdvised: dayNumberFromIso(window.lastAdvised),
  };
}

export type { NamesByKey };

/** What is known of an entry beside its days: what it goes by, or what it warns of, says whether it goes by anything. */
export interface Dated extends Pick<EntryInput, 'protectiveWatch'> {
  lead?: EntryLead | undefined;
  warnings?: readonly EntryWarning[] | undefined;
}

/** What is said about an entry wherever it is shown. Needs the texts `calendars` and `sky`. */
export interface EntryWords {
  /** `best 14 to 30 June`, `watch 5 December to 28 February`, `on 5 July`. */
  window: (content: Dated, window: EntryWindow | null, year: number) => string;
  /** The four days as a sentence. */
  windowSentence: (window: EntryWindow) => string;
  /** `Goes by Pleiades: first morning seen`. */
  lead: (content: Pick<EntryInput, 'lead'>, markers: NamesByKey) => string;
  /** The same beside its own label: `Pleiades: first morning seen`. */
  leadAlone: (content: Pick<EntryInput, 'lead'>, markers: NamesByKey) => string;
}

/** Is nothing chosen yet from which its days are counted? */
export function goesByNothing({ lead, warnings }: Pick<Dated, 'lead' | 'warnings'>): boolean {
  return lead?.type === 'none' || warnings?.includes('no-lead-yet') === true;
}

/** Year that stands for any in "5 July": a day of every year has no 29 February. */
const ANY_YEAR = 2027;

export function useEntryWords(): EntryWords {
  const { t } = useTranslation(['calendars', 'sky', 'anchors']);
  const dates = useDateWords();
  const sign = useSkySignWords();
  const titles = useEntryTitles();
  const windowSentence = useWindowSentence();
  return useMemo(() => {
    const leadWords = (group: 'lead' | 'leadAlone', lead: EntryLead, markers: NamesByKey) => {
      if (lead.type === 'fixed-date') {
        const day = dates.day({ year: ANY_YEAR, ...lead.date });
        return t(`${group}.fixed`, { day, source: lead.source });
      }
      if (lead.type === 'sky') {
        const name = sign(lead.spec, markers);
        if (goesAsSeen(lead)) {
          const which = lead.spec.kind === 'moon-phase' ? 'moonSeen' : 'signSeen';
          return t(`anchors:${group}.${which}`, { sign: name, nth: lead.occurrence });
        }
        // Moons are numbered from the first of the year on; of the rest only the second needs a word.
        if (lead.spec.kind === 'moon-phase')
          return t(`${group}.skyNth`, { sign: name, nth: lead.occurrence });
        return t(`${group}.${lead.occurrence === 2 ? 'skySecond' : 'sky'}`, { sign: name });
      }
      if (lead.type === 'nature-sign') {
        const { from, to } = lead.usual;
        return t(`anchors:${group}.nature`, {
          name: lead.name,
          from: dates.day({ year: ANY_YEAR, ...from }),
          to: dates.day({ year: ANY_YEAR, ...to }),
        });
      }
      if (lead.type === 'entry-planned' || lead.type === 'entry-actual') {
        const title = titles.get(lead.entryId);
        if (lead.type === 'entry-actual')
          return t(`anchors:${group}.actual`, { title: title ?? t('anchors:another') });
        return t(`anchors:${group}.planned`, {
          title: title ?? t('anchors:another'),
          day: t(`anchors:day.${lead.day}`),
        });
      }
      if (lead.type === 'none' || lead.markerKey === '') return t(`${group}.none`);
      const names = markers.get(lead.markerKey);
      if (lead.type === 'marker-as-seen') {
        return t(`anchors:${group}.seen`, {
          marker: names ? markerName(names) : lead.markerKey,
          phenomenon: t(`sky:phenomenon.${lead.phenomenon}`),
        });
      }
      return t(`${group}.${lead.occurrence === 2 ? 'markerSecond' : 'marker'}`, {
        marker: names ? markerName(names) : lead.markerKey,
        phenomenon: t(`sky:phenomenon.${lead.phenomenon}`),
      });
    };
    return {
      window: ({ protectiveWatch, ...entry }, window, year) => {
        if (goesByNothing(entry)) return t('days.noLead');
        if (window === null) return t('days.none', { year });
        const { earliest, bestFrom, bestTo, lastAdvised } = window;
        if (earliest === lastAdvised) return t('days.fixed', { day: dates.day(earliest) });
        if (protectiveWatch) return t('days.watch', { range: dates.range(earliest, lastAdvised) });
        if (bestFrom === bestTo) return t('days.bestDay', { day: dates.day(bestFrom) });
        return t('days.best', { range: dates.range(bestFrom, bestTo) });
      },
      windowSentence,
      lead: ({ lead }, markers) => leadWords('lead', lead, markers),
      leadAlone: ({ lead }, markers) => leadWords('leadAlone', lead, markers),
    };
  }, [t, dates, sign, titles, windowSentence]);
}

/** The four days as a sentence, by date or by day number. Needs the texts `calendars`. */
export function useWindowSentence(): (window: EntryWindow | WindowDayNumbers) => string {
  const { t } = useTranslation('calendars');
  const dates = useDateWords();
  return useCallback(
    ({ earliest, bestFrom, bestTo, lastAdvised }) =>
      t('days.sentence', {
        earliest: dates.day(earliest),
        bestFrom: dates.day(bestFrom),
        bestTo: dates.day(bestTo),
        lastAdvised: dates.day(lastAdvised),
      }),
    [t, dates],
  );
}
