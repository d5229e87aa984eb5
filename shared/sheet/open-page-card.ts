import { codeSquares, type CodeSquares } from './code-squares.js';
import type { DrawnPage, Primitive } from './primitives.js';
import { rule } from './strokes.js';
import { leadingMm, textBlock, type TextMeasurer, type TextStyle, wrapText } from './text-layout.js';
import { roundMm } from './units.js';

/** What hangs where people pass by: whose page it is, its address to scan and to type. All words ready. */
export interface OpenPageCardModel {
  readonly title: string;
  /** What stands on the page. */
  readonly what: string;
  /** That anybody can read it. */
  readonly forAll: string;
  readonly squares: CodeSquares;
  readonly how: string;
  /** The address in pieces, each on a line of its own. */
  readonly address: readonly string[];
  /** That the village can end it, and the day of the print. */
  readonly foot: readonly string[];
}

/** A5, upright: half a sheet of office paper. */
const WIDTH_MM = 148;
const HEIGHT_MM = 210;
const MARGIN_MM = 10;
const WIDTH = WIDTH_MM - 2 * MARGIN_MM;
/** The code is scanned from as far as ten times its side: over a counter, or past the people in front. */
const CODE_MM = 92;
const CODE_LEAST_MM = 55;
const GAP_MM = 2.5;
const SMALLER_TITLES_PT = [30, 24, 20, 16];

const WHAT: TextStyle = { role: 'legend', sizePt: 14, weight: 400, leadingEm: 1.25 };
const FOR_ALL: TextStyle = { role: 'legend-name', sizePt: 18, weight: 700, leadingEm: 1.25 };
const HOW: TextStyle = { role: 'legend', sizePt: 14, weight: 400, leadingEm: 1.2 };
const ADDRESS: TextStyle = { role: 'legend-name', sizePt: 16, weight: 700, leadingEm: 1.25 };
const FOOT: TextStyle = { role: 'foot', sizePt: 12, weight: 400, leadingEm: 1.2 };

/** Words one under the other, each part a gap below the one before. */
interface Stack {
  readonly heightMm: number;
  readonly draw: (top: number) => Primitive[];
}

/** One page. The code takes the room that the words leave; a long name of a village is written smaller, and nothing is cut. */
export function layoutOpenPageCard(model: OpenPageCardModel, measurer: TextMeasurer): DrawnPage {
  const foot = stackOf(
    model.foot.map((text) => ({ text, style: FOOT, gapMm: 0 })),
    measurer,
  );
  const below = stackOf(
    [
      { text: model.how, style: HOW, gapMm: 1 },
      { text: model.address.join('\n'), style: ADDRESS, gapMm: GAP_MM },
    ],
    measurer,
  );
  const heads = SMALLER_TITLES_PT.map((sizePt) => {
    const title: TextStyle = { role: 'legend-name', sizePt, weight: 700, leadingEm: 1.2 };
    return stackOf(
      [
        { text: model.title, style: title, gapMm: GAP_MM },
        { text: model.what, style: WHAT, gapMm: 1.5 },
        { text: model.forAll, style: FOR_ALL, gapMm: 0 },
      ],
      measurer,
    );
  });
  const roomFor = ({ heightMm }: Stack) =>
    HEIGHT_MM - 2 * MARGIN_MM - heightMm - below.heightMm - foot.heightMm - 2 * GAP_MM;
  const head = heads.find((each) => roomFor(each) >= CODE_LEAST_MM) ?? heads.at(-1);
  if (head === undefined) throw new RangeError('A card needs a title');
  const sideMm = Math.min(CODE_MM, roomFor(head));
  const footTop = HEIGHT_MM - MARGIN_MM - foot.heightMm;
  const belowTop = footTop - GAP_MM - below.heightMm;
  const headBottom = MARGIN_MM + head.heightMm;
  return {
    name: model.title,
    width: WIDTH_MM,
    height: HEIGHT_MM,
    primitives: [
      ...head.draw(MARGIN_MM),
      ...codeSquares(model.squares, {
        x: (WIDTH_MM - sideMm) / 2,
        y: headBottom + (belowTop - headBottom - sideMm) / 2,
        width: sideMm,
      }),
      ...below.draw(belowTop),
      rule(MARGIN_MM, WIDTH_MM - MARGIN_MM, roundMm(footTop - 1)),
      ...foot.draw(footTop),
    ],
  };
}

function stackOf(
  parts: readonly { text: string; style: TextStyle; gapMm: number }[],
  measurer: TextMeasurer,
): Stack {
  const written = parts.map(({ text, style, gapMm }) => {
    const lines = wrapText(text, WIDTH, style, measurer);
    return { lines, style, heightMm: lines.length * leadingMm(style) + gapMm };
  });
  return {
    heightMm: written.reduce((sum, { heightMm }) => sum + heightMm, 0),
    draw: (top) =>
      written.map(({ lines, style }, index) => {
        const above = written.slice(0, index).reduce((sum, { heightMm }) => sum + heightMm, 0);
        return textBlock(lines, { x: MARGIN_MM, top: top + above }, style, measurer);
      }),
  };
}
