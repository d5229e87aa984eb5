import { useQuery } from '@tanstack/react-query';
import { useEffect } from 'react';
import { useTranslation } from 'react-i18next';
import { useSearchParams } from 'react-router-dom';
import type { OpenPage as Opened } from '#shared/contracts/open-page.js';
import { ApiProblem } from '#src/lib/api-problem.js';
import { useDateWords } from '#src/lib/date-words.js';
import { usePageTitle } from '#src/lib/page-title.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Mast, Page } from '#src/ui/page.js';
import { Board, Care } from '#src/ui/surfaces.js';
import { EmptyState, Skeleton, TroubleNote } from '#src/ui/waiting.js';
import { openPageQuery } from '../api/open-page-api.js';
import { OpenEntries } from './open-entries.js';
import { usePlaceWords } from './use-place-words.js';

/** For whoever has the address, signed in or not: what a village shows to everybody. */
export function OpenPage() {
  const { t } = useTranslation('open');
  const [query] = useSearchParams();
  const words = useProblemWords();
  const { data, error, refetch } = useQuery(openPageQuery(query.get('page') ?? ''));
  useNotForSearchEngines();
  usePageTitle(data ? t('title', { village: data.communityName }) : t('titleAlone'));
  if (data !== undefined) return <Shown page={data} />;
  const isGone = error instanceof ApiProblem && error.slug === 'not-found';
  return (
    <Page>
      <Mast title={t('titleAlone')} />
      {error === null && (
        <Board>
          <Skeleton lines={6} />
        </Board>
      )}
      {isGone && (
        <Board>
          <EmptyState title={t('gone')}>{t('goneWhy')}</EmptyState>
        </Board>
      )}
      {error !== null && !isGone && (
        <TroubleNote title={t('trouble')} sentence={words.problem(error)} onRetry={() => void refetch()} />
      )}
    </Page>
  );
}

function Shown({ page }: { page: Opened }) {
  const { t } = useTranslation('open');
  const dates = useDateWords();
  const { communityName: village, version, entries } = page;
  const place = usePlaceWords()(page);
  return (
    <Page>
      <Mast
        title={t('title', { village })}
        under={
          <>
            {place !== null && <span className="block">{place}</span>}
            {version && (
              <span className="block">
                {t('issue', {
                  label: version.label,
                  date: dates.day(version.publishedAt.slice(0, 10), 'year'),
                })}
              </span>
            )}
          </>
        }
      />
      <div className="grid grid-cols-1 gap-4">
        <Care>
          <p>
            <strong>{t('care')}</strong>
          </p>
          <p>{t('cautions.weather')}</p>
          <p>{t('cautions.eyes')}</p>
          <p>{t('cautions.night')}</p>
        </Care>
        <Board title={t('entries')}>
          {version === null || entries.length === 0 ? (
            <EmptyState title={t('nothing')}>{t('nothingHint')}</EmptyState>
          ) : (
            <OpenEntries entries={entries} markers={page.markers} year={version.year} />
          )}
        </Board>
        <p className="text-small">{t('foot')}</p>
      </div>
    </Page>
  );
}

/** The same as the server's header says, for those that only look at the page. */
function useNotForSearchEngines(): void {
  useEffect(() => {
    const meta = document.createElement('meta');
    meta.name = 'robots';
    meta.content = 'noindex, nofollow';
    document.head.append(meta);
    return () => {
      meta.remove();
    };
  }, []);
}
