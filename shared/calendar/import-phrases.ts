import { escapePattern } from '#shared/kernel/escape-pattern.js';

/** A way to say something with holes for what differs, `{{star}} due south at {{hour}}`, held against a cell as a whole. */
export interface ImportPhrase {
  /** What it says, as in the product's own texts: `due-meridian`, `south`. */
  path: readonly string[];
  pattern: RegExp;
}

/** What may differ within a phrase. */
export type PhraseHole =
  | 'star'
  | 'phenomenon'
  | 'hour'
  | 'depth'
  | 'altitude'
  | 'count'
  | 'day'
  | 'month'
  | 'year'
  | 'sign'
  | 'number'
  | 'azimuth'
  | 'compass'
  | 'point'
  | 'ridge'
  | 'entry'
  | 'name';

export interface SaidPhrase {
  path: readonly string[];
  holes: Readonly<Partial<Record<PhraseHole, string>>>;
}

/** Texts by where they stand: names of signs, as the product's own language files hold them. */
export interface PhraseTree {
  readonly [part: string]: string | PhraseTree;
}

const HOLE = /\{\{(\w+)\}\}/u;
const PLURAL = /_(?:zero|one|two|few|many|other)$/u;
const NUMBER = String.raw`\d{1,3}(?:[.,]\d+)?`;
/** Holes that hold figures or one word; all others hold words. */
const FIGURES: Readonly<Record<string, string>> = {
  hour: String.raw`\d{1,2}(?:[:.]\d{2})?`,
  ...{ day: String.raw`\d{1,2}`, month: String.raw`\p{L}+\.?`, year: String.raw`\d{4}` },
  ...{ depth: NUMBER, altitude: NUMBER, azimuth: NUMBER, count: NUMBER, number: NUMBER },
};

/**
 * Every phrase of a tree of texts; one text may hold several, parted by `|`. Those that say most in words of their own come
 * first, so that "planned date of {{entry}}" is asked before "planned {{entry}}".
 */
export function phrasesOf(...trees: readonly PhraseTree[]): ImportPhrase[] {
  return trees
    .flatMap((tree) => leavesOf(tree, []))
    .flatMap(({ path, text }) =>
      text.split('|').flatMap((each) => {
        const plain = each.trim();
        return plain === '' ? [] : [{ path, text: plain }];
      }),
    )
    .sort((a, b) => ownLetters(b.text) - ownLetters(a.text))
    .map(({ path, text }) => ({ path, pattern: patternOf(text) }));
}

/** The first phrase that the words are, with what stands in its holes. */
export function saidBy(words: string, phrases: readonly ImportPhrase[]): SaidPhrase | null {
  const text = levelled(words);
  for (const { path, pattern } of phrases) {
    const found = pattern.exec(text);
    if (found !== null) return { path, holes: found.groups ?? {} };
  }
  return null;
}

function leavesOf(tree: PhraseTree, above: readonly string[]): { path: readonly string[]; text: string }[] {
  return Object.entries(tree).flatMap(([part, value]) => {
    const path = [...above, part.replace(PLURAL, '')];
    return typeof value === 'string' ? [{ path, text: value }] : leavesOf(value, path);
  });
}

function patternOf(text: string): RegExp {
  const parts = levelled(text).split(HOLE);
  // Every second part is the name of a hole.
  const pattern = parts.map((part, index) => (index % 2 === 1 ? holeOf(part) : wordsOf(part))).join('');
  return new RegExp(`^(?:the )?${pattern}$`, 'iu');
}

function holeOf(name: string): string {
  return `(?<${name}>${FIGURES[name] ?? '.+?'})`;
}

/** A comma more or less between words is no other phrase; alone it parts what stands before it from what follows. */
function wordsOf(text: string): string {
  const escaped = escapePattern(text).replace(/°/gu, ' ?°');
  return /\p{L}/u.test(text) ? escaped.replace(/,/gu, ',?') : escaped;
}

/** Composed, one space between words, one kind of apostrophe. */
function levelled(text: string): string {
  return text.normalize('NFC').replace(/['’ʼ]/gu, '’').replace(/\s+/gu, ' ').trim();
}

function ownLetters(text: string): number {
  return text.split(HOLE).reduce((sum, part, index) => sum + (index % 2 === 1 ? 0 : part.length), 0);
}
