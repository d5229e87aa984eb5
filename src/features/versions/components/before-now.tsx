import { useTranslation } from 'react-i18next';
import type { EntryComparison, VersionEntryBody } from '#shared/contracts/versions.js';
import { useDateWords } from '#src/lib/date-words.js';
import { windowDayNumbers } from '#src/lib/entry-words.js';
import { MonthScale } from '#src/ui/pictures/month-scale.js';
import { WindowBar } from '#src/ui/pictures/window-bar.js';
import { barsSpan } from '../model/entry-change.js';
import type { CompareWords } from '../model/entry-sentences.js';

/** The window before and now, on the same whole months. */
export function BeforeNow({
  entry,
  year,
  words,
}: {
  entry: EntryComparison;
  year: number;
  words: CompareWords;
}) {
  const { t } = useTranslation('versions');
  const dates = useDateWords();
  const span = barsSpan(entry);
  const { before, after } = entry;
  if (span === null || !before || !after) return null;
  const months = [year - 1, year, year + 1]
    .flatMap((each) => dates.months(each))
    .filter(({ dayNumber, days }) => dayNumber <= span.last && dayNumber + days > span.first);
  const monthStarts = months.slice(1).map(({ dayNumber }) => dayNumber);
  const bar = (body: VersionEntryBody) =>
    body.dates.window && (
      <WindowBar
        span={span}
        days={windowDayNumbers(body.dates.window)}
        kind={body.content.protectiveWatch ? 'watch' : 'work'}
        label=""
        height={10}
        monthStarts={monthStarts}
      />
    );
  return (
    <div
      className="before-now"
      role="img"
      aria-label={t('compare.bars', {
        title: entry.titleOfficer,
        before: words.window(before),
        after: words.window(after),
      })}
    >
      <span>{t('compare.before')}</span>
      {bar(before)}
      <span>{t('compare.now')}</span>
      {bar(after)}
      <span />
      <MonthScale span={span} months={months} />
    </div>
  );
}
