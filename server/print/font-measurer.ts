import type { TextMeasurer } from '#shared/sheet/text-layout.js';
import { MM_PER_PT } from '#shared/sheet/units.js';
import { fontOf, textRuns } from './font-book.js';

/** Remembered widths: a sheet asks for the same words over and over. */
const REMEMBERED = 20_000;
const widthsEm = new Map<string, number>();

/** Measures with the typefaces that will draw the text, kerning and marks included. */
export const fontMeasurer: TextMeasurer = {
  widthMm: (text, { sizePt, weight }) => {
    const key = `${weight} ${text}`;
    let em = widthsEm.get(key);
    if (em === undefined) {
      em = textRuns(text, weight).reduce((sum, run) => {
        const font = fontOf(run.face, weight);
        return sum + font.layout(run.text).advanceWidth / font.unitsPerEm;
      }, 0);
      if (widthsEm.size >= REMEMBERED) widthsEm.clear();
      widthsEm.set(key, em);
    }
    return em * sizePt * MM_PER_PT;
  },
};
