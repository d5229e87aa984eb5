import { Table as TableIcon } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import type { Look } from '#shared/contracts/look.js';
import { markerName } from '#src/lib/marker-names.js';
import { More } from '#src/ui/fold.js';
import { Table } from '#src/ui/table.js';
import { useLookWords } from '../model/use-look-words.js';

/** The picture as a table, behind one key. */
export function PathTable({ look }: { look: Look }) {
  const { t } = useTranslation('look');
  const words = useLookWords();
  return (
    <div className="mt-3">
      <More label={t('table.show')} icon={<TableIcon aria-hidden size={20} />}>
        <Table caption={t('table.caption', { marker: markerName(look.marker) })} className="mt-2">
          <thead>
            <tr>
              <th scope="col">{t('table.time')}</th>
              <th scope="col">{t('table.compass')}</th>
              <th scope="col">{t('table.height')}</th>
              <th scope="col">{t('table.sun')}</th>
              <th scope="col">{t('table.seen')}</th>
            </tr>
          </thead>
          <tbody>
            {look.path.map((moment, index) => (
              <tr key={`${moment.localTime} ${index}`}>
                <th scope="row">{moment.localTime}</th>
                <td>
                  {words.compass(moment.azimuthDeg)},{' '}
                  {t('table.deg', { value: Math.round(moment.azimuthDeg) % 360 })}
                </td>
                <td>
                  {moment.isUp
                    ? t('table.heightOf', {
                        hands: words.hands(moment.aboveSkylineDeg),
                        value: Math.round(moment.aboveSkylineDeg),
                      })
                    : t('table.behind')}
                </td>
                <td>{t('table.deg', { value: Math.round(moment.sunDepressionDeg) })}</td>
                <td>{t(moment.isSeen ? 'table.isSeen' : moment.isUp ? 'table.tooLight' : 'table.no')}</td>
              </tr>
            ))}
          </tbody>
        </Table>
      </More>
    </div>
  );
}
