import { keepPreviousData, useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { useParams, useSearchParams } from 'react-router-dom';
import type { AirAnswer } from '#shared/contracts/air.js';
import type { Place } from '#shared/contracts/places.js';
import type { Phenomenon } from '#shared/sky/vocabulary.js';
import { readYear } from '#src/lib/civil-year.js';
import { useCurrentPlace } from '#src/lib/community.js';
import { useDateWords } from '#src/lib/date-words.js';
import { todayIn } from '#src/lib/days.js';
import { markerName } from '#src/lib/marker-names.js';
import { usePageTitle } from '#src/lib/page-title.js';
import { paths } from '#src/lib/paths.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { useSettled } from '#src/lib/settled.js';
import { YearStepper } from '#src/lib/year-stepper.js';
import { Mast, Page } from '#src/ui/page.js';
import { Board, Care } from '#src/ui/surfaces.js';
import { Skeleton, TroubleNote } from '#src/ui/waiting.js';
import { airQuery } from '../api/air-query.js';
import { ModelBasis } from './model-basis.js';
import { PhenomenonBoard } from './phenomenon-board.js';

/** A second opinion on the days of a star or figure: the model of visibility in three airs beside the published rules. */
export function AirPage() {
  const { t } = useTranslation('air');
  const { markerKey = '' } = useParams();
  const [search] = useSearchParams();
  const { place, places, isLoading } = useCurrentPlace();
  const shown = places.find((each) => each.id === search.get('placeId')) ?? place;
  if (shown !== null) return <AirAtPlace key={shown.id} place={shown} markerKey={markerKey} />;
  return (
    <Page>
      <Mast title={t('titlePlain')} backTo={paths.star(markerKey)} />
      <Board>{isLoading ? <Skeleton lines={6} /> : <p>{t('noPlace')}</p>}</Board>
    </Page>
  );
}

const PAUSE_MS = 300;

function AirAtPlace({ place, markerKey }: { place: Place; markerKey: string }) {
  const { t } = useTranslation('air');
  const problems = useProblemWords();
  const dates = useDateWords();
  const [search, setSearch] = useSearchParams();
  const [year, setYear] = useState(() => readYear(search.get('year') ?? '') ?? todayIn(place.timeZone).year);
  const settledYear = useSettled(year, PAUSE_MS);
  const { data, error, refetch, isPlaceholderData } = useQuery({
    ...airQuery(place.id, markerKey, settledYear),
    placeholderData: keepPreviousData,
  });
  const changeYear = (next: number) => {
    setYear(next);
    setSearch(
      (before) => {
        before.set('year', String(next));
        return before;
      },
      { replace: true, preventScrollReset: true },
    );
  };
  const isLate = isPlaceholderData || settledYear !== year;
  const title = data ? t('title', { star: markerName(data) }) : t('titlePlain');
  usePageTitle(title);
  return (
    <Page>
      <Mast
        title={title}
        under={t('under', { place: place.name, year: dates.year(year) })}
        backTo={paths.star(markerKey, { placeId: place.id, year })}
      />
      <YearStepper className="mb-4 w-44" labelForEars year={year} onChange={changeYear} />
      {data ? (
        <div aria-busy={isLate} className={isLate ? 'opacity-85' : undefined}>
          <Answer answer={data} />
        </div>
      ) : (
        <Board>
          {error === null ? (
            <Skeleton lines={8} />
          ) : (
            <TroubleNote
              title={t('trouble')}
              sentence={problems.problem(error)}
              onRetry={() => {
                void refetch();
              }}
            />
          )}
        </Board>
      )}
    </Page>
  );
}

/** Those with minutes first: side by side on a wide screen. */
const IN_ORDER: readonly Phenomenon[] = [
  'heliacal-rising',
  'heliacal-setting',
  'acronychal-rising',
  'cosmical-setting',
];

function Answer({ answer }: { answer: AirAnswer }) {
  const { t } = useTranslation(['air', 'stars']);
  const { outcome, outcomeDetail } = answer;
  const hasDays = outcome === 'rises-and-sets';
  return (
    <div className="grid grid-cols-[minmax(0,1fr)] gap-4">
      <div className="grid grid-cols-[minmax(0,1fr)] gap-4 wide:grid-cols-[minmax(0,7fr)_minmax(0,5fr)] wide:items-start wide:gap-6">
        <Board>
          <p>{t('lead')}</p>
          <p className="mt-2">{t('disagree')}</p>
        </Board>
        <Care>
          <p>{t('stars:star.eyes')}</p>
          <p className="mt-1">{t('stars:star.nights')}</p>
        </Care>
      </div>
      {hasDays ? (
        <div className="grid grid-cols-[minmax(0,1fr)] gap-4 wide:grid-cols-2 wide:items-start wide:gap-6">
          {IN_ORDER.map((phenomenon) => (
            <PhenomenonBoard key={phenomenon} answer={answer} phenomenon={phenomenon} />
          ))}
        </div>
      ) : (
        <Board>
          <p>{t(`outcome.${outcome === 'never-sets' ? outcome : (outcomeDetail ?? 'never-rises')}`)}</p>
        </Board>
      )}
      <ModelBasis answer={answer} />
    </div>
  );
}
