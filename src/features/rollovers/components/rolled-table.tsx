import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import type { RolledEntry, RolloverReport } from '#shared/contracts/rollovers.js';
import { useEntryWords } from '#src/lib/entry-words.js';
import { paths } from '#src/lib/paths.js';
import { WhyMovedLines } from '#src/lib/why-moved-lines.js';
import { Table } from '#src/ui/table.js';
import type { RolledGroup } from '../model/rolled-groups.js';

interface RolledTableProps {
  group: RolledGroup;
  entries: readonly RolledEntry[];
  report: RolloverReport;
}

/** Entries with their days in both years, and how far the day that moved most has moved. */
export function RolledTable({ group, entries, report }: RolledTableProps) {
  const { t } = useTranslation('rollovers');
  const words = useEntryWords();
  const moveWords = useMoveWords();
  const { calendarId, fromYear: from, year } = report;
  return (
    <Table middle caption={t('table.caption', { group: t(`group.${group}`, { year }), from, year })}>
      <thead>
        <tr>
          <th scope="col">{t('table.entry')}</th>
          <th scope="col">{from}</th>
          <th scope="col">{year}</th>
          <th scope="col">{t('table.move')}</th>
        </tr>
      </thead>
      <tbody>
        {entries.map((entry) => (
          <tr key={entry.entryId}>
            <th scope="row">
              <Link className="link-line" to={paths.calendar(calendarId, { entry: entry.entryId })}>
                {entry.titleOfficer}
              </Link>
              {group === 'consent' && (
                <>
                  <br />
                  <Link className="link-line" to={paths.itemConsents('entry', entry.entryId)}>
                    {t('askAgain')}
                  </Link>
                </>
              )}
            </th>
            <td>{words.window({ ...entry, warnings: entry.before.warnings }, entry.before.window, from)}</td>
            <td>{words.window({ ...entry, warnings: entry.after.warnings }, entry.after.window, year)}</td>
            <td>
              {moveWords(entry.movedDays)}
              {entry.why && (
                <div className="text-small text-umber-soft">
                  <WhyMovedLines why={entry.why} />
                </div>
              )}
            </td>
          </tr>
        ))}
      </tbody>
    </Table>
  );
}

function useMoveWords() {
  const { t } = useTranslation('rollovers');
  return (days: number | null): string => {
    if (days === null) return t('move.none');
    if (days === 0) return t('move.same');
    return t(days > 0 ? 'move.later' : 'move.earlier', { count: Math.abs(days) });
  };
}
