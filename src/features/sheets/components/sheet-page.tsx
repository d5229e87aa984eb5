import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { useParams, useSearchParams } from 'react-router-dom';
import { SHEET_LAYOUTS, type SheetLayout } from '#shared/contracts/sheets.js';
import type { SheetPage } from '#shared/sheet/primitives.js';
import type { VersionSummary } from '#shared/contracts/versions.js';
import { calendarQuery, versionsQuery } from '#src/lib/calendar-queries.js';
import { useRoles } from '#src/lib/community.js';
import { listWords } from '#src/lib/list-words.js';
import { usePageTitle } from '#src/lib/page-title.js';
import { NoticesAbove } from '#src/lib/notices-above.js';
import { paths } from '#src/lib/paths.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { ButtonAnchor, ButtonLink } from '#src/ui/button.js';
import { SelectField } from '#src/ui/field.js';
import { Mast, Page, ThumbBar } from '#src/ui/page.js';
import { PickGroup } from '#src/ui/pick.js';
import { Board, Care } from '#src/ui/surfaces.js';
import { EmptyState, Skeleton, TroubleNote } from '#src/ui/waiting.js';
import { Download } from 'lucide-react';
import { sheetPdfUrl, sheetQuery, type SheetChoice } from '../api/sheets-queries.js';
import { PageBrowser } from './page-browser.js';
import { WallSteps } from './wall-steps.js';

/** Look at every page of the peg sheet before it is printed, then make the PDF. */
export function SheetPreviewPage() {
  const { t } = useTranslation('sheets');
  const { calendarId = '' } = useParams();
  const words = useProblemWords();
  const calendar = useQuery(calendarQuery(calendarId));
  const versions = useQuery(versionsQuery(calendarId));
  usePageTitle(t('title'));
  const trouble = calendar.error ?? versions.error;
  return (
    <Page>
      {calendar.data && versions.data ? (
        <SheetDesk
          calendarId={calendarId}
          under={t('under', {
            community: calendar.data.communityName,
            place: calendar.data.placeName,
            year: String(calendar.data.year),
          })}
          versions={versions.data}
        />
      ) : (
        <>
          <Mast title={t('title')} backTo={paths.calendars()} />
          {trouble === null ? (
            <Skeleton lines={8} />
          ) : (
            <TroubleNote
              sentence={words.problem(trouble)}
              onRetry={() => {
                void calendar.refetch();
                void versions.refetch();
              }}
            />
          )}
        </>
      )}
    </Page>
  );
}

