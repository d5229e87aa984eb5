import { useTranslation } from 'react-i18next';
import type { NightMinutes } from '#shared/contracts/air.js';
import { CLARITIES } from '#shared/sky/vocabulary.js';
import { Table } from '#src/ui/table.js';

/** The picture's minutes as numbers, with the Moon of each night beside. */
export function MinutesTable({
  nights,
  star,
  dayAt,
}: {
  nights: readonly NightMinutes[];
  star: string;
  dayAt: (dayNumber: number) => string;
}) {
  const { t } = useTranslation('air');
  return (
    <>
      <Table caption={t('minutesCaption', { star })} className="max-w-measure">
        <thead>
          <tr>
            <th scope="col">{t('day')}</th>
            {CLARITIES.map((clarity) => (
              <th key={clarity} scope="col">
                {t(`air.${clarity}`)}
              </th>
            ))}
            <th scope="col">{t('underMoon')}</th>
          </tr>
        </thead>
        <tbody>
          {nights.map(({ dayNumber, byClarity, underMoon }) => (
            <tr key={dayNumber}>
              <th scope="row">{dayAt(dayNumber)}</th>
              {CLARITIES.map((clarity) => (
                <td key={clarity}>{byClarity[clarity]}</td>
              ))}
              <td>{underMoon}</td>
            </tr>
          ))}
        </tbody>
      </Table>
      <p className="mt-1 text-small text-umber-soft">{t('moonNote')}</p>
    </>
  );
}
