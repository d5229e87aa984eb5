import { texts as en } from './en/tables.js';
import { texts as es } from './es/tables.js';
import { texts as fr } from './fr/tables.js';
import { texts as pt } from './pt/tables.js';
import { texts as sw } from './sw/tables.js';

/** Languages in which a table may be written and is offered to be filled in; screens are in those of `languages.ts`. */
export const TABLE_LANGUAGES = ['en', 'es', 'fr', 'pt', 'sw'] as const;
export type TableLanguage = (typeof TABLE_LANGUAGES)[number];

/** Those whose words somebody who speaks the language has read. */
export const READ_TABLE_LANGUAGES: readonly TableLanguage[] = ['en'];

export const tableTexts = { en, es, fr, pt, sw } as const;
