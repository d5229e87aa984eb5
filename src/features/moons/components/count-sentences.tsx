import { useTranslation } from 'react-i18next';
import type { MoonTable } from '#shared/contracts/moons.js';
import { useDateWords } from '#src/lib/date-words.js';
import { markerName } from '#src/lib/marker-names.js';
import { monthCountOf } from '../model/moon-rows.js';

/** What the sign makes of the year: twelve months or thirteen, and how sure that is. */
export function CountSentences({ table }: { table: MoonTable }) {
  const { t } = useTranslation(['moons', 'sky']);
  const dates = useDateWords();
  const { rule, year } = table;
  if (rule === null) return <p>{t('rule.lineNone')}</p>;
  const { thirteenth, localYear, nearEdgeYear, crescentMissing } = monthCountOf(table);
  if (rule.starOutcome !== 'rises-and-sets') return <p>{t(`count.${rule.starOutcome}`)}</p>;
  const [sign] = rule.signs;
  return (
    <div className="grid gap-1.5">
      {sign ? (
        <p>
          {t('count.sign', {
            star: markerName(rule.marker),
            phenomenon: t(`sky:phenomenon.${rule.phenomenon}`),
            days: dates.aboutWithin(
              sign.expected.gregorian,
              sign.early?.gregorian ?? null,
              sign.late?.gregorian ?? null,
            ),
          })}
        </p>
      ) : (
        <p>{t('count.noSign', { year: dates.year(year) })}</p>
      )}
      {thirteenth?.month ? (
        <p>
          {t('count.thirteen', {
            year: dates.year(thirteenth.month.localYear),
            day: dates.day(thirteenth.month.begins.gregorian, 'year'),
          })}
        </p>
      ) : (
        <p>{localYear === null ? t('count.notNamed') : t('count.twelve', { year: dates.year(localYear) })}</p>
      )}
      {nearEdgeYear !== null && <p>{t('count.nearEdge', { year: dates.year(nearEdgeYear) })}</p>}
      {crescentMissing && <p className="text-small text-umber-soft">{t('count.crescentMissing')}</p>}
    </div>
  );
}
