import { UserRoundX } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { Board } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { useTakeNameOff, type Item } from '../api/withdrawals-api.js';
import { SureButton } from '#src/lib/sure-button.js';

/** The thing stays, its giver is named no more. */
export function NameBoard({ item }: { item: Item }) {
  const { t } = useTranslation('withdrawals');
  const say = useToast();
  const takeOff = useTakeNameOff(item);
  return (
    <Board title={t('name.title')}>
      <p className="mb-3">{t('name.what')}</p>
      <SureButton
        label={t('name.ask')}
        icon={<UserRoundX aria-hidden size={20} />}
        question={t('name.sure')}
        what={<p>{t('gone.cannot')}</p>}
        yes={t('name.yes')}
        act={async () => {
          await takeOff.mutateAsync();
          say(t('name.done'));
        }}
      />
    </Board>
  );
}
