import type { DrawnPage, Primitive } from './primitives.js';
import { rule, straight } from './strokes.js';
import { leadingMm, textBlock, type TextMeasurer, type TextStyle, wrapText } from './text-layout.js';
import { roundMm } from './units.js';
import type { WatchCardModel } from './watch-card-model.js';
import { COMPASS_ROOM_MM, pictureOf } from './watch-card-picture.js';

/** A5, upright: half a sheet of office paper, read in the hand at dawn by a small light. */
const WIDTH_MM = 148;
const HEIGHT_MM = 210;
const MARGIN_MM = 9;
const LEFT = MARGIN_MM;
const RIGHT = WIDTH_MM - MARGIN_MM;
const WIDTH = RIGHT - LEFT;

const TITLE: TextStyle = { role: 'legend-name', sizePt: 22, weight: 700, leadingEm: 1.2 };
const WHEN: TextStyle = { role: 'legend', sizePt: 14, weight: 400, leadingEm: 1.25 };
const LIMIT_LARGE: TextStyle = { role: 'month-name', sizePt: 40, weight: 700, leadingEm: 1.05 };
const LIMIT_SMALLER: TextStyle = { role: 'event-name', sizePt: 30, weight: 700, leadingEm: 1.1 };
const SENTENCE: TextStyle = { role: 'legend', sizePt: 14, weight: 400, leadingEm: 1.25 };
const CAUTION: TextStyle = { role: 'legend', sizePt: 14, weight: 700, leadingEm: 1.25 };
const FOOT: TextStyle = { role: 'foot', sizePt: 12, weight: 400, leadingEm: 1.2 };

/** From the largest picture to the smallest that still tells something. */
const PICTURE_HEIGHTS_MM = [62, 54, 46, 38] as const;
const BETWEEN_MM = 1.4;

/** One page. What must be there stands first and last; sentences fill the room between, the picture gives way to them. */
export function layoutWatchCard(model: WatchCardModel, measurer: TextMeasurer): DrawnPage {
  const head = headOf(model, measurer);
  const foot = footOf(model, measurer);
  const wrapped = model.sentences.map((sentence) => wrapText(sentence, WIDTH, SENTENCE, measurer));
  const neededMm = wrapped.reduce((sum, lines) => sum + heightMm(lines, SENTENCE) + BETWEEN_MM, 0);
  const roomMm = foot.top - head.bottom;
  const { picture } = model;
  const pictureMm =
    picture === null
      ? 0
      : (PICTURE_HEIGHTS_MM.find((height) => roomMm - pictureRoomMm(height) >= neededMm) ??
        PICTURE_HEIGHTS_MM[PICTURE_HEIGHTS_MM.length - 1] ??
        0);
  const drawn =
    picture === null
      ? []
      : pictureOf(picture, { x: LEFT, y: head.bottom + 2, width: WIDTH, height: pictureMm }, measurer);

  let top = head.bottom + (picture === null ? 2 : pictureRoomMm(pictureMm));
  const sentences = wrapped.flatMap((lines): Primitive[] => {
    const height = heightMm(lines, SENTENCE);
    if (top + height > foot.top) return [];
    const block = textBlock(lines, { x: LEFT, top }, SENTENCE, measurer);
    top += height + BETWEEN_MM;
    return [block];
  });
  return {
    name: model.title,
    width: WIDTH_MM,
    height: HEIGHT_MM,
    primitives: [...head.primitives, ...drawn, ...sentences, ...foot.primitives],
  };
}

function pictureRoomMm(heightMm: number): number {
  return 2 + heightMm + COMPASS_ROOM_MM + 2;
}

function heightMm(lines: readonly string[], style: TextStyle): number {
  return lines.length * leadingMm(style);
}

function headOf(model: WatchCardModel, measurer: TextMeasurer): { primitives: Primitive[]; bottom: number } {
  const primitives: Primitive[] = [];
  let top = MARGIN_MM;
  const put = (text: string, style: TextStyle): void => {
    const lines = wrapText(text, WIDTH, style, measurer);
    if (lines.length === 0) return;
    primitives.push(textBlock(lines, { x: LEFT, top }, style, measurer));
    top += heightMm(lines, style);
  };
  put(model.title, TITLE);
  put(model.when, WHEN);
  top += 1.5;
  primitives.push(straight('rule', { x: LEFT, y: top }, { x: RIGHT, y: top }, 1.2));
  top += 1;
  put(model.limit, measurer.widthMm(model.limit, LIMIT_LARGE) <= WIDTH ? LIMIT_LARGE : LIMIT_SMALLER);
  top += 1;
  primitives.push(straight('rule', { x: LEFT, y: top }, { x: RIGHT, y: top }, 1.2));
  return { primitives, bottom: roundMm(top) };
}

/** Laid from the bottom upward. */
function footOf(model: WatchCardModel, measurer: TextMeasurer): { primitives: Primitive[]; top: number } {
  const foot = wrapText(model.foot, WIDTH, FOOT, measurer);
  const cautions = wrapText(model.cautions.join(' '), WIDTH, CAUTION, measurer);
  const footTop = HEIGHT_MM - MARGIN_MM - heightMm(foot, FOOT);
  const cautionTop = footTop - 2 - heightMm(cautions, CAUTION);
  return {
    primitives: [
      rule(LEFT, RIGHT, roundMm(cautionTop - 1)),
      textBlock(cautions, { x: LEFT, top: cautionTop }, CAUTION, measurer),
      rule(LEFT, RIGHT, roundMm(footTop - 1)),
      textBlock(foot, { x: LEFT, top: footTop }, FOOT, measurer),
    ],
    top: roundMm(cautionTop - 2),
  };
}
