import { useTranslation } from 'react-i18next';
import { useDateWords } from '#src/lib/date-words.js';
import { More } from '#src/ui/fold.js';
import { Table } from '#src/ui/table.js';
import type { SecondScale } from '../model/use-second-scale.js';

/** The second scale in words: what each part is called and when it begins. */
export function ScaleTable({ name, parts, lang }: SecondScale) {
  const { t } = useTranslation('strip');
  const dates = useDateWords();
  return (
    <More label={t('scaleTable', { scale: name })}>
      <Table caption={name}>
        <thead>
          <tr>
            <th scope="col">{t('part')}</th>
            <th scope="col">{t('begins')}</th>
          </tr>
        </thead>
        <tbody>
          {parts.map(({ dayNumber, long, ownName }) => (
            <tr key={dayNumber}>
              <th scope="row">
                {ownName !== undefined && (
                  <span className="own-words block" lang={lang}>
                    {ownName}
                  </span>
                )}
                {long}
              </th>
              <td>{dates.day(dayNumber, 'short-year')}</td>
            </tr>
          ))}
        </tbody>
      </Table>
    </More>
  );
}
