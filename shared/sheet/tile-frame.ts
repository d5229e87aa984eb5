import {
  barDown,
  FOOT,
  footStatements,
  issueWords,
  PEG_MM,
  DRILL_MM,
  SCALE_BAR_MM,
  scaleBar,
} from './page-foot.js';
import type { Primitive } from './primitives.js';
import type { SheetModel } from './sheet-model.js';
import { clearing, straight } from './strokes.js';
import { fitStatements, leadingMm, onOneLine, textBlock, textOnBaseline, textUpward } from './text-layout.js';
import type { TextMeasurer, TextStyle } from './text-layout.js';
import { roundMm } from './units.js';
import { LEGEND_BOLD } from './word-block.js';
import { FLAP_MM, TILE_PAGE_HEIGHT_MM } from './year-tiles.js';
import type { Tile } from './year-tiles.js';

const CODE: TextStyle = { role: 'tile-code', sizePt: 24, weight: 700 };
const TIGHT_FOOT: TextStyle = { ...FOOT, leadingEm: 1.24 };
const TIGHT_CAUTION: TextStyle = { role: 'foot', sizePt: 12, weight: 700, leadingEm: 1.24 };
const HEAD_INSET_MM = 3;
const BAR_DOWN_FROM_BOTTOM_MM = 103;
const TEXT_RIGHT_MM = 286;
const FOOT_LINES = 2;
const CROP_MM = 6;
const CROP_GAP_MM = 1.5;

/** Everything around a tile's part of the board: head, flaps, crop marks, bars and foot. */
export function tileFrame(
  model: SheetModel,
  tile: Tile,
  namesDawnOrDusk: boolean,
  measurer: TextMeasurer,
): Primitive[] {
  return [
    ...flaps(model, tile, measurer),
    ...cropMarks(tile),
    ...head(model, tile, measurer),
    ...bars(model, tile, measurer),
    ...foot(model, namesDawnOrDusk, measurer),
  ];
}

function head(model: SheetModel, tile: Tile, measurer: TextMeasurer): Primitive[] {
  const { words } = model;
  const title = words.boardTitle({ community: model.communityName, issue: issueWords(model) });
  const days = words.tileDays({
    code: tile.code,
    from: tile.firstDay,
    to: tile.lastDay,
    fromMonth: words.monthName(tile.firstMonth).officer,
    toMonth: words.monthName(tile.lastMonth).officer,
  });
  const isTest = tile.row === 1 && tile.column === 1;
  const second = [days, words.printed(model.printDate), ...(isTest ? [words.printFirst(tile.code)] : [])];
  const left = tile.trim.x + 2;
  const headRight = tile.trim.x + tile.trim.width - HEAD_INSET_MM;
  const codeWidth = measurer.widthMm(tile.code, CODE);
  const mapRight = headRight - codeWidth - 3;
  const topWidth = measurer.widthMm(words.top(), FOOT);
  const mapLeft = mapRight - 15;
  const arrowX = mapLeft - 8;
  const textWidth = arrowX - 4 - topWidth - 4 - left;
  const titleLine = onOneLine(title, textWidth, LEGEND_BOLD, measurer);
  return [
    textBlock([titleLine], { x: left, top: 8 }, LEGEND_BOLD, measurer),
    textBlock(fitting(second, textWidth, 1, measurer), { x: left, top: 14.9 }, TIGHT_FOOT, measurer),
    textOnBaseline([words.top()], { x: arrowX - 4, baseline: 18.6, align: 'right' }, FOOT, measurer),
    straight('arrow', { x: arrowX, y: 18.8 }, { x: arrowX, y: 9 }, 0.6),
    straight('arrow', { x: arrowX - 3, y: 12.4 }, { x: arrowX, y: 9 }, 0.6),
    straight('arrow', { x: arrowX + 3, y: 12.4 }, { x: arrowX, y: 9 }, 0.6),
    ...tileMap(tile, mapLeft),
    textOnBaseline(
      [tile.code],
      { x: headRight, baseline: 18.8, align: 'right', figures: true },
      CODE,
      measurer,
    ),
  ];
}

