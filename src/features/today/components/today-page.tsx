import { useQuery } from '@tanstack/react-query';
import { ArrowRight } from 'lucide-react';
import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { Navigate, useLocation } from 'react-router-dom';
import type { Today, WaitingItem } from '#shared/contracts/today.js';
import { useCurrentCommunity, useCurrentPlace, useRoles } from '#src/lib/community.js';
import { useDateWords } from '#src/lib/date-words.js';
import { usePageTitle } from '#src/lib/page-title.js';
import { paths } from '#src/lib/paths.js';
import { hasArrived } from '#src/lib/arrival.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { ButtonLink } from '#src/ui/button.js';
import { Columns, Mast, Page, ThumbBar } from '#src/ui/page.js';
import { EmptyState, Skeleton, StaleLine, TroubleNote } from '#src/ui/waiting.js';
import { todayQuery } from '../api/today-query.js';
import { landingOf } from '../model/landing.js';
import { addressOf, useWaitingWords } from '../model/waiting-words.js';
import { ComingBoard } from './coming-board.js';
import { PegBoard } from './peg-board.js';
import { WaitingBoard } from './waiting-board.js';
import { WatchCard } from './watch-card.js';

interface TodayPageProps {
  /** Boards of other features: what waits for a word, what must come down, signs of nature, rain. */
  asked: ReactNode;
  urgent?: ReactNode;
  signs?: ReactNode;
  weather?: ReactNode;
}

/** What waits for the person, the peg, and what to look for. Who comes in for one task is led on to it. */
export function TodayPage({ asked, urgent, signs, weather }: TodayPageProps) {
  const { t } = useTranslation(['today', 'common']);
  const { communityId, communityName } = useCurrentCommunity();
  const { place, isLoading } = useCurrentPlace();
  const words = useProblemWords();
  const dates = useDateWords();
  const today = useQuery({ ...todayQuery(communityId, place?.id ?? null), enabled: !isLoading });
  usePageTitle(t('title'));
  const { data } = today;
  const hasJustCome = useHasJustCome();
  const { roles } = useRoles();
  const landing = hasJustCome && data ? landingOf(roles, data.waiting) : null;
  if (landing) return <Navigate to={addressOf(landing)} replace />;
  return (
    <Page>
      <Mast
        title={data ? dates.day(data.date, 'weekday') : t('title')}
        under={data?.placeName ?? communityName}
      />
      {today.isPending && <Skeleton lines={8} />}
      {today.error !== null && data && (
        <StaleLine onRetry={() => void today.refetch()}>
          {t('common:offline.stale', { when: dates.moment(new Date(today.dataUpdatedAt)) })}
        </StaleLine>
      )}
      {today.error !== null && !data && (
        <TroubleNote sentence={words.problem(today.error)} onRetry={() => void today.refetch()} />
      )}
      {urgent}
      {data && <TodayBoards data={data} asked={asked} signs={signs} weather={weather} />}
    </Page>
  );
}

/** Signed in a moment ago, or opened the application here; not by the rail, which must always lead to Today. */
function useHasJustCome(): boolean {
  const location = useLocation();
  return location.key === 'default' || hasArrived(location.state);
}

type TodayBoardsProps = Omit<TodayPageProps, 'urgent'> & { data: Today };

function TodayBoards({ data, asked, signs, weather }: TodayBoardsProps) {
  const { t } = useTranslation('today');
  const { is } = useRoles();
  const { place } = useCurrentPlace();
  const first = data.coming[0];
  const waiting = (
    <WaitingBoard items={data.waiting} consentsDue={data.consentsDue} heirsOpen={data.heirsOpen} />
  );
  const watch = first ? (
    <WatchCard coming={first} place={place} later={data.comingIsLater} />
  ) : data.placeId === null ? (
    <NoPlace />
  ) : (
    <EmptyState title={t('watch.none')} />
  );
  // Who comes with work to do meets it first; a villager meets the peg and the sky first.
  const worksFirst = is('officer', 'elder', 'steward', 'staff') && data.waiting.length > 0;
  return (
    <>
      <Columns>
        {worksFirst ? (
          <>
            <div className="grid content-start gap-4">
              {waiting}
              {asked}
              <MainAction item={data.waiting[0]} />
              <ComingBoard today={data} />
            </div>
            <div className="grid content-start gap-4">
              <PegBoard today={data} />
              {signs}
              {watch}
              {weather}
            </div>
          </>
        ) : (
          <>
            <div className="grid content-start gap-4">
              <PegBoard today={data} />
              {signs}
              {watch}
              {weather}
            </div>
            <div className="grid content-start gap-4">
              {waiting}
              {asked}
              <ComingBoard today={data} />
            </div>
          </>
        )}
      </Columns>
    </>
  );
}

/** The first thing that waits is the one main action of the screen. */
function MainAction({ item }: { item: WaitingItem | undefined }) {
  const { t } = useTranslation('today');
  const wordsOf = useWaitingWords();
  if (!item) return null;
  const label = () => {
    switch (item.kind) {
      case 'answer-entries':
      case 'answer-own-entries':
      case 'sign-as-elder':
        return t('action.review');
      case 'go-on-with-draft':
      case 'elder-asked-change':
      case 'elder-said-not-for-board':
        return t('action.draft', { year: String(item.year) });
      case 'print-published':
        return t('action.sheet');
      default:
        return t('action.sign');
    }
  };
  return (
    <ThumbBar>
      <ButtonLink
        look="main"
        to={wordsOf(item).to}
        icon={<ArrowRight aria-hidden size={22} className="turns" />}
      >
        {label()}
      </ButtonLink>
    </ThumbBar>
  );
}

function NoPlace() {
  const { t } = useTranslation('today');
  const { is } = useRoles();
  return (
    <EmptyState
      title={t('noPlace')}
      action={
        is('officer') ? <ButtonLink to={paths.newPlace()}>{t('addPlace')}</ButtonLink> : t('askOfficer')
      }
    >
      {t('noPlaceHint')}
    </EmptyState>
  );
}
