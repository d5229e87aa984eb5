import { describe, expect, it } from 'vitest';
import { layoutSignInCard, type SignInCardModel } from '#shared/sheet/sign-in-card.js';
import { fontMeasurer } from '#server/print/font-measurer.js';

const SIZE = 33;

function model(changes: Partial<SignInCardModel> = {}): SignInCardModel {
  return {
    size: 'a6',
    title: 'Sign-in card',
    villageName: 'Upper Tazimel',
    name: 'Grandmother',
    how: 'Scan the squares, or type the letters. Then your PIN.',
    care: 'Tell nobody your PIN.',
    address: 'calendar.example.org/card',
    codeGroups: ['ABC', 'DEF', 'GHJ', 'KMN', 'PQR', 'STU'],
    squares: { size: SIZE, isDark: (row, column) => (row + column) % 3 !== 0 },
    ...changes,
  };
}

describe.each(['a6', 'a7'] as const)('a card of %s', (size) => {
  const page = layoutSignInCard(
    model({ size, villageName: 'A village with a very long name '.repeat(4) }),
    fontMeasurer,
  );
  const squares = page.primitives.filter((each) => each.type === 'rect');
  const texts = page.primitives.filter((each) => each.type === 'text');

  it('keeps all words on the paper and off the squares', () => {
    const right = Math.max(...squares.map(({ x, width }) => x + width));
    const bottom = Math.max(...squares.map(({ y, height }) => y + height));
    for (const { box } of texts) {
      expect(box.x + box.width).toBeLessThanOrEqual(page.width);
      expect(box.y + box.height).toBeLessThanOrEqual(page.height);
      expect(box.x >= right || box.y >= bottom).toBe(true);
    }
  });

  it('leaves four squares of quiet ground around the code, as readers need it (ISO/IEC 18004, from memory)', () => {
    const left = Math.min(...squares.map(({ x }) => x));
    const squareMm = Math.min(...squares.map(({ width }) => width));
    const words = texts.filter(({ box }) => box.y < (squares.at(-1)?.y ?? 0));
    expect(left).toBeGreaterThanOrEqual(4 * squareMm);
    for (const { box } of words) {
      const right = Math.max(...squares.map(({ x, width }) => x + width));
      expect(box.x - right).toBeGreaterThanOrEqual(4 * squareMm);
    }
  });

  it('draws every dark square and no light one', () => {
    const squareMm = Math.min(...squares.map(({ width }) => width));
    const drawn = squares.reduce((sum, { width }) => sum + Math.round(width / squareMm), 0);
    const { isDark } = model().squares;
    const dark = Array.from({ length: SIZE * SIZE }, (_, index) =>
      isDark(Math.floor(index / SIZE), index % SIZE),
    ).filter(Boolean);
    expect(drawn).toBe(dark.length);
  });
});

it('always has the letters of the code: without them a broken camera shuts the door', () => {
  const page = layoutSignInCard(model({ size: 'a7', how: 'Long words '.repeat(40) }), fontMeasurer);
  const words = page.primitives.flatMap((each) =>
    each.type === 'text' ? each.lines.map(({ text }) => text) : [],
  );
  expect(words.join(' ')).toContain('ABC');
  expect(words.join(' ')).toContain('STU');
});