function fitting(
  statements: readonly string[],
  widthMm: number,
  maxLines: number,
  measurer: TextMeasurer,
): string[] {
  return fitStatements(statements, widthMm, maxLines, TIGHT_FOOT, measurer).lines;
}

function tileMap(tile: Tile, left: number): Primitive[] {
  const width = 15 / tile.columns;
  const height = 10 / tile.rows;
  return Array.from({ length: tile.rows * tile.columns }, (_, index): Primitive => {
    const row = Math.floor(index / tile.columns);
    const column = index % tile.columns;
    return {
      type: 'rect',
      role: 'tile-map',
      x: roundMm(left + column * width + 0.3),
      y: roundMm(9 + row * height + 0.3),
      width: roundMm(width - 0.6),
      height: roundMm(height - 0.6),
      fill: row === tile.row && column === tile.column ? 'solid' : 'open',
      strokeMm: 0.35,
      cornerMm: 0,
    };
  });
}

/** Marks outside the trim at its four corners: cut from mark to mark. */
function cropMarks({ trim }: Tile): Primitive[] {
  const right = trim.x + trim.width;
  const bottom = trim.y + trim.height;
  return [
    { x: trim.x, y: trim.y, dx: -1, dy: -1 },
    { x: right, y: trim.y, dx: 1, dy: -1 },
    { x: trim.x, y: bottom, dx: -1, dy: 1 },
    { x: right, y: bottom, dx: 1, dy: 1 },
  ].flatMap(({ x, y, dx, dy }) => [
    straight(
      'crop',
      { x: x + dx * CROP_GAP_MM, y },
      { x: x + dx * Math.min(CROP_GAP_MM + CROP_MM, dx < 0 ? trim.x - 8 : Infinity), y },
    ),
    straight('crop', { x, y: y + dy * CROP_GAP_MM }, { x, y: y + dy * (CROP_GAP_MM + CROP_MM) }),
  ]);
}

/** Strips that the neighbours are glued over. What is printed on them is only needed until then. */
function flaps(model: SheetModel, tile: Tile, measurer: TextMeasurer): Primitive[] {
  const { trim } = tile;
  const right = trim.x + trim.width;
  const bottom = trim.y + trim.height;
  const glue = model.words.glueHere();
  const glueWidth = measurer.widthMm(glue, FOOT);
  const outer = { right: right + FLAP_MM, bottom: bottom + FLAP_MM };
  const edge = (x1: number, y1: number, x2: number, y2: number): Primitive => ({
    ...straight('cut', { x: x1, y: y1 }, { x: x2, y: y2 }),
    ink: 'grey',
  });
  const primitives: Primitive[] = [];
  if (tile.flapRight) {
    const height = trim.height - BAR_DOWN_FROM_BOTTOM_MM - 3;
    const middle = trim.y + height / 2;
    primitives.push(
      hatchedFlap(right, trim.y, FLAP_MM, height),
      edge(outer.right, trim.y, outer.right, tile.flapBelow ? outer.bottom : bottom),
      edge(right, trim.y, outer.right, trim.y),
      ...(tile.flapBelow ? [] : [edge(right, bottom, outer.right, bottom)]),
      clearing(right + 2.6, middle - glueWidth / 2 - 1.5, FLAP_MM - 5.2, glueWidth + 3),
      textUpward(glue, { x: right + FLAP_MM / 2 + 1.5, middle }, FOOT, measurer),
    );
  }
  if (tile.flapBelow) {
    const left = right - glueWidth - 16;
    const flapRight = tile.flapRight ? outer.right : right;
    const middle = (left + flapRight) / 2;
    primitives.push(
      hatchedFlap(left, bottom, flapRight - left, FLAP_MM),
      edge(trim.x, outer.bottom, flapRight, outer.bottom),
      edge(trim.x, bottom, trim.x, outer.bottom),
      ...(tile.flapRight ? [] : [edge(right, bottom, right, outer.bottom)]),
      clearing(middle - glueWidth / 2 - 1.5, bottom + 2.6, glueWidth + 3, FLAP_MM - 5.2),
      textOnBaseline(
        [glue],
        { x: middle, baseline: bottom + FLAP_MM / 2 + 1.5, align: 'middle' },
        FOOT,
        measurer,
      ),
    );
  }
  return primitives;
}

