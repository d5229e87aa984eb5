import { useTranslation } from 'react-i18next';
import type { ChartStar } from '#shared/contracts/figures.js';
import { TickField } from '#src/ui/field.js';
import { Table } from '#src/ui/table.js';

/** Bright ones first: the faint end of a crowded field is only scrolled past. */
const ROWS_MAX = 40;

/** The stars of the picture as a table; with `onToggle` each can be put in and taken out. */
export function ChartTable({
  stars,
  memberHrs,
  nameOf,
  onToggle,
}: {
  stars: readonly ChartStar[];
  memberHrs: readonly number[];
  nameOf: (star: ChartStar) => string;
  onToggle: ((hr: number) => void) | null;
}) {
  const { t, i18n } = useTranslation('figures');
  const number = new Intl.NumberFormat(i18n.language, { maximumFractionDigits: 1, minimumFractionDigits: 1 });
  const rows = [...stars].sort((a, b) => a.vMag - b.vMag).slice(0, ROWS_MAX);
  return (
    <Table caption={t('table.caption')} middle>
      <thead>
        <tr>
          <th scope="col">{t('table.star')}</th>
          <th scope="col">{t('table.brightness')}</th>
          <th scope="col">{t('table.where')}</th>
        </tr>
      </thead>
      <tbody>
        {rows.map((star) => (
          <tr key={star.hr}>
            <th scope="row">
              {onToggle === null ? (
                nameOf(star)
              ) : (
                <TickField
                  label={nameOf(star)}
                  checked={memberHrs.includes(star.hr)}
                  onChange={() => {
                    onToggle(star.hr);
                  }}
                />
              )}
            </th>
            <td>{number.format(star.vMag)}</td>
            <td dir="ltr">
              {t('table.place', {
                rightAscension: number.format(star.rightAscensionDeg),
                declination: number.format(star.declinationDeg),
              })}
            </td>
          </tr>
        ))}
      </tbody>
    </Table>
  );
}
