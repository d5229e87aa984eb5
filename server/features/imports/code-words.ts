import { plainWords } from '#shared/calendar/import-dates.js';
import type { PhraseTree } from '#shared/calendar/import-phrases.js';
import {
  BASES,
  CONFIDENCES,
  OPERATIONS,
  RECORD_SIGN_TYPES,
  REPEATS,
  STILL_SEEN,
} from '#shared/contracts/event-record.js';

/** Closed lists that a table may name by words. */
const CODE_LISTS = {
  operations: OPERATIONS,
  repeats: REPEATS,
  confidences: CONFIDENCES,
  bases: BASES,
  signTypes: RECORD_SIGN_TYPES,
  stillSeen: STILL_SEEN,
} as const;
type CodeList = keyof typeof CODE_LISTS;
type Code<L extends CodeList> = (typeof CODE_LISTS)[L][number];

/** Of one language: what each code may be called, several parted by commas; what is lacking is called by its code. */
export type CodeWords = { readonly [L in CodeList]?: { readonly [C in Code<L>]?: string } };

/** By plain words. */
export type TableCodes = { readonly [L in CodeList]: ReadonlyMap<string, Code<L>> };

export function tableCodes(languages: readonly CodeWords[]): TableCodes {
  return {
    operations: byName('operations', languages),
    repeats: byName('repeats', languages),
    confidences: byName('confidences', languages),
    bases: byName('bases', languages),
    signTypes: byName('signTypes', languages),
    stillSeen: byName('stillSeen', languages),
  };
}

function byName<L extends CodeList>(list: L, languages: readonly CodeWords[]): ReadonlyMap<string, Code<L>> {
  const codes: readonly Code<L>[] = CODE_LISTS[list];
  return new Map([
    ...languages.flatMap((words) => {
      const names: { readonly [C in Code<L>]?: string } = words[list] ?? {};
      return codes.flatMap((code) => namesOf(names[code] ?? '').map((name) => [name, code] as const));
    }),
    ...codes.map((code) => [code, code] as const),
  ]);
}

/** Names as they are compared, in a text where commas part them; each also without its accents, as keyboards leave them. */
export function namesOf(list: string): string[] {
  const names = list
    .split(',')
    .map((name) => plainWords(name))
    .filter((name) => name !== '');
  return [...new Set([...names, ...names.map(withoutAccents)])];
}

/** Ways to say things, each also without its accents. */
export function inPlainLetters(tree: PhraseTree): PhraseTree {
  return Object.fromEntries(
    Object.entries(tree).map(([part, said]): [string, string | PhraseTree] => {
      if (typeof said !== 'string') return [part, inPlainLetters(said)];
      const plain = withoutAccents(said);
      return [part, plain === said ? said : `${said}|${plain}`];
    }),
  );
}

/** Only of the product's own words: in a village's, a mark may make another word. */
function withoutAccents(text: string): string {
  return text
    .normalize('NFD')
    .replace(/\p{Mn}/gu, '')
    .normalize('NFC');
}
