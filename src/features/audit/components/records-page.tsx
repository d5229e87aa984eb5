import { useInfiniteQuery } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { auditQuery } from '../api/audit-queries.js';
import { auditSentence } from '../model/audit-sentence.js';
import { useCurrentCommunity } from '#src/lib/community.js';
import { useDateWords } from '#src/lib/date-words.js';
import { usePageTitle } from '#src/lib/page-title.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Button } from '#src/ui/button.js';
import { Mast, Page } from '#src/ui/page.js';
import { Board } from '#src/ui/surfaces.js';
import { EmptyState, Skeleton, TroubleNote } from '#src/ui/waiting.js';

/** Who did what, newest first. `tabs` comes from the village's pages. */
export function RecordsPage({ tabs }: { tabs: ReactNode }) {
  const { t, i18n } = useTranslation(['audit', 'common', 'sharing']);
  const { communityId, communityName } = useCurrentCommunity();
  const words = useProblemWords();
  const dates = useDateWords();
  const records = useInfiniteQuery(auditQuery(communityId));
  const events = records.data?.pages.flatMap((page) => page.items) ?? [];
  usePageTitle(t('title'));
  return (
    <Page>
      <Mast title={communityName} under={t('title')} />
      {tabs}
      <Board className="mt-4">
        <p className="mb-3 text-umber-soft">{t('lead')}</p>
        {records.isPending && <Skeleton lines={8} />}
        {records.error !== null && (
          <TroubleNote sentence={words.problem(records.error)} onRetry={() => void records.refetch()} />
        )}
        {records.isSuccess && events.length === 0 && (
          <EmptyState title={t('empty')}>{t('emptyHint')}</EmptyState>
        )}
        <ol>
          {events.map((event) => (
            <li key={event.id} className="border-t border-hairline py-2 first:border-t-0">
              <p>{auditSentence(t, i18n.language, event)}</p>
              <p className="text-umber-soft">
                <time dateTime={event.at}>{dates.moment(event.at)}</time>
              </p>
            </li>
          ))}
        </ol>
        {records.hasNextPage && (
          <Button
            className="mt-3"
            busy={records.isFetchingNextPage}
            onClick={() => void records.fetchNextPage()}
          >
            {t('more')}
          </Button>
        )}
      </Board>
    </Page>
  );
}
