import { escapePattern } from '#shared/kernel/escape-pattern.js';

/** People of a village as they are called, and words that are no name of anybody though they stand in one: roles. */
export interface KnownNames {
  names: readonly string[];
  notNames: ReadonlySet<string>;
}

/** Shorter parts of a name are letters and numbers, or words like "of". */
const PART_LETTERS_MIN = 3;

/**
 * Names of people that stand in words, each as the person is called: the whole name in any case, or one of its parts as it
 * is written, with its capital, for a plant may be called as somebody is. Only whole words count.
 */
export function namesIn(words: string, { names, notNames }: KnownNames): string[] {
  const text = words.normalize('NFC');
  const whole = new Map(names.map((name) => [nameKey(name), name.trim()]));
  return [...whole.values()].filter(
    (name) =>
      name !== '' &&
      (stands(name, text, 'iu') || partsOf(name, notNames).some((part) => stands(part, text, 'u'))),
  );
}

function partsOf(name: string, notNames: ReadonlySet<string>): string[] {
  const parts = name.normalize('NFC').split(/[\s,.]+/u);
  // A single word is the whole name, which was asked already.
  if (parts.length < 2) return [];
  return parts.filter(
    (part) =>
      part.replace(/[^\p{L}\p{M}]/gu, '').length >= PART_LETTERS_MIN && !notNames.has(part.toLowerCase()),
  );
}

function stands(name: string, text: string, flags: 'u' | 'iu'): boolean {
  const words = escapePattern(plain(name)).replace(/ /gu, String.raw`\s+`);
  return new RegExp(String.raw`(?<![\p{L}\p{M}\p{N}])${words}(?![\p{L}\p{M}\p{N}])`, flags).test(text);
}

/** The same for every way to write one name. */
export function nameKey(name: string): string {
  return plain(name).toLowerCase();
}

function plain(name: string): string {
  return name.normalize('NFC').replace(/\s+/gu, ' ').trim();
}
