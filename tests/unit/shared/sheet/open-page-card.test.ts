import { describe, expect, it } from 'vitest';
import { fontMeasurer } from '#server/print/font-measurer.js';
import { layoutOpenPageCard, type OpenPageCardModel } from '#shared/sheet/open-page-card.js';
import { allWords, boundsOf, SAFE_MARGIN_MM } from '#tests/support/sheet/page-checks.js';

const SIZE = 37;
const KEY = 'ABCD-EFGH-JKMN-PQRS-TUVW';

function model(changes: Partial<OpenPageCardModel> = {}): OpenPageCardModel {
  return {
    title: 'The year’s work of Upper Tazimel',
    what: 'Which work is done on which days, and by which star: what the village itself opened to everybody.',
    forAll: 'Anybody can read this.',
    squares: { size: SIZE, isDark: (row, column) => (row + column) % 3 !== 0 },
    how: 'Hold a telephone’s camera over the squares. Or type this address, all of it in one piece:',
    address: ['calendar.example.org/open?page=', KEY],
    foot: ['The village can switch the page off on any day.', 'Printed on 2 December 2026.'],
    ...changes,
  };
}

const LONG_NAME = 'A village with a very long name indeed, and one more '.repeat(2).slice(0, 120);

describe.each([
  ['a short name', model()],
  ['the longest name', model({ title: `The year’s work of ${LONG_NAME}` })],
  ['a long address', model({ address: [`${'calendar-of-the-village.'.repeat(4)}org/open?page=`, KEY] })],
])('a card to hang up with %s', (_what, card) => {
  const page = layoutOpenPageCard(card, fontMeasurer);
  const squares = page.primitives.filter((each) => each.type === 'rect');
  const [left, right] = [
    Math.min(...squares.map(({ x }) => x)),
    Math.max(...squares.map(({ x, width }) => x + width)),
  ];
  const [top, bottom] = [
    Math.min(...squares.map(({ y }) => y)),
    Math.max(...squares.map(({ y, height }) => y + height)),
  ];
  const squareMm = Math.min(...squares.map(({ width }) => width));

  it('is one piece of A5 with all its words inside the margin that printers leave blank', () => {
    expect([page.width, page.height]).toEqual([148, 210]);
    for (const primitive of page.primitives) {
      const { x, y, width, height } = boundsOf(primitive);
      expect(Math.min(x, y, page.width - x - width, page.height - y - height)).toBeGreaterThanOrEqual(
        SAFE_MARGIN_MM,
      );
    }
  });

  it('cuts nothing: every word stands there, the address in its own letters', () => {
    const words = allWords([page]).replace(/\s+/gu, ' ');
    for (const text of [card.title, card.what, card.forAll, card.how, ...card.foot]) {
      expect(words).toContain(text.trim());
    }
    expect(words.replaceAll(' ', '')).toContain(card.address.join(''));
  });

  it('leaves four squares of quiet ground around the code, as readers need it (ISO/IEC 18004, from memory)', () => {
    const quietMm = 4 * squareMm - 0.05;
    for (const primitive of page.primitives) {
      if (primitive.type === 'rect') continue;
      const box = boundsOf(primitive);
      const isBeside = box.x + box.width <= left - quietMm || box.x >= right + quietMm;
      const isApart = box.y + box.height <= top - quietMm || box.y >= bottom + quietMm;
      expect(isBeside || isApart).toBe(true);
    }
  });

  it('has squares large enough for a plain telephone at arm’s length', () => {
    expect(right - left).toBeGreaterThanOrEqual(45);
  });
});

it('breaks the address before the key, so that its letters stand together', () => {
  const lines = allWords([layoutOpenPageCard(model(), fontMeasurer)]).split('\n');
  expect(lines).toContain('calendar.example.org/open?page=');
  expect(lines).toContain(KEY);
});
