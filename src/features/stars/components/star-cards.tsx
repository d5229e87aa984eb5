import { memo } from 'react';
import { Trans, useTranslation } from 'react-i18next';
import type { MarkerRow } from '#shared/contracts/stars.js';
import { MarkerIcon } from '#src/ui/icons/marker-icon.js';
import { MonthScale } from '#src/ui/pictures/month-scale.js';
import { noDates } from '../model/row-outcome.js';
import { hiddenOf, type StarRow } from '../model/star-rows.js';
import { StripCell } from './star-cells.js';
import { StarLink } from './star-link.js';
import { useStarTableFacts } from './star-table-context.js';

/** Under 700 px: a card is a lane and a sentence. */
export function StarCards({ stars }: { stars: readonly StarRow[] }) {
  return (
    <ul className="grid gap-4">
      {stars.map((star) => (
        <li key={star.row.markerKey}>
          <StarCard star={star} />
        </li>
      ))}
    </ul>
  );
}

const StarCard = memo(function StarCard({ star }: { star: StarRow }) {
  const { dates, firstDayNumber, lastDayNumber } = useStarTableFacts();
  return (
    // The heading's link reaches over the whole card: one link to hear, a large one to touch.
    <article className="board relative has-[a:focus-visible]:outline-3 has-[a:focus-visible]:outline-offset-2 has-[a:focus-visible]:outline-indigo">
      <div className="mb-2 flex items-center gap-3">
        <MarkerIcon markerKey={star.row.markerKey} size={28} />
        <div>
          <h2>
            <StarLink
              className="text-umber no-underline after:absolute after:inset-0 after:content-[''] focus-visible:outline-none"
              markerKey={star.row.markerKey}
            >
              {star.title}
            </StarLink>
          </h2>
          <p className="text-small text-umber-soft">{star.second}</p>
        </div>
      </div>
      <StripCell star={star} height={25} />
      <MonthScale span={{ first: firstDayNumber, last: lastDayNumber }} months={dates.months} />
      <p className="mt-1">
        <StarSentence row={star.row} />
      </p>
    </article>
  );
});

/** The one thing to know of a star: when it comes back, or why there is no such day. */
function StarSentence({ row }: { row: MarkerRow }) {
  const { t } = useTranslation('stars');
  const { latitudeDeg, dates } = useStarTableFacts();
  const why = noDates(row, latitudeDeg);
  if (why !== null) return t(`none.${why}`, { year: dates.year });

  const sentence = sentenceOf(row);
  if (sentence === null) return t('none.none-in-this-year', { year: dates.year });
  const { key, days, nights } = sentence;
  return (
    <Trans
      t={t}
      i18nKey={`card.${key}`}
      values={{
        day: dates.day(days.expected),
        between: dates.between(days),
        year: dates.year,
        ...(nights === undefined ? {} : { count: nights }),
      }}
      components={{ 1: <strong /> }}
    />
  );
}

type Days = MarkerRow['phenomena']['heliacal-rising']['occurrences'][number];

function sentenceOf(row: MarkerRow): {
  key: 'comesBack' | 'comesBackAfter' | 'neverHiddenBut' | 'lastSeen' | 'risesLast' | 'setsFirst';
  days: Days;
  nights?: number;
} | null {
  const first = (phenomenon: keyof MarkerRow['phenomena']) => row.phenomena[phenomenon].occurrences[0];
  const rising = first('heliacal-rising');
  const nights = hiddenOf(row);
  if (rising !== undefined) {
    if (row.notes.includes('never-disappears')) return { key: 'neverHiddenBut', days: rising };
    return nights === undefined
      ? { key: 'comesBack', days: rising }
      : { key: 'comesBackAfter', days: rising, nights };
  }
  const evening = first('heliacal-setting');
  if (evening !== undefined) return { key: 'lastSeen', days: evening };
  const lastRising = first('acronychal-rising');
  if (lastRising !== undefined) return { key: 'risesLast', days: lastRising };
  const firstSetting = first('cosmical-setting');
  return firstSetting === undefined ? null : { key: 'setsFirst', days: firstSetting };
}
