import { useSuspenseQueries } from '@tanstack/react-query';
import { GitCompareArrows, Layers, Printer } from 'lucide-react';
import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { Navigate, useParams } from 'react-router-dom';
import { isOut, wasPublished } from '#shared/calendar/version-state.js';
import {
  submissionNumber,
  type Version,
  type VersionEntry,
  type VersionSummary,
} from '#shared/contracts/versions.js';
import { calendarQuery, versionQuery, versionsQuery } from '#src/lib/calendar-queries.js';
import { useDateWords } from '#src/lib/date-words.js';
import { EntryTitles, titlesOf } from '#src/lib/entry-titles.js';
import { usePageTitle } from '#src/lib/page-title.js';
import { NoticesAbove } from '#src/lib/notices-above.js';
import { paths } from '#src/lib/paths.js';
import { useRolesIn } from '#src/lib/roles-in.js';
import { ButtonLink } from '#src/ui/button.js';
import { Columns, Mast, Page } from '#src/ui/page.js';
import { StateChip } from '#src/ui/state-chip.js';
import { Board } from '#src/ui/surfaces.js';
import { BasisBoard } from './basis-board.js';
import { ChangesBoard } from './changes-board.js';
import { EngineNotice } from './engine-notice.js';
import { FrozenEntries } from './frozen-entries.js';
import { FrozenStrip } from './frozen-strip.js';
import { MissingBoard } from './missing-board.js';
import { RestoreDraft } from './restore-draft.js';
import { SealBoard } from './seal-board.js';
import { SignaturesBoard } from './signatures-board.js';
import { useVersionName } from './use-version-name.js';
import { VersionActions } from './version-actions.js';

interface VersionPageProps {
  /** How far the elders are, the way into the review and signing: they belong to the reviews. */
  review?: ((version: Version) => ReactNode) | undefined;
  /** The way to what belongs to an entry: notes, voices, who may see it. */
  about?: ((entry: VersionEntry) => ReactNode) | undefined;
  /** The ways in which it leaves the house; they belong to the exports. */
  takeAlong?: ((version: Version, communityId: string) => ReactNode) | undefined;
}

/** A version as it was frozen, what is missing before it is signed off, and what can be done with it. */
export function VersionPage({ review, about, takeAlong }: VersionPageProps) {
  const { calendarId = '', number = '' } = useParams();
  const isNumber = submissionNumber.safeParse(number).success;
  // "draft" is no frozen version: its page is the editor.
  if (!isNumber) return <Navigate to={paths.calendar(calendarId)} replace />;
  return <FrozenVersion {...{ calendarId, review, about, takeAlong }} number={Number(number)} />;
}

interface FrozenVersionProps extends VersionPageProps {
  calendarId: string;
  number: number;
}

function FrozenVersion({ calendarId, number, review, about, takeAlong }: FrozenVersionProps) {
  const { t } = useTranslation('versions');
  // Asked for together: one after the other would be three ways to the server.
  const [{ data: calendar }, { data: version }, { data: versions }] = useSuspenseQueries({
    queries: [calendarQuery(calendarId), versionQuery(calendarId, number), versionsQuery(calendarId)],
  });
  const older = versions.find((each) => each.number < number) ?? null;
  const mended =
    version.label !== null && versions.find((each) => each.label !== null && each.number < number);
  const name = useVersionName()(version);
  usePageTitle(name);
  const { isOfficer } = useRolesIn(calendar.communityId);
  const isOpen = isOut(version.state);
  return (
    <Page>
      <Mast
        title={name}
        under={
          <span className="flex flex-wrap items-center gap-x-3 gap-y-1">
            <StateChip state={version.state} />
            <span>{t('page.under', { year: calendar.year, place: version.header.place.name })}</span>
          </span>
        }
        backTo={paths.versions(calendarId)}
      />
      <NoticesAbove />
      <Columns wider="first" className="mb-4">
        <StateBoard version={version} older={older} mayRestore={isOfficer && !isOpen} />
        {isOpen ? <MissingBoard version={version} /> : <SignaturesBoard version={version} />}
      </Columns>
      {review !== undefined && <div className="mb-4">{review(version)}</div>}
      <EngineNotice version={version} />
      <FrozenStrip version={version} />
      <Columns wider="first">
        <EntryTitles titles={titlesOf(version.entries)}>
          <FrozenEntries version={version} about={about} />
        </EntryTitles>
        <div className="grid gap-4">
          {isOpen && <SignaturesBoard version={version} />}
          {mended && <ChangesBoard version={version} before={mended} />}
          {takeAlong?.(version, calendar.communityId)}
          <BasisBoard header={version.header} />
          <SealBoard version={version} />
        </div>
      </Columns>
    </Page>
  );
}

interface StateBoardProps {
  version: Version;
  older: VersionSummary | null;
  mayRestore: boolean;
}

/** What its state means, who submitted it when, and the ways on. */
function StateBoard({ version, older, mayRestore }: StateBoardProps) {
  const { t } = useTranslation('versions');
  const dates = useDateWords();
  const { calendarId, number, state } = version;
  return (
    <Board>
      <p className="text-lead">{t(`state.${state}`)}</p>
      <p className="mt-1 text-small text-umber-soft">
        {t('page.submitted', { name: version.submittedBy, when: dates.moment(version.submittedAt) })}
        {version.publishedAt !== null && (
          <> · {t('page.publishedAt', { when: dates.moment(version.publishedAt) })}</>
        )}
      </p>
      <div className="mt-3 flex flex-wrap items-start gap-3">
        <VersionActions version={version} />
        {wasPublished(state) && state !== 'recalled' && (
          <ButtonLink to={paths.sheet(calendarId, { number })} icon={<Printer aria-hidden size={20} />}>
            {t('page.sheet')}
          </ButtonLink>
        )}
        {older && (
          <ButtonLink
            look="quiet"
            to={paths.compare(calendarId, { from: older.number, to: number })}
            icon={<GitCompareArrows aria-hidden size={20} />}
          >
            {t('page.compare')}
          </ButtonLink>
        )}
        <ButtonLink look="quiet" to={paths.versions(calendarId)} icon={<Layers aria-hidden size={20} />}>
          {t('page.versions')}
        </ButtonLink>
      </div>
      {mayRestore && <RestoreDraft version={version} />}
    </Board>
  );
}
