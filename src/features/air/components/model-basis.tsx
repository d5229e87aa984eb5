import { useTranslation } from 'react-i18next';
import type { AirAnswer } from '#shared/contracts/air.js';
import { Board } from '#src/ui/surfaces.js';

/** What the model takes for granted, and where it comes from. */
export function ModelBasis({ answer }: { answer: AirAnswer }) {
  const { t, i18n } = useTranslation('air');
  const number = new Intl.NumberFormat(i18n.language, { minimumFractionDigits: 2, maximumFractionDigits: 2 });
  const { clear, ordinary, hazy } = answer.extinctionMag;
  return (
    <Board title={t('basis')}>
      <div className="grid gap-2">
        <p>
          {t('basisAir', {
            clear: number.format(clear),
            ordinary: number.format(ordinary),
            hazy: number.format(hazy),
          })}
        </p>
        <p>{t('basisEyes')}</p>
        <p>{t('basisOpposite')}</p>
        {answer.kind === 'figure' && <p>{t('basisFigure')}</p>}
        <p className="text-small text-umber-soft">{t('basisSource')}</p>
        <p className="text-small text-umber-soft">
          {t('basisEngine', { version: answer.basis.engineVersion, source: answer.basis.thresholdSource })}
        </p>
      </div>
    </Board>
  );
}
