import { useTranslation } from 'react-i18next';

/** How much is kept by its people, and how much was withdrawn: said where its givers let it be said. */
export function KeptLine({ keptCount, withdrawnCount = 0 }: { keptCount: number; withdrawnCount?: number }) {
  const { t } = useTranslation('sharing');
  if (keptCount === 0 && withdrawnCount === 0) return null;
  return (
    <div className="mt-3 text-umber-soft">
      {keptCount > 0 && <p>{t('kept', { count: keptCount })}</p>}
      {withdrawnCount > 0 && <p>{t('withdrawn', { count: withdrawnCount })}</p>}
    </div>
  );
}
