import { useTranslation } from 'react-i18next';
import { isStarLead } from '#shared/calendar/entry-model.js';
import type { EntryDates, EntryInput, EntryWindow } from '#shared/contracts/calendars.js';
import { useDateWords } from '#src/lib/date-words.js';
import { dateOfDayNumber, dayNumberOf, readDate } from '#src/lib/days.js';
import { endOfLead } from '#src/lib/sky-words.js';
import { RingRow, type RangeMark } from '#src/ui/pictures/ring-row.js';

/** Longer windows would make holes too small to count; they are drawn a week a hole elsewhere. */
const HOLES_MAX = 60;

/** The row of holes from the sign to the last day, with the sign's bracket and the window below. */
export function EntryDays({
  window,
  dates,
  content,
}: {
  window: EntryWindow;
  dates: EntryDates;
  content: EntryInput;
}) {
  const { t } = useTranslation('reviews');
  const words = useDateWords();
  const days = {
    earliest: number(window.earliest),
    bestFrom: number(window.bestFrom),
    bestTo: number(window.bestTo),
    lastAdvised: number(window.lastAdvised),
  };
  const range = rangeOf(dates, content);
  const first = Math.min(days.earliest, range?.early ?? range?.expected ?? days.earliest);
  const last = Math.max(days.lastAdvised, range?.late ?? range?.expected ?? days.lastAdvised);
  const label = t('picture', {
    from: words.day(dateOfDayNumber(first)),
    to: words.day(dateOfDayNumber(last)),
    earliest: words.day(window.earliest),
    bestFrom: words.day(window.bestFrom),
    bestTo: words.day(window.bestTo),
    last: words.day(window.lastAdvised),
  });
  return (
    <figure>
      <RingRow
        span={{ first, last: Math.min(last, first + HOLES_MAX - 1) }}
        label={label}
        ranges={range === null ? [] : [range]}
        windows={[{ key: 'window', days, kind: content.protectiveWatch ? 'watch' : 'work' }]}
      />
      <figcaption className="flex justify-between text-umber-soft text-small">
        <span>{words.day(dateOfDayNumber(first))}</span>
        <span>{words.day(dateOfDayNumber(Math.min(last, first + HOLES_MAX - 1)))}</span>
      </figcaption>
    </figure>
  );
}

function rangeOf({ marker }: EntryDates, { lead }: EntryInput): RangeMark | null {
  if (marker === null || (lead.type !== 'sky' && !isStarLead(lead))) return null;
  return {
    key: 'range',
    early: marker.early?.dayNumber ?? null,
    expected: marker.expected.dayNumber,
    late: marker.late?.dayNumber ?? null,
    side: endOfLead(lead),
  };
}

function number(iso: string): number {
  const date = readDate(iso);
  return date === null ? 0 : dayNumberOf(date);
}
