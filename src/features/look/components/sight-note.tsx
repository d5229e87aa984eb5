import { Eye } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import type { Look, LookSight } from '#shared/contracts/look.js';
import { useDateWords } from '#src/lib/date-words.js';
import { markerName } from '#src/lib/marker-names.js';
import { More } from '#src/ui/fold.js';

/** An offset that rounds to less than this is none. */
const EVEN_MAG = 0.15;

/** What the thick line goes by: the model of visibility as it was set, what it says by itself, or the rule of the dates. */
export function SightNote({ look: { marker, sight } }: { look: Look }) {
  const { t } = useTranslation('look');
  return (
    <More label={t('sight.show')} icon={<Eye aria-hidden size={20} />}>
      {sight.because === null ? (
        <BySetModel name={markerName(marker)} sight={sight} />
      ) : (
        <p className="mt-2">{t(`sight.dates.${sight.because}`)}</p>
      )}
    </More>
  );
}

function BySetModel({ name, sight }: { name: string; sight: LookSight }) {
  const { t, i18n } = useTranslation(['look', 'sky']);
  const dates = useDateWords();
  const { offsetMag, phenomenon, expectedDate, plainFromAt, plainToAt } = sight;
  const offset = offsetMag ?? 0;
  const mag = new Intl.NumberFormat(i18n.language, { maximumFractionDigits: 1 }).format(Math.abs(offset));
  return (
    <div className="mt-2 grid gap-1.5">
      {phenomenon !== null && expectedDate !== null && (
        <p>
          {t('sight.model', {
            marker: name,
            phenomenon: t(`sky:phenomenon.${phenomenon}`),
            day: dates.day(expectedDate, 'year'),
          })}
        </p>
      )}
      <p>
        {Math.abs(offset) < EVEN_MAG
          ? t('sight.even')
          : t(offset > 0 ? 'sight.keener' : 'sight.duller', { mag })}{' '}
        {plainFromAt === null || plainToAt === null
          ? t('sight.plainNone')
          : t('sight.plain', { from: plainFromAt, to: plainToAt })}
      </p>
    </div>
  );
}
