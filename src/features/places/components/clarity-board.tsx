import { useTranslation } from 'react-i18next';
import { Board } from '#src/ui/surfaces.js';
import { ClarityMonths } from './clarity-months.js';
import type { FieldPart } from './place-form-parts.js';

export function ClarityBoard({ draft, change }: FieldPart) {
  const { t } = useTranslation('places');
  return (
    <Board title={t('clarity.title')}>
      <ClarityMonths
        clarityByMonth={draft.clarityByMonth}
        onChange={(clarityByMonth) => {
          change({ clarityByMonth });
        }}
      />
      <p className="mt-2 text-small text-umber-soft">{t('clarity.hint')}</p>
    </Board>
  );
}
