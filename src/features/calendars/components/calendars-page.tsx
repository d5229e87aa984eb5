import { useQuery } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { useSearchParams } from 'react-router-dom';
import type { Calendar } from '#shared/contracts/calendars.js';
import { useCurrentCommunity } from '#src/lib/community.js';
import { NoticesAbove } from '#src/lib/notices-above.js';
import { usePageTitle } from '#src/lib/page-title.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { useRolesIn } from '#src/lib/roles-in.js';
import { Columns, Mast, Page } from '#src/ui/page.js';
import { Board } from '#src/ui/surfaces.js';
import { EmptyState, Skeleton, TroubleNote } from '#src/ui/waiting.js';
import { calendarsQuery } from '../api/calendars-queries.js';
import { wantedMarker } from '../model/wanted-marker.js';
import { BeginCalendar } from './begin-calendar.js';
import { CalendarCard } from './calendar-card.js';
import { ChooseForMarker } from './choose-for-marker.js';

interface CalendarsPageProps {
  /** The way from one year to the next, on each calendar's card. */
  next: (card: { calendar: Calendar; calendars: readonly Calendar[]; isOfficer: boolean }) => ReactNode;
}

/** The calendars of the village, and the way to begin one. */
export function CalendarsPage({ next }: CalendarsPageProps) {
  const { t } = useTranslation('calendars');
  const { communityId, communityName } = useCurrentCommunity();
  const { isOfficer, isElder, seesDrafts } = useRolesIn(communityId);
  const words = useProblemWords();
  const calendars = useQuery(calendarsQuery(communityId));
  const [search] = useSearchParams();
  const asked = wantedMarker(search);
  const wanted = isOfficer ? asked : null;
  usePageTitle(t('list.title'));
  const list = calendars.data ?? [];
  return (
    <Page>
      <Mast title={t('list.title')} under={t('list.under', { village: communityName })} />
      <NoticesAbove />
      {wanted !== null && <ChooseForMarker wanted={wanted} calendars={list} />}
      <Columns wider="first">
        <div className="grid gap-4">
          {calendars.isPending && (
            <Board>
              <Skeleton />
            </Board>
          )}
          {calendars.isError && (
            <TroubleNote
              title={t('list.trouble')}
              sentence={words.problem(calendars.error)}
              onRetry={() => void calendars.refetch()}
            />
          )}
          {calendars.isSuccess && list.length === 0 && (
            <Board>
              <EmptyState title={t('list.empty')}>
                {isOfficer ? t('list.emptyOfficer') : t('list.emptyOthers')}
              </EmptyState>
            </Board>
          )}
          {list.map((calendar) => (
            <CalendarCard
              key={calendar.id}
              calendar={calendar}
              isOfficer={isOfficer}
              isElder={isElder}
              seesDrafts={seesDrafts}
              wanted={wanted}
              next={wanted === null ? next({ calendar, calendars: list, isOfficer }) : null}
            />
          ))}
        </div>
        {isOfficer && calendars.isSuccess && (
          <BeginCalendar communityId={communityId} calendars={list} wanted={wanted} />
        )}
      </Columns>
    </Page>
  );
}
