import { Download, UserRoundX } from 'lucide-react';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { ApiProblem } from '#src/lib/api-problem.js';
import { paths } from '#src/lib/paths.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { useSession } from '#src/lib/session.js';
import { SureButton } from '#src/lib/sure-button.js';
import { ButtonAnchor, ButtonLink } from '#src/ui/button.js';
import { TextField } from '#src/ui/field.js';
import { PickGroup } from '#src/ui/pick.js';
import { Board } from '#src/ui/surfaces.js';
import { ownDataUrl, useLeave } from '../api/privacy-api.js';

/** What is kept about the person: to read about, to take along, and to leave behind. */
export function OwnDataBoard() {
  const { t } = useTranslation('privacy');
  return (
    <Board title={t('own')}>
      <p className="mb-3">{t('ownLead')}</p>
      <div className="flex flex-wrap gap-3">
        <ButtonLink look="quiet" to={paths.privacy()}>
          {t('link')}
        </ButtonLink>
        <ButtonAnchor href={ownDataUrl()} download="dawnpeg.json" icon={<Download aria-hidden size={20} />}>
          {t('download')}
        </ButtonAnchor>
        <Leave />
      </div>
    </Board>
  );
}

function Leave() {
  const { t } = useTranslation('privacy');
  const words = useProblemWords();
  const leave = useLeave();
  const byCard = useSession().card !== null;
  const [secret, setSecret] = useState('');
  const [takeBackGiven, setTakeBackGiven] = useState(false);
  const code = leave.error instanceof ApiProblem ? leave.error.errors[0]?.code : undefined;
  return (
    <SureButton
      label={t('leave')}
      look="quiet"
      icon={<UserRoundX aria-hidden size={20} />}
      question={t('leaveTitle')}
      what={
        <div className="grid gap-4">
          <p>{t('leaveWhat')}</p>
          <PickGroup
            label={t('given')}
            stacked
            value={takeBackGiven ? 'goes' : 'stays'}
            onChange={(choice) => {
              setTakeBackGiven(choice === 'goes');
            }}
            options={(['stays', 'goes'] as const).map((value) => ({
              value,
              label: t(`gives.${value}.name`),
              note: t(`gives.${value}.note`),
            }))}
          />
          <TextField
            label={t(byCard ? 'pin' : 'password')}
            type="password"
            inputMode={byCard ? 'numeric' : undefined}
            autoComplete={byCard ? 'off' : 'current-password'}
            value={secret}
            problem={code === undefined ? undefined : words.field(code)}
            onChange={(event) => {
              setSecret(event.currentTarget.value);
            }}
          />
        </div>
      }
      yes={t('yes')}
      tick={{ label: t('tick'), reason: t('tickFirst') }}
      act={async () => {
        await leave.mutateAsync({ ...(byCard ? { pin: secret } : { password: secret }), takeBackGiven });
      }}
    />
  );
}
