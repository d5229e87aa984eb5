import { useTranslation } from 'react-i18next';
import { useDateWords } from '#src/lib/date-words.js';
import { useEntryWords, type NamesByKey } from '#src/lib/entry-words.js';
import { Table } from '#src/ui/table.js';
import type { ShownEntry } from '../model/preview-dates.js';

const COLUMNS = ['entry', 'lead', 'earliest', 'bestFrom', 'bestTo', 'lastAdvised'] as const;
const DAYS = ['earliest', 'bestFrom', 'bestTo', 'lastAdvised'] as const;

/** The strip as a table. */
export function StripTable({
  entries,
  year,
  markers,
}: {
  entries: readonly ShownEntry[];
  year: number;
  markers: NamesByKey;
}) {
  const { t } = useTranslation('calendars');
  const dates = useDateWords();
  const words = useEntryWords();
  return (
    <Table caption={t('strip.tableCaption', { year })}>
      <thead>
        <tr>
          {COLUMNS.map((column) => (
            <th key={column} scope="col">
              {t(`strip.column.${column}`)}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {entries.map(({ id, content, dates: found }) => (
          <tr key={id}>
            <th scope="row">{content.titleOfficer || t('editor.untitled')}</th>
            <td>{words.leadAlone(content, markers)}</td>
            {found?.window ? (
              DAYS.map((day) => <td key={day}>{found.window && dates.day(found.window[day], 'short')}</td>)
            ) : (
              <td colSpan={DAYS.length}>{t('days.none', { year })}</td>
            )}
          </tr>
        ))}
      </tbody>
    </Table>
  );
}
