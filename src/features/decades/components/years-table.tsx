import { useTranslation } from 'react-i18next';
import type { LongLook, LookedEntry } from '#shared/contracts/decades.js';
import { useDateWords } from '#src/lib/date-words.js';
import { useEntryWords } from '#src/lib/entry-words.js';
import { Table } from '#src/ui/table.js';

/** The same days in words: a row for each entry, a column for each year. */
export function YearsTable({ look, entries }: { look: LongLook; entries: readonly LookedEntry[] }) {
  const { t } = useTranslation('decades');
  const words = useEntryWords();
  const dates = useDateWords();
  const years = Array.from({ length: look.years }, (_, index) => look.from + index);
  return (
    <Table caption={t('tableCaption', { from: look.from, to: look.from + look.years - 1 })}>
      <thead>
        <tr>
          <th scope="col">{t('entry')}</th>
          {years.map((year) => (
            <th key={year} scope="col">
              {dates.year(year)}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {entries.map((entry) => (
          <tr key={entry.entryId}>
            <th scope="row">{entry.titleOfficer}</th>
            {entry.years.map(({ year, window, warnings }) => (
              <td key={year}>{words.window({ ...entry, warnings }, window, year)}</td>
            ))}
          </tr>
        ))}
      </tbody>
    </Table>
  );
}
