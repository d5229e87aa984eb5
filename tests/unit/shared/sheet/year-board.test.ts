import { beforeAll, describe, expect, it } from 'vitest';
import { fontMeasurer } from '#server/print/font-measurer.js';
import type { Box, SheetPage } from '#shared/sheet/primitives.js';
import { yearBoard } from '#shared/sheet/year-board.js';
import { allWords, boundsOf, overlap, rings, texts } from '#tests/support/sheet/page-checks.js';
import { entry, marker, upperTazimel } from '#tests/support/sheet/upper-tazimel-sheet.js';

let demo: SheetPage[] = [];
// Reading the typefaces for the first time is slow.
beforeAll(() => {
  demo = yearBoard(upperTazimel({ layout: 'year-board' }), fontMeasurer);
}, 60_000);

function tilesOf(pages: readonly SheetPage[] = demo): (SheetPage & { trim: Box })[] {
  return pages.flatMap((page) =>
    page.kind === 'tile' && page.trim !== null ? [{ ...page, trim: page.trim }] : [],
  );
}

describe('the year board', () => {
  it('is nine tiles of A4 on its side, then the sheet that hangs beside it', () => {
    const pages = demo;
    expect(pages.slice(0, 9).map((page) => page.name)).toEqual([
      '1-1',
      '1-2',
      '1-3',
      '2-1',
      '2-2',
      '2-3',
      '3-1',
      '3-2',
      '3-3',
    ]);
    expect(pages.slice(9).length).toBeGreaterThan(0);
    for (const page of pages) expect([page.width, page.height]).toEqual([297, 210]);
    for (const page of pages.slice(9)) expect(page.kind).toBe('legend');
  });

  it('joins to 762 mm by 456 mm of board: 80 mm of names, 31 columns of 22 mm, 12 rows of 38 mm', () => {
    const tiles = tilesOf();
    const width = tiles.slice(0, 3).reduce((sum, tile) => sum + tile.trim.width, 0);
    const height = [0, 3, 6].reduce((sum, index) => sum + (tiles[index]?.trim.height ?? 0), 0);
    expect([width, height]).toEqual([80 + 31 * 22, 12 * 38]);
  });

  it('keeps 22 mm from hole to hole over the seams, once trimmed and joined', () => {
    const tiles = tilesOf();
    const joined = tiles.flatMap((tile, index) => {
      const column = index % 3;
      const row = Math.floor(index / 3);
      const left = tiles.slice(row * 3, row * 3 + column).reduce((sum, other) => sum + other.trim.width, 0);
      return rings([tile]).map((ring) => ({
        date: ring.date,
        x: left + ring.cx - tile.trim.x,
        y: row * 4 * 38 + ring.cy - tile.trim.y,
      }));
    });
    expect(joined).toHaveLength(365);
    for (const { date, x, y } of joined) {
      expect(x).toBeCloseTo(80 + 5.2 + (Number(date.slice(8)) - 1) * 22, 3);
      expect(y).toBeCloseTo(4.6 + (Number(date.slice(5, 7)) - 1) * 38, 3);
    }
  });

  it('has no hole, number or word cut by a seam: each lies whole inside the trim or whole outside', () => {
    for (const tile of tilesOf()) {
      const { trim } = tile;
      for (const primitive of tile.primitives) {
        if (primitive.type !== 'ring' && primitive.type !== 'text' && primitive.type !== 'icon') continue;
        const { x, y, width, height } = boundsOf(primitive);
        const within = overlap({ x, y, width, height }, trim);
        if (!within) continue;
        const label = primitive.type === 'text' ? primitive.lines[0]?.text : primitive.type;
        expect(x, `${tile.name} left ${label}`).toBeGreaterThanOrEqual(trim.x - 0.01);
        expect(x + width, `${tile.name} right ${label}`).toBeLessThanOrEqual(trim.x + trim.width + 0.01);
        expect(y, `${tile.name} top ${label}`).toBeGreaterThanOrEqual(trim.y - 0.01);
        expect(y + height, `${tile.name} bottom ${label}`).toBeLessThanOrEqual(trim.y + trim.height + 0.01);
      }
    }
  });

  it('gives every tile its crop marks outside the trim, its map, its code and the arrow to the top', () => {
    for (const tile of tilesOf()) {
      const crops = tile.primitives.filter(
        (primitive) => primitive.type === 'line' && primitive.role === 'crop',
      );
      expect(crops).toHaveLength(8);
      for (const crop of crops) {
        const { x, y, width, height } = boundsOf(crop);
        const clear =
          x + width < tile.trim.x ||
          x > tile.trim.x + tile.trim.width ||
          y + height < tile.trim.y ||
          y > tile.trim.y + tile.trim.height;
        expect(clear).toBe(true);
      }
      const map = tile.primitives.filter(
        (primitive) => primitive.type === 'rect' && primitive.role === 'tile-map',
      );
      expect(map).toHaveLength(9);
      const here = map.findIndex((primitive) => primitive.type === 'rect' && primitive.fill === 'solid');
      expect(`${Math.floor(here / 3) + 1}-${(here % 3) + 1}`).toBe(tile.name);
      expect(texts([tile]).find((text) => text.role === 'tile-code')?.lines[0]?.text).toBe(tile.name);
      expect(allWords([tile])).toContain('top');
    }
  });

  it('has a flap to glue wherever a neighbour follows, 12 mm wide, and none at the board’s own edges', () => {
    const flaps = tilesOf().map(
      (tile) =>
        tile.primitives.filter((primitive) => primitive.type === 'rect' && primitive.role === 'flap').length,
    );
    expect(flaps).toEqual([2, 2, 1, 2, 2, 1, 1, 1, 0]);
    for (const tile of tilesOf()) {
      const count = texts([tile]).filter((text) => text.lines[0]?.text === 'glue here').length;
      expect(count).toBe(
        tile.primitives.filter((primitive) => 'role' in primitive && primitive.role === 'flap').length,
      );
      for (const primitive of tile.primitives) {
        if (primitive.type !== 'rect' || primitive.role !== 'flap') continue;
        const isRight = primitive.x >= tile.trim.x + tile.trim.width - 0.01;
        expect(isRight ? primitive.width : primitive.height).toBe(12);
      }
    }
  });

  it('names the months at 40 points and whole events at 30, with pictures of 15 mm', () => {
    const tiles = tilesOf();
    const months = texts(tiles).filter((text) => text.role === 'month-name');
    expect(months.map((text) => text.lines[0]?.text)).toEqual([
      'January',
      'February',
      'March',
      'April',
      'May',
      'June',
      'July',
      'August',
      'September',
      'October',
      'November',
      'December',
    ]);
    const names = texts(tiles).filter((text) => text.role === 'event-name');
    expect(names.map((text) => text.lines[0]?.text)).toContain('Ŋɔ́rɛ̃ · Sow long millet'.normalize('NFC'));
    for (const icon of tiles.flatMap((tile) =>
      tile.primitives.filter((primitive) => primitive.type === 'icon'),
    )) {
      expect(icon.size).toBeGreaterThanOrEqual(15);
    }
  });

  it('offers picture and number where a name does not fit at its size, and the words on the legend', () => {
    const long = {
      village: '',
      officer: 'Clean the channels of the upper terraces and mend their walls together',
    };
    const pages = yearBoard(
      upperTazimel({ layout: 'year-board', markers: [], entries: [entry({ titles: long })] }),
      fontMeasurer,
    );
    const tiles = pages.filter((page) => page.kind === 'tile');
    expect(texts(tiles).filter((text) => text.role === 'event-name')).toEqual([]);
    expect(
      tiles.flatMap((tile) => tile.primitives.filter((primitive) => primitive.type === 'icon')),
    ).toHaveLength(1);
    expect(allWords(pages.filter((page) => page.kind === 'legend')).replaceAll('\n', ' ')).toContain(
      long.officer,
    );
  });

  it('says on the legend what to look for, what to do and what if it is late', () => {
    const legend = demo.filter((page) => page.kind === 'legend');
    const said = allWords(legend).replaceAll('\n', ' ');
    for (const text of [
      'Look for',
      'Do',
      'If late',
      'soil wet to a hand depth; weaver',
      'Best days: 14\u00a0to\u00a030\u00a0June.',
      'agricultural office',
    ]) {
      expect(said).toContain(text);
    }
  });

  it('puts a star’s letter once in black, on its expected day', () => {
    const alone = upperTazimel({ layout: 'year-board', entries: [], markers: [marker()] });
    const tiles = tilesOf(yearBoard(alone, fontMeasurer));
    const black = tiles.flatMap((tile) =>
      tile.primitives.flatMap((primitive, index) => {
        const next = tile.primitives[index + 1];
        return primitive.type === 'rect' &&
          primitive.role === 'tag' &&
          primitive.fill === 'solid' &&
          next?.type === 'text' &&
          next.sizePt === 12
          ? [{ tile: tile.name, middle: primitive.x + primitive.width / 2 }]
          : [];
      }),
    );
    const hole = rings(tiles).find((ring) => ring.date === '2027-06-07');
    expect(black).toHaveLength(1);
    expect(black[0]?.middle).toBeCloseTo(hole?.cx ?? 0, 2);
  });

  it('names on the sheet beside it what a mended board says otherwise', () => {
    const changes = { title: 'Changed since 2027-1', lines: ['Sow: best 16–30 June; before, 14–30 June'] };
    const pages = yearBoard(upperTazimel({ layout: 'year-board', changes }), fontMeasurer);
    const legend = allWords(pages.filter(({ kind }) => kind === 'legend'));
    for (const line of [changes.title, ...changes.lines]) expect(legend).toContain(line);
    expect(allWords(tilesOf(pages))).not.toContain('Changed since');
  });
});