function hatchedFlap(x: number, y: number, width: number, height: number): Primitive {
  return {
    type: 'rect',
    role: 'flap',
    x: roundMm(x),
    y: roundMm(y),
    width: roundMm(width),
    height: roundMm(height),
    fill: 'wide-hatch',
    strokeMm: 0,
    cornerMm: 0,
  };
}

/** Both bars and how to print: on the flaps, or in their place where a tile has none. */
function bars(model: SheetModel, tile: Tile, measurer: TextMeasurer): Primitive[] {
  const { words } = model;
  const right = tile.trim.x + tile.trim.width;
  const bottom = tile.trim.y + tile.trim.height;
  const left = tile.trim.x + 1.5;
  const beside = left + SCALE_BAR_MM + 4;
  const room = right - beside - measurer.widthMm(words.glueHere(), FOOT) - 18;
  const peg = words.pegAndDrill({ pegMm: PEG_MM, drillMm: DRILL_MM });
  const lines = [
    ...fitting([words.measureAcross(), peg], room, 1, measurer),
    ...fitting([words.fullSize()], room, 1, measurer),
  ];
  return [
    ...barDown(
      model,
      { x: right + 3.8, top: bottom - BAR_DOWN_FROM_BOTTOM_MM, textBaseline: right + 10.2 },
      measurer,
    ),
    scaleBar('across', left, bottom + FLAP_MM / 2),
    textBlock(
      lines,
      { x: beside, top: bottom + FLAP_MM / 2 - (lines.length * leadingMm(TIGHT_FOOT)) / 2 },
      TIGHT_FOOT,
      measurer,
    ),
  ];
}

/** Three lines under everything: caution and contacts first, then care for eyes, basis and names as they fit. */
function foot(model: SheetModel, namesDawnOrDusk: boolean, measurer: TextMeasurer): Primitive[] {
  const left = 12.5;
  const top = TILE_PAGE_HEIGHT_MM - 7.6 - (FOOT_LINES + 1) * leadingMm(TIGHT_FOOT);
  const caution = model.words.shortCaution();
  const contacts = model.words.contacts(model.contacts);
  const cautionWidth = measurer.widthMm(caution, TIGHT_CAUTION);
  const room = TEXT_RIGHT_MM - left - cautionWidth - 6;
  const contactsBeside = measurer.widthMm(contacts, TIGHT_FOOT) <= room;
  const others = footStatements(model, namesDawnOrDusk, measurer).filter((text) => text !== contacts);
  const width = TEXT_RIGHT_MM - left;
  const contactsBelow = fitting([contacts], width, FOOT_LINES, measurer).length > 0;
  const numbers = contactsBelow ? contacts : model.words.contactsElsewhere();
  const rest = contactsBeside ? others : [numbers, ...others];
  return [
    textBlock(
      [onOneLine(caution, width, TIGHT_CAUTION, measurer)],
      { x: left, top },
      TIGHT_CAUTION,
      measurer,
    ),
    ...(contactsBeside
      ? [textBlock([contacts], { x: TEXT_RIGHT_MM, top, align: 'right' }, TIGHT_FOOT, measurer)]
      : []),
    textBlock(
      fitting(rest, width, FOOT_LINES, measurer),
      { x: left, top: top + leadingMm(TIGHT_FOOT) },
      TIGHT_FOOT,
      measurer,
    ),
  ];
}
