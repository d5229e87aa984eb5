import { intlLocale } from './date-words.js';

/** `steward and officer`, `seed, soil and rain`: a list as the language writes it. */
export function listWords(words: readonly string[], language: string): string {
  return new Intl.ListFormat(intlLocale(language), { type: 'conjunction' }).format(words);
}
