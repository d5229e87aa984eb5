import { useTranslation } from 'react-i18next';
import { PATTERNS } from '#src/lib/paths.js';
import { Button } from '#src/ui/button.js';
import { Dialog } from '#src/ui/dialog.js';

export interface IssuedCode {
  name: string;
  code: string;
}

/** A one-time code in large type, to copy by hand. It cannot be shown again. */
export function CodeDialog({ issued, onClose }: { issued: IssuedCode | null; onClose: () => void }) {
  const { t } = useTranslation('people');
  return (
    <Dialog
      title={t('code.title', { name: issued?.name ?? '' })}
      isOpen={issued !== null}
      onClose={onClose}
      closesBeside={false}
    >
      <p>{t('code.lead')}</p>
      <p className="my-4 text-center text-[28px] tracking-[0.08em]" translate="no">
        <strong>{issued?.code}</strong>
      </p>
      <p className="mb-4">{t('code.how', { address: location.origin + PATTERNS.welcome })}</p>
      <Button look="main" full onClick={onClose}>
        {t('code.done')}
      </Button>
    </Dialog>
  );
}
