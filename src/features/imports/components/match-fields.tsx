import { useTranslation } from 'react-i18next';
import { IMPORT_COLUMNS, type ImportColumn, type TableInput } from '#shared/contracts/imports.js';
import { ownTableLanguage } from '#src/lib/table-language.js';
import { SelectField } from '#src/ui/field.js';
import type { Matching } from '../model/match-columns.js';
import type { SavedTable } from '../model/read-table.js';
import { wordsOfTables } from '../model/table-languages.js';

const ORDERS = ['day-first', 'month-first'] as const;

interface MatchFieldsProps {
  table: SavedTable;
  matching: Matching;
  dayOrder: TableInput['dayOrder'];
  onMatch: (index: number, column: ImportColumn | null) => void;
  onOrder: (order: TableInput['dayOrder']) => void;
}

/** One choice for each column of the table, with what stands in it. */
export function MatchFields({ table, matching, dayOrder, onMatch, onOrder }: MatchFieldsProps) {
  const { t, i18n } = useTranslation('imports');
  const { titleOf } = wordsOfTables(ownTableLanguage(i18n.resolvedLanguage));
  return (
    <div className="grid gap-3">
      <h3>{t('match.title')}</h3>
      <p className="text-small">{t('match.what')}</p>
      <div className="grid gap-3 sm:grid-cols-2">
        {table.titles.map((title, index) => {
          const example = table.lines.map(({ cells }) => cells[index] ?? '').find((cell) => cell !== '');
          const name = title === '' ? t('match.unnamed', { number: index + 1 }) : title;
          return (
            <SelectField
              key={`${String(index)} ${title}`}
              label={
                example === undefined
                  ? t('match.columnAlone', { title: name })
                  : t('match.column', { title: name, example: short(example) })
              }
              value={matching[index] ?? ''}
              onChange={(event) => {
                const { value } = event.currentTarget;
                onMatch(index, IMPORT_COLUMNS.find((column) => column === value) ?? null);
              }}
            >
              <option value="">{t('match.none')}</option>
              {IMPORT_COLUMNS.map((column) => (
                <option key={column} value={column}>
                  {titleOf(column)}
                </option>
              ))}
            </SelectField>
          );
        })}
      </div>
      <SelectField
        label={t('match.order')}
        value={dayOrder ?? ''}
        onChange={(event) => {
          const { value } = event.currentTarget;
          onOrder(ORDERS.find((order) => order === value) ?? null);
        }}
      >
        <option value="">{t('match.orderUnsaid')}</option>
        {ORDERS.map((order) => (
          <option key={order} value={order}>
            {t(`match.${order}`)}
          </option>
        ))}
      </SelectField>
    </div>
  );
}

const SHOWN_LETTERS = 32;

function short(text: string): string {
  const letters = Array.from(text);
  return letters.length <= SHOWN_LETTERS ? text : `${letters.slice(0, SHOWN_LETTERS).join('')}…`;
}
