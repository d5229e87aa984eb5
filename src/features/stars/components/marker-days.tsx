import { useQuery } from '@tanstack/react-query';
import { useTranslation } from 'react-i18next';
import { useCurrentPlace, useRoles } from '#src/lib/community.js';
import { todayIn } from '#src/lib/days.js';
import type { Place } from '#shared/contracts/places.js';
import type { MarkerDetail } from '#shared/contracts/stars.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Board } from '#src/ui/surfaces.js';
import { Skeleton, TroubleNote } from '#src/ui/waiting.js';
import { starQuery } from '../api/stars-queries.js';
import { FourDays } from './four-days.js';
import { NoPlace } from './no-place.js';
import { useStarDates } from './star-dates.js';

/** The four days of a marker in the present year at the place on screen; a part of another screen. */
export function MarkerDays({ markerKey }: { markerKey: string }) {
  const { place, isLoading } = useCurrentPlace();
  if (place === null) return <Board>{isLoading ? <Skeleton lines={6} /> : <NoPlace />}</Board>;
  return <DaysAtPlace markerKey={markerKey} place={place} />;
}

function DaysAtPlace({ markerKey, place }: { markerKey: string; place: Place }) {
  const words = useProblemWords();
  const { year } = todayIn(place.timeZone);
  const { data, error, refetch } = useQuery(starQuery(place.id, markerKey, year));
  if (data === undefined) {
    return (
      <Board>
        {error === null ? (
          <Skeleton lines={6} />
        ) : (
          <TroubleNote
            sentence={words.problem(error)}
            onRetry={() => {
              void refetch();
            }}
          />
        )}
      </Board>
    );
  }
  return <Days star={data} place={place} />;
}

function Days({ star, place }: { star: MarkerDetail; place: Place }) {
  const { t } = useTranslation('stars');
  const dates = useStarDates(star.year, star.firstDayNumber);
  const mayTie = useRoles().is('officer');
  return (
    <div>
      <p className="mb-2 text-small text-umber-soft">{t('under', { place: place.name, year: dates.year })}</p>
      <FourDays star={star} dates={dates} place={place} mayTie={mayTie} />
    </div>
  );
}
