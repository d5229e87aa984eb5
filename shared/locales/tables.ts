import { texts as en } from './en/tables.js';
import { texts as es } from './es/tables.js';
import { texts as fr } from './fr/tables.js';
import { texts as pt } from './pt/tables.js';
import { texts as sw } from './sw/tables.js';

/** All that is said in tables, by the languages of `table-languages.ts`. */
export const tableTexts = { en, es, fr, pt, sw } as const;
