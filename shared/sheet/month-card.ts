import { barLegend } from './bar-legend.js';
import { CARD_AREA, CARD_BOTTOM_MM, CARD_PITCH_MM, cardPage, stackedRows } from './card-page.js';
import { daysInMonth, isoOf, nextLeapYears, weekdayOf } from './civil-days.js';
import { dayHole, laneMiddle, rowBars } from './day-row.js';
import type { DayRow } from './day-row.js';
import { lanesOfRow } from './lanes.js';
import type { RowLanes, RowSpan } from './lanes.js';
import { cardHead, holesOfMonth } from './month-head.js';
import { moonDayMark, moonDayOf } from './moon-days.js';
import { monthWords } from './month-words.js';
import { FOOT, pageFoot } from './page-foot.js';
import type { Primitive, SheetPage } from './primitives.js';
import type { SheetModel } from './sheet-model.js';
import { spansOfMonth } from './spans.js';
import { rule } from './strokes.js';
import { capHeightMm, leadingMm, textBlock, textOnBaseline, wrapText } from './text-layout.js';
import type { TextMeasurer, TextStyle } from './text-layout.js';
import { flowBlocks, LEGEND, LEGEND_BOLD, planCard, plainBlock } from './word-block.js';
import { wordCards } from './word-cards.js';

const { left: LEFT_MM, right: RIGHT_MM } = CARD_AREA;
const RING_DY_MM = 4.9;
/** Higher than the day's number, so that the two are never read as one. */
const MOON_DAY_DY_MM = 2.9;
const LANES_TOP_MM = 8.8;
const LANES_HEIGHT_MM = 16.2;
const MAX_LANES = 4;
const WEEKDAY: TextStyle = { role: 'weekday', sizePt: 14, weight: 400 };

/** Twelve cards, each followed by what did not fit on it at full size, and after them those that are no month's. */
export function monthCards(model: SheetModel, measurer: TextMeasurer): SheetPage[] {
  const months = Array.from({ length: 12 }, (_, index) => index + 1);
  return [...months.flatMap((month) => cardsOfMonth(model, month, measurer)), ...wordCards(model, measurer)];
}

function cardsOfMonth(model: SheetModel, month: number, measurer: TextMeasurer): SheetPage[] {
  const grid = monthGrid(model, month, measurer);
  const name = model.words.monthName(month).officer;
  const pointer = plainBlock(model.words.moreOnNextCard(name), LEGEND_BOLD, CARD_AREA, measurer);
  const wordsTop = grid.bottom + 1;
  const footRoom = CARD_BOTTOM_MM - wordsTop - pointer.height - 1;
  const foot = pageFoot(model, CARD_AREA, namesMarkers(model, month), footRoom, measurer);
  const footTop = CARD_BOTTOM_MM - foot.height;
  const fresh = continuationTop(model, month, measurer);
  const items = monthWords(model, month, CARD_AREA, measurer);
  const statements = foot.leftOut.map((text) => plainBlock(text, LEGEND, CARD_AREA, measurer));
  const { here, onward } = planCard(
    [...items, ...statements.map((block) => ({ short: block, full: block }))],
    footTop - wordsTop - 0.5,
    pointer.height,
  );
  const hereRows = [...here, ...(onward.length > 0 ? [pointer] : [])].flatMap(({ rows }) => rows);
  const following = flowBlocks(onward, footTop - fresh - 2);
  const cards = following.length + 1;
  const ofMonth = (card: number): string => model.words.cardOf({ month: name, card, cards });
  return [
    cardPage(
      model,
      { kind: 'month-card', month, name },
      [...grid.primitives, ...stackedRows(hereRows, wordsTop), ...foot.draw(footTop)],
      measurer,
    ),
    ...following.map((rows, index) => {
      const head = continuationHead(model, month, ofMonth(index + 2), measurer);
      return cardPage(
        model,
        { kind: 'continuation', month, name: ofMonth(index + 2) },
        [...head, ...stackedRows(rows, fresh), ...foot.draw(footTop)],
        measurer,
      );
    }),
  ];
}

/** Dawn and dusk are spoken of where a marker's range touches the month. */
function namesMarkers(model: SheetModel, month: number): boolean {
  return spansOfMonth(model.year, month, model.markers, []).length > 0;
}

function continuationTop(model: SheetModel, month: number, measurer: TextMeasurer): number {
  return cardHead(model, month, holesOfMonth(model, month), CARD_AREA, measurer).bottom + 4;
}

function continuationHead(
  model: SheetModel,
  month: number,
  second: string,
  measurer: TextMeasurer,
): Primitive[] {
  const head = cardHead(model, month, second, CARD_AREA, measurer);
  return [...head.primitives, rule(LEFT_MM, RIGHT_MM, continuationTop(model, month, measurer) - 2.5)];
}

