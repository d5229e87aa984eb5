import { useSuspenseQuery } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { useParams } from 'react-router-dom';
import type { Calendar } from '#shared/contracts/calendars.js';
import { calendarQuery } from '#src/lib/calendar-queries.js';
import { usePageTitle } from '#src/lib/page-title.js';
import { paths } from '#src/lib/paths.js';
import { useRolesIn } from '#src/lib/roles-in.js';
import { Mast, Page } from '#src/ui/page.js';
import { Board } from '#src/ui/surfaces.js';
import { BringInBoard } from './bring-in-board.js';
import { CopyBoard } from './copy-board.js';

/** What leaves the draft and what comes into it. `takeAlong` belongs to the exports. */
export function MovesPage({ takeAlong }: { takeAlong: (calendar: Calendar) => ReactNode }) {
  const { t } = useTranslation('imports');
  const { calendarId = '' } = useParams();
  const { data: calendar } = useSuspenseQuery(calendarQuery(calendarId));
  const { seesDrafts, isOfficer } = useRolesIn(calendar.communityId);
  usePageTitle(t('page.title'));
  const { placeName: place, year } = calendar;
  return (
    <Page>
      <Mast
        title={t('page.title')}
        under={t('page.under', { place, year })}
        backTo={paths.calendar(calendarId)}
      />
      <div className="grid grid-cols-1 gap-4">
        {isOfficer && <BringInBoard calendar={calendar} />}
        {isOfficer && <CopyBoard calendar={calendar} />}
        {seesDrafts ? takeAlong(calendar) : <Board>{t('page.closed')}</Board>}
      </div>
    </Page>
  );
}
