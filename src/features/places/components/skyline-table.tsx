import { useTranslation } from 'react-i18next';
import type { SkylinePoint } from '#shared/contracts/places.js';
import { Table } from '#src/ui/table.js';
import { useSkylineWords } from './skyline-words.js';

/** The table behind the silhouette. */
export function SkylineTable({ points }: { points: readonly SkylinePoint[] }) {
  const { t } = useTranslation('places');
  const words = useSkylineWords();
  return (
    <Table caption={t('skyline.tableCaption')} className="max-w-form">
      <thead>
        <tr>
          <th scope="col">{t('skyline.tableAzimuth')}</th>
          <th scope="col">{t('skyline.tableWords')}</th>
          <th scope="col">{t('skyline.tableHeight')}</th>
        </tr>
      </thead>
      <tbody>
        {points.map((point) => (
          <tr key={point.azimuthDeg}>
            <th scope="row">{words.degrees(point.azimuthDeg)}</th>
            <td>{words.direction(point.azimuthDeg)}</td>
            <td>{words.degrees(point.altitudeDeg)}</td>
          </tr>
        ))}
      </tbody>
    </Table>
  );
}
