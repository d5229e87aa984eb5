import type { TextMeasurer } from '#shared/sheet/text-layout.js';
import { MM_PER_PT } from '#shared/sheet/units.js';
import { fontOf, textRuns } from './font-book.js';
import type { FaceName, FontWeight } from './font-book.js';

/** Remembered words: a sheet asks for the same ones over and over. */
const REMEMBERED = 20_000;
const widthsEm = new Map<string, number>();

/** A word with the space after it is shaped as one piece, here and when it is drawn. */
function wordWidthEm(word: string, face: FaceName, weight: FontWeight): number {
  const key = `${face} ${weight} ${word}`;
  const known = widthsEm.get(key);
  if (known !== undefined) return known;
  const font = fontOf(face, weight);
  const widthEm = font.layout(word).advanceWidth / font.unitsPerEm;
  if (widthsEm.size >= REMEMBERED) widthsEm.clear();
  widthsEm.set(key, widthEm);
  return widthEm;
}

/** Measures with the typefaces that will draw the text, kerning and marks included. */
export const fontMeasurer: TextMeasurer = {
  widthMm: (text, { sizePt, weight }) => {
    let em = 0;
    for (const run of textRuns(text, weight)) {
      for (const word of run.text.split(/(?<=[ \t])/u)) em += wordWidthEm(word, run.face, weight);
    }
    return em * sizePt * MM_PER_PT;
  },
};
