import { expect, it } from 'vitest';
import { awaitedGroups } from '#src/features/open-page/model/awaited-groups.js';

const entry = (entryId: string, awaited: Parameters<typeof awaitedGroups>[0][number]['awaited']) => ({
  ...{ entryId, title: `Title ${entryId}`, awaited, found: [], noNames: [] },
});

it('asks about a figure once, however many entries go by it, and says which', () => {
  const figure = { itemType: 'figure', itemId: 'f', what: 'nobody-asked' } as const;
  expect(awaitedGroups([entry('a', [figure]), entry('b', [figure])])).toEqual([
    { itemType: 'figure', what: 'nobody-asked', things: [{ itemId: 'f', titles: ['Title a', 'Title b'] }] },
  ]);
});

it('tells of everything that an entry waits for, and of nothing else', () => {
  const own = { itemType: 'entry', itemId: 'a', what: 'no-answer' } as const;
  const figure = { itemType: 'figure', itemId: 'f', what: 'not-open' } as const;
  const groups = awaitedGroups([entry('a', [figure, own]), entry('b', [])]);
  expect(groups.map(({ itemType, what }) => `${itemType} ${what}`)).toEqual([
    'entry no-answer',
    'figure not-open',
  ]);
});
