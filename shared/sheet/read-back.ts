import type { DrawnPage, Primitive } from './primitives.js';
import { rule, straight } from './strokes.js';
import { leadingMm, textBlock, type TextMeasurer, type TextStyle, wrapText } from './text-layout.js';
import { roundMm } from './units.js';

/** What is read aloud to a meeting and marked by its elders, all words ready. */
export interface ReadBackModel {
  readonly title: string;
  readonly lead: string;
  readonly entries: readonly { readonly title: string; readonly sentences: readonly string[] }[];
  /** The four answers, in the order of the buttons. */
  readonly answers: readonly [string, string, string, string];
  /** Whoever answers, each with a line for a thumb or a mark. */
  readonly elders: readonly string[];
  readonly lineForWords: string;
  /** On every page: which submission, and its hash. */
  readonly foot: readonly string[];
}

/** A4, upright. */
const WIDTH_MM = 210;
const HEIGHT_MM = 297;
const MARGIN_MM = 14;
const WIDTH = WIDTH_MM - 2 * MARGIN_MM;
const NAME_MM = 42;
const BOX_MM = 9;
const ROW_MM = 17;
const COLUMN_MM = 20;
const SIGN_MM = 9;

const TITLE: TextStyle = { role: 'legend-name', sizePt: 24, weight: 700, leadingEm: 1.2 };
const HEAD: TextStyle = { role: 'legend-name', sizePt: 20, weight: 700, leadingEm: 1.2 };
const TEXT: TextStyle = { role: 'legend', sizePt: 17, weight: 400, leadingEm: 1.3 };
const SMALL: TextStyle = { role: 'foot', sizePt: 12, weight: 400, leadingEm: 1.2 };

/** A piece that stays together on a page. */
interface Block {
  heightMm: number;
  draw: (top: number) => Primitive[];
}

/** Each entry begins a page of its own if it does not fit whole behind the one before it; nothing is left out. */
export function layoutReadBack(model: ReadBackModel, measurer: TextMeasurer): DrawnPage[] {
  const foot = model.foot.flatMap((words) => wrapText(words, WIDTH, SMALL, measurer));
  const footTop = HEIGHT_MM - MARGIN_MM - foot.length * leadingMm(SMALL);
  const pages: Primitive[][] = [[]];
  let top = MARGIN_MM;
  const turn = () => {
    pages.push([]);
    top = MARGIN_MM;
  };
  for (const group of groupsOf(model, measurer)) {
    const height = group.reduce((sum, { heightMm }) => sum + heightMm, 0);
    if (top > MARGIN_MM && top + height > footTop - 3) turn();
    for (const { heightMm, draw } of group) {
      if (top > MARGIN_MM && top + heightMm > footTop - 3) turn();
      pages.at(-1)?.push(...draw(top));
      top += heightMm;
    }
  }
  return pages.map((primitives, index) => ({
    name: `${index + 1}`,
    width: WIDTH_MM,
    height: HEIGHT_MM,
    primitives: [
      ...primitives,
      rule(MARGIN_MM, WIDTH_MM - MARGIN_MM, roundMm(footTop - 1.5)),
      textBlock(foot, { x: MARGIN_MM, top: footTop }, SMALL, measurer),
    ],
  }));
}

function groupsOf(model: ReadBackModel, measurer: TextMeasurer): Block[][] {
  const text = (words: string, style: TextStyle, afterMm: number) => textOf(words, style, afterMm, measurer);
  return [
    [...text(model.title, TITLE, 2), ...text(model.lead, TEXT, 4)],
    ...model.entries.map((entry, index) => [
      between(),
      ...text(`${index + 1}. ${entry.title}`, HEAD, 1),
      ...entry.sentences.flatMap((sentence) => text(sentence, TEXT, 0.5)),
      heads(model.answers, measurer),
      ...model.elders.map((name) => elderRow(name, measurer)),
      wordsLine(model.lineForWords, measurer),
    ]),
  ];
}

