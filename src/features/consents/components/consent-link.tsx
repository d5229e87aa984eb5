import { HandHeart } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import type { ConsentItemType } from '#shared/contracts/consents.js';
import { paths } from '#src/lib/paths.js';
import { ButtonLink } from '#src/ui/button.js';

/** The way from a thing to what was agreed about it. */
export function ConsentLink({ itemType, itemId }: { itemType: ConsentItemType; itemId: string }) {
  const { t } = useTranslation('consents');
  return (
    <div className="grid justify-items-start gap-1">
      <ButtonLink to={paths.itemConsents(itemType, itemId)} icon={<HandHeart aria-hidden size={20} />}>
        {t('open')}
      </ButtonLink>
      <p className="text-small text-umber-soft">{t('openHint')}</p>
    </div>
  );
}
