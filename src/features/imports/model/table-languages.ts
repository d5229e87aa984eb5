import { TABLE_LANGUAGES, type TableLanguage } from '#shared/locales/table-languages.js';
import { tableTexts } from '#shared/locales/tables.js';
import { columnWordsOf, languageOfTitles, type ImportColumnWords } from './column-words.js';

/** Words for tables of one language; titles of every other one are known, too. */
export function wordsOfTables(language: TableLanguage): ImportColumnWords {
  const others = TABLE_LANGUAGES.filter((each) => each !== language);
  return columnWordsOf([language, ...others].map((each) => tableTexts[each]));
}

/** The language in which a table's titles are; where none is in any, that of the person. */
export function tableLanguageOf(titles: readonly string[], own: string): TableLanguage {
  const ownFirst = [...TABLE_LANGUAGES].sort((a, b) => Number(b === own) - Number(a === own));
  return languageOfTitles(titles, ownFirst, tableTexts) ?? TABLE_LANGUAGES[0];
}
