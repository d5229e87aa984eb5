import type { DrawnPage, Primitive } from './primitives.js';
import { rule, straight } from './strokes.js';
import { leadingMm, textBlock, type TextMeasurer, type TextStyle, wrapText } from './text-layout.js';
import { roundMm } from './units.js';

/** What a consent card says, all words ready. */
export interface ConsentCardModel {
  readonly title: string;
  /** For whom, and about what. */
  readonly under: readonly string[];
  readonly asked: readonly string[];
  /** Each use by itself, in the order of the form. */
  readonly uses: readonly { readonly words: string; readonly isYes: boolean }[];
  readonly rules: readonly string[];
  /** How to take it back: always printed, in bold. */
  readonly withdraw: readonly string[];
  /** Empty lines to write on. */
  readonly lines: readonly string[];
  readonly foot: string;
}

/** A5, upright: half a sheet of office paper, to be kept at home. */
const WIDTH_MM = 148;
const HEIGHT_MM = 210;
const MARGIN_MM = 10;
const WIDTH = WIDTH_MM - 2 * MARGIN_MM;
const MARK_MM = 8;
const DISC_MM = 1.9;
const LINE_ROOM_MM = 15;

const TITLE: TextStyle = { role: 'legend-name', sizePt: 22, weight: 700, leadingEm: 1.2 };
const UNDER: TextStyle = { role: 'legend', sizePt: 14, weight: 400, leadingEm: 1.25 };
const TEXT: TextStyle = { role: 'legend', sizePt: 14, weight: 400, leadingEm: 1.22 };
const BOLD: TextStyle = { role: 'legend', sizePt: 14, weight: 700, leadingEm: 1.22 };
const FOOT: TextStyle = { role: 'foot', sizePt: 12, weight: 400, leadingEm: 1.2 };

/** A piece that stays together on a page. */
interface Block {
  heightMm: number;
  draw: (top: number) => Primitive[];
}

/** As many pages as it needs: nothing that was agreed is ever left out. */
export function layoutConsentCard(model: ConsentCardModel, measurer: TextMeasurer): DrawnPage[] {
  const foot = wrapText(model.foot, WIDTH, FOOT, measurer);
  const footTop = HEIGHT_MM - MARGIN_MM - foot.length * leadingMm(FOOT);
  const pages = onPages(blocksOf(model, measurer), footTop - 2);
  return pages.map((primitives, index) => ({
    name: pages.length === 1 ? model.title : `${model.title} ${index + 1}`,
    width: WIDTH_MM,
    height: HEIGHT_MM,
    primitives: [
      ...primitives,
      rule(MARGIN_MM, WIDTH_MM - MARGIN_MM, roundMm(footTop - 1)),
      textBlock(foot, { x: MARGIN_MM, top: footTop }, FOOT, measurer),
    ],
  }));
}

function onPages(blocks: readonly Block[], bottom: number): Primitive[][] {
  const pages: Primitive[][] = [[]];
  let top = MARGIN_MM;
  for (const { heightMm, draw } of blocks) {
    if (top + heightMm > bottom && top > MARGIN_MM) {
      pages.push([]);
      top = MARGIN_MM;
    }
    pages.at(-1)?.push(...draw(top));
    top += heightMm;
  }
  return pages;
}

function blocksOf(model: ConsentCardModel, measurer: TextMeasurer): Block[] {
  const text = (words: string, style: TextStyle, afterMm = 0.6) => textOf(words, style, afterMm, measurer);
  return [
    ...text(model.title, TITLE),
    ...model.under.flatMap((words) => text(words, UNDER)),
    between(),
    ...model.asked.flatMap((words) => text(words, TEXT)),
    between(),
    ...model.uses.map((use) => useOf(use, measurer)),
    between(),
    ...model.rules.flatMap((words) => text(words, TEXT)),
    between(),
    ...model.withdraw.flatMap((words) => text(words, BOLD)),
    ...model.lines.map((words) => lineOf(words, measurer)),
  ];
}

/** Long words may go over to the next page between two lines. */
function textOf(words: string, style: TextStyle, afterMm: number, measurer: TextMeasurer): Block[] {
  const lines = wrapText(words, WIDTH, style, measurer);
  return lines.map((line, index) => ({
    heightMm: leadingMm(style) + (index === lines.length - 1 ? afterMm : 0),
    draw: (top) => [textBlock([line], { x: MARGIN_MM, top }, style, measurer)],
  }));
}

/** A full round for yes, an empty one for no; the word says it, too. */
function useOf({ words, isYes }: ConsentCardModel['uses'][number], measurer: TextMeasurer): Block {
  const style = isYes ? BOLD : TEXT;
  const lines = wrapText(words, WIDTH - MARK_MM, style, measurer);
  return {
    heightMm: lines.length * leadingMm(style),
    draw: (top) => [
      {
        type: 'disc',
        role: 'tag',
        cx: roundMm(MARGIN_MM + DISC_MM + 0.5),
        cy: roundMm(top + leadingMm(style) / 2),
        radius: DISC_MM,
        fill: isYes ? 'solid' : 'open',
        inkedSide: null,
        strokeMm: 0.5,
      },
      textBlock(lines, { x: MARGIN_MM + MARK_MM, top }, style, measurer),
    ],
  };
}

function between(): Block {
  return {
    heightMm: 3,
    draw: (top) => [rule(MARGIN_MM, WIDTH_MM - MARGIN_MM, roundMm(top + 1.2))],
  };
}

function lineOf(words: string, measurer: TextMeasurer): Block {
  return {
    heightMm: LINE_ROOM_MM,
    draw: (top) => {
      const y = top + LINE_ROOM_MM - leadingMm(FOOT) - 1;
      return [
        straight('rule', { x: MARGIN_MM, y }, { x: WIDTH_MM - MARGIN_MM, y }, 0.4),
        textBlock([words], { x: MARGIN_MM, top: y + 0.5 }, FOOT, measurer),
      ];
    },
  };
}
