import { describe, expect, it } from 'vitest';
import { NEW_WORD, withMoved, withWord } from '#src/features/word-lists/model/word-changes.js';

const word = (key: string) => ({ ...NEW_WORD, key, word: key });
const items = ['a', 'b', 'c'].map(word);
const keys = (list: typeof items) => list.map(({ key }) => key).join('');

describe('words of a list', () => {
  it('move by places, and stay where they are at its ends', () => {
    expect(keys(withMoved(items, 0, 2))).toBe('bca');
    expect(keys(withMoved(items, 2, 1))).toBe('acb');
    expect(keys(withMoved(items, 0, -1))).toBe('abc');
    expect(keys(withMoved(items, 2, 3))).toBe('abc');
  });

  it('are written in their place; a new one comes last', () => {
    expect(withWord(items, { ...word('b'), word: 'B' }).map((one) => one.word)).toEqual(['a', 'B', 'c']);
    expect(withWord(items, { ...NEW_WORD, word: 'new' }).at(-1)?.word).toBe('new');
  });
});
