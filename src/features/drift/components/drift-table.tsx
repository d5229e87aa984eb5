import { useTranslation } from 'react-i18next';
import type { DriftDay, DriftEpoch } from '#shared/contracts/drift.js';
import { useDateWords } from '#src/lib/date-words.js';
import { Table } from '#src/ui/table.js';
import { useJulianWords } from './use-julian-words.js';
import type { DriftBoardProps } from './drift-board.js';

/** The picture in numbers: each year with both calendars and the Sun's longitude. */
export function DriftTable({ drift, phenomenon, yearInUse, caption }: DriftBoardProps & { caption: string }) {
  const { t } = useTranslation('drift');
  const dates = useDateWords();
  return (
    <>
      <Table caption={caption} captionForEars={false} className="max-w-measure">
        <thead>
          <tr>
            <th scope="col">{t('table.year')}</th>
            <th scope="col">{t('table.gregorian')}</th>
            <th scope="col">{t('table.julian')}</th>
            <th scope="col">{t('table.sun')}</th>
          </tr>
        </thead>
        <tbody>
          {drift.epochs.map((epoch) => {
            const [day] = epoch.phenomena[phenomenon].occurrences;
            const year = dates.year(epoch.year);
            return (
              <tr key={epoch.year} aria-current={epoch.year === yearInUse || undefined}>
                <th scope="row">{epoch.year === yearInUse ? t('table.inUse', { year }) : year}</th>
                {day === undefined ? (
                  <td colSpan={3}>{t(`table.noDay.${whyNoDay(epoch, phenomenon)}`)}</td>
                ) : (
                  <DayCells day={day} />
                )}
              </tr>
            );
          })}
        </tbody>
      </Table>
      <p className="mt-2 text-small text-umber-soft">{t('table.sunNote')}</p>
    </>
  );
}

function DayCells({ day }: { day: DriftDay }) {
  const { i18n } = useTranslation('drift');
  const dates = useDateWords();
  const julian = useJulianWords();
  const degrees = new Intl.NumberFormat(i18n.language, {
    maximumFractionDigits: 1,
    minimumFractionDigits: 1,
  });
  return (
    <>
      <td>
        {dates.day(day.expected.gregorian)}
        {day.early !== null && day.late !== null && (
          <span className="range-line">{dates.range(day.early.gregorian, day.late.gregorian, 'short')}</span>
        )}
      </td>
      <td>{julian(day.expected.julian)}</td>
      <td>{degrees.format(day.sunLongitudeDeg)}°</td>
    </>
  );
}

function whyNoDay({ outcome, phenomena }: DriftEpoch, phenomenon: DriftBoardProps['phenomenon']) {
  if (outcome !== 'rises-and-sets') return outcome;
  return phenomena[phenomenon].outcome === 'never-dark-enough' ? 'never-dark-enough' : 'none-in-this-year';
}
