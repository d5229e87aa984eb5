import { Undo2 } from 'lucide-react';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { ConsentLine } from '#shared/contracts/consents.js';
import { useCurrentCommunity } from '#src/lib/community.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Button } from '#src/ui/button.js';
import { Dialog } from '#src/ui/dialog.js';
import { Care } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { useWithdrawConsent } from '../api/consents-api.js';

/** Taking a consent back: said first what it does, for it is felt at once. */
export function Withdraw({ line }: { line: ConsentLine }) {
  const { t } = useTranslation('consents');
  const words = useProblemWords();
  const say = useToast();
  const { communityId } = useCurrentCommunity();
  const withdraw = useWithdrawConsent(communityId);
  const [asking, setAsking] = useState(false);
  const close = () => {
    setAsking(false);
  };
  const take = async () => {
    try {
      await withdraw.mutateAsync(line);
    } catch {
      // Said in the dialog.
      return;
    }
    // The button itself is gone by now: there is nothing left to take back.
    close();
    say(t('sheet.withdrawn'));
  };
  return (
    <div>
      <Button
        icon={<Undo2 aria-hidden size={20} />}
        onClick={() => {
          setAsking(true);
        }}
      >
        {t('sheet.withdraw')}
      </Button>
      <Dialog title={t('sheet.withdrawTitle')} isOpen={asking} onClose={close}>
        <div className="grid gap-4">
          <p>{t('sheet.withdrawText')}</p>
          {withdraw.error !== null && (
            <Care role="alert">
              <p>{words.problem(withdraw.error)}</p>
            </Care>
          )}
          <Button
            look="main"
            full
            busy={withdraw.isPending}
            onClick={() => {
              void take();
            }}
          >
            {t('sheet.withdrawDo')}
          </Button>
          <Button full onClick={close}>
            {t('sheet.stop')}
          </Button>
        </div>
      </Dialog>
    </div>
  );
}
