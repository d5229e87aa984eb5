import { codeSquares, type CodeSquares } from './code-squares.js';
import type { DrawnPage, Primitive } from './primitives.js';
import { leadingMm, textBlock, type TextMeasurer, type TextStyle, wrapText } from './text-layout.js';

/** What stands on a card with which somebody signs in. */
export interface SignInCardModel {
  readonly size: 'a6' | 'a7';
  readonly title: string;
  readonly villageName: string;
  /** As the person wishes to be called on paper; empty for nobody's name. */
  readonly name: string;
  /** What to do with it, in one sentence. */
  readonly how: string;
  readonly care: string;
  readonly address: string;
  readonly codeGroups: readonly string[];
  readonly squares: CodeSquares;
}

interface Format {
  readonly widthMm: number;
  readonly heightMm: number;
  readonly marginMm: number;
  readonly squaresMm: number;
  readonly title: TextStyle;
  readonly village: TextStyle;
  readonly name: TextStyle;
  readonly words: TextStyle;
  readonly code: TextStyle;
}

/** Lying postcards. A7 goes into a pocket; A6 has larger letters for older eyes. */
const FORMATS: Record<SignInCardModel['size'], Format> = {
  a6: {
    widthMm: 148,
    heightMm: 105,
    marginMm: 7,
    squaresMm: 54,
    title: { role: 'legend', sizePt: 14, weight: 400, leadingEm: 1.25 },
    village: { role: 'legend-name', sizePt: 20, weight: 700, leadingEm: 1.2 },
    name: { role: 'legend-name', sizePt: 18, weight: 400, leadingEm: 1.2 },
    words: { role: 'legend', sizePt: 14, weight: 400, leadingEm: 1.2 },
    code: { role: 'legend-name', sizePt: 22, weight: 700, leadingEm: 1.2 },
  },
  a7: {
    widthMm: 105,
    heightMm: 74,
    marginMm: 5,
    squaresMm: 41,
    title: { role: 'foot', sizePt: 12, weight: 400, leadingEm: 1.15 },
    village: { role: 'legend-name', sizePt: 14, weight: 700, leadingEm: 1.15 },
    name: { role: 'legend-name', sizePt: 14, weight: 400, leadingEm: 1.15 },
    words: { role: 'foot', sizePt: 12, weight: 400, leadingEm: 1.15 },
    code: { role: 'legend-name', sizePt: 17, weight: 700, leadingEm: 1.2 },
  },
};

/** One page: the squares to scan, beside them whose village it is and what to do, below them the letters to type. */
export function layoutSignInCard(model: SignInCardModel, measurer: TextMeasurer): DrawnPage {
  const format = FORMATS[model.size];
  const { widthMm, heightMm, marginMm, squaresMm } = format;
  const left = marginMm + squaresMm + marginMm / 2;
  const width = widthMm - marginMm - left;
  const foot = footOf(model, format, measurer);

  const primitives: Primitive[] = [];
  let top = marginMm;
  const put = (text: string, style: TextStyle, gapMm: number): void => {
    const lines = wrapText(text, width, style, measurer);
    const height = lines.length * leadingMm(style);
    if (lines.length === 0 || top + height > foot.top) return;
    primitives.push(textBlock(lines, { x: left, top }, style, measurer));
    top += height + gapMm;
  };
  put(model.villageName, format.village, 0.5);
  put(model.name, format.name, 0.5);
  put(model.title, format.title, 1.5);
  put(model.how, format.words, 1.5);
  put(model.care, format.words, 0);
  return {
    name: model.title,
    width: widthMm,
    height: heightMm,
    primitives: [
      ...codeSquares(model.squares, { x: marginMm, y: marginMm, width: squaresMm }),
      ...primitives,
      ...foot.primitives,
    ],
  };
}

/** The letters and the address, for a phone that cannot scan: from the bottom edge upwards. */
function footOf(
  { codeGroups, address }: SignInCardModel,
  { widthMm, heightMm, marginMm, code, words }: Format,
  measurer: TextMeasurer,
): { primitives: Primitive[]; top: number } {
  const width = widthMm - 2 * marginMm;
  const addressLines = wrapText(address, width, words, measurer);
  const codeLines = wrapText(codeGroups.join('  '), width, code, measurer);
  const addressTop = heightMm - marginMm - addressLines.length * leadingMm(words);
  const top = addressTop - codeLines.length * leadingMm(code);
  const x = marginMm + 1;
  return {
    top,
    primitives: [
      textBlock(codeLines, { x, top }, code, measurer),
      textBlock(addressLines, { x, top: addressTop }, words, measurer),
    ],
  };
}
