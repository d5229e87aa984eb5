import { keepPreviousData, useQuery } from '@tanstack/react-query';
import { Link as LinkIcon } from 'lucide-react';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { useLocation, useParams, useSearchParams } from 'react-router-dom';
import type { Place } from '#shared/contracts/places.js';
import type { MarkerDetail } from '#shared/contracts/stars.js';
import { useCurrentPlace, useRoles } from '#src/lib/community.js';
import { todayIn } from '#src/lib/days.js';
import { usePageTitle } from '#src/lib/page-title.js';
import { paths } from '#src/lib/paths.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { useSettled } from '#src/lib/settled.js';
import { ButtonLink } from '#src/ui/button.js';
import { Mast, Page, ThumbBar } from '#src/ui/page.js';
import { Board, Care } from '#src/ui/surfaces.js';
import { Skeleton, TroubleNote } from '#src/ui/waiting.js';
import { starQuery } from '../api/stars-queries.js';
import { isJulian, readYear } from '#src/lib/civil-year.js';
import { YearStepper } from '#src/lib/year-stepper.js';
import { phenomenonToTie } from '../model/tie.js';
import { BasisBoard } from './basis-board.js';
import { FourDays } from './four-days.js';
import { NoPlace } from './no-place.js';
import { OldData } from './old-data.js';
import { useStarDates } from './star-dates.js';
import { useStarNaming } from './star-names.js';
import { StarWays } from './star-ways.js';
import { YearBoard } from './year-board.js';

/** One star or figure from the place on screen: its year, its four days, and what they rest on. */
export function StarPage({ notes }: { notes: (markerKey: string) => React.ReactNode }) {
  const { t } = useTranslation('stars');
  const { markerKey = '' } = useParams();
  const [search] = useSearchParams();
  const { place, places, isLoading } = useCurrentPlace();
  const shown = places.find((each) => each.id === search.get('placeId')) ?? place;
  if (shown !== null) {
    return (
      <StarAtPlace
        key={`${markerKey} ${shown.id}`}
        place={shown}
        markerKey={markerKey}
        notes={notes(markerKey)}
      />
    );
  }
  return (
    <Page>
      <Mast title={t('title')} backTo={paths.stars()} />
      <Board>{isLoading ? <Skeleton lines={6} /> : <NoPlace />}</Board>
    </Page>
  );
}

const PAUSE_MS = 250;

interface StarAtPlaceProps {
  place: Place;
  markerKey: string;
  notes: React.ReactNode;
}

function StarAtPlace({ place, markerKey, notes }: StarAtPlaceProps) {
  const { t } = useTranslation('stars');
  const words = useProblemWords();
  const [search, setSearch] = useSearchParams();
  const list = useListAddress(place);
  const [year, setYear] = useState(() => readYear(search.get('year') ?? '') ?? todayIn(place.timeZone).year);
  const settledYear = useSettled(year, PAUSE_MS);
  const { data, error, refetch, isPlaceholderData, dataUpdatedAt } = useQuery({
    ...starQuery(place.id, markerKey, settledYear),
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
  if (data === undefined) {
    return (
      <Page>
        <Mast title={t('title')} backTo={list} />
        <Board>
          {error === null ? (
            <Skeleton lines={8} />
          ) : (
            <TroubleNote
              title={t('trouble')}
              sentence={words.problem(error)}
              onRetry={() => {
                void refetch();
              }}
            />
          )}
        </Board>
      </Page>
    );
  }
  return (
    <StarScreen
      star={data}
      place={place}
      list={list}
      isLate={isPlaceholderData || settledYear !== year}
      notice={error !== null && <OldData updatedAt={dataUpdatedAt} refetch={refetch} />}
      notes={notes}
      yearStepper={<YearStepper className="w-44" labelForEars year={year} onChange={changeYear} />}
    />
  );
}

interface StarScreenProps {
  star: MarkerDetail;
  place: Place;
  list: string;
  isLate: boolean;
  notice: React.ReactNode;
  notes: React.ReactNode;
  yearStepper: React.ReactNode;
}

function StarScreen({ star, place, list, isLate, notice, notes, yearStepper }: StarScreenProps) {
  const { t } = useTranslation('stars');
  const mayTie = useRoles().is('officer');
  const naming = useStarNaming()(star);
  const dates = useStarDates(star.year, star.firstDayNumber);
  const tied = phenomenonToTie(star);
  usePageTitle(naming.title);
  return (
    <Page>
      <Mast
        title={naming.title}
        under={t('star.under', { designation: naming.second, place: place.name, year: dates.year })}
        backTo={list}
      >
        {mayTie && tied !== null && (
          <ThumbBar>
            <ButtonLink
              look="main"
              to={paths.calendars({ marker: star.markerKey, phenomenon: tied })}
              icon={<LinkIcon aria-hidden size={22} />}
            >
              {t('star.tie')}
            </ButtonLink>
          </ThumbBar>
        )}
      </Mast>
      {notice}
      <div aria-busy={isLate} className={isLate ? 'opacity-85' : undefined}>
        <YearBoard star={star} title={naming.title} dates={dates} place={place} yearStepper={yearStepper} />
        {isJulian(star.year) && <p className="mt-3 text-small">{t('julian')}</p>}
        {/* A phone reads cautions before the days; a wide screen has them beside. */}
        <div className="mt-4 grid gap-4 wide:grid-cols-[minmax(0,7fr)_minmax(0,5fr)] wide:grid-rows-[auto_1fr] wide:items-start wide:gap-6">
          <Care className="wide:col-start-2">
            <p>{t('star.eyes')}</p>
            <p className="mt-1">{t('star.nights')}</p>
          </Care>
          <div className="wide:col-start-1 wide:row-span-2 wide:row-start-1">
            <FourDays star={star} dates={dates} place={place} mayTie={mayTie} />
          </div>
          <div className="grid gap-4">
            <StarWays markerKey={star.markerKey} placeId={place.id} year={star.year} />
            <BasisBoard star={star} dates={dates} placeId={place.id} />
            {notes}
          </div>
        </div>
      </div>
    </Page>
  );
}

/** Back to the list as it was, where the star was opened from it. */
function useListAddress(place: Place): string {
  const [search] = useSearchParams();
  const state: unknown = useLocation().state;
  if (typeof state === 'object' && state !== null && 'list' in state && typeof state.list === 'string') {
    return state.list;
  }
  const year = readYear(search.get('year') ?? '');
  return paths.stars({ placeId: place.id, ...(year === null ? {} : { year }) });
}
