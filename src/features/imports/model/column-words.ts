import { IMPORT_COLUMNS, type ImportColumn } from '#shared/contracts/imports.js';
import type { ExampleLine } from './template.js';

/** What one language says of columns: how each is called, what else it may be called (a line parts them), and lines of the template. */
export interface ColumnTexts {
  column: Partial<Record<ImportColumn, string>>;
  alias: Partial<Record<ImportColumn, string>>;
  template: {
    lines: Readonly<Record<string, ExampleLine>>;
    /** Lines of templates of before that people may still have, where they said something else. */
    before?: Readonly<Record<string, ExampleLine>>;
  };
}

/** A title under which a column may stand. */
export type KnownTitle = readonly [title: string, column: ImportColumn];

/** How columns are called, and all other titles under which they may stand. */
export interface ImportColumnWords {
  titleOf: (column: ImportColumn) => string;
  /** What comes first counts. */
  titles: readonly KnownTitle[];
  /** Of the templates of every language, also of those of before. */
  examples: readonly ExampleLine[];
}

/**
 * Words for tables of one language where those of others are known, too: the first language names the columns, and its titles
 * come before those of the others. What it lacks comes from those behind it.
 * @param languages that of the table first
 */
export function columnWordsOf(languages: readonly ColumnTexts[]): ImportColumnWords {
  return {
    titleOf: (column) => languages.map((texts) => texts.column[column]).find(isSaid) ?? column,
    titles: [
      ...languages.flatMap((texts) => [...ownTitles(texts), ...otherTitles(texts)]),
      ...IMPORT_COLUMNS.map((column) => [column, column] as const),
    ],
    examples: languages.flatMap(({ template }) => [
      ...Object.values(template.lines),
      ...Object.values(template.before ?? {}),
    ]),
  };
}

/** The language in which most titles of a table are; of several the first. */
export function languageOfTitles<L extends string>(
  titles: readonly string[],
  languages: readonly L[],
  texts: Readonly<Record<L, ColumnTexts>>,
): L | undefined {
  const there = new Set(titles.map(plainTitle));
  const counted = languages.map((language) => ({
    language,
    count: new Set(
      [...ownTitles(texts[language]), ...otherTitles(texts[language])]
        .map(([title]) => plainTitle(title))
        .filter((title) => there.has(title)),
    ).size,
  }));
  const most = Math.max(...counted.map(({ count }) => count));
  return counted.find(({ count }) => count === most)?.language;
}

/** `Window_early` and `window early` are one title, and so are those with and without their accents. */
export function plainTitle(title: string): string {
  return title
    .normalize('NFD')
    .replace(/\p{Mn}/gu, '')
    .toLowerCase()
    .replace(/['ʼ]/gu, '’')
    .replace(/[\s_-]+/gu, ' ')
    .trim();
}

function ownTitles({ column }: ColumnTexts): KnownTitle[] {
  return IMPORT_COLUMNS.flatMap((each) => {
    const title = column[each];
    return isSaid(title) ? [[title, each] as const] : [];
  });
}

function otherTitles({ alias }: ColumnTexts): KnownTitle[] {
  return IMPORT_COLUMNS.flatMap((each) =>
    (alias[each] ?? '')
      .split('|')
      .map((title) => title.trim())
      .filter(isSaid)
      .map((title) => [title, each] as const),
  );
}

function isSaid(title: string | undefined): title is string {
  return title !== undefined && title !== '';
}
