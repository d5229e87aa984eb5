import { useTranslation } from 'react-i18next';
import type { MarkerRow } from '#shared/contracts/stars.js';
import type { Phenomenon } from '#shared/sky/vocabulary.js';
import { MarkerIcon } from '#src/ui/icons/marker-icon.js';
import { YearLane } from '#src/ui/pictures/year-lane.js';
import { brightnessWord, magnitudeText } from '../model/row-outcome.js';
import type { StarRow } from '../model/star-rows.js';
import { StarLink } from './star-link.js';
import { useStarTableFacts } from './star-table-context.js';
import { useStripSentence } from './strip-words.js';

export function StarName({ star }: { star: StarRow }) {
  return (
    <span className="flex items-center gap-2 wide:gap-3">
      <MarkerIcon markerKey={star.row.markerKey} size={26} />
      <span className="min-w-0">
        <StarLink
          className="inline-flex min-h-8 items-center text-umber decoration-edge"
          markerKey={star.row.markerKey}
        >
          {star.title}
        </StarLink>
        <span className="range-line">{star.second}</span>
      </span>
    </span>
  );
}

export function StripCell({ star, height = 20 }: { star: StarRow; height?: number }) {
  const { dates, firstDayNumber, lastDayNumber } = useStarTableFacts();
  const sentence = useStripSentence(dates);
  return (
    <YearLane
      span={{ first: firstDayNumber, last: lastDayNumber }}
      segments={star.row.strip}
      height={height}
      label={sentence(star.title, star.row.strip)}
    />
  );
}

/** A date with its range under it; a second one of the same year below. */
export function DayCell({ row, phenomenon }: { row: MarkerRow; phenomenon: Phenomenon }) {
  const { t } = useTranslation('stars');
  const { dates } = useStarTableFacts();
  const { outcome, occurrences } = row.phenomena[phenomenon];
  const [first, second] = occurrences;
  if (first === undefined) {
    return (
      <span className="text-small text-umber-soft">
        {outcome === 'never-dark-enough' ? t('neverDark') : t('notIn', { year: dates.year })}
      </span>
    );
  }
  return (
    <>
      {dates.day(first.expected, 'short')}
      <span className="range-line">{dates.shortRange(first)}</span>
      {second !== undefined && (
        <span className="range-line">{t('andAgain', { day: dates.day(second.expected, 'short') })}</span>
      )}
    </>
  );
}

export function HiddenCell({ row }: { row: MarkerRow }) {
  const { t } = useTranslation('stars');
  if (row.notes.includes('never-disappears')) return <span className="text-small">{t('neverHidden')}</span>;
  if (row.nightsHidden === null) return null;
  return (
    <>
      {row.nightsHidden}
      <span className="range-line">{t('nightsWord', { count: row.nightsHidden })}</span>
      {row.notes.includes('lost-in-light-nights') && <span className="range-line">{t('lightNights')}</span>}
    </>
  );
}

export function MagnitudeCell({ row }: { row: MarkerRow }) {
  const { t, i18n } = useTranslation('stars');
  // A patch of sky has no magnitude, only a class.
  if (row.hr === null) return <span className="text-small">{t('patch')}</span>;
  return (
    <>
      {magnitudeText(row.vMag, i18n.language)}
      <span className="range-line">{t(`brightness.${brightnessWord(row.vMag)}`)}</span>
    </>
  );
}
