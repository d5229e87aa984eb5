import { useQuery } from '@tanstack/react-query';
import { Copy, Link2, Unlink } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { FEEDS_MAX, type Feed } from '#shared/contracts/exports.js';
import { useDateWords } from '#src/lib/date-words.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { SureButton } from '#src/lib/sure-button.js';
import { Button } from '#src/ui/button.js';
import { Board, Care } from '#src/ui/surfaces.js';
import { Skeleton, TroubleNote } from '#src/ui/waiting.js';
import { feedAddress, feedsQuery, useEndFeed, useMakeFeed } from '../api/exports-api.js';

/** The person’s own addresses for the calendar of a telephone: make one, see when it was fetched, end it. */
export function FeedsBoard({ communityId }: { communityId: string }) {
  const { t } = useTranslation('exports');
  const words = useProblemWords();
  const feeds = useQuery(feedsQuery(communityId));
  const make = useMakeFeed(communityId);
  return (
    <Board title={t('feeds.title')}>
      <p className="text-small">{t('feeds.what')}</p>
      {feeds.isPending && <Skeleton lines={2} />}
      {feeds.error !== null && (
        <TroubleNote sentence={words.problem(feeds.error)} onRetry={() => void feeds.refetch()} />
      )}
      {make.data && <MadeAddress key={make.data.id} address={feedAddress(make.data.key)} />}
      {feeds.data && (
        <>
          <ul className="mt-2">
            {feeds.data.map((feed) => (
              <FeedRow key={feed.id} communityId={communityId} feed={feed} />
            ))}
          </ul>
          {feeds.data.length < FEEDS_MAX && (
            <Button
              className="mt-2"
              icon={<Link2 aria-hidden size={20} />}
              onClick={() => {
                make.mutate();
              }}
            >
              {t('feeds.make')}
            </Button>
          )}
        </>
      )}
      {make.error !== null && <TroubleNote sentence={words.problem(make.error)} />}
    </Board>
  );
}

/** Shown once; whoever has it needs no password. */
function MadeAddress({ address }: { address: string }) {
  const { t } = useTranslation('exports');
  return (
    <div className="mt-3 grid gap-2" role="status">
      <p>{t('feeds.made')}</p>
      <p className="break-all" translate="no">
        <code>{address}</code>
      </p>
      <Button
        icon={<Copy aria-hidden size={20} />}
        onClick={() => {
          void navigator.clipboard.writeText(address);
        }}
      >
        {t('feeds.copy')}
      </Button>
      <Care>{t('feeds.care')}</Care>
    </div>
  );
}

function FeedRow({ communityId, feed }: { communityId: string; feed: Feed }) {
  const { t } = useTranslation('exports');
  const dates = useDateWords();
  const end = useEndFeed(communityId);
  const made = dates.moment(feed.madeAt);
  return (
    <li className="flex flex-wrap items-center justify-between gap-2 py-2">
      <span>
        {t('feeds.madeOn', { when: made })}
        <span className="block text-small">
          {feed.fetchedOn === null
            ? t('feeds.neverFetched')
            : t('feeds.fetchedOn', { date: dates.day(feed.fetchedOn) })}
        </span>
      </span>
      <SureButton
        label={t('feeds.end')}
        icon={<Unlink aria-hidden size={20} />}
        question={t('feeds.endSure')}
        what={t('feeds.endWhat')}
        yes={t('feeds.endDo')}
        act={() => end.mutateAsync(feed.id).then(() => undefined)}
      />
    </li>
  );
}
