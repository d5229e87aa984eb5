import { useQueries } from '@tanstack/react-query';
import { useMemo, useState } from 'react';
import { useTranslation } from 'react-i18next';
import { dayNumberFromIso } from '#shared/kernel/iso-date.js';
import { intlLocale, useDateWords } from '#src/lib/date-words.js';
import { dateOfDayNumber } from '#src/lib/days.js';
import { windowDayNumbers } from '#src/lib/entry-words.js';
import type { DaySpan } from '#src/ui/pictures/day-span.js';
import { moonStartsQuery } from '../api/moons-query.js';
import { countedMoons, yearsToCount } from './strip-moons.js';
import { civilMonths, daysOf, knownCalendars, marketWeeks, runsFrom, type ScalePart } from './strip-scale.js';
import { centreOf, nextCentre, wholeSpan, zoomedBy, zoomedSpan, type Zoom } from './strip-span.js';
import { keepStripSettings, readStripSettings, type StripSettings } from './strip-view.js';
import type { Editor } from './use-editor.js';

export type Strip = ReturnType<typeof useStrip>;

/** Which days the strip shows, how close, and by which scales. */
export function useStrip(editor: Editor) {
  const { calendar, community, selected } = editor;
  const dates = useDateWords();
  const [zoom, setZoom] = useState<Zoom>('year');
  const [settings, setSettings] = useState(() => readStripSettings(calendar.communityId));
  const localStart = settings.yearFrom === 'local' ? (community?.yearStart.date ?? null) : null;
  const whole = useMemo(() => wholeSpan(calendar.year, localStart), [calendar.year, localStart]);
  const [centre, setCentre] = useState(() => centreOf(whole));
  const span = useMemo(() => zoomedSpan(zoom, whole, centre), [zoom, whole, centre]);
  const months = useMemo(
    () =>
      zoom === 'month'
        ? daysOf(span, (day) => dates.day(day))
        : yearsOf(span).flatMap((year) => dates.months(year)),
    [zoom, span, dates],
  );
  const window = selected?.dates?.window;
  return {
    zoom,
    span,
    months,
    settings,
    second: useSecondScale(editor, settings, span),
    isFirst: span.first === whole.first,
    isLast: span.last === whole.last,
    /** Closer around the open entry, or around the middle. */
    zoomTo: (next: Zoom) => {
      const days = window ? windowDayNumbers(window) : null;
      const isWider = next === 'year' || (next === 'season' && zoom === 'month');
      setCentre(
        !isWider && days ? centreOf({ first: days.earliest, last: days.lastAdvised }) : centreOf(span),
      );
      setZoom(next);
    },
    zoomBy: (step: 1 | -1) => {
      setZoom(zoomedBy(zoom, step));
    },
    go: (direction: 1 | -1) => {
      setCentre(nextCentre(zoom, whole, centre, direction));
    },
    set: (change: Partial<StripSettings>) => {
      const next = { ...settings, ...change };
      setSettings(next);
      keepStripSettings(calendar.communityId, next);
    },
  };
}

function yearsOf({ first, last }: DaySpan): number[] {
  const [from, to] = [dateOfDayNumber(first).year, dateOfDayNumber(last).year];
  return from === to ? [from] : [from, to];
}

/** The scale under the months; null where none is wanted, or it is on its way. */
function useSecondScale(
  { calendar, community }: Editor,
  { scale, marketDays, marketDay }: StripSettings,
  span: DaySpan,
): { name: string; parts: ScalePart[] } | null {
  const { t, i18n } = useTranslation('strip');
  const dates = useDateWords();
  const locale = intlLocale(i18n.language);
  const yearStart = community?.yearStart.date ?? null;
  const years = useMemo(
    () => (scale === 'moons' && yearStart !== null ? yearsToCount(span, yearStart) : []),
    [scale, span, yearStart],
  );
  const moons = useQueries({
    queries: years.map((year) => moonStartsQuery(calendar.placeId, year)),
    // With a year on its way the numbers would be wrong.
    combine: (answers) =>
      answers.every(({ data }) => data !== undefined) ? answers.flatMap(({ data }) => data ?? []) : [],
  });
  return useMemo(() => {
    if (scale === 'none') return null;
    if (scale === 'moons') {
      const [fromYear] = years;
      if (yearStart === null || fromYear === undefined) return null;
      const named = countedMoons(moons, fromYear, yearStart).map(({ dayNumber, nth, yearStartDay }) => {
        const long = t('moonLong', { nth, day: dates.day(yearStartDay, 'year') });
        return { dayNumber, short: t('moonShort', { nth }), narrow: String(nth), long };
      });
      return named.length === 0 ? null : { name: t('scale.moons'), parts: runsFrom(named, span) };
    }
    if (scale === 'market') {
      const parts = marketWeeks(span, marketDays, dayNumberFromIso(marketDay), (day) => ({
        short: dates.day(day, 'short'),
        narrow: '',
        long: t('marketWeek', { day: dates.day(day) }),
      }));
      return { name: t('scale.market'), parts };
    }
    const known = knownCalendars(locale).find(({ calendar: key }) => key === scale);
    return known ? { name: known.name, parts: civilMonths(span, known.calendar, locale) } : null;
  }, [scale, marketDays, marketDay, span, yearStart, years, moons, t, dates, locale]);
}
