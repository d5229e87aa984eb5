import { useTranslation } from 'react-i18next';
import { useDateWords } from '#src/lib/date-words.js';
import { useEntryWords, windowDayNumbers } from '#src/lib/entry-words.js';
import { useMarkerDayWords } from '#src/lib/marker-day-words.js';
import { endOfLead } from '#src/lib/sky-words.js';
import { MonthScale } from '#src/ui/pictures/month-scale.js';
import { RangeBracket, RingRow, type RangeMark } from '#src/ui/pictures/ring-row.js';
import { WindowShape } from '#src/ui/pictures/window-bar.js';
import type { FormState } from '../model/form-state.js';

/** More holes than these would touch one another. */
const RINGS_MAX = 48;
const MARGIN_DAYS = 2;

/** The marker's range beside the window: how sure the sign is, and what is done after it, are two things. */
export function WindowPicture({ form }: { form: FormState }) {
  const { t } = useTranslation('calendars');
  const dateWords = useDateWords();
  const words = useEntryWords();
  const days = useMarkerDayWords();
  const { dates, draft, year } = form;
  if (!dates?.window) return null;
  const window = windowDayNumbers(dates.window);
  const { marker } = dates;
  const range: RangeMark | null = marker && {
    key: 'range',
    early: marker.early?.dayNumber ?? null,
    expected: marker.expected.dayNumber,
    late: marker.late?.dayNumber ?? null,
    side: endOfLead(form.content.lead),
  };
  const firsts = [window.earliest, range?.early ?? range?.expected ?? window.earliest];
  const lasts = [window.lastAdvised, range?.late ?? range?.expected ?? window.lastAdvised];
  const span = { first: Math.min(...firsts) - MARGIN_DAYS, last: Math.max(...lasts) + MARGIN_DAYS };
  const months = [year - 1, year, year + 1]
    .flatMap((each) => dateWords.months(each))
    .filter((month) => month.dayNumber <= span.last && month.dayNumber + month.days > span.first);
  const sentence = words.windowSentence(dates.window);
  const label = marker
    ? t('form.windowPicture', { window: sentence, range: days.about(marker) })
    : t('form.windowPictureFixed', { window: sentence });
  const kind = draft.protectiveWatch ? 'watch' : 'work';
  const ranges = range ? [range] : [];
  return (
    <figure>
      {span.last - span.first < RINGS_MAX ? (
        <RingRow
          span={span}
          label={label}
          ranges={ranges}
          windows={[{ key: 'window', days: window, kind }]}
        />
      ) : (
        <div className="picture">
          <MonthScale span={span} months={months} />
          <svg role="img" aria-label={label} width="100%" height={44}>
            {range && <RangeBracket range={range} span={span} y={2} />}
            <WindowShape span={span} days={window} kind={kind} y={28} height={12} />
          </svg>
        </div>
      )}
      <div className="flex justify-between gap-3 text-small text-umber-soft" aria-hidden>
        <span>{dateWords.day(span.first)}</span>
        <span>{dateWords.day(span.last)}</span>
      </div>
      {marker && <figcaption className="mt-1 text-small text-umber-soft">{t('form.rangeBeside')}</figcaption>}
    </figure>
  );
}
