import { useQuery } from '@tanstack/react-query';
import { PenLine } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import type { ElderProgress } from '#shared/contracts/reviews.js';
import type { Version } from '#shared/contracts/versions.js';
import { meetingsEndpoints } from '#shared/contracts/meetings.js';
import { apiUrl } from '#src/lib/api-client.js';
import { useRoles } from '#src/lib/community.js';
import { paths } from '#src/lib/paths.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Button, ButtonLink } from '#src/ui/button.js';
import { CountPegs } from '#src/ui/pegs.js';
import { Board, Care } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { Skeleton, TroubleNote } from '#src/ui/waiting.js';
import { answersQuery, useSign } from '../api/reviews-api.js';
import { AnswerSentence } from './others-words.js';

/** The review as a version's page shows it: how far the elders are, what they asked, and the steward's signature. */
export function ReviewBoard({ version }: { version: Version }) {
  const { t } = useTranslation('reviews');
  const { is } = useRoles();
  const words = useProblemWords();
  const ref = { calendarId: version.calendarId, number: version.number };
  const answers = useQuery({ ...answersQuery(ref), enabled: is('officer', 'elder', 'steward') });
  if (!is('officer', 'elder', 'steward')) return null;
  const inReview = version.state === 'in-review';
  const said = (answers.data?.items ?? []).filter(({ answer, note }) => answer !== 'agree' || note !== '');
  const titles = new Map(version.entries.map(({ entryId, content }) => [entryId, content.titleOfficer]));

  return (
    <Board title={t('board.title')}>
      {answers.isPending && <Skeleton lines={4} />}
      {answers.error !== null && (
        <TroubleNote sentence={words.problem(answers.error)} onRetry={() => void answers.refetch()} />
      )}
      {answers.data && (
        <div className="grid gap-4">
          <ul aria-label={t('board.progress')} className="grid gap-3">
            {answers.data.progress.map((elder) => (
              <li key={elder.elderId}>
                <ElderLine elder={elder} />
              </li>
            ))}
          </ul>
          {inReview && (
            <div className="flex flex-wrap gap-2">
              {is('elder') && (
                <ButtonLink look="main" to={paths.review(version.calendarId, version.number)}>
                  {t('board.open')}
                </ButtonLink>
              )}
              {is('officer', 'steward') && (
                <ButtonLink to={paths.meeting(version.calendarId, version.number)}>
                  {t('meeting.open')}
                </ButtonLink>
              )}
              <a
                className="btn"
                href={apiUrl(meetingsEndpoints.sheet, {
                  params: { calendarId: version.calendarId, number: String(version.number) },
                })}
              >
                {t('meeting.print')}
              </a>
              {!is('elder') && is('officer', 'steward') && (
                <ButtonLink to={paths.review(version.calendarId, version.number)}>
                  {t('board.writeDown')}
                </ButtonLink>
              )}
            </div>
          )}
          {is('steward') && inReview && <StewardSign version={version} />}
          <div>
            <h3>{t('board.answersTitle')}</h3>
            {said.length === 0 && <p className="text-umber-soft">{t('board.nothingSaid')}</p>}
            <ul className="mt-2 grid gap-3">
              {said.map((answer) => (
                <li key={answer.id}>
                  <strong className="block">{titles.get(answer.entryId)}</strong>
                  <AnswerSentence answer={answer} />
                  {answer.letStand && <span className="block text-umber-soft">{t('kept')}</span>}
                </li>
              ))}
            </ul>
          </div>
        </div>
      )}
    </Board>
  );
}

function ElderLine({ elder }: { elder: ElderProgress }) {
  const { t } = useTranslation('reviews');
  const state = elder.wroteTheDraft
    ? t('board.wrote')
    : elder.signed
      ? t('board.signed')
      : elder.answered === 0
        ? t('board.notOpened')
        : undefined;
  const sentence = t('board.elder', { name: elder.elderName, done: elder.answered, count: elder.of });
  return (
    <>
      <span className="block">
        {sentence}
        {state !== undefined && <span className="text-umber-soft"> · {state}</span>}
      </span>
      {elder.of <= 24 && <CountPegs done={elder.answered} total={elder.of} label={sentence} />}
    </>
  );
}

function StewardSign({ version }: { version: Version }) {
  const { t } = useTranslation('reviews');
  const say = useToast();
  const words = useProblemWords();
  const sign = useSign({ calendarId: version.calendarId, number: version.number });
  // The button is gone once the signature counts; what follows is said all the same.
  const signNow = async () => {
    try {
      const { state } = await sign.mutateAsync('steward');
      say(state === 'signed-off' ? t('end.signedOff') : t('end.signed'));
    } catch (cause) {
      say(words.problem(cause));
    }
  };
  const { signAsSteward, signClosedBy } = version.may;
  if (!signAsSteward) {
    return signClosedBy === null ? null : (
      <Care>
        <p>{t(`end.closed.${signClosedBy}`)}</p>
      </Care>
    );
  }
  return (
    <div className="grid gap-2">
      <p>{t('board.stewardHint')}</p>
      <p>{t('board.stewardKept')}</p>
      <Button
        look="main"
        busy={sign.isPending}
        icon={<PenLine aria-hidden size={22} />}
        onClick={() => {
          void signNow();
        }}
      >
        {t('board.signSteward')}
      </Button>
    </div>
  );
}
