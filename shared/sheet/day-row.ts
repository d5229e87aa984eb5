import { hatchedBar, STROKE_MM } from './strokes.js';
import type { RowLanes, RowSpan } from './lanes.js';
import type { Primitive, RingPrimitive } from './primitives.js';
import { capHeightMm, textOnBaseline } from './text-layout.js';
import type { TextMeasurer, TextStyle } from './text-layout.js';
import { roundMm } from './units.js';

export const RING_RADIUS_MM = 3;
export const RING_CROSS_MM = 3;

const BAR_MM = 2.4;
const TAG_HEIGHT_MM = 3.7;
const TAG_STYLE: TextStyle = { role: 'tag', sizePt: 12, weight: 700 };
const DAY_STYLE: TextStyle = { role: 'day-number', sizePt: 20, weight: 700 };

/** One row of holes: a week of a card, or the columns of a month that one tile holds. */
export interface DayRow {
  /** Left edge of a day's cell. */
  readonly leftOf: (day: number) => number;
  readonly pitchMm: number;
  readonly top: number;
  /** Centre of a hole from the left and the top of its cell. */
  readonly ringDx: number;
  readonly ringDy: number;
  readonly lanesTop: number;
  readonly lanePitchMm: number;
}

/** The hole of a day and its number beside it. */
export function dayHole(
  row: DayRow,
  day: { readonly date: string; readonly number: number; readonly isLeapDay: boolean },
  measurer: TextMeasurer,
): Primitive[] {
  const cx = row.leftOf(day.number) + row.ringDx;
  const cy = row.top + row.ringDy;
  const ring: RingPrimitive = {
    type: 'ring',
    date: day.date,
    cx: roundMm(cx),
    cy: roundMm(cy),
    radius: RING_RADIUS_MM,
    crossLength: RING_CROSS_MM,
    strokeMm: STROKE_MM,
    dashed: day.isLeapDay,
  };
  const number = textOnBaseline(
    [String(day.number)],
    { x: cx + RING_RADIUS_MM + 1.1, baseline: cy + capHeightMm(DAY_STYLE.sizePt) / 2, figures: true },
    DAY_STYLE,
    measurer,
  );
  return [ring, number];
}

/** The bars and brackets under a row of holes. */
export function rowBars(row: DayRow, lanes: RowLanes, measurer: TextMeasurer): Primitive[] {
  return lanes.placed.flatMap((placed) =>
    placed.span.kind === 'marker' ? markerBracket(row, placed, measurer) : entryBar(row, placed, measurer),
  );
}

export function laneMiddle(row: DayRow, lane: number): number {
  return row.top + row.lanesTop + (lane + 0.5) * row.lanePitchMm;
}

/** Where a tag begins: a letter stands at its expected day, everything else at the beginning of its stretch. */
function tag(
  text: string,
  at: { readonly left: number; readonly middle: number },
  look: 'square' | 'round-solid' | 'round-open',
  measurer: TextMeasurer,
): { primitives: Primitive[]; right: number } {
  const isRound = look !== 'square';
  const textWidth = measurer.widthMm(text, TAG_STYLE);
  const width = Math.max(textWidth + (isRound ? 2.2 : 1.5), TAG_HEIGHT_MM + (isRound ? 0.5 : 0.2));
  const height = TAG_HEIGHT_MM;
  return {
    right: at.left + width,
    primitives: [
      {
        type: 'rect',
        role: 'tag',
        x: roundMm(at.left),
        y: roundMm(at.middle - height / 2),
        width: roundMm(width),
        height: roundMm(height),
        fill: look === 'round-solid' ? 'solid' : 'paper',
        strokeMm: STROKE_MM,
        cornerMm: isRound ? roundMm(height / 2) : 0,
      },
      textOnBaseline(
        [text],
        {
          x: at.left + width / 2,
          baseline: at.middle + capHeightMm(TAG_STYLE.sizePt) / 2,
          align: 'middle',
          figures: true,
          paint: look === 'round-solid' ? 'paper' : 'ink',
        },
        TAG_STYLE,
        measurer,
      ),
    ],
  };
}

