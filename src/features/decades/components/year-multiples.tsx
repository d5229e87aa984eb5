import { useTranslation } from 'react-i18next';
import type { LookedEntry } from '#shared/contracts/decades.js';
import { useDateWords } from '#src/lib/date-words.js';
import { goesByNothing, windowDayNumbers } from '#src/lib/entry-words.js';
import { SignIcon } from '#src/ui/icons/drawn-icon.js';
import { MonthScale } from '#src/ui/pictures/month-scale.js';
import { WindowBar } from '#src/ui/pictures/window-bar.js';
import { bestFromRange, monthsOf, spanIn, type MonthSpan } from '../model/year-rows.js';

interface YearMultiplesProps {
  entry: LookedEntry;
  villageLanguageTag: string;
}

/** One entry: a bar for each year, all on the same months, and in a sentence how far its best days wander. */
export function YearMultiples({ entry, villageLanguageTag }: YearMultiplesProps) {
  const { t } = useTranslation('decades');
  const summary = useSummary()(entry);
  const months = monthsOf(entry);
  const { titleOfficer, titleVillage, icon } = entry;
  return (
    <section className="board year-multiples" aria-label={titleOfficer}>
      <h2 className="flex items-center gap-3 text-lead">
        <SignIcon sign={icon} size={30} />
        <span>
          {titleOfficer}
          {titleVillage !== '' && (
            <span className="own-words text-umber-soft" lang={villageLanguageTag}>
              {' · '}
              {titleVillage}
            </span>
          )}
        </span>
      </h2>
      <p className="mt-1 text-small">{summary}</p>
      {months !== null && (
        <div className="mt-2" role="img" aria-label={t('picture', { title: titleOfficer, summary })}>
          <Rows entry={entry} months={months} />
        </div>
      )}
    </section>
  );
}

function Rows({ entry, months }: { entry: LookedEntry; months: MonthSpan }) {
  const { t } = useTranslation('decades');
  const dates = useDateWords();
  const marksIn = (year: number) => {
    const span = spanIn(year, months);
    return [year - 1, year, year + 1]
      .flatMap((each) => dates.months(each))
      .filter(({ dayNumber, days }) => dayNumber <= span.last && dayNumber + days > span.first);
  };
  const [first] = entry.years;
  return (
    <div className="year-rows" aria-hidden>
      {entry.years.map(({ year, window }) => (
        <div key={year} className="year-row">
          <span className="tabular">{year}</span>
          {window === null ? (
            <span className="text-small text-umber-soft">{t('none')}</span>
          ) : (
            <WindowBar
              span={spanIn(year, months)}
              days={windowDayNumbers(window)}
              kind={entry.protectiveWatch ? 'watch' : 'work'}
              label=""
              height={9}
              monthStarts={marksIn(year)
                .slice(1)
                .map(({ dayNumber }) => dayNumber)}
            />
          )}
        </div>
      ))}
      {first && (
        <div className="year-row">
          <span />
          <MonthScale span={spanIn(first.year, months)} months={marksIn(first.year)} />
        </div>
      )}
    </div>
  );
}

/** How far an entry's best days wander in those years. */
function useSummary(): (entry: LookedEntry) => string {
  const { t } = useTranslation('decades');
  const dates = useDateWords();
  return (entry) => {
    const range = bestFromRange(entry);
    if (range === null) return t(entry.years.every(goesByNothing) ? 'noLead' : 'noYear');
    const { first, last, yearsWithout } = range;
    const days = { from: dates.day(first.window.bestFrom), to: dates.day(last.window.bestFrom) };
    const sentences = [
      days.from === days.to
        ? t('same', { day: days.from })
        : t('between', { ...days, fromYear: first.year, toYear: last.year }),
      ...(yearsWithout > 0 ? [t('without', { count: yearsWithout })] : []),
      ...(entry.years.some(({ isPlanned }) => isPlanned) ? [t('planned')] : []),
    ];
    return sentences.join(' ');
  };
}
