import { useQueries } from '@tanstack/react-query';
import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import type { Community } from '#shared/contracts/people.js';
import { dayNumberFromIso } from '#shared/kernel/iso-date.js';
import { intlLocale, useDateWords } from '#src/lib/date-words.js';
import type { DaySpan } from '#src/ui/pictures/day-span.js';
import { moonStartsQuery } from '../api/moons-query.js';
import { countedMoons, yearsToCount } from './strip-moons.js';
import {
  civilMonths,
  knownCalendars,
  marketWeeks,
  runsFrom,
  villageMonths,
  type ScalePart,
} from './strip-scale.js';
import type { StripSettings } from './strip-view.js';
import type { Editor } from './use-editor.js';

export interface SecondScale {
  name: string;
  parts: ScalePart[];
  /** The language of names that the village gave. */
  lang?: string;
}

/** The scale under the months; null where none is wanted, or it is on its way. */
export function useSecondScale(
  { calendar, community }: Editor,
  { scale, marketDays, marketDay }: StripSettings,
  span: DaySpan,
): SecondScale | null {
  const { t, i18n } = useTranslation('strip');
  const dates = useDateWords();
  const locale = intlLocale(i18n.language);
  const moons = useMoonParts(calendar.placeId, scale === 'moons' ? community : null, span);
  return useMemo(() => {
    switch (scale) {
      case 'none':
        return null;
      case 'moons':
        return moons.length === 0 || community === null
          ? null
          : { name: t('scale.moons'), parts: moons, lang: community.villageLanguage.tag };
      case 'months':
        return community === null || community.localMonths.length === 0
          ? null
          : {
              name: t('scale.months'),
              parts: villageMonths(span, community.localMonths),
              lang: community.villageLanguage.tag,
            };
      case 'market':
        return {
          name: t('scale.market'),
          parts: marketWeeks(span, marketDays, dayNumberFromIso(marketDay), (day) => ({
            short: dates.day(day, 'short'),
            // Lines alone: a number for every week would leave no room between them.
            narrow: '',
            long: t('marketWeek', { day: dates.day(day) }),
          })),
        };
      default: {
        const known = knownCalendars(locale).find(({ calendar: key }) => key === scale);
        return known ? { name: known.name, parts: civilMonths(span, known.calendar, locale) } : null;
      }
    }
  }, [scale, marketDays, marketDay, span, community, moons, t, dates, locale]);
}

const NO_YEARS: number[] = [];

/** Moons by their number in the village's year, and by name where they have one; none while they are on their way. */
function useMoonParts(placeId: string, community: Community | null, span: DaySpan): ScalePart[] {
  const { t } = useTranslation('strip');
  const dates = useDateWords();
  const years = useMemo(
    () => (community === null ? NO_YEARS : yearsToCount(span, community.yearStart.date)),
    [span, community],
  );
  const starts = useQueries({
    queries: years.map((year) => moonStartsQuery(placeId, year)),
    // With a year on its way the numbers would be wrong.
    combine: (answers) =>
      answers.every(({ data }) => data !== undefined) ? answers.flatMap(({ data }) => data ?? []) : [],
  });
  return useMemo(() => {
    const [fromYear] = years;
    if (community === null || fromYear === undefined) return [];
    const { yearStart, moonNames } = community;
    const named = countedMoons(starts, fromYear, yearStart.date).map(({ dayNumber, nth, yearStartDay }) => {
      const ownName = moonNames[nth - 1] ?? '';
      return {
        dayNumber,
        short: ownName === '' ? t('moonShort', { nth }) : ownName,
        narrow: String(nth),
        long: t('moonLong', { nth, day: dates.day(yearStartDay, 'year') }),
        ...(ownName === '' ? {} : { ownName, mayCut: true }),
      };
    });
    return runsFrom(named, span);
  }, [years, community, starts, span, t, dates]);
}
