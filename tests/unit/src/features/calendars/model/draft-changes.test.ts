import { describe, expect, it } from 'vitest';
import type { DraftGlance } from '#shared/contracts/draft-changes.js';
import { newsOf } from '#src/features/calendars/model/draft-changes.js';

const told = (
  entries: readonly (readonly [string, number, { byMe?: boolean; done?: string; variant?: number }?])[],
  rest: Partial<DraftGlance> = {},
): DraftGlance => ({
  entries: entries.map(([entryId, version, { byMe = false, done = null, variant } = {}]) => ({
    ...{ entryId, version, byMe, doneTypedAt: done },
    variants: variant === undefined ? [] : [{ variantId: 'theirs', version: variant }],
  })),
  locked: false,
  publishedNumber: null,
  ...rest,
});
const held = {
  entries: [
    { id: 'sow', version: 1 },
    { id: 'weed', version: 3 },
  ],
  calendar: { locked: false, published: null },
};
const same = told([
  ['sow', 1],
  ['weed', 3],
]);

describe('news of a draft', () => {
  it('are none where the page holds it as it is, though it was done on this page', () => {
    expect(newsOf(held, null, same)).toEqual({ isOlder: false, added: [], saved: [], gone: [] });
  });

  it('name what others saved, put in and took out', () => {
    const now = told([
      ['sow', 2],
      ['reap', 1],
    ]);
    expect(newsOf(held, same, now)).toEqual({
      isOlder: true,
      added: ['reap'],
      saved: ['sow'],
      gone: ['weed'],
    });
  });

  it('take in what the same person did elsewhere without naming it', () => {
    const now = told([
      ['sow', 2, { byMe: true }],
      ['weed', 3],
    ]);
    expect(newsOf(held, same, now)).toEqual({ isOlder: true, added: [], saved: [], gone: [] });
  });

  it.each([
    [
      'another order',
      told([
        ['weed', 3],
        ['sow', 1],
      ]),
    ],
    ['a submission that is out', { ...same, locked: true }],
    ['a published version', { ...same, publishedNumber: 1 }],
    [
      'a day that was typed',
      told([
        ['sow', 1, { done: '2027-06-24T06:00:00.000Z' }],
        ['weed', 3],
      ]),
    ],
  ])('are an older page for %s', (_, now) => {
    expect(newsOf(held, same, now)).toMatchObject({ isOlder: true, saved: [], gone: [] });
  });

  it('never take a page for older than it is: its own answer came before the glance', () => {
    const ahead = { ...held, entries: [{ id: 'sow', version: 2 }, ...held.entries.slice(1)] };
    expect(newsOf(ahead, same, same).isOlder).toBe(false);
  });

  it('ask for other timings anew where one was put in, saved or taken out', () => {
    const with1 = told([
      ['sow', 1, { variant: 1 }],
      ['weed', 3],
    ]);
    const with2 = told([
      ['sow', 1, { variant: 2 }],
      ['weed', 3],
    ]);
    const older = [newsOf(held, same, with1), newsOf(held, with1, with2), newsOf(held, with2, same)];
    expect(older.map(({ isOlder }) => isOlder)).toEqual([true, true, true]);
    expect(newsOf(held, with1, with1).isOlder).toBe(false);
  });
});
