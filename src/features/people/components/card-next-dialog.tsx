import { IdCard } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { paths } from '#src/lib/paths.js';
import { Button, ButtonLink } from '#src/ui/button.js';
import { Dialog } from '#src/ui/dialog.js';

/** Somebody without an address was added: how they come in, and the way to it. */
export function CardNextDialog({ name, onClose }: { name: string | null; onClose: () => void }) {
  const { t } = useTranslation('people');
  return (
    <Dialog title={t('add.added', { name: name ?? '' })} isOpen={name !== null} onClose={onClose}>
      <div className="grid gap-4">
        <p>{t('add.cardNext', { name: name ?? '' })}</p>
        <ButtonLink look="main" full to={paths.villageCards()} icon={<IdCard aria-hidden size={22} />}>
          {t('add.toCards')}
        </ButtonLink>
        <Button full onClick={onClose}>
          {t('add.later')}
        </Button>
      </div>
    </Dialog>
  );
}
