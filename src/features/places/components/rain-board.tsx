import { useTranslation } from 'react-i18next';
import { Board } from '#src/ui/surfaces.js';
import type { FieldPart } from './place-form-parts.js';
import { RainMonths } from './rain-months.js';

export function RainBoard({ draft, change }: FieldPart) {
  const { t } = useTranslation('places');
  return (
    <Board title={t('rain.title')}>
      <RainMonths
        rainMonths={draft.rainMonths}
        onChange={(rainMonths) => {
          change({ rainMonths });
        }}
      />
      <p className="mt-2 text-small text-umber-soft">{t('rain.hint')}</p>
    </Board>
  );
}
