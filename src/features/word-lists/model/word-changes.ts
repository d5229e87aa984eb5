import type { ListedWord } from '#shared/contracts/word-lists.js';

/** One that is being added has no key yet. */
export const NEW_WORD: ListedWord = {
  key: '',
  like: null,
  word: '',
  isHidden: false,
  fromDays: null,
  toDays: null,
};

/** The list with one word as it is written now; a new one comes last. */
export function withWord(items: readonly ListedWord[], word: ListedWord): ListedWord[] {
  if (word.key === '') return [...items, word];
  return items.map((item) => (item.key === word.key ? word : item));
}

/** The list with one word a place further up or down; unchanged at its ends. */
export function withMoved(items: readonly ListedWord[], from: number, to: number): ListedWord[] {
  const item = items[from];
  if (item === undefined || to < 0 || to >= items.length) return [...items];
  const rest = items.filter((_, index) => index !== from);
  return [...rest.slice(0, to), item, ...rest.slice(to)];
}
