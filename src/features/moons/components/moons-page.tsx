import { keepPreviousData, useQuery } from '@tanstack/react-query';
import { Download } from 'lucide-react';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { useSearchParams } from 'react-router-dom';
import { moonsEndpoints } from '#shared/contracts/moons.js';
import type { Place } from '#shared/contracts/places.js';
import { apiUrl } from '#src/lib/api-client.js';
import { useCurrentPlace } from '#src/lib/community.js';
import { useDateWords } from '#src/lib/date-words.js';
import { todayIn } from '#src/lib/days.js';
import { usePageTitle } from '#src/lib/page-title.js';
import { paths } from '#src/lib/paths.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { useSettled } from '#src/lib/settled.js';
import { ButtonAnchor } from '#src/ui/button.js';
import { Mast, Page } from '#src/ui/page.js';
import { Stepper } from '#src/ui/stepper.js';
import { Board, Care } from '#src/ui/surfaces.js';
import { Skeleton, StaleLine, TroubleNote } from '#src/ui/waiting.js';
import { moonsQuery } from '../api/moons-query.js';
import {
  MOONS_FIRST_YEAR,
  MOONS_LAST_YEAR,
  moonQuestionOf,
  type MoonsChoice,
  readMoonsAddress,
  writeMoonsAddress,
} from '../model/moons-address.js';
import { CountRule } from './count-rule.js';
import { MoonsPicture } from './moons-picture.js';
import { NextCrescent } from './next-crescent.js';
import { VenusBoard } from './venus-board.js';

/** The Moons of the place on screen. */
export function MoonsPage() {
  const { t } = useTranslation('moons');
  const { place, isLoading } = useCurrentPlace();
  usePageTitle(t('title'));
  if (place !== null) return <MoonsOfPlace key={place.id} place={place} />;
  return (
    <Page>
      <Mast title={t('title')} backTo={paths.stars()} />
      <Board>{isLoading ? <Skeleton lines={6} /> : <p>{t('noPlace')}</p>}</Board>
    </Page>
  );
}

const PAUSE_MS = 250;

function MoonsOfPlace({ place }: { place: Place }) {
  const { t } = useTranslation(['moons', 'common']);
  const words = useProblemWords();
  const dates = useDateWords();
  const { choice, change } = useMoonsChoice(todayIn(place.timeZone).year);
  const question = moonQuestionOf(useSettled(choice, PAUSE_MS));
  const { data, error, refetch, isPlaceholderData, dataUpdatedAt } = useQuery({
    ...moonsQuery(place.id, question),
    placeholderData: keepPreviousData,
  });
  const retry = () => {
    void refetch();
  };
  const isLate = isPlaceholderData || question.year !== choice.year;
  const chosen = data?.markers.find(({ markerKey }) => markerKey === choice.marker) ?? data?.rule?.marker;
  return (
    <Page>
      <Mast
        title={t('title')}
        under={t('under', { place: place.name, year: dates.year(choice.year) })}
        backTo={paths.stars()}
      />
      <div className="mb-4 flex flex-wrap items-end gap-3">
        <Stepper
          className="w-44"
          label={<span className="for-ears">{t('year')}</span>}
          value={choice.year}
          min={MOONS_FIRST_YEAR}
          max={MOONS_LAST_YEAR}
          bigStep={100}
          format={dates.year}
          onChange={(year) => {
            change({ year });
          }}
        />
        <ButtonAnchor
          href={apiUrl(moonsEndpoints.csv, { params: { placeId: place.id }, query: question })}
          download
          aria-label={t('csvLabel')}
          icon={<Download aria-hidden size={20} />}
        >
          {t('csv')}
        </ButtonAnchor>
      </div>
      {error !== null && data !== undefined && (
        <div className="mb-3">
          <StaleLine onRetry={retry}>
            {t('common:offline.stale', { when: dates.moment(new Date(dataUpdatedAt)) })}
          </StaleLine>
        </div>
      )}
      {data === undefined ? (
        <Board>
          {error === null ? (
            <Skeleton lines={10} />
          ) : (
            <TroubleNote title={t('trouble')} sentence={words.problem(error)} onRetry={retry} />
          )}
        </Board>
      ) : (
        <div aria-busy={isLate} className={isLate ? 'moon-boards opacity-85' : 'moon-boards'}>
          <NextCrescent table={data} place={place} />
          <Care>
            <p>{t('eyes')}</p>
            <p className="mt-1">{t('nights')}</p>
          </Care>
          <MoonsPicture table={data} place={place}>
            <CountRule choice={choice} change={change} markers={data.markers} chosen={chosen ?? null} />
          </MoonsPicture>
          <VenusBoard table={data} />
          <p className="text-small text-umber-soft">
            {t('witnesses')} {t('firstCrescentMeans')} {t('basis', { version: data.engineVersion })}
          </p>
        </div>
      )}
    </Page>
  );
}

/** What the page shows; on screen at once, in the address as well, so that going back finds it again. */
function useMoonsChoice(thisYear: number): {
  choice: MoonsChoice;
  change: (patch: Partial<MoonsChoice>) => void;
} {
  const [search, setSearch] = useSearchParams();
  const [choice, setChoice] = useState(() => readMoonsAddress(search, thisYear));
  const change = (patch: Partial<MoonsChoice>) => {
    const next = { ...choice, ...patch };
    setChoice(next);
    setSearch((before) => writeMoonsAddress(before, next, thisYear), {
      replace: true,
      preventScrollReset: true,
    });
  };
  return { choice, change };
}
