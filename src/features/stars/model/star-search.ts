import { plainWords } from './star-names.js';

/** What of a star can be searched. */
export interface Searchable {
  /** Null for a patch of sky. */
  hr: number | null;
  /** Names, designation, letter and constellation in words. */
  words: readonly string[];
}

const INFIX_LEAST = 3;

/**
 * True where every word that was typed fits: the beginning of a word of the star, or three letters anywhere in it.
 * Numbers fit whole (an HR or a Flamsteed number), or as the beginning of an HR number from three digits on.
 */
export function fitsSearch(star: Searchable, typed: string): boolean {
  return plainWords(typed.replace(/\bhr(?=\d)/giu, 'hr ')).every((word) => fitsWord(star, word));
}

function fitsWord(star: Searchable, word: string): boolean {
  if (word === 'hr') return true;
  if (/^\d+$/u.test(word)) {
    const hr = String(star.hr ?? '');
    return hr === word || (word.length >= INFIX_LEAST && hr.startsWith(word)) || star.words.includes(word);
  }
  return star.words.some((own) => own.startsWith(word) || (word.length >= INFIX_LEAST && own.includes(word)));
}
