import { beforeAll, describe, expect, it, vi } from 'vitest';
import {
  layoutSheetForServer,
  pdfAbout,
  renderSheetPdf,
  unprintableLetters,
} from '#server/print/sheet-pdf.js';
import { renderPages } from '#server/print/render-pages.js';
import type { SheetPage } from '#shared/sheet/primitives.js';
import type { SheetModel } from '#shared/sheet/sheet-model.js';
import { readPdfPages, ringsIn, scaleBarsIn } from '#tests/support/pdf/pdf-content.js';
import type { PdfPageContent } from '#tests/support/pdf/pdf-content.js';
import { readPdfFonts, readPdfText, readPdfTitle } from '#tests/support/pdf/read-text.js';
import { rings } from '#tests/support/sheet/page-checks.js';
import { entry, upperTazimel, words } from '#tests/support/sheet/upper-tazimel-sheet.js';

// Drawing a whole year takes a while on a busy machine.
vi.setConfig({ testTimeout: 60_000, hookTimeout: 60_000 });

const LAYOUTS = ['month-cards', 'year-board'] as const;
/** Three decimals of a point in the file are a third of a micrometre. */
const FILE_MM = 0.002;

describe.each(LAYOUTS)('the PDF of %s', (layout) => {
  let model: SheetModel;
  let laidOut: SheetPage[];
  let file: Buffer;
  let pages: PdfPageContent[];
  // Reading the typefaces for the first time is slow.
  beforeAll(async () => {
    model = upperTazimel({ layout });
    laidOut = layoutSheetForServer(model);
    file = await renderPages(laidOut, pdfAbout(model));
    pages = readPdfPages(file);
  });

  it('has the sizes of its paper and as many pages as were laid out', () => {
    expect(pages.map((page) => [round(page.widthMm), round(page.heightMm)])).toEqual(
      laidOut.map((page) => [page.width, page.height]),
    );
  });

  it('paints exactly 365 rings of 6 mm, each where it was laid out, none dashed', () => {
    const painted = pages.map((page) => ringsIn(page).filter(({ radius }) => Math.abs(radius - 3) < FILE_MM));
    expect(painted.flat()).toHaveLength(365);
    expect(painted.flat().some(({ isDashed }) => isDashed)).toBe(false);
    laidOut.forEach((page, index) => {
      const wanted = rings([page]);
      expect(painted[index]).toHaveLength(wanted.length);
      wanted.forEach((ring, at) => {
        const found = painted[index]?.[at];
        expect(Math.abs((found?.cx ?? 0) - ring.cx)).toBeLessThan(FILE_MM);
        expect(Math.abs((found?.cy ?? 0) - ring.cy)).toBeLessThan(FILE_MM);
      });
    });
  });

  it('paints both bars on every page at 100.0 mm over the outer edges of their ticks', () => {
    for (const page of pages) {
      const bars = scaleBarsIn(page);
      expect(bars.map(({ axis }) => axis).toSorted()).toEqual(['across', 'down']);
      for (const bar of bars) expect(Math.abs(bar.lengthMm - 100)).toBeLessThan(0.01);
    }
  });

  it('paints no line thinner than 0.35 mm, the drawn signs apart', () => {
    const thin = pages.flatMap((page) =>
      page.paths.filter((path) => path.isStroked && path.strokeMm < 0.35 - FILE_MM),
    );
    expect(thin).toEqual([]);
  });

  it('gives its words back as they were typed, tone marks composed', () => {
    const text = readPdfText(file).normalize('NFC').replace(/\s+/gu, ' ');
    for (const wanted of [
      'Ŋɔ́rɛ̃ · Sow long millet',
      'Ɓèŋu̍ · Cluster returns',
      'tsʼá',
      'Stars tell the season, not the rain. Check soil and forecast first.',
      'September',
      'Weather service: 900.',
      '2027-1',
    ]) {
      expect(text).toContain(wanted.normalize('NFC'));
    }
  });

  it('embeds whole letters of its own typefaces and maps them to Unicode', () => {
    const fonts = readPdfFonts(file);
    expect(fonts.length).toBeGreaterThan(0);
    for (const font of fonts) {
      expect(font.name).toMatch(/Andika/u);
      expect(font).toMatchObject({ isEmbedded: true, hasUnicode: true });
    }
  });

  it('is small, names itself, its language and that it must not be scaled', () => {
    expect(file.byteLength).toBeLessThan(5_000_000);
    const raw = file.toString('latin1');
    expect(raw).toContain('/PrintScaling /None');
    expect(raw).toContain('/Lang (en)');
    expect(readPdfTitle(file)).toBe('Upper Tazimel, year board 2027-1');
  });

  it('is the same file for the same model, and another for another print date', async () => {
    expect((await renderSheetPdf(model)).equals(file)).toBe(true);
    const later = await renderSheetPdf({ ...model, printDate: '2027-01-16' });
    expect(later.equals(file)).toBe(false);
  });

  it('dashes 29 February and nothing else in a leap year', async () => {
    const leap = upperTazimel({
      layout,
      year: 2028,
      words: words(2028),
      label: '2028-1',
      entries: [],
      markers: [],
    });
    const found = readPdfPages(await renderSheetPdf(leap))
      .flatMap(ringsIn)
      .filter(({ radius }) => Math.abs(radius - 3) < FILE_MM);
    expect(found).toHaveLength(366);
    expect(found.filter(({ isDashed }) => isDashed)).toHaveLength(1);
  });

  it('says that it is a draft on every page', async () => {
    const draft = await renderSheetPdf(upperTazimel({ layout, label: null, stateWatermark: 'In review' }));
    const sheets = readPdfText(draft).split('\f').slice(0, -1);
    expect(sheets.length).toBe(laidOut.length);
    for (const sheet of sheets) expect(sheet.replace(/\s+/gu, ' ')).toContain('In review');
  }, 60_000);
});

describe('words in other scripts', () => {
  const titles = [
    { village: 'በላይኛው እርከን መዝራት', officer: 'Sow' },
    { village: 'ऊपरी खेतों में बोना', officer: 'Sow' },
    { village: 'ɔ̃́ ị̄́ g͡b n᷄ ʔ ǃ', officer: 'Sow' },
  ];

  it('are drawn with typefaces that have them, and come back from the file', async () => {
    const model = upperTazimel({
      markers: [],
      entries: titles.map((each, index) => entry({ number: index + 1, titles: each })),
    });
    expect(unprintableLetters(layoutSheetForServer(model))).toEqual([]);
    const file = await renderSheetPdf(model);
    const text = readPdfText(file).normalize('NFC');
    for (const word of ['በላይኛው', 'እርከን', 'መዝራት']) expect(text).toContain(word);
    // Vowel signs are reordered on paper; the file says how they were typed.
    for (const word of ['ऊपरी', 'खेतों', 'में', 'बोना']) expect(text).toContain(word.normalize('NFC'));
    expect(
      readPdfFonts(file)
        .map(({ name }) => name)
        .join(' '),
    ).toMatch(/NotoSansEthiopic.*NotoSansDevanagari/u);
  });

  it('that no typeface has are named, so that nobody prints empty boxes unawares', () => {
    const model = upperTazimel({ entries: [entry({ titles: { village: '田植え', officer: 'Plant' } })] });
    expect(unprintableLetters(layoutSheetForServer(model))).toEqual(['田', '植', 'え']);
  });
});

function round(lengthMm: number): number {
  return Math.round(lengthMm * 1000) / 1000;
}
