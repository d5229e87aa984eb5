import { FileInput } from 'lucide-react';
import { useQuery } from '@tanstack/react-query';
import { useTranslation } from 'react-i18next';
import type { Calendar } from '#shared/contracts/calendars.js';
import type { ImportColumn, ReadLine } from '#shared/contracts/imports.js';
import { markersQuery } from '#src/lib/calendar-queries.js';
import type { NamesByKey } from '#src/lib/marker-names.js';
import { useEntryWords } from '#src/lib/entry-words.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Button } from '#src/ui/button.js';
import { Care } from '#src/ui/surfaces.js';
import { Table } from '#src/ui/table.js';
import { LandingDays } from './landing-days.js';

interface ReadLinesProps {
  lines: readonly ReadLine[];
  /** As the table calls its column. */
  columnName: (column: ImportColumn) => string;
  calendar: Pick<Calendar, 'placeId' | 'year'>;
  isBusy: boolean;
  onBring: () => void;
}

/** What every line becomes, or what is the matter with it; those that need another look come first. */
export function ReadLines({ lines, columnName, calendar, isBusy, onBring }: ReadLinesProps) {
  const { t } = useTranslation('imports');
  const { placeId, year } = calendar;
  const markers = useQuery(markersQuery(placeId, year)).data?.byKey ?? NO_NAMES;
  const wrong = lines.filter(({ problems }) => problems.length > 0);
  const right = lines.filter(({ problems }) => problems.length === 0);
  return (
    <div className="grid gap-3">
      <h3>{t('lines.title')}</h3>
      {wrong.length > 0 ? (
        <Care role="status">
          <p>{t('lines.wrong', { count: wrong.length })}</p>
        </Care>
      ) : (
        <p role="status">{t('lines.allGood', { count: lines.length })}</p>
      )}
      <Table caption={t('lines.caption')}>
        <thead>
          <tr>
            <th scope="col">{t('lines.line')}</th>
            <th scope="col">{t('lines.entry')}</th>
            <th scope="col">{t('lines.becomes')}</th>
          </tr>
        </thead>
        <tbody>
          {[...wrong, ...right].map((line) => (
            <tr key={line.line}>
              <td>{line.line}</td>
              <th scope="row">{line.title}</th>
              <td>
                <Becomes line={line} columnName={columnName} year={year} markers={markers} />
              </td>
            </tr>
          ))}
        </tbody>
      </Table>
      {wrong.length === 0 && (
        <>
          <p className="text-small">{t('lines.levels')}</p>
          <Button look="main" busy={isBusy} icon={<FileInput aria-hidden size={20} />} onClick={onBring}>
            {t('lines.bring', { count: lines.length })}
          </Button>
        </>
      )}
    </div>
  );
}

const NO_NAMES: NamesByKey = new Map();

interface BecomesProps {
  line: ReadLine;
  columnName: ReadLinesProps['columnName'];
  year: number;
  markers: NamesByKey;
}

/** Its days, and how its words were understood: what it goes by. */
function Becomes({ line, columnName, year, markers }: BecomesProps) {
  const { t } = useTranslation('imports');
  const words = useEntryWords();
  const problems = useProblemWords();
  if (line.problems.length > 0) {
    return (
      <ul className="grid gap-1">
        {line.problems.map(({ column, code }) => (
          <li key={`${column} ${code}`}>
            {t('lines.problem', { column: columnName(column), remedy: problems.field(code) })}
          </li>
        ))}
      </ul>
    );
  }
  const { lead } = line;
  return (
    <>
      <LandingDays coming={line} year={year} />
      {lead !== null && !('entryId' in lead) && <p className="text-small">{words.lead({ lead }, markers)}</p>}
    </>
  );
}