function textOf(words: string, style: TextStyle, afterMm: number, measurer: TextMeasurer): Block[] {
  const lines = wrapText(words, WIDTH, style, measurer);
  return lines.map((line, index) => ({
    heightMm: leadingMm(style) + (index === lines.length - 1 ? afterMm : 0),
    draw: (top) => [textBlock([line], { x: MARGIN_MM, top }, style, measurer)],
  }));
}

function between(): Block {
  return { heightMm: 5, draw: (top) => [rule(MARGIN_MM, WIDTH_MM - MARGIN_MM, roundMm(top + 2))] };
}

const columnLeft = (index: number) => MARGIN_MM + NAME_MM + index * COLUMN_MM;

/** Sign and word of each answer above its boxes. */
function heads(answers: ReadBackModel['answers'], measurer: TextMeasurer): Block {
  const lines = answers.map((words) => wrapText(words, COLUMN_MM - 2, SMALL, measurer));
  const tallest = Math.max(...lines.map(({ length }) => length));
  return {
    heightMm: 2 + SIGN_MM + tallest * leadingMm(SMALL) + 1,
    draw: (top) =>
      answers.flatMap((_, index) => [
        ...answerSign(index, columnLeft(index), top + 2),
        textBlock(lines[index] ?? [], { x: columnLeft(index), top: top + 2 + SIGN_MM }, SMALL, measurer),
      ]),
  };
}

/** What happens to the peg: in its hole, to another hole, taken off, somebody else's. */
function answerSign(index: number, x: number, top: number): Primitive[] {
  const middle = top + SIGN_MM / 2 - 0.5;
  const disc = (cx: number, radius: number, fill: 'solid' | 'open'): Primitive => ({
    type: 'disc',
    role: 'tag',
    cx: roundMm(x + cx),
    cy: roundMm(middle),
    radius,
    fill,
    inkedSide: null,
    strokeMm: 0.5,
  });
  const line = (fromX: number, fromY: number, toX: number, toY: number): Primitive =>
    straight('rule', { x: x + fromX, y: middle + fromY }, { x: x + toX, y: middle + toY }, 0.7);
  switch (index) {
    case 0:
      return [disc(3.5, 3, 'solid')];
    case 1:
      return [
        disc(2.4, 2, 'open'),
        line(5, 0, 10, 0),
        line(8.6, -1.4, 10, 0),
        line(8.6, 1.4, 10, 0),
        disc(13, 2, 'solid'),
      ];
    case 2:
      return [disc(3.5, 3, 'open'), line(0.5, -3, 6.5, 3), line(0.5, 3, 6.5, -3)];
    default:
      return [disc(3.5, 3, 'open')];
  }
}

/** A name, four boxes, and a line for a thumb or a mark. */
function elderRow(name: string, measurer: TextMeasurer): Block {
  const lines = wrapText(name, NAME_MM - 2, TEXT, measurer).slice(0, 2);
  return {
    heightMm: ROW_MM,
    draw: (top) => [
      textBlock(lines, { x: MARGIN_MM, top: top + 1 }, TEXT, measurer),
      ...[0, 1, 2, 3].map((index): Primitive => ({
        type: 'rect',
        role: 'tag',
        x: roundMm(columnLeft(index)),
        y: roundMm(top + 2),
        width: BOX_MM,
        height: BOX_MM,
        fill: 'open',
        strokeMm: 0.6,
        cornerMm: 1,
      })),
      straight('rule', { x: columnLeft(4), y: top + 12 }, { x: WIDTH_MM - MARGIN_MM, y: top + 12 }, 0.4),
    ],
  };
}

function wordsLine(words: string, measurer: TextMeasurer): Block {
  return {
    heightMm: 19,
    draw: (top) => [
      straight('rule', { x: MARGIN_MM, y: top + 11 }, { x: WIDTH_MM - MARGIN_MM, y: top + 11 }, 0.4),
      textBlock([words], { x: MARGIN_MM, top: top + 11.5 }, SMALL, measurer),
    ],
  };
}
