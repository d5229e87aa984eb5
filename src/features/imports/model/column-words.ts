import type { ImportColumn } from '#shared/contracts/imports.js';
import type { ExampleLine } from './template.js';

/** How columns are called, what else they may be called, and the lines of the template. */
export interface ImportColumnWords {
  titleOf: (column: ImportColumn) => string;
  titlesOf: (column: ImportColumn) => readonly string[];
  examples: readonly ExampleLine[];
}

/** What one language says of columns; what it lacks is left out. */
export interface ColumnTexts {
  imports: {
    column?: { when?: string };
    alias?: Partial<Record<ImportColumn, string>>;
    template?: { lines?: Readonly<Record<string, ExampleLine>> };
  };
  files: { calendarCsv?: { column?: Partial<Record<ImportColumn, string>> } };
}

/**
 * Words for a person who reads in one language, where tables may be in any: the first language gives titles and template, a
 * title of every language is known. What the first one lacks comes from those behind it.
 * @param languages that of the person first, the one that is complete last
 */
export function columnWordsOf(languages: readonly ColumnTexts[]): ImportColumnWords {
  const titleIn = ({ imports, files }: ColumnTexts, column: ImportColumn) =>
    column === 'when' ? imports.column?.when : files.calendarCsv?.column?.[column];
  const titlesIn = (texts: ColumnTexts, column: ImportColumn) => [
    titleIn(texts, column) ?? '',
    ...(texts.imports.alias?.[column] ?? '').split('|'),
  ];
  const titlesOf = (column: ImportColumn) =>
    languages
      .flatMap((texts) => titlesIn(texts, column))
      .map((title) => title.trim())
      .filter((title) => title !== '');
  const lines = languages.find(({ imports }) => imports.template?.lines !== undefined)?.imports.template;
  return {
    titleOf: (column) => titlesOf(column)[0] ?? column,
    titlesOf,
    examples: Object.values(lines?.lines ?? {}),
  };
}
