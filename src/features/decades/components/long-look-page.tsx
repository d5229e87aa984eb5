import { useQuery, useSuspenseQuery } from '@tanstack/react-query';
import { ArrowLeft, ArrowRight, Printer } from 'lucide-react';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { useParams, useSearchParams } from 'react-router-dom';
import { CALENDAR_FIRST_YEAR, CALENDAR_LAST_YEAR } from '#shared/contracts/calendars.js';
import { LONG_LOOK_YEARS, type LongLook } from '#shared/contracts/decades.js';
import { versionNumber } from '#shared/contracts/versions.js';
import { calendarQuery } from '#src/lib/calendar-queries.js';
import { usePageTitle } from '#src/lib/page-title.js';
import { paths } from '#src/lib/paths.js';
import { MoreOfThem, useShownPart } from '#src/lib/shown-part.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Button, ButtonLink } from '#src/ui/button.js';
import { Mast, Page } from '#src/ui/page.js';
import { PickGroup } from '#src/ui/pick.js';
import { Board } from '#src/ui/surfaces.js';
import { EmptyState, Skeleton, TroubleNote } from '#src/ui/waiting.js';
import { longLookQuery } from '../api/long-look-query.js';
import { YearMultiples } from './year-multiples.js';
import { YearsTable } from './years-table.js';

const LAST_FIRST_YEAR = CALENDAR_LAST_YEAR - LONG_LOOK_YEARS.usual + 1;

/** Ten years of a calendar in one view: what wanders with the Moon, and what stays with the stars. */
export function LongLookPage() {
  const { t } = useTranslation('decades');
  const { calendarId = '' } = useParams();
  const [search] = useSearchParams();
  const { data: calendar } = useSuspenseQuery(calendarQuery(calendarId));
  const asked = Number(search.get('from') ?? calendar.year);
  const from = Math.min(
    Math.max(Number.isInteger(asked) ? asked : calendar.year, CALENDAR_FIRST_YEAR),
    LAST_FIRST_YEAR,
  );
  const to = from + LONG_LOOK_YEARS.usual - 1;
  const number = versionNumber.safeParse(search.get('number')).data;
  const words = useProblemWords();
  const look = useQuery(longLookQuery(calendarId, from, number));
  usePageTitle(t('title', { from, to }));
  const link = (first: number) =>
    paths.longLook(calendarId, { from: first, ...(number !== undefined && { number }) });
  return (
    <Page>
      <Mast
        title={t('title', { from, to })}
        under={t('under', { place: calendar.placeName })}
        backTo={paths.calendars()}
      />
      <p className="mb-3">{t('lead')}</p>
      <div className="mb-4 flex flex-wrap gap-3">
        {from > CALENDAR_FIRST_YEAR && (
          <ButtonLink
            look="quiet"
            to={link(Math.max(from - LONG_LOOK_YEARS.usual, CALENDAR_FIRST_YEAR))}
            icon={<ArrowLeft aria-hidden className="turns" size={20} />}
          >
            {t('before')}
          </ButtonLink>
        )}
        {from < LAST_FIRST_YEAR && (
          <ButtonLink
            look="quiet"
            to={link(Math.min(from + LONG_LOOK_YEARS.usual, LAST_FIRST_YEAR))}
            icon={<ArrowRight aria-hidden className="turns" size={20} />}
          >
            {t('after')}
          </ButtonLink>
        )}
        <Button
          icon={<Printer aria-hidden size={20} />}
          onClick={() => {
            window.print();
          }}
        >
          {t('print')}
        </Button>
      </div>
      {look.isPending && (
        <Board>
          <Skeleton lines={8} />
        </Board>
      )}
      {look.isError && (
        <TroubleNote
          title={t('trouble')}
          sentence={words.problem(look.error)}
          onRetry={() => void look.refetch()}
        />
      )}
      {look.data && <Looked look={look.data} />}
    </Page>
  );
}

function Looked({ look }: { look: LongLook }) {
  const { t } = useTranslation('decades');
  const [view, setView] = useState<'pictures' | 'table'>('pictures');
  const { label, number, entries } = look;
  const { shown, left, more } = useShownPart(entries);
  if (entries.length === 0) {
    return (
      <Board>
        <EmptyState title={t('empty')} />
      </Board>
    );
  }
  return (
    <>
      <p className="mb-3 text-small text-umber-soft">
        {number === 'draft' ? t('byDraft') : t('byVersion', { name: label ?? number })}
      </p>
      <PickGroup
        className="compare-show mb-4"
        label={t('view')}
        labelForEars
        value={view}
        onChange={setView}
        options={[
          { value: 'pictures', label: t('pictures') },
          { value: 'table', label: t('asTable') },
        ]}
      />
      {view === 'table' ? (
        <YearsTable look={look} entries={shown} />
      ) : (
        <div className="multiples">
          {shown.map((entry) => (
            <YearMultiples key={entry.entryId} entry={entry} villageLanguageTag={look.villageLanguageTag} />
          ))}
        </div>
      )}
      <MoreOfThem left={left} more={more} />
    </>
  );
}
