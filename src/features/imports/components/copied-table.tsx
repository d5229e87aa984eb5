import { useTranslation } from 'react-i18next';
import type { VillageCopy } from '#shared/contracts/imports.js';
import { Table } from '#src/ui/table.js';
import { LandingDays } from './landing-days.js';

/** What becomes of each entry in the other village; what stays behind says why. */
export function CopiedTable({ entries, year }: { entries: VillageCopy['entries']; year: number }) {
  const { t } = useTranslation('imports');
  if (entries.length === 0) return <p role="status">{t('copy.nothing')}</p>;
  return (
    <Table caption={t('copy.caption')}>
      <thead>
        <tr>
          <th scope="col">{t('copy.entry')}</th>
          <th scope="col">{t('copy.becomes')}</th>
        </tr>
      </thead>
      <tbody>
        {entries.map((entry, index) => (
          <tr key={`${String(index)} ${entry.title}`}>
            <th scope="row">{entry.title}</th>
            <td>
              {entry.comes && <LandingDays coming={entry} year={year} />}
              {entry.notes.map((note) => (
                <p key={note} className="text-small">
                  {t(`copy.note.${note}`)}
                </p>
              ))}
            </td>
          </tr>
        ))}
      </tbody>
    </Table>
  );
}
