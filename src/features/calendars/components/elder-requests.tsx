import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import { paths } from '#src/lib/paths.js';
import { Button } from '#src/ui/button.js';
import { StateIcon } from '#src/ui/icons/state-icon.js';
import { More } from '#src/ui/fold.js';
import { Well } from '#src/ui/surfaces.js';
import type { ElderRequest, EntryAnswers } from '../model/elder-requests.js';

interface ElderRequestsProps {
  answers: EntryAnswers;
  calendarId: string;
  number: number;
  entryId: string;
  /** Null where the draft cannot be written to. */
  ways: { changeDays: () => void; changeWords: () => void; takeOut: () => void } | null;
}

/** What elders asked stands on top of the entry, with ways out; differences that are kept stand beside it. */
export function ElderRequests({ answers, calendarId, number, entryId, ways }: ElderRequestsProps) {
  const { t } = useTranslation('calendars');
  return (
    <div className="mt-3 grid gap-3">
      {answers.requests.map((request) => (
        <div key={request.answer.id} className="elder-asks">
          <StateIcon
            state={request.answer.answer === 'change-this' ? 'changes-asked' : 'not-for-the-board'}
            size={26}
          />
          <div>
            <RequestWords request={request} />
            {request.changedSince && (
              <p className="text-small text-umber-soft">{t('request.changedSince')}</p>
            )}
            {ways === null ? (
              <p className="text-small text-umber-soft">{t('request.lockedNote', { number })}</p>
            ) : (
              <RequestWays request={request} ways={ways} />
            )}
            <Link className="link-line" to={paths.review(calendarId, number, { entry: entryId })}>
              {t('request.toAnswers')}
            </Link>
          </div>
        </div>
      ))}
      {answers.kept.map((answer) => (
        <Well key={answer.id} className="flex gap-3">
          <StateIcon state="two-ways" size={24} />
          <div>
            <p>
              {answer.note === ''
                ? t('request.keptPlain', { name: answer.elderName })
                : t('request.kept', { name: answer.elderName, note: answer.note })}
            </p>
            <p className="text-small text-umber-soft">{t('request.keptNote')}</p>
          </div>
        </Well>
      ))}
    </div>
  );
}

function RequestWords({ request: { answer } }: { request: ElderRequest }) {
  const { t } = useTranslation('calendars');
  const name = answer.elderName;
  const { note } = answer;
  const isChange = answer.answer === 'change-this';
  const key = isChange
    ? note === ''
      ? 'request.saysNothing'
      : 'request.says'
    : note === ''
      ? 'request.notForBoardPlain'
      : 'request.notForBoard';
  return (
    <>
      <p>{t(key, { name, note })}</p>
      {answer.recordedByName !== null && (
        <p className="text-small text-umber-soft">
          {answer.witness === null
            ? t('request.typed', { recorder: answer.recordedByName, name })
            : t('request.recorded', { recorder: answer.recordedByName, witness: answer.witness })}
        </p>
      )}
      {answer.spoken !== null && (
        <p className="text-small text-umber-soft">{t(`request.spoken.${answer.spoken.state}`)}</p>
      )}
    </>
  );
}

function RequestWays({
  request: { answer },
  ways,
}: {
  request: ElderRequest;
  ways: NonNullable<ElderRequestsProps['ways']>;
}) {
  const { t } = useTranslation('calendars');
  return (
    <>
      <div className="flex flex-wrap gap-x-2">
        {answer.answer === 'change-this' && (
          <>
            <Button look="quiet" onClick={ways.changeDays}>
              {t('request.changeDays')}
            </Button>
            <Button look="quiet" onClick={ways.changeWords}>
              {t('request.changeWords')}
            </Button>
          </>
        )}
        <Button look="quiet" onClick={ways.takeOut}>
          {t('request.takeOut')}
        </Button>
      </div>
      {answer.answer === 'change-this' && (
        <More label={t('request.leaveStand')}>
          <p className="text-small">{t('request.leaveStandNote', { name: answer.elderName })}</p>
        </More>
      )}
    </>
  );
}
