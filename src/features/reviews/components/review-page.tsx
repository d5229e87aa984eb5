import { useQuery } from '@tanstack/react-query';
import { useTranslation } from 'react-i18next';
import { useParams } from 'react-router-dom';
import { versionQuery } from '#src/lib/calendar-queries.js';
import { EntryTitles, titlesOf } from '#src/lib/entry-titles.js';
import { usePageTitle } from '#src/lib/page-title.js';
import { paths } from '#src/lib/paths.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Mast, Page } from '#src/ui/page.js';
import { Skeleton, TroubleNote } from '#src/ui/waiting.js';
import { answersQuery } from '../api/reviews-api.js';
import { ReviewRound, type About, type SpeakAbout } from './review-round.js';

/** An elder's review of a submission: one entry at a time, in large type. */
export function ReviewPage({ about, speak }: { about: About; speak: SpeakAbout }) {
  const { t } = useTranslation('reviews');
  const { calendarId = '', number = '' } = useParams();
  const ref = { calendarId, number: Number(number) };
  const words = useProblemWords();
  const version = useQuery(versionQuery(calendarId, ref.number));
  const answers = useQuery(answersQuery(ref));
  usePageTitle(t('title', { year: version.data?.header.year ?? '' }));

  if (version.data && answers.data) {
    return (
      <EntryTitles titles={titlesOf(version.data.entries)}>
        <ReviewRound version={version.data} answers={answers.data} about={about} speak={speak} />
      </EntryTitles>
    );
  }
  const trouble = version.error ?? answers.error;
  return (
    <Page className="review">
      <Mast title={t('title', { year: '' })} backTo={paths.version(calendarId, ref.number)} />
      {trouble === null ? (
        <Skeleton lines={8} />
      ) : (
        <TroubleNote
          sentence={words.problem(trouble)}
          onRetry={() => {
            void version.refetch();
            void answers.refetch();
          }}
        />
      )}
    </Page>
  );
}
