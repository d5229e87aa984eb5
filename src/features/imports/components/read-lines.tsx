import { FileInput } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import type { ReadLine } from '#shared/contracts/imports.js';
import { useEntryWords } from '#src/lib/entry-words.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Button } from '#src/ui/button.js';
import { Care } from '#src/ui/surfaces.js';
import { Table } from '#src/ui/table.js';
import { useImportColumnWords } from '../model/use-import-words.js';

interface ReadLinesProps {
  lines: readonly ReadLine[];
  year: number;
  isBusy: boolean;
  onBring: () => void;
}

/** What every line becomes, or what is the matter with it; those that need another look come first. */
export function ReadLines({ lines, year, isBusy, onBring }: ReadLinesProps) {
  const { t } = useTranslation('imports');
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
                <Becomes line={line} year={year} />
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

function Becomes({ line, year }: { line: ReadLine; year: number }) {
  const { t } = useTranslation('imports');
  const words = useEntryWords();
  const problems = useProblemWords();
  const { titleOf } = useImportColumnWords();
  if (line.problems.length > 0) {
    return (
      <ul className="grid gap-1">
        {line.problems.map(({ column, code }) => (
          <li key={`${column} ${code}`}>
            {t('lines.problem', { column: titleOf(column), remedy: problems.field(code) })}
          </li>
        ))}
      </ul>
    );
  }
  if (line.window === null) return t('lines.noDay');
  return words.window(line, line.window, year);
}
