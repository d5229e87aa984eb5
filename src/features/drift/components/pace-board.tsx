import { useTranslation } from 'react-i18next';
import type { DriftAnswer } from '#shared/contracts/drift.js';
import { PHENOMENA } from '#shared/sky/vocabulary.js';
import { PhenomenonIcon } from '#src/ui/icons/phenomenon-icon.js';
import { Board } from '#src/ui/surfaces.js';
import { usePaceWords } from './use-pace-words.js';

/** The pace of the four days side by side: they do not move alike. */
export function PaceBoard({ drift }: { drift: DriftAnswer }) {
  const { t } = useTranslation(['drift', 'sky']);
  const paces = usePaceWords();
  return (
    <Board title={t('paces')}>
      <p className="text-small text-umber-soft">{t('pacesNote')}</p>
      <dl className="facts mt-2">
        {PHENOMENA.map((phenomenon) => (
          <div key={phenomenon} className="contents">
            <dt className="flex items-center gap-2">
              <PhenomenonIcon phenomenon={phenomenon} size={28} />
              {t(`sky:phenomenonTitle.${phenomenon}`)}
            </dt>
            <dd>{paces.short(drift.daysPerCentury[phenomenon])}</dd>
          </div>
        ))}
      </dl>
      <p className="mt-3 text-small text-umber-soft">{t('paceWhy')}</p>
    </Board>
  );
}
