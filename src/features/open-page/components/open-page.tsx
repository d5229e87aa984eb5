import { useQuery } from '@tanstack/react-query';
import { useEffect } from 'react';
import { useTranslation } from 'react-i18next';
import { useSearchParams } from 'react-router-dom';
import type { OpenPage as Opened } from '#shared/contracts/open-page.js';
import { useDateWords } from '#src/lib/date-words.js';
import { PageOnItsWay } from '#src/lib/page-on-its-way.js';
import { usePageTitle } from '#src/lib/page-title.js';
import { Mast, Page } from '#src/ui/page.js';
import { Board, Care } from '#src/ui/surfaces.js';
import { EmptyState } from '#src/ui/waiting.js';
import { openPageQuery } from '../api/open-page-api.js';
import { OpenEntries } from './open-entries.js';
import { usePlaceWords } from './use-place-words.js';

/** For whoever has the address, signed in or not: what a village shows to everybody. */
export function OpenPage() {
  const { t } = useTranslation('open');
  const [query] = useSearchParams();
  const { data, error, refetch } = useQuery(openPageQuery(query.get('page') ?? ''));
  useNotForSearchEngines();
  usePageTitle(data ? t('title', { village: data.communityName }) : t('titleAlone'));
  if (data !== undefined) return <Shown page={data} />;
  return (
    <PageOnItsWay
      title={t('titleAlone')}
      error={error}
      gone={{ title: t('gone'), why: t('goneWhy') }}
      trouble={t('trouble')}
      onRetry={() => void refetch()}
    />
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
