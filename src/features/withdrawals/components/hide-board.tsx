import { Eye, EyeOff } from 'lucide-react';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { PAUSE_DAYS, type ItemState } from '#shared/contracts/withdrawals.js';
import { useDateWords } from '#src/lib/date-words.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Button } from '#src/ui/button.js';
import { Board } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { usePause, useResume, type Item } from '../api/withdrawals-api.js';
import { ForWhom } from './for-whom.js';
import { SureButton } from '#src/lib/sure-button.js';

/** Hides a thing from everybody, or brings it back as it was. */
export function HideBoard({ item, state }: { item: Item; state: ItemState }) {
  const { t } = useTranslation('withdrawals');
  return (
    <Board title={t('hide.title')}>
      {state.state === 'paused' ? <Hidden item={item} state={state} /> : <Shown item={item} state={state} />}
    </Board>
  );
}

function Shown({ item, state }: { item: Item; state: ItemState }) {
  const { t } = useTranslation('withdrawals');
  const say = useToast();
  const pause = usePause(item);
  const [askedById, setAskedById] = useState<string | null>(null);
  return (
    <div className="grid gap-3">
      <p>{t('hide.what')}</p>
      <p>{t('hide.until', { count: PAUSE_DAYS })}</p>
      {!state.isMine && <ForWhom value={askedById} onChange={setAskedById} />}
      <div>
        <SureButton
          label={t('hide.ask')}
          icon={<EyeOff aria-hidden size={20} />}
          question={t('hide.sure')}
          what={<p>{t('hide.what')}</p>}
          yes={t('hide.yes')}
          act={async () => {
            await pause.mutateAsync(askedById);
            say(t('hide.done'));
          }}
        />
      </div>
    </div>
  );
}

function Hidden({ item, state: { pausedAt, may } }: { item: Item; state: ItemState }) {
  const { t } = useTranslation('withdrawals');
  const dates = useDateWords();
  const say = useToast();
  const words = useProblemWords();
  const resume = useResume(item);
  const bringBack = async () => {
    try {
      await resume.mutateAsync();
      say(t('hide.backDone'));
    } catch (cause) {
      say(words.problem(cause));
    }
  };
  return (
    <div className="grid gap-3">
      {pausedAt !== null && <p>{t('hide.since', { when: dates.moment(pausedAt) })}</p>}
      {may.resume ? (
        <div>
          <Button
            icon={<Eye aria-hidden size={20} />}
            busy={resume.isPending}
            onClick={() => void bringBack()}
          >
            {t('hide.back')}
          </Button>
        </div>
      ) : (
        <p>{t('hide.onlyGiver')}</p>
      )}
    </div>
  );
}
