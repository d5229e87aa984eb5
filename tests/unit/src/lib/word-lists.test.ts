import { describe, expect, it } from 'vitest';
import type { ListedWord, WordList } from '#shared/contracts/word-lists.js';
import { chosenValue, wordOptions } from '#src/lib/word-lists.js';

const CODES = ['sow', 'weed', 'other'] as const;
const OWN = '0190a4c2-0000-4000-8000-000000000001';
const plain = { isHidden: false, fromDays: null, toDays: null };
const listed = (key: string, like: ListedWord['like'], word = '', isHidden = false): ListedWord => ({
  ...plain,
  ...{ key, like, word, isHidden },
});
const NOTHING = { code: null, word: undefined };
const labels = (
  list: WordList | undefined,
  chosen: Parameters<typeof wordOptions<(typeof CODES)[number]>>[3],
) => wordOptions(list, CODES, (code) => `usual ${code}`, chosen).map(({ label }) => label);

describe('what can be chosen', () => {
  it('stands in the village’s order and words; what is no part of the list comes last', () => {
    const items = [
      listed(OWN, 'sow', 'drop seed'),
      listed('weed', 'weed', 'pull grass'),
      listed('sow', 'sow'),
    ];
    expect(labels({ version: 1, items }, NOTHING)).toEqual([
      ...['drop seed', 'pull grass', 'usual sow', 'usual other'],
    ]);
  });

  it('leaves out what is hidden, except where it is what the entry says', () => {
    const items = [listed(OWN, 'sow', 'drop seed', true), listed('weed', 'weed'), listed('sow', 'sow')];
    const list = { version: 1, items };
    expect(labels(list, NOTHING)).not.toContain('drop seed');
    expect(labels(list, { code: 'sow', word: { id: OWN, word: 'drop seed' } })).toContain('drop seed');
  });

  it('has its usual names while the list is on its way, and what the entry says', () => {
    expect(labels(undefined, { code: 'sow', word: { id: OWN, word: 'drop seed' } })).toEqual([
      ...['usual sow', 'usual weed', 'usual other', 'drop seed'],
    ]);
  });

  it('is told by the id of the village’s own word, or by the code', () => {
    expect(chosenValue({ code: 'sow', word: { id: OWN, word: 'drop seed' } })).toBe(OWN);
    expect(chosenValue({ code: 'sow', word: { word: 'throw' } })).toBe('sow');
    expect(chosenValue(NOTHING)).toBe('');
  });
});
