import { RECORD_COLUMNS, type ImportColumn, type TableLine } from '#shared/contracts/imports.js';
import { csvText } from '#shared/kernel/csv.js';

/** Columns of the empty table: what a person would write by hand. */
export const TEMPLATE_COLUMNS = [
  'number',
  'titleVillage',
  'titleOfficer',
  'kind',
  'crop',
  'when',
  'bestFromDays',
  'bestToDays',
  'earliest',
  'bestFrom',
  'bestTo',
  'lastAdvised',
  'lastDate',
  'lastDateSource',
  'otherSigns',
  'ifLate',
  'caution',
  'notes',
  'giver',
  ...RECORD_COLUMNS,
] as const satisfies readonly ImportColumn[];

export type ExampleLine = Readonly<Partial<Record<ImportColumn, string>>>;

/** An empty table in somebody's language, with lines that show how. Spreadsheets read it rightly by the mark in front. */
export function templateCsv(
  titleOf: (column: ImportColumn) => string,
  examples: readonly ExampleLine[],
): string {
  const rows = examples.map((example) => TEMPLATE_COLUMNS.map((column) => example[column] ?? null));
  return `\ufeff${csvText([TEMPLATE_COLUMNS.map(titleOf), ...rows])}`;
}

/** An example that nobody changed. */
export function isExample({ cells }: TableLine, examples: readonly ExampleLine[]): boolean {
  return examples.some((example) => {
    const said = Object.entries(example).filter(([, value]) => value !== '');
    return (
      said.length === Object.keys(cells).length &&
      said.every(([column, value]) => cells[column as ImportColumn] === value)
    );
  });
}
