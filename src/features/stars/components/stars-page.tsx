import { keepPreviousData, useQuery } from '@tanstack/react-query';
import { useTable } from '@tanstack/react-table';
import { Moon } from 'lucide-react';
import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import { useSearchParams } from 'react-router-dom';
import type { Place } from '#shared/contracts/places.js';
import type { MarkerRow } from '#shared/contracts/stars.js';
import { useCurrentPlace } from '#src/lib/community.js';
import { useDateWords } from '#src/lib/date-words.js';
import { todayIn } from '#src/lib/days.js';
import { FROM_MID, useMediaQuery } from '#src/lib/media-query.js';
import { usePageTitle } from '#src/lib/page-title.js';
import { paths } from '#src/lib/paths.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Button, ButtonLink } from '#src/ui/button.js';
import { Mast, Page } from '#src/ui/page.js';
import { Board, Care } from '#src/ui/surfaces.js';
import { EmptyState, Skeleton, TroubleNote } from '#src/ui/waiting.js';
import { starTableQuery } from '../api/stars-queries.js';
import { isJulian } from '#src/lib/civil-year.js';
import { chooseRows, hasLightNights, isInShortList, ownFirst } from '../model/star-choice.js';
import { ROWS_STEP, type SortKey } from '../model/star-list-query.js';
import type { StarRow } from '../model/star-rows.js';
import { NoPlace } from './no-place.js';
import { OldData } from './old-data.js';
import { useStarDates } from './star-dates.js';
import { StarCards } from './star-cards.js';
import { starColumns, starFeatures } from './star-columns.js';
import { useStarNaming } from './star-names.js';
import { StarTableContext, type StarTableFacts } from './star-table-context.js';
import { StarTable } from './star-table.js';
import { PlaceSelect, StarsToolbar } from './stars-toolbar.js';
import { useStarList } from './use-star-list.js';

/** The stars of the place on screen. */
export function StarsPage() {
  const { t } = useTranslation('stars');
  const { place, places, isLoading, choosePlace } = useCurrentPlace();
  const [search] = useSearchParams();
  usePageTitle(t('title'));
  // A link may name another place of the village.
  const named = places.find((each) => each.id === search.get('placeId'));
  const shown = named ?? place;
  if (shown !== null) {
    return <StarsOfPlace key={shown.id} place={shown} places={places} onPlace={choosePlace} />;
  }
  return (
    <Page>
      <Mast title={t('title')} />
      <Board>{isLoading ? <Skeleton lines={6} /> : <NoPlace />}</Board>
    </Page>
  );
}

interface StarsOfPlaceProps {
  place: Place;
  places: readonly Place[];
  onPlace: (placeId: string) => void;
}

const NO_ROWS: readonly MarkerRow[] = [];

