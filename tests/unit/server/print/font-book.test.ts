import { describe, expect, it } from 'vitest';
import { textRuns, unprintableClusters } from '#server/print/font-book.js';
import { fontMeasurer } from '#server/print/font-measurer.js';

describe('runs of one typeface', () => {
  it('keep a letter and its marks together, composed', () => {
    expect(textRuns('Ŋɔ̃́rɛ̀ e\u0301', 400)).toEqual([{ face: 'andika', text: 'Ŋɔ̃́rɛ̀ é'.normalize('NFC') }]);
  });

  it('change with the script, and keep spaces and points with the script before them', () => {
    expect(textRuns('መዝራት ላይ · Sow. बोना', 700).map(({ face, text }) => [face, text])).toEqual([
      ['ethiopic', 'መዝራት ላይ · '],
      ['andika', 'Sow. '],
      ['devanagari', 'बोना'],
    ]);
  });

  it('have letters of Latin, tones, clicks, glottal stops and stacked marks in Andika', () => {
    const letters = 'ñ ṇ ŋ ɓ ɗ ƙ ƴ ʔ ʼ ʕ ꞌ ǀ ǁ ǂ ǃ ọ́ ɔ̃́ ị̄́ g͡b n᷄ a̱ ɓ̰ ɛ̌ – · “ ” … %';
    expect(unprintableClusters(letters)).toEqual([]);
    expect(textRuns(letters, 400)).toHaveLength(1);
  });

  it('are told of letters that none has', () => {
    expect(unprintableClusters('Sow 田 now, 田 again ☉')).toEqual(['田', '☉']);
  });
});

describe('measuring', () => {
  it('grows with the size, and by nothing for a mark over a letter', () => {
    const at = (text: string, sizePt: number) => fontMeasurer.widthMm(text, { sizePt, weight: 400 });
    expect(at('Sow long millet', 28)).toBeCloseTo(2 * at('Sow long millet', 14), 9);
    expect(at('ɔ̃́', 30)).toBeCloseTo(at('ɔ', 30), 9);
    expect(fontMeasurer.widthMm('millet', { sizePt: 30, weight: 700 })).toBeGreaterThan(at('millet', 30));
  });

  it('gives figures of one width, so that days stand in line', () => {
    const widths = Array.from('0123456789', (figure) =>
      fontMeasurer.widthMm(figure, { sizePt: 20, weight: 700 }),
    );
    for (const width of widths) expect(width).toBeCloseTo(widths[0] ?? 0, 9);
  });

  it('knows that capitals of 30, 20 and 40 points are 7.5, 5 and 10 mm high', async () => {
    const { fontOf } = await import('#server/print/font-book.js');
    const { CAP_HEIGHT_EM } = await import('#shared/sheet/type-floors.js');
    const font = fontOf('andika', 700);
    const heightEm = font.glyphForCodePoint(0x48).bbox.maxY / font.unitsPerEm;
    expect(heightEm).toBeCloseTo(CAP_HEIGHT_EM, 4);
    const highMm = (sizePt: number) => (heightEm * sizePt * 25.4) / 72;
    expect(highMm(30)).toBeGreaterThanOrEqual(7.5);
    expect(highMm(20)).toBeGreaterThanOrEqual(5);
    expect(highMm(40)).toBeGreaterThanOrEqual(10);
  });
});
