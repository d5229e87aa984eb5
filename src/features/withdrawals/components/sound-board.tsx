import { MicOff } from 'lucide-react';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { ItemState } from '#shared/contracts/withdrawals.js';
import { SureButton } from '#src/lib/sure-button.js';
import { Board } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { useRemoveSound, type Item } from '../api/withdrawals-api.js';
import { ForWhom } from './for-whom.js';

/** The voice goes, what was written out from it stays. */
export function SoundBoard({ item, state }: { item: Item; state: ItemState }) {
  const { t } = useTranslation('withdrawals');
  const say = useToast();
  const remove = useRemoveSound(item);
  const [askedById, setAskedById] = useState<string | null>(null);
  return (
    <Board title={t('sound.title')}>
      <div className="grid gap-3">
        <p>{t('sound.what')}</p>
        {!state.isMine && <ForWhom value={askedById} onChange={setAskedById} />}
        <div>
          <SureButton
            label={t('sound.ask')}
            icon={<MicOff aria-hidden size={20} />}
            question={t('sound.sure')}
            what={<p>{t('gone.cannot')}</p>}
            yes={t('sound.yes')}
            act={async () => {
              await remove.mutateAsync(askedById);
              say(t('sound.done'));
            }}
          />
        </div>
      </div>
    </Board>
  );
}
