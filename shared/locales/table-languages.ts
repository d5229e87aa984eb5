/** Languages in which a table may be written and is offered; screens are in those of `languages.ts`. */
export const TABLE_LANGUAGES = ['en', 'es', 'fr', 'pt', 'sw'] as const;
export type TableLanguage = (typeof TABLE_LANGUAGES)[number];

/** Each as whoever speaks it calls it. */
export const TABLE_LANGUAGE_NAMES: Readonly<Record<TableLanguage, string>> = {
  en: 'English',
  es: 'Español',
  fr: 'Français',
  pt: 'Português',
  sw: 'Kiswahili',
};

/** Those whose words somebody who speaks the language has read. */
export const READ_TABLE_LANGUAGES: readonly TableLanguage[] = ['en'];
