import { beforeAll, describe, expect, it } from 'vitest';
import { fontMeasurer } from '#server/print/font-measurer.js';
import { CARD_PITCH_MM } from '#shared/sheet/card-page.js';
import { monthCards } from '#shared/sheet/month-card.js';
import type { SheetPage } from '#shared/sheet/primitives.js';
import type { SheetModel } from '#shared/sheet/sheet-model.js';
import { allWords, rings, texts } from '#tests/support/sheet/page-checks.js';
import { entry, marker, upperTazimel, words } from '#tests/support/sheet/upper-tazimel-sheet.js';

let demo: SheetPage[] = [];
// Reading the typefaces for the first time is slow.
beforeAll(() => {
  demo = monthCards(upperTazimel(), fontMeasurer);
}, 60_000);

function cards(change?: Partial<SheetModel>): SheetPage[] {
  return change ? monthCards(upperTazimel(change), fontMeasurer) : demo;
}

function cardOf(month: number, change?: Partial<SheetModel>): SheetPage {
  const card = cards(change).find((page) => page.kind === 'month-card' && page.month === month);
  if (card === undefined) throw new Error(`no card for month ${month}`);
  return card;
}

describe('month cards', () => {
  it('are twelve of A4 upright, each followed by its own continuation, holes on the cards only', () => {
    const pages = cards();
    expect(pages.filter((page) => page.kind === 'month-card').map((page) => page.month)).toEqual(
      Array.from({ length: 12 }, (_, index) => index + 1),
    );
    for (const page of pages) {
      expect([page.width, page.height]).toEqual([210, 297]);
      if (page.kind !== 'month-card') expect(rings([page])).toEqual([]);
    }
    const months = pages.map((page) => page.month ?? 13);
    expect(months).toEqual(months.toSorted((a, b) => a - b));
  });

  it('hold every day of their month, 25.4 mm apart both ways, each weekday under its name', () => {
    const holes = rings([cardOf(6)]);
    expect(holes).toHaveLength(30);
    const first = holes[0];
    if (first === undefined) throw new Error('no hole');
    // 1 June 2027 is a Tuesday.
    holes.forEach((hole, index) => {
      const column = (1 + index) % 7;
      const row = Math.floor((1 + index) / 7);
      expect(hole.cx).toBeCloseTo(first.cx + (column - 1) * CARD_PITCH_MM, 3);
      expect(hole.cy).toBeCloseTo(first.cy + row * CARD_PITCH_MM, 3);
      expect(hole.radius).toBe(3);
      expect(hole.crossLength).toBe(3);
    });
  });

  it.each([
    [[true], 'star’s days'],
    [[false], 'sign’s days'],
    [[true, false], 'days of a star or sign'],
  ])('say in the key what leads: stars %j', (areStars, said) => {
    const markers = areStars.map((isStar, index) => marker({ isStar, letter: 'AB'[index] ?? 'C' }));
    const key = allWords([cardOf(6, { markers, entries: [] })]);
    expect(key).toContain(said);
    expect(key.match(/days of a star or sign|(star|sign)’s days/gu)).toEqual([said]);
  });

  it.each([
    [1, 'Mon', 1],
    [7, 'Sun', 2],
    [6, 'Sat', 3],
  ] as const)('begin the week on weekday %i where the village does', (firstWeekday, name, column) => {
    const card = cardOf(6, { firstWeekday });
    const weekdays = texts([card]).filter((text) => text.role === 'weekday');
    expect(weekdays[0]?.lines[0]?.text).toBe(name);
    expect(rings([card])[0]?.cx).toBeCloseTo(16.1 + 6.15 + column * CARD_PITCH_MM, 3);
  });

  it('repeat an entry’s number at every week of its bar', () => {
    const tags = texts([cardOf(6)]).filter(
      (text) => text.role === 'tag' && text.lines[0]?.text === '4' && text.sizePt === 12,
    );
    // 10 June to the end of the month touches the weeks of 7, 14, 21 and 28 June.
    expect(tags).toHaveLength(4);
  });

  it('write words for what comes in the month at 30 points, and only in a small list what begins or ends in it', () => {
    const june = cards({ markers: [] }).filter((page) => page.month === 6);
    const large = texts(june)
      .filter((text) => text.role === 'event-name')
      .flatMap((text) => text.lines.map((line) => line.text))
      .join(' ');
    expect(large).toContain('Seed lending');
    expect(large).toContain('Sow long millet');
    expect(large).not.toContain('Mend terraces');
    expect(allWords(june)).toContain('Mend terraces, spread manure: late days until 5\u00a0June');
    expect(allWords(june)).toContain('Sow short millet: early days from 20\u00a0June');
  });

  it('send on to the next card what does not fit, never smaller, and say so', () => {
    const entries = Array.from({ length: 12 }, (_, index) => entry({ number: index + 1 }));
    const june = cards({ entries, markers: [] }).filter((page) => page.month === 6);
    expect(june.length).toBeGreaterThan(1);
    expect(allWords(june.slice(0, 1))).toContain('More words for June stand on the next card.');
    const named = texts(june).filter(
      (text) => text.role === 'event-name' && text.lines[0]?.text.includes('Sow long'),
    );
    expect(named.every((text) => text.sizePt === 30)).toBe(true);
    const tags = texts(june).filter((text) => text.role === 'tag' && text.sizePt === 20);
    expect(new Set(tags.map((text) => text.lines[0]?.text))).toEqual(
      new Set(entries.map(({ number }) => String(number))),
    );
  });

  it('name the bars for which a week has no lane', () => {
    const entries = Array.from({ length: 7 }, (_, index) => entry({ number: index + 1 }));
    expect(allWords([cardOf(6, { entries, markers: [] })])).toContain('+ 4, 5, 6, 7');
    const crowd = Array.from({ length: 80 }, (_, index) => entry({ number: index + 1 }));
    expect(allWords([cardOf(6, { entries: crowd, markers: [] })])).toContain('+ 77 more');
  });

  it('explain only the shapes that they show', () => {
    expect(allWords([cardOf(2)])).not.toContain('best days');
    expect(allWords([cardOf(9)])).toContain('watch');
    expect(allWords([cardOf(6)])).not.toContain('watch');
    expect(allWords([cardOf(7)])).toContain('fixed day');
  });

  it('put the leap years under the holes where the leap day ends its row', () => {
    // 29 February 2032 is a Sunday.
    const model = { year: 2032, words: words(2032), label: '2032-1' };
    expect(allWords([cardOf(2, model)]).replaceAll('\n', ' ')).toContain(
      'comes only in leap years: next in 2036, 2040, 2044',
    );
    expect(allWords([cardOf(2, { year: 2028, words: words(2028), label: '2028-1' })])).toContain(
      'next 2032, 2036, 2040; skip in other years',
    );
  });

  it('carry a window over the year’s end into December alone, with the year where it ends', () => {
    const winter = entry({
      window: { earliest: '2027-12-15', bestFrom: '2027-12-20', bestTo: '2028-01-10', latest: '2028-01-15' },
    });
    const pages = cards({ entries: [winter], markers: [] });
    const december = allWords(pages.filter((page) => page.month === 12)).replaceAll('\n', ' ');
    expect(december).toContain('20\u00a0December to 10\u00a0January\u00a02028');
    expect(allWords(pages.filter((page) => page.month === 1))).not.toContain('millet');
  });
});
