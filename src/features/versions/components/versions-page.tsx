import { useQuery, useSuspenseQuery } from '@tanstack/react-query';
import { GitCompareArrows } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { useParams } from 'react-router-dom';
import type { Calendar } from '#shared/contracts/calendars.js';
import type { VersionSummary } from '#shared/contracts/versions.js';
import { calendarQuery, versionsQuery } from '#src/lib/calendar-queries.js';
import { useDateWords } from '#src/lib/date-words.js';
import { usePageTitle } from '#src/lib/page-title.js';
import { paths } from '#src/lib/paths.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { useRolesIn } from '#src/lib/roles-in.js';
import { useWideScreen } from '#src/lib/wide-screen.js';
import { ButtonLink } from '#src/ui/button.js';
import { StateIcon } from '#src/ui/icons/state-icon.js';
import { Mast, Page } from '#src/ui/page.js';
import { StateChip } from '#src/ui/state-chip.js';
import { Board } from '#src/ui/surfaces.js';
import { TaskList, type Task } from '#src/ui/task-list.js';
import { EmptyState, Skeleton, TroubleNote } from '#src/ui/waiting.js';
import { useVersionName } from './use-version-name.js';

/** Submissions and published versions of a calendar, newest first, with the draft on top. */
export function VersionsPage() {
  const { t } = useTranslation('versions');
  const { calendarId = '' } = useParams();
  const { data: calendar } = useSuspenseQuery(calendarQuery(calendarId));
  const { seesDrafts } = useRolesIn(calendar.communityId);
  const words = useProblemWords();
  const isWide = useWideScreen();
  const versions = useQuery(versionsQuery(calendarId));
  usePageTitle(t('list.title'));
  const list = versions.data ?? [];
  const sides = list.length + (seesDrafts ? 1 : 0);
  const draftTask = useDraftTask(calendar);
  const versionTask = useVersionTask(calendarId);
  const compare = sides > 1 && list.length > 0 && (
    <ButtonLink to={paths.compare(calendarId)} icon={<GitCompareArrows aria-hidden size={20} />}>
      {t('list.compare')}
    </ButtonLink>
  );
  return (
    <Page>
      <Mast
        title={t('list.title')}
        under={t('list.under', { year: calendar.year, place: calendar.placeName })}
        backTo={paths.calendars()}
      >
        {isWide && compare}
      </Mast>
      {versions.isPending && (
        <Board>
          <Skeleton />
        </Board>
      )}
      {versions.isError && (
        <TroubleNote
          title={t('list.trouble')}
          sentence={words.problem(versions.error)}
          onRetry={() => void versions.refetch()}
        />
      )}
      {versions.isSuccess && (
        <Board className="max-w-[48rem]">
          <TaskList tasks={[...(seesDrafts ? [draftTask] : []), ...list.map(versionTask)]} />
          {list.length === 0 && (
            <EmptyState title={t('list.empty')}>
              {seesDrafts ? t('list.emptyHint') : t('list.emptyOthers')}
            </EmptyState>
          )}
        </Board>
      )}
      {!isWide && compare && <div className="mt-4">{compare}</div>}
    </Page>
  );
}

function useDraftTask(calendar: Calendar): Task {
  const { t } = useTranslation('versions');
  const { entryCount, locked } = calendar;
  return {
    key: 'draft',
    icon: <StateIcon state="draft" size={26} />,
    title: t('list.draftTitle'),
    detail: t(locked ? 'list.draftLocked' : 'list.draftLine', { count: entryCount }),
    to: paths.calendar(calendar.id),
  };
}

function useVersionTask(calendarId: string): (version: VersionSummary) => Task {
  const { t } = useTranslation('versions');
  const dates = useDateWords();
  const nameOf = useVersionName();
  return (version) => ({
    key: String(version.number),
    icon: <StateIcon state={version.state} size={26} />,
    title: (
      <span className="flex flex-wrap items-center gap-2">
        <span>{nameOf(version)}</span>
        <StateChip state={version.state} />
      </span>
    ),
    detail: [
      t('list.line', {
        count: version.entryCount,
        name: version.submittedBy,
        when: dates.moment(version.submittedAt),
      }),
      ...(version.publishedAt === null
        ? []
        : [t('list.published', { when: dates.moment(version.publishedAt) })]),
    ].join(' · '),
    to: paths.version(calendarId, version.number),
  });
}