function SheetDesk({
  calendarId,
  under,
  versions,
}: {
  calendarId: string;
  under: string;
  versions: readonly VersionSummary[];
}) {
  const { t, i18n } = useTranslation('sheets');
  const words = useProblemWords();
  const seesDraft = useRoles().is('officer', 'elder', 'steward');
  const [search, setSearch] = useSearchParams();
  const [layout, setLayout] = useState<SheetLayout>('month-cards');
  const number = search.get('number') ?? firstChoice(versions, seesDraft);
  const choice: SheetChoice = { calendarId, number: number ?? 'draft', layout };
  const sheet = useQuery({ ...sheetQuery(choice), enabled: number !== null });
  const mast = (action: boolean) => (
    <Mast title={t('title')} under={under} backTo={paths.calendar(calendarId)}>
      {action && (
        <ThumbBar>
          <ButtonAnchor
            look="main"
            href={sheetPdfUrl(choice)}
            download
            icon={<Download aria-hidden size={22} />}
          >
            {t('make')}
          </ButtonAnchor>
        </ThumbBar>
      )}
    </Mast>
  );
  if (number === null) {
    return (
      <>
        {mast(false)}
        <EmptyState
          title={t('none')}
          action={<ButtonLink to={paths.calendar(calendarId)}>{t('toCalendar')}</ButtonLink>}
        >
          {t('noneHint')}
        </EmptyState>
      </>
    );
  }
  return (
    <>
      {mast(true)}
      <NoticesAbove />
      <div className="sheet-desk">
        <div className="grid content-start gap-4">
          <Board title={t('what')}>
            <div className="grid gap-4">
              <PickGroup
                label={t('what')}
                labelForEars
                stacked
                value={layout}
                onChange={setLayout}
                options={SHEET_LAYOUTS.map((value) => ({
                  value,
                  label: t(`layout.${value}`),
                  note: t(`layout.${value}-note`),
                }))}
              />
              <VersionSelect
                versions={versions}
                seesDraft={seesDraft}
                value={number}
                onChange={(next) => {
                  setSearch({ number: next }, { replace: true });
                }}
              />
              <Watermark number={number} versions={versions} />
            </div>
          </Board>
          {sheet.data && (
            <Board title={t('paper')}>
              <p>{t('sheets', { count: sheet.data.pages.length })}</p>
              <CardsBeside pages={sheet.data.pages} />
              {sheet.data.fileBytes !== null && (
                <p>{t('fileSize', { size: (sheet.data.fileBytes / 1_000_000).toFixed(1) })}</p>
              )}
            </Board>
          )}
        </div>
        <div className="min-w-0">
          {sheet.isPending && <Skeleton lines={10} />}
          {sheet.error !== null && (
            <TroubleNote sentence={words.problem(sheet.error)} onRetry={() => void sheet.refetch()} />
          )}
          {sheet.data && sheet.data.missingLetters.length > 0 && (
            <Care className="mb-4">
              <p>{t('missingLetters', { letters: listWords(sheet.data.missingLetters, i18n.language) })}</p>
            </Care>
          )}
          {sheet.data && <PageBrowser key={layout} pages={sheet.data.pages} />}
          <WallSteps layout={layout} />
        </div>
      </div>
    </>
  );
}

/** The cards that are no month's, so that nobody looks for them only when they come out of the printer. */
function CardsBeside({ pages }: { pages: readonly SheetPage[] }) {
  const { t } = useTranslation('sheets');
  const names = pages.filter(({ kind }) => kind === 'words-card').map(({ name }) => name);
  if (names.length === 0) return null;
  return (
    <>
      <p>{t('beside')}</p>
      <ul className="list-disc ps-5">
        {names.map((name) => (
          <li key={name}>{name}</li>
        ))}
      </ul>
    </>
  );
}

function VersionSelect({
  versions,
  seesDraft,
  value,
  onChange,
}: {
  versions: readonly VersionSummary[];
  seesDraft: boolean;
  value: string;
  onChange: (number: string) => void;
}) {
  const { t } = useTranslation(['sheets', 'common']);
  return (
    <SelectField
      label={t('sheets:version')}
      value={value}
      onChange={(event) => {
        onChange(event.currentTarget.value);
      }}
    >
      {versions.map(({ number, label, state }) => (
        <option key={number} value={number}>
          {label === null
            ? t('sheets:submission', { number, state: t(`common:state.${state}`) })
            : t('sheets:issue', { label, state: t(`common:state.${state}`) })}
        </option>
      ))}
      {seesDraft && <option value="draft">{t('sheets:draft')}</option>}
    </SelectField>
  );
}

function Watermark({ number, versions }: { number: string; versions: readonly VersionSummary[] }) {
  const { t } = useTranslation(['sheets', 'common']);
  const state = versions.find((version) => String(version.number) === number)?.state ?? 'draft';
  if (state === 'published') return null;
  return (
    <Care>
      <p>{t('sheets:watermarked', { state: t(`common:state.${state}`) })}</p>
    </Care>
  );
}

/** What hangs on the wall comes first: the published version, else the newest that the person sees. */
function firstChoice(versions: readonly VersionSummary[], seesDraft: boolean): string | null {
  const published = versions.find((version) => version.state === 'published');
  const newest = published ?? versions[0];
  if (newest) return String(newest.number);
  return seesDraft ? 'draft' : null;
}
