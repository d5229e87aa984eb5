import { useQuery } from '@tanstack/react-query';
import { useTranslation } from 'react-i18next';
import { useSearchParams } from 'react-router-dom';
import type { Place } from '#shared/contracts/places.js';
import { useCurrentPlace } from '#src/lib/community.js';
import { useDateWords } from '#src/lib/date-words.js';
import { markerName } from '#src/lib/marker-names.js';
import { usePageTitle } from '#src/lib/page-title.js';
import { paths } from '#src/lib/paths.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { useSettled } from '#src/lib/settled.js';
import { ButtonLink } from '#src/ui/button.js';
import { Mast, Page } from '#src/ui/page.js';
import { Board } from '#src/ui/surfaces.js';
import { EmptyState, Skeleton, StaleLine, TroubleNote } from '#src/ui/waiting.js';
import { lookQuery } from '../api/look-query.js';
import { type LookAddress, readLookAddress } from '../model/look-address.js';
import { LookScreen } from './look-screen.js';

/** Where to look for one star on one morning or evening, for somebody who stands outside in the dark. */
export function LookPage() {
  const { t } = useTranslation('look');
  const [search] = useSearchParams();
  const { place, places, isLoading } = useCurrentPlace();
  const shown = places.find((each) => each.id === search.get('placeId')) ?? place;
  const address = readLookAddress(search);
  usePageTitle(t('title'));
  if (shown !== null && address.marker !== null) {
    return <LookAtPlace place={shown} address={address} marker={address.marker} />;
  }
  return (
    <Page>
      <Mast title={t('title')} backTo={paths.stars()} />
      <Board>
        {isLoading ? (
          <Skeleton lines={6} />
        ) : shown === null ? (
          <EmptyState title={t('noPlace')}>{t('noPlaceHint')}</EmptyState>
        ) : (
          <EmptyState
            title={t('noStar')}
            action={<ButtonLink to={paths.stars({ placeId: shown.id })}>{t('toStars')}</ButtonLink>}
          >
            {t('noStarHint')}
          </EmptyState>
        )}
      </Board>
    </Page>
  );
}

/** Somebody who steps through the days asks for the one they stop at. */
const PAUSE_MS = 200;

function LookAtPlace({ place, address, marker }: { place: Place; address: LookAddress; marker: string }) {
  const { t } = useTranslation(['look', 'common']);
  const words = useProblemWords();
  const dates = useDateWords();
  const [, setSearch] = useSearchParams();
  const { phenomenon } = address;
  const settledDate = useSettled(address.date, PAUSE_MS);
  const question = { marker, phenomenon, ...(settledDate === null ? {} : { date: settledDate }) };
  const { data, error, refetch, isPlaceholderData, dataUpdatedAt } = useQuery(lookQuery(place.id, question));
  const change = (next: Partial<Pick<LookAddress, 'phenomenon' | 'date'>>) => {
    setSearch(
      (before) => {
        for (const [key, value] of Object.entries(next)) if (value !== null) before.set(key, value);
        return before;
      },
      { replace: true, preventScrollReset: true },
    );
  };
  const back = paths.star(marker, { placeId: place.id });
  if (data === undefined) {
    return (
      <Page>
        <Mast title={t('title')} under={place.name} backTo={back} />
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
    <Page>
      <Mast title={markerName(data.marker)} under={t('underOf', { place: place.name })} backTo={back} />
      {error !== null && (
        <StaleLine
          onRetry={() => {
            void refetch();
          }}
        >
          {t('common:offline.stale', { when: dates.moment(new Date(dataUpdatedAt)) })}
        </StaleLine>
      )}
      <LookScreen
        look={data}
        date={address.date ?? data.date}
        isLate={isPlaceholderData || settledDate !== address.date}
        onChange={change}
      />
    </Page>
  );
}
