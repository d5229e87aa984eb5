import { useTranslation } from 'react-i18next';
import type { Place } from '#shared/contracts/places.js';
import type { MarkerDetail } from '#shared/contracts/stars.js';
import { Board } from '#src/ui/surfaces.js';
import { listWords } from '#src/lib/list-words.js';
import { paths } from '#src/lib/paths.js';
import { ButtonLink } from '#src/ui/button.js';
import { noDates, type NoDates } from '../model/row-outcome.js';
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
  const { star, place } = props;
  const { t } = useTranslation('stars');
  const why = noDates(star, place.latitudeDeg);
  return (
    <section aria-labelledby="star-days" className="grid content-start gap-4">
      <h2 id="star-days" className="for-ears">
        {t('star.fourDays')}
      </h2>
      {why !== null ? (
        <NoDays {...props} why={why} />
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

/** What to go by where the star gives no day. */
const INSTEAD = {
  'never-sets-north': 'turns',
  'never-sets-south': 'turns',
  'never-rises': 'rises',
  'below-skyline': 'rises',
  'never-dark-enough': 'light',
  'none-in-this-year': 'otherYear',
} as const satisfies Record<NoDates, string>;

function NoDays({ star, dates, place, why }: FourDaysProps & { why: NoDates }) {
  const { t, i18n } = useTranslation('stars');
  const tooLight = star.outcome === 'never-sets' ? star.strip.filter(({ state }) => state === 'hidden') : [];
  const ranges = tooLight.map(({ fromDayNumber, toDayNumber }) => dates.rangeAt(fromDayNumber, toDayNumber));
  return (
    <Board>
      <p className="text-lead leading-snug">{t(`none.${why}`, { year: dates.year })}</p>
      {ranges.length > 0 && (
        <p className="mt-2">{t('instead.lightNights', { ranges: listWords(ranges, i18n.language) })}</p>
      )}
      <p className="mt-2">{t(`instead.${INSTEAD[why]}`)}</p>
      <ButtonLink className="mt-3" to={paths.stars({ placeId: place.id, year: star.year })}>
        {t('instead.toStars')}
      </ButtonLink>
    </Board>
  );
}
