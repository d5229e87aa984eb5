import { useTranslation } from 'react-i18next';
import type { Place } from '#shared/contracts/places.js';
import type { MarkerDetail } from '#shared/contracts/stars.js';
import { Board } from '#src/ui/surfaces.js';
import { noDates } from '../model/row-outcome.js';
import { CARD_ORDER } from '../model/tie.js';
import { DateCard } from './date-card.js';
import type { StarDates } from './star-dates.js';

export interface FourDaysProps {
  star: MarkerDetail;
  dates: StarDates;
  place: Place;
  mayTie: boolean;
}

/** Four cards, or the one sentence why there are no days. */
export function FourDays(props: FourDaysProps) {
  const { star, dates, place } = props;
  const { t } = useTranslation('stars');
  const why = noDates(star, place.latitudeDeg);
  return (
    <section aria-labelledby="star-days" className="grid content-start gap-4">
      <h2 id="star-days" className="for-ears">
        {t('star.fourDays')}
      </h2>
      {why !== null ? (
        <Board>
          <p className="text-lead leading-snug">{t(`none.${why}`, { year: dates.year })}</p>
        </Board>
      ) : (
        <>
          {star.notes.includes('never-disappears') && (
            <Board>
              <p>{t('star.neverHidden')}</p>
            </Board>
          )}
          <div className="grid gap-4 mid:grid-cols-2">
            {CARD_ORDER.map((phenomenon) => (
              <DateCard key={phenomenon} {...props} phenomenon={phenomenon} />
            ))}
          </div>
        </>
      )}
    </section>
  );
}