function StarsOfPlace({ place, places, onPlace }: StarsOfPlaceProps) {
  const { t } = useTranslation('stars');
  const words = useProblemWords();
  const dateWords = useDateWords();
  const [, setSearch] = useSearchParams();
  const thisYear = todayIn(place.timeZone).year;
  const { query, settledYear, set } = useStarList(thisYear);
  const isMid = useMediaQuery(FROM_MID);
  const { data, error, refetch, isPlaceholderData, dataUpdatedAt } = useQuery({
    ...starTableQuery(place.id, settledYear),
    placeholderData: keepPreviousData,
  });
  const rows = data?.items ?? NO_ROWS;
  const stars = useStars(rows);
  const chosen = useMemo(
    () => chooseStars(stars, { search: query.search, show: query.show, does: query.does }),
    [stars, query.search, query.show, query.does],
  );
  const counts = useMemo(
    () => (rows.length === 0 ? null : { good: rows.filter(isInShortList).length, all: rows.length }),
    [rows],
  );
  const table = useTable({
    features: starFeatures,
    columns: starColumns,
    data: chosen,
    getRowId: (star) => star.row.markerKey,
    state: { sorting: [{ id: query.sort, desc: query.descending }] },
  });
  const sorted = ownFirst(table.getRowModel().rows, (star) => star.original.row);
  const shown = sorted.slice(0, query.rows);
  const facts = useFacts(place, data);
  const isLate = isPlaceholderData || query.year !== settledYear;

  const choosePlace = (placeId: string) => {
    setSearch((before) => {
      before.delete('placeId');
      return before;
    });
    onPlace(placeId);
  };
  const sort = (column: SortKey) => {
    set({ sort: column, descending: query.sort === column && !query.descending });
  };
  return (
    <Page>
      <Mast title={t('title')} under={t('under', { place: place.name, year: dateWords.year(query.year) })}>
        {isMid && <PlaceSelect place={place} places={places} onPlace={choosePlace} forEars />}
      </Mast>
      <StarsToolbar
        query={query}
        set={set}
        place={place}
        places={places}
        counts={counts}
        hasHeads={isMid}
        onPlace={choosePlace}
      />
      <p className="mb-3">
        <ButtonLink look="quiet" to={paths.moons({ year: query.year })} icon={<Moon aria-hidden size={20} />}>
          {t('toMoons')}
        </ButtonLink>
      </p>
      {error !== null && data !== undefined && <OldData updatedAt={dataUpdatedAt} refetch={refetch} />}
      {isJulian(query.year) && <p className="mb-3 text-small">{t('julian')}</p>}
      {hasLightNights(rows) && (
        <Care className="mb-4">
          <p>{t('lightNightsHere')}</p>
        </Care>
      )}
      {data === undefined ? (
        <Board>
          {error === null ? (
            <Skeleton lines={10} />
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
      ) : chosen.length === 0 ? (
        <Board>
          <EmptyState
            title={t('nothingFits')}
            action={
              <Button
                onClick={() => {
                  set({ search: '', show: 'all', does: 'any', rows: ROWS_STEP });
                }}
              >
                {t('showAll')}
              </Button>
            }
          >
            {t('nothingFitsHint')}
          </EmptyState>
        </Board>
      ) : (
        <StarTableContext value={facts}>
          <div aria-busy={isLate} className={isLate ? 'opacity-85' : undefined}>
            {isMid ? (
              <StarTable
                table={table}
                rows={shown}
                onSort={sort}
                caption={t('caption', { place: place.name, year: facts.dates.year })}
              />
            ) : (
              <StarCards stars={shown.map((row) => row.original)} />
            )}
          </div>
        </StarTableContext>
      )}
      <div className="mt-3 flex flex-wrap items-center gap-x-4">
        <p className="text-small" role="status">
          {data !== undefined &&
            (shown.length < sorted.length
              ? t('shownOf', { shown: shown.length, total: sorted.length })
              : t('shown', { count: sorted.length }))}
        </p>
        {shown.length < sorted.length && (
          <Button
            onClick={() => {
              set({ rows: query.rows + ROWS_STEP });
            }}
          >
            {t('moreRows', { count: Math.min(ROWS_STEP, sorted.length - shown.length) })}
          </Button>
        )}
      </div>
      <p className="mt-3 text-small text-umber-soft">
        {query.show === 'good' && query.search.trim() === '' && t('goodMeans')} {t('dayRule')}
      </p>
    </Page>
  );
}

/** Rows with their names; made once for a table, not for every letter of a search. */
function useStars(rows: readonly MarkerRow[]): readonly StarRow[] {
  const naming = useStarNaming();
  return useMemo(() => rows.map((row) => ({ row, ...naming(row) })), [rows, naming]);
}

function chooseStars(stars: readonly StarRow[], choice: Parameters<typeof chooseRows>[1]): StarRow[] {
  const byRow = new Map(stars.map((star) => [star.row, star]));
  const rows = chooseRows([...byRow.keys()], choice, (row) => byRow.get(row) ?? { hr: row.hr, words: [] });
  return rows.flatMap((row) => byRow.get(row) ?? []);
}

function useFacts(
  place: Place,
  data: { year: number; firstDayNumber: number; lastDayNumber: number } | undefined,
): StarTableFacts {
  const year = data?.year ?? todayIn(place.timeZone).year;
  const firstDayNumber = data?.firstDayNumber ?? 0;
  const lastDayNumber = data?.lastDayNumber ?? 0;
  const dates = useStarDates(year, firstDayNumber);
  return useMemo(
    () => ({
      year,
      firstDayNumber,
      lastDayNumber,
      placeId: place.id,
      latitudeDeg: place.latitudeDeg,
      dates,
    }),
    [year, firstDayNumber, lastDayNumber, place, dates],
  );
}
