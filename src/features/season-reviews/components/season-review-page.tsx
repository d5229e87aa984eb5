import { useQuery, useSuspenseQuery } from '@tanstack/react-query';
import { Printer } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { useParams } from 'react-router-dom';
import type { SeasonReview } from '#shared/contracts/season-reviews.js';
import { calendarQuery } from '#src/lib/calendar-queries.js';
import { useDateWords } from '#src/lib/date-words.js';
import { EntryTitles } from '#src/lib/entry-titles.js';
import { usePageTitle } from '#src/lib/page-title.js';
import { paths } from '#src/lib/paths.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { useRolesIn } from '#src/lib/roles-in.js';
import { Button, ButtonLink } from '#src/ui/button.js';
import { Mast, Page } from '#src/ui/page.js';
import { Board } from '#src/ui/surfaces.js';
import { Skeleton, TroubleNote } from '#src/ui/waiting.js';
import { seasonReviewQuery } from '../api/season-queries.js';
import { useSeasonWords } from '../model/season-words.js';
import { Decisions } from './decisions.js';
import { EntryReview, type Writing } from './entry-review.js';
import { Lessons } from './lessons.js';
import { PrintedSeason } from './printed-season.js';

/** A year looked back at, for the meeting at its end. */
export function SeasonReviewPage() {
  const { t } = useTranslation('season');
  const { calendarId = '' } = useParams();
  const words = useProblemWords();
  const { data: calendar } = useSuspenseQuery(calendarQuery(calendarId));
  const { isOfficer, isElder, isSteward } = useRolesIn(calendar.communityId);
  const { data, error, refetch } = useQuery(seasonReviewQuery(calendarId));
  usePageTitle(t('title', { year: calendar.year }));
  const writing = { typesDays: isOfficer || isElder, decides: isOfficer || isSteward };
  if (data !== undefined) return <Year review={data} writing={writing} />;
  return (
    <Page>
      <Mast title={t('title', { year: calendar.year })} backTo={paths.calendars()} />
      {error === null ? (
        <Board>
          <Skeleton lines={6} />
        </Board>
      ) : (
        <TroubleNote title={t('trouble')} sentence={words.problem(error)} onRetry={() => void refetch()} />
      )}
    </Page>
  );
}

function Year({ review, writing }: { review: SeasonReview; writing: Writing }) {
  const { t } = useTranslation('season');
  const words = useSeasonWords();
  const { calendarId, year, entries, nextCalendarId } = review;
  const titles = new Map(entries.map(({ entryId, titleOfficer }) => [entryId, titleOfficer]));
  const next = year + 1;
  return (
    <EntryTitles titles={titles}>
      <Page className="season">
        <div className="season-screen">
          <Mast title={t('title', { year })} under={words.under(review)} backTo={paths.calendars()} />
          <p className="mb-4 max-w-prose">{t('lead')}</p>
          {/* Below the title: beside it a phone has no room for both. */}
          <div className="mb-4">
            <Button
              icon={<Printer aria-hidden size={20} />}
              onClick={() => {
                window.print();
              }}
            >
              {t('print')}
            </Button>
          </div>
          <div className="grid grid-cols-1 gap-4">
            <Board title={t('wholeYear')}>
              <Lessons calendarId={calendarId} entryId={null} lessons={review.lessons} />
              <Decisions
                review={review}
                entryId={null}
                decisions={review.decisions}
                decides={writing.decides}
              />
              {nextCalendarId === null ? (
                <p className="mt-3 text-small text-umber-soft">{t('decisions.noNext', { year: next })}</p>
              ) : (
                <p className="mt-3">
                  <ButtonLink to={paths.calendar(nextCalendarId)}>
                    {t('decisions.openNext', { year: next })}
                  </ButtonLink>
                </p>
              )}
            </Board>
            <Notices review={review} />
            <Board title={t('entries')}>
              {entries.length === 0 && <p>{t('nothing')}</p>}
              <div className="season-folds">
                {entries.map((entry) => (
                  <EntryReview key={entry.entryId} review={review} entry={entry} writing={writing} />
                ))}
              </div>
            </Board>
          </div>
        </div>
        <PrintedSeason review={review} />
      </Page>
    </EntryTitles>
  );
}

function Notices({ review: { year, notices } }: { review: SeasonReview }) {
  const { t } = useTranslation('season');
  const dates = useDateWords();
  if (notices.length === 0) return null;
  return (
    <Board title={t('notices.title', { year })}>
      <ul className="grid gap-2">
        {notices.map(({ id, issuer, issuedOn, expiresOn, text }) => (
          <li key={id}>
            {t('notices.line', { issuer, from: dates.day(issuedOn), to: dates.day(expiresOn), text })}
          </li>
        ))}
      </ul>
      <p className="mt-2 text-small text-umber-soft">{t('notices.beside')}</p>
    </Board>
  );
}
