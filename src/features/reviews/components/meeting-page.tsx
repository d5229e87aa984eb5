import { useQuery } from '@tanstack/react-query';
import { useTranslation } from 'react-i18next';
import { useParams } from 'react-router-dom';
import { useRoles } from '#src/lib/community.js';
import { versionQuery } from '#src/lib/calendar-queries.js';
import { usePageTitle } from '#src/lib/page-title.js';
import { paths } from '#src/lib/paths.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Mast, Page } from '#src/ui/page.js';
import { Care } from '#src/ui/surfaces.js';
import { Skeleton, TroubleNote } from '#src/ui/waiting.js';
import { answersQuery } from '../api/reviews-api.js';
import { MeetingForm } from './meeting-form.js';

/** What elders marked on paper at a meeting is typed in here, entry by entry. */
export function MeetingPage() {
  const { t } = useTranslation(['reviews', 'common']);
  const { calendarId = '', number = '' } = useParams();
  const ref = { calendarId, number: Number(number) };
  const { is } = useRoles();
  const words = useProblemWords();
  const version = useQuery(versionQuery(calendarId, ref.number));
  const answers = useQuery(answersQuery(ref));
  usePageTitle(t('meeting.title'));
  const trouble = version.error ?? answers.error;
  return (
    <Page>
      <Mast title={t('meeting.title')} backTo={paths.version(calendarId, ref.number)} />
      {!is('officer', 'steward') && (
        <Care>
          <p>{t('meeting.notYours')}</p>
        </Care>
      )}
      {trouble !== null && <TroubleNote sentence={words.problem(trouble)} />}
      {trouble === null && (version.data === undefined || answers.data === undefined) && (
        <Skeleton lines={8} />
      )}
      {is('officer', 'steward') &&
        version.data &&
        answers.data &&
        (version.data.state === 'in-review' ? (
          <MeetingForm version={version.data} elders={answers.data.progress} given={answers.data.items} />
        ) : (
          <Care>
            <p>{t('notInReview', { state: t(`common:state.${version.data.state}`) })}</p>
          </Care>
        ))}
    </Page>
  );
}
