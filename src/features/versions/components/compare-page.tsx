import { useQuery, useSuspenseQueries } from '@tanstack/react-query';
import { Printer } from 'lucide-react';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { useParams, useSearchParams } from 'react-router-dom';
import { calendarQuery, versionQuery, versionsQuery } from '#src/lib/calendar-queries.js';
import { KeptLine } from '#src/lib/kept-line.js';
import { usePageTitle } from '#src/lib/page-title.js';
import { paths } from '#src/lib/paths.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { useRolesIn } from '#src/lib/roles-in.js';
import { useWideScreen } from '#src/lib/wide-screen.js';
import { Button } from '#src/ui/button.js';
import { Mast, Page } from '#src/ui/page.js';
import { Board } from '#src/ui/surfaces.js';
import { EmptyState, Skeleton, TroubleNote } from '#src/ui/waiting.js';
import { comparisonQuery } from '../api/comparison-query.js';
import { CHANGE_TOPICS } from '../model/change-topics.js';
import { sideChoices, sidesOf, type Sides } from '../model/compare-sides.js';
import { CompareResult, type Show } from './compare-result.js';
import { CompareSides } from './compare-sides.js';
import { useVersionName } from './use-version-name.js';

/** What changed between two versions of a calendar, in sentences. */
export function ComparePage() {
  const { t } = useTranslation('versions');
  const { calendarId = '' } = useParams();
  const [search, setSearch] = useSearchParams();
  const [{ data: calendar }, { data: versions }] = useSuspenseQueries({
    queries: [calendarQuery(calendarId), versionsQuery(calendarId)],
  });
  const { seesDrafts } = useRolesIn(calendar.communityId);
  usePageTitle(t('compare.title'));
  const isWide = useWideScreen();
  const asked = { from: search.get('from'), to: search.get('to') };
  const sides = sidesOf(asked, versions, seesDrafts);
  return (
    <Page>
      <Mast
        title={t('compare.title')}
        under={t('compare.under', { year: calendar.year, place: calendar.placeName })}
        backTo={paths.versions(calendarId)}
      >
        {sides !== null && isWide && <PrintButton />}
      </Mast>
      {sides === null ? (
        <Board>
          <EmptyState title={t('compare.fewer')} />
        </Board>
      ) : (
        <>
          <CompareSides
            sides={sides}
            versions={versions}
            choices={sideChoices(versions, seesDrafts)}
            onChange={(next) => {
              setSearch({ ...next }, { replace: true, preventScrollReset: true });
            }}
          />
          <Compared calendarId={calendarId} sides={sides} seesDrafts={seesDrafts} />
          {!isWide && (
            <div className="mt-4">
              <PrintButton />
            </div>
          )}
        </>
      )}
    </Page>
  );
}

function PrintButton() {
  const { t } = useTranslation('versions');
  return (
    <Button
      icon={<Printer aria-hidden size={20} />}
      onClick={() => {
        window.print();
      }}
    >
      {t('compare.print')}
    </Button>
  );
}

function Compared({
  calendarId,
  sides,
  seesDrafts,
}: {
  calendarId: string;
  sides: Sides;
  seesDrafts: boolean;
}) {
  const { t } = useTranslation('versions');
  const words = useProblemWords();
  const [show, setShow] = useState<Show>('changed');
  const [search, setSearch] = useSearchParams();
  const topic = CHANGE_TOPICS.find((each) => each === search.get('about')) ?? null;
  const comparison = useQuery({
    ...comparisonQuery(calendarId, sides.from, sides.to),
    enabled: sides.from !== sides.to,
  });
  if (sides.from === sides.to) return <p className="mt-4">{t('compare.sameSides')}</p>;
  if (comparison.isPending) {
    return (
      <Board className="mt-4">
        <Skeleton lines={5} />
      </Board>
    );
  }
  if (comparison.isError) {
    return (
      <TroubleNote
        title={t('compare.trouble')}
        sentence={words.problem(comparison.error)}
        onRetry={() => void comparison.refetch()}
      />
    );
  }
  return (
    <>
      <CompareResult
        calendarId={calendarId}
        comparison={comparison.data}
        seesDrafts={seesDrafts}
        show={show}
        onShow={setShow}
        topic={topic}
        onTopic={(about) => {
          setSearch({ ...sides, ...(about && { about }) }, { replace: true, preventScrollReset: true });
        }}
      />
      {[sides.from, sides.to].map(
        (side) => side !== 'draft' && <NotShown key={side} calendarId={calendarId} number={Number(side)} />,
      )}
    </>
  );
}

/** What a side holds beyond what this person sees, and how much of it was withdrawn: never what it was. */
function NotShown({ calendarId, number }: { calendarId: string; number: number }) {
  const { t } = useTranslation('versions');
  const { data: version } = useQuery(versionQuery(calendarId, number));
  const nameOf = useVersionName();
  if (version === undefined || version.keptCount + version.withdrawnCount === 0) return null;
  return (
    <div className="mt-3">
      <p className="text-small">{t('notShown', { name: nameOf(version) })}</p>
      <KeptLine keptCount={version.keptCount} withdrawnCount={version.withdrawnCount} />
    </div>
  );
}