/** Title, weekdays, holes, bars and the key to the bars. */
function monthGrid(
  model: SheetModel,
  month: number,
  measurer: TextMeasurer,
): { primitives: Primitive[]; bottom: number } {
  const { words, year } = model;
  const head = cardHead(model, month, holesOfMonth(model, month), CARD_AREA, measurer);
  const gridTop = Math.max(46, head.bottom + 7.6);
  const firstWeekday = model.firstWeekday ?? 1;
  const lead = (weekdayOf(isoOf(year, month, 1)) - firstWeekday + 7) % 7;
  const days = daysInMonth(year, month);
  const weeks = Math.ceil((lead + days) / 7);
  const spans = spansOfMonth(year, month, model.markers, model.entries);
  const primitives: Primitive[] = [...head.primitives];
  const shown: RowSpan[] = [];

  for (let column = 0; column < 7; column += 1) {
    const x = LEFT_MM + column * CARD_PITCH_MM + 3.1;
    const name = words.weekdayShort(((firstWeekday - 1 + column) % 7) + 1);
    primitives.push(textOnBaseline([name], { x, baseline: gridTop - 2 }, WEEKDAY, measurer));
  }
  for (let week = 0; week < weeks; week += 1) {
    const from = Math.max(1, week * 7 - lead + 1);
    const to = Math.min(days, week * 7 - lead + 7);
    const lanes = lanesOfRow(spans, from, to, MAX_LANES);
    const row = weekRow(gridTop + week * CARD_PITCH_MM, week * 7 - lead + 1, lanes);
    primitives.push(rule(LEFT_MM, RIGHT_MM, row.top));
    for (let day = from; day <= to; day += 1) {
      const isLeapDay = month === 2 && day === 29;
      const date = isoOf(year, month, day);
      primitives.push(...dayHole(row, { date, number: day, isLeapDay }, measurer));
      const moonDay = moonDayOf(date, model.moonBegins);
      const right = row.leftOf(day) + CARD_PITCH_MM - 0.7;
      if (moonDay !== null) {
        primitives.push(moonDayMark(moonDay, { right, middle: row.top + MOON_DAY_DY_MM }, measurer));
      }
    }
    primitives.push(...rowBars(row, lanes, measurer), ...leftOver(model, row, from, lanes, measurer));
    shown.push(...lanes.placed);
  }
  const gridBottom = gridTop + weeks * CARD_PITCH_MM;
  primitives.push(rule(LEFT_MM, RIGHT_MM, gridBottom));

  let bottom = gridBottom + 0.6;
  if (month === 2 && days === 29) {
    const note = leapNote(
      model,
      { column: (lead + 28) % 7, rowTop: gridBottom - CARD_PITCH_MM, bottom },
      measurer,
    );
    primitives.push(...note.primitives);
    bottom = note.bottom;
  }
  const key = barLegend(
    model,
    shown,
    { ...CARD_AREA, top: bottom, moonDays: model.moonBegins.length > 0 },
    measurer,
  );
  return { primitives: [...primitives, ...key.primitives], bottom: bottom + key.height };
}

function weekRow(top: number, firstDay: number, lanes: RowLanes): DayRow {
  const used = Math.max(3, lanes.laneCount + (lanes.left.length > 0 ? 1 : 0));
  return {
    leftOf: (day) => LEFT_MM + (day - firstDay) * CARD_PITCH_MM,
    pitchMm: CARD_PITCH_MM,
    top,
    ringDx: 6.15,
    ringDy: RING_DY_MM,
    lanesTop: LANES_TOP_MM,
    lanePitchMm: LANES_HEIGHT_MM / used,
  };
}

/** Names of the bars that a week has no room for: their numbers where these fit, else how many they are. */
function leftOver(
  model: SheetModel,
  row: DayRow,
  firstDay: number,
  lanes: RowLanes,
  measurer: TextMeasurer,
): Primitive[] {
  if (lanes.left.length === 0) return [];
  const start = row.leftOf(firstDay) + 0.2;
  const numbers = `+ ${lanes.left.map(({ tag }) => tag).join(', ')}`;
  const fits = measurer.widthMm(numbers, FOOT) <= RIGHT_MM - start;
  const text = fits ? numbers : model.words.moreBars(lanes.left.length);
  // A first week that begins late in the row has free ground to its left.
  const x = Math.max(LEFT_MM, Math.min(start, RIGHT_MM - measurer.widthMm(text, FOOT)));
  const baseline = laneMiddle(row, lanes.laneCount) + capHeightMm(FOOT.sizePt) / 2;
  return [textOnBaseline([text], { x, baseline, figures: true }, FOOT, measurer)];
}

/** Beside 29 February: the years that have it. In one line in the free cells to its right, or under the holes. */
function leapNote(
  model: SheetModel,
  at: { readonly column: number; readonly rowTop: number; readonly bottom: number },
  measurer: TextMeasurer,
): { primitives: Primitive[]; bottom: number } {
  const years = nextLeapYears(model.year, 3);
  const short = model.words.leapYearsShort(years);
  const left = LEFT_MM + (at.column + 1) * CARD_PITCH_MM + 2;
  if (measurer.widthMm(short, FOOT) <= RIGHT_MM - left) {
    const baseline = at.rowTop + RING_DY_MM + capHeightMm(FOOT.sizePt) / 2;
    return {
      primitives: [textOnBaseline([short], { x: left, baseline }, FOOT, measurer)],
      bottom: at.bottom,
    };
  }
  const lines = wrapText(model.words.leapYearsOnly(years), RIGHT_MM - LEFT_MM, LEGEND, measurer);
  return {
    primitives: [textBlock(lines, { x: RIGHT_MM, top: at.bottom, align: 'right' }, LEGEND, measurer)],
    bottom: at.bottom + lines.length * leadingMm(LEGEND),
  };
}
