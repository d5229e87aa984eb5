import { useMemo, useState } from 'react';
import { useDateWords } from '#src/lib/date-words.js';
import { dateOfDayNumber } from '#src/lib/days.js';
import { windowDayNumbers } from '#src/lib/entry-words.js';
import type { DaySpan } from '#src/ui/pictures/day-span.js';
import { daysOf } from './strip-scale.js';
import { centreOf, nextCentre, wholeSpan, zoomedBy, zoomedSpan, type Zoom } from './strip-span.js';
import { keepStripSettings, readStripSettings, type StripSettings } from './strip-view.js';
import type { Editor } from './use-editor.js';
import { useSecondScale } from './use-second-scale.js';

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
    whole,
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
