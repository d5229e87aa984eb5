import { useQuery } from '@tanstack/react-query';
import { useTranslation } from 'react-i18next';
import { useParams } from 'react-router-dom';
import { usePageTitle } from '#src/lib/page-title.js';
import { paths } from '#src/lib/paths.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { ButtonLink } from '#src/ui/button.js';
import { Mast, Page } from '#src/ui/page.js';
import { Board } from '#src/ui/surfaces.js';
import { Skeleton, TroubleNote } from '#src/ui/waiting.js';
import { ownEntriesQuery } from '../api/own-entries-api.js';
import { OwnEntriesRound, type BesideOwnEntry } from './own-entries-round.js';

/** What somebody keeps with others of a submission in review, one entry at a time, in large type. */
export function OwnEntriesPage(beside: BesideOwnEntry) {
  const { t } = useTranslation('reviews');
  const { calendarId = '', number = '' } = useParams();
  const ref = { calendarId, number: Number(number) };
  const words = useProblemWords();
  const own = useQuery(ownEntriesQuery(ref));
  const title = t('own.title', { place: own.data?.placeName ?? '', year: own.data?.year ?? '' });
  usePageTitle(title);

  if (own.data && own.data.items.length > 0) {
    return <OwnEntriesRound versionRef={ref} own={own.data} title={title} {...beside} />;
  }
  return (
    <Page className="review">
      <Mast title={own.data ? title : t('own.plainTitle')} backTo={paths.today()} />
      {own.data ? (
        <Board title={t('own.nothing')}>
          <p>{t('own.nothingHint')}</p>
          <ButtonLink to={paths.today()}>{t('leave')}</ButtonLink>
        </Board>
      ) : own.error === null ? (
        <Skeleton lines={8} />
      ) : (
        <TroubleNote
          sentence={words.problem(own.error)}
          onRetry={() => {
            void own.refetch();
          }}
        />
      )}
    </Page>
  );
}
