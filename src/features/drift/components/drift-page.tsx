import { keepPreviousData, useQuery } from '@tanstack/react-query';
import { useTranslation } from 'react-i18next';
import { useParams, useSearchParams } from 'react-router-dom';
import type { DriftAnswer } from '#shared/contracts/drift.js';
import type { Place } from '#shared/contracts/places.js';
import { readYear } from '#src/lib/civil-year.js';
import { useCurrentPlace } from '#src/lib/community.js';
import { useDateWords } from '#src/lib/date-words.js';
import { todayIn } from '#src/lib/days.js';
import { markerName } from '#src/lib/marker-names.js';
import { usePageTitle } from '#src/lib/page-title.js';
import { paths } from '#src/lib/paths.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { useSettled } from '#src/lib/settled.js';
import { ButtonLink } from '#src/ui/button.js';
import { Columns, Mast, Page } from '#src/ui/page.js';
import { Board } from '#src/ui/surfaces.js';
import { Skeleton, TroubleNote } from '#src/ui/waiting.js';
import { driftQuery } from '../api/drift-queries.js';
import { readView, type DriftView } from '../model/drift-years.js';
import { DriftBoard } from './drift-board.js';
import { DriftControls } from './drift-controls.js';
import { PaceBoard } from './pace-board.js';

/** How a star's or a figure's days moved through the centuries, seen from the place on screen. */
export function DriftPage() {
  const { t } = useTranslation('drift');
  const { markerKey = '' } = useParams();
  const [search] = useSearchParams();
  const { place, places } = useCurrentPlace();
  const shown = places.find((each) => each.id === search.get('placeId')) ?? place;
  if (shown !== null) {
    return <DriftAtPlace key={`${markerKey} ${shown.id}`} place={shown} markerKey={markerKey} />;
  }
  return (
    <Page>
      <Mast title={t('titlePlain')} backTo={paths.star(markerKey)} />
      <Board>
        <Skeleton lines={6} />
      </Board>
    </Page>
  );
}

const PAUSE_MS = 300;

function DriftAtPlace({ place, markerKey }: { place: Place; markerKey: string }) {
  const { t } = useTranslation('drift');
  const problems = useProblemWords();
  const dates = useDateWords();
  const [search, setSearch] = useSearchParams();
  const view = readView(search);
  const yearInUse = readYear(search.get('year') ?? '') ?? todayIn(place.timeZone).year;
  const settled = useSettled(`${String(view.from)} ${String(view.to)}`, PAUSE_MS);
  const [from = view.from, to = view.to] = settled.split(' ').map(Number);
  const { data, error, refetch, isPlaceholderData } = useQuery({
    ...driftQuery(place.id, markerKey, from, to, yearInUse),
    placeholderData: keepPreviousData,
  });
  const star = data ? markerName(data) : null;
  const title = star === null ? t('titlePlain') : t('title', { star });
  usePageTitle(title);
  const change = (patch: Partial<DriftView>) => {
    const next = { ...view, ...patch };
    setSearch(
      (before) => {
        before.set('from', String(next.from));
        before.set('to', String(next.to));
        before.set('its', next.phenomenon);
        return before;
      },
      { replace: true, preventScrollReset: true },
    );
  };
  const isLate = isPlaceholderData || settled !== `${String(view.from)} ${String(view.to)}`;
  return (
    <Page>
      <Mast
        title={title}
        under={t('under', { place: place.name, from: dates.year(view.from), to: dates.year(view.to) })}
        backTo={paths.star(markerKey, { placeId: place.id, year: yearInUse })}
      />
      <DriftControls view={view} onChange={change} />
      {data === undefined ? (
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
      ) : (
        <div aria-busy={isLate} className={isLate ? 'grid gap-4 opacity-85' : 'grid gap-4'}>
          <DriftBoard
            drift={data}
            star={markerName(data)}
            placeId={place.id}
            phenomenon={view.phenomenon}
            yearInUse={yearInUse}
          />
          <Columns>
            <PaceBoard drift={data} />
            <BasisBoard drift={data} place={place}>
              <ButtonLink
                to={paths.finder({
                  placeId: place.id,
                  by: 'old',
                  old: markerKey,
                  its: view.phenomenon,
                  since: sinceOf(view, yearInUse),
                })}
              >
                {t('finder')}
              </ButtonLink>
            </BasisBoard>
          </Columns>
        </div>
      )}
    </Page>
  );
}

function BasisBoard({
  drift,
  place,
  children,
}: {
  drift: DriftAnswer;
  place: Place;
  children: React.ReactNode;
}) {
  const { t } = useTranslation('drift');
  const { thresholdSource: source, engineVersion: version } = drift.basis;
  return (
    <Board title={t('basis')}>
      <p>{t('basisLine', { source, place: place.name, version })}</p>
      <p className="mt-2 text-small text-umber-soft">{t('basisCare')}</p>
      <div className="mt-3">{children}</div>
    </Board>
  );
}

/** From where the picture begins, where that is an old time; otherwise five centuries ago. */
function sinceOf({ from }: DriftView, yearInUse: number): number {
  return Math.min(Math.max(from, 1500), yearInUse - 1);
}