/** A bracket over the days of a marker's range; the black letter is its expected day. */
function markerBracket(row: DayRow, placed: RowSpan, measurer: TextMeasurer): Primitive[] {
  const { span, from, to } = placed;
  const y = roundMm(laneMiddle(row, placed.lane));
  const opens = span.begins && span.from === from;
  const closes = span.ends && span.to === to;
  const left = roundMm(row.leftOf(from) + (opens ? 0.6 : 0));
  const right = roundMm(row.leftOf(to) + row.pitchMm - (closes ? 0.6 : 0));
  const line = (x1: number, y1: number, x2: number, y2: number): Primitive => ({
    type: 'line',
    role: 'bracket',
    x1,
    y1,
    x2,
    y2,
    strokeMm: 0.6,
    ink: 'ink',
  });
  const point = span.point !== null && span.point >= from && span.point <= to ? span.point : null;
  const width = Math.max(measurer.widthMm(span.tag, TAG_STYLE) + 2.2, TAG_HEIGHT_MM + 0.5);
  const tagLeft = point === null ? left + 1.2 : row.leftOf(point) + row.ringDx - width / 2;
  return [
    line(left, y, right, y),
    ...(opens ? [line(left, roundMm(y - 1.7), left, y)] : []),
    ...(closes ? [line(right, roundMm(y - 1.7), right, y)] : []),
    ...tag(span.tag, { left: tagLeft, middle: y }, point === null ? 'round-open' : 'round-solid', measurer)
      .primitives,
  ];
}

/** An entry's bar in one row: its number, then early margin, best days, late margin; or the open bar of a watch. */
function entryBar(row: DayRow, placed: RowSpan, measurer: TextMeasurer): Primitive[] {
  const { span, from, to } = placed;
  const middle = laneMiddle(row, placed.lane);
  const named = tag(span.tag, { left: row.leftOf(from) + 0.2, middle }, 'square', measurer);
  const barLeft = named.right + 0.5;
  const closes = span.ends && span.to === to;
  const rowRight = row.leftOf(to) + row.pitchMm - (closes ? 0.8 : 0);
  const bars = span.parts.flatMap((part): Primitive[] => {
    if (part.to < from || part.from > to) return [];
    const left = Math.max(barLeft, row.leftOf(Math.max(part.from, from)));
    const right = Math.min(rowRight, row.leftOf(Math.min(part.to, to)) + row.pitchMm);
    if (right - left < 0.4) return [];
    return [hatchedBar(part.look, { left, right, middle, height: BAR_MM })];
  });
  return [...bars, ...named.primitives, ...stopAndPoint(row, placed, { middle, right: rowRight })];
}

/** The wall at the end of a bar whose last day is fixed, and the diamond of a single fixed day. */
function stopAndPoint(
  row: DayRow,
  { span, from, to }: RowSpan,
  at: { readonly middle: number; readonly right: number },
): Primitive[] {
  const primitives: Primitive[] = [];
  if (span.stop !== null && span.stop >= from && span.stop <= to) {
    const right = row.leftOf(span.stop) + row.pitchMm - 0.8;
    primitives.push({
      type: 'rect',
      role: 'last-advised',
      x: roundMm(right - 1.2),
      y: roundMm(at.middle - 1.95),
      width: 1.2,
      height: 3.9,
      fill: 'solid',
      strokeMm: 0,
      cornerMm: 0,
    });
  }
  if (span.point !== null && span.point >= from && span.point <= to) {
    primitives.push({
      type: 'diamond',
      cx: roundMm(row.leftOf(span.point) + row.pitchMm / 2),
      cy: roundMm(at.middle),
      reach: 2,
    });
  }
  return primitives;
}
