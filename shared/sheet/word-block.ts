import type { IconKey } from './icons.js';
import type { Primitive } from './primitives.js';
import type { Label } from './sheet-model.js';
import { STROKE_MM } from './strokes.js';
import { capHeightMm, leadingMm, textBlock, textOnBaseline, wrapLabel, wrapText } from './text-layout.js';
import type { TextMeasurer, TextStyle } from './text-layout.js';
import { circlesWidthMm, tickCircles } from './tick-circles.js';
import { roundMm } from './units.js';

export const EVENT_NAME: TextStyle = { role: 'event-name', sizePt: 30, weight: 700 };
export const LEGEND: TextStyle = { role: 'legend', sizePt: 14, weight: 400 };
export const LEGEND_BOLD: TextStyle = { role: 'legend', sizePt: 14, weight: 700 };
const BIG_TAG: TextStyle = { role: 'tag', sizePt: 20, weight: 700 };
const SMALL_TAG: TextStyle = { role: 'tag', sizePt: 12, weight: 700 };

export const BLOCK_ICON_MM = 15;
const BIG_TAG_MM = 9.4;
const TITLE_INDENT_MM = 29;
const SIDE_GAP_MM = 5;
const AFTER_BLOCK_MM = 0.8;

/** One line of words with all that stands in it; a block is cut between rows only. */
export interface WordRow {
  readonly height: number;
  draw(top: number): Primitive[];
}

export interface WordBlock {
  readonly rows: readonly WordRow[];
  readonly height: number;
}

/** The same thing with and without all there is to know about it. */
export interface CardWords {
  readonly short: WordBlock;
  readonly full: WordBlock;
}

export interface BlockArea {
  readonly left: number;
  readonly right: number;
}

/** How a marker or an entry is named in a block. */
export interface BlockName {
  readonly tag: string;
  readonly kind: 'marker' | 'entry';
  readonly icon: IconKey;
  readonly titles: Label;
}

/** Something to know about an entry; circles to be ticked stand before its words. */
export interface WordDetail {
  readonly text: string;
  readonly bold: boolean;
  readonly circles?: number;
}

function block(rows: readonly WordRow[]): WordBlock {
  return { rows, height: rows.reduce((sum, row) => sum + row.height, 0) };
}

/**
 * A name at reading size from across a room: tag, picture and title, its days at the right where they fit
 * without another line, else as a sentence below; then what to know, at the size for reading in the hand.
 */
export function nameBlock(
  name: BlockName,
  when: { readonly side: readonly string[]; readonly sentence: string },
  details: readonly WordDetail[],
  area: BlockArea,
  measurer: TextMeasurer,
): CardWords {
  const left = area.left + TITLE_INDENT_MM;
  const width = area.right - left;
  const sideWidth = Math.max(0, ...when.side.map((line) => measurer.widthMm(line, LEGEND))) + SIDE_GAP_MM;
  const wide = wrapLabel(name.titles, width, EVENT_NAME, measurer);
  const narrow = wrapLabel(name.titles, width - sideWidth, EVENT_NAME, measurer);
  const daysAtTheSide = when.side.length > 0 && narrow.length === wide.length;
  const titles = daysAtTheSide ? narrow : wide;
  const titleHeight = leadingMm(EVENT_NAME);

  const rows: WordRow[] = titles.map((title, index) => ({
    height: titleHeight,
    draw: (top) => [
      ...(index === 0
        ? tagAndPicture(name, { left: area.left, middle: top + titleHeight / 2 }, measurer)
        : []),
      textBlock([title], { x: left, top }, EVENT_NAME, measurer),
      ...(index === 0 && daysAtTheSide
        ? [
            textBlock(
              when.side,
              {
                x: area.right,
                top: top + (titleHeight - when.side.length * leadingMm(LEGEND)) / 2,
                align: 'right',
              },
              LEGEND,
              measurer,
            ),
          ]
        : []),
    ],
  }));
  const said = ({ text, bold, circles = 0 }: WordDetail): WordRow[] => {
    const style = bold ? LEGEND_BOLD : LEGEND;
    const height = leadingMm(style);
    const x = left + circlesWidthMm(circles);
    return wrapText(text, area.right - x, style, measurer).map((line, index) => ({
      height,
      draw: (top) => [
        ...(index === 0 ? tickCircles(circles, { left, middle: top + height / 2 }) : []),
        textBlock([line], { x, top }, style, measurer),
      ],
    }));
  };
  if (!daysAtTheSide) rows.push(...said({ text: when.sentence, bold: false }));
  const end: WordRow = { height: AFTER_BLOCK_MM, draw: () => [] };
  const more = details.flatMap(said);
  return { short: block([...rows, end]), full: block([...rows, ...more, end]) };
}

/** One line of the small list: what is only at its edge in this month. */
export function smallBlock(
  name: { readonly tag: string; readonly kind: 'marker' | 'entry' },
  sentence: string,
  area: BlockArea,
  measurer: TextMeasurer,
): CardWords {
  const left = area.left + 9;
  const height = leadingMm(LEGEND);
  const small = block(
    wrapText(sentence, area.right - left, LEGEND, measurer).map((line, index) => ({
      height,
      draw: (top) => [
        ...(index === 0
          ? tagMark(name, { left: area.left, middle: top + height / 2, size: 5 }, SMALL_TAG, measurer)
          : []),
        textBlock([line], { x: left, top }, LEGEND, measurer),
      ],
    })),
  );
  return { short: small, full: small };
}

/** Plain lines without a tag, with white ground of `afterMm` after them. */
export function plainBlock(
  text: string,
  style: TextStyle,
  area: BlockArea,
  measurer: TextMeasurer,
  afterMm = 0,
): WordBlock {
  const lines = wrapText(text, area.right - area.left, style, measurer);
  return block(
    lines.map((line, index) => ({
      height: leadingMm(style) + (index === lines.length - 1 ? afterMm : 0),
      draw: (top) => [textBlock([line], { x: area.left, top }, style, measurer)],
    })),
  );
}

function tagAndPicture(
  name: BlockName,
  at: { readonly left: number; readonly middle: number },
  measurer: TextMeasurer,
): Primitive[] {
  return [
    ...tagMark(name, { ...at, size: BIG_TAG_MM }, BIG_TAG, measurer),
    {
      type: 'icon',
      icon: name.icon,
      x: roundMm(at.left + 11.8),
      y: roundMm(at.middle - BLOCK_ICON_MM / 2),
      size: BLOCK_ICON_MM,
    },
  ];
}

/** A marker's letter in a black round, an entry's number in a square; wider where it has more figures. */
export function tagMark(
  name: { readonly tag: string; readonly kind: 'marker' | 'entry' },
  at: { readonly left: number; readonly middle: number; readonly size: number },
  style: TextStyle,
  measurer: TextMeasurer,
): Primitive[] {
  const isMarker = name.kind === 'marker';
  const width = Math.max(at.size, measurer.widthMm(name.tag, style) + (isMarker ? 3 : 2));
  return [
    {
      type: 'rect',
      role: 'tag',
      x: roundMm(at.left + STROKE_MM / 2),
      y: roundMm(at.middle - at.size / 2),
      width: roundMm(width),
      height: at.size,
      fill: isMarker ? 'solid' : 'paper',
      strokeMm: STROKE_MM,
      cornerMm: isMarker ? at.size / 2 : 0,
    },
    textOnBaseline(
      [name.tag],
      {
        x: at.left + STROKE_MM / 2 + width / 2,
        baseline: at.middle + capHeightMm(style.sizePt) / 2,
        align: 'middle',
        figures: true,
        paint: isMarker ? 'paper' : 'ink',
      },
      style,
      measurer,
    ),
  ];
}

/**
 * What stands on a card and what goes on to the next. Everything in full where it fits; else the names in their
 * order as long as they fit, the first of them in full as far as room is left, and a line that points onward.
 * What was cut short or left out comes again in full.
 */
export function planCard(
  items: readonly CardWords[],
  heightMm: number,
  pointerHeightMm: number,
): { readonly here: WordBlock[]; readonly onward: WordBlock[] } {
  if (sumOf(items.map(({ full }) => full)) <= heightMm) {
    return { here: items.map(({ full }) => full), onward: [] };
  }
  let room = heightMm - pointerHeightMm;
  let count = 0;
  for (const { short } of items) {
    if (short.height > room) break;
    room -= short.height;
    count += 1;
  }
  const here: WordBlock[] = [];
  const onward: WordBlock[] = [];
  for (const { short, full } of items.slice(0, count)) {
    const more = full.height - short.height;
    if (more > room) {
      here.push(short);
      onward.push(full);
    } else {
      here.push(full);
      room -= more;
    }
  }
  return { here, onward: [...onward, ...items.slice(count).map(({ full }) => full)] };
}

function sumOf(blocks: readonly WordBlock[]): number {
  return blocks.reduce((sum, each) => sum + each.height, 0);
}

/**
 * Fills areas of one height with blocks in their order. A block moves on whole where a fresh area can hold it,
 * and is cut between its rows only where none could. No block, no area.
 */
export function flowBlocks(blocks: readonly WordBlock[], heightMm: number): WordRow[][] {
  if (blocks.length === 0) return [];
  const areas: WordRow[][] = [[]];
  let room = heightMm;
  const turn = (): void => {
    areas.push([]);
    room = heightMm;
  };
  for (const each of blocks) {
    if (each.height > room && each.height <= heightMm) turn();
    for (const row of each.rows) {
      if (row.height > room) turn();
      areas.at(-1)?.push(row);
      room -= row.height;
    }
  }
  return areas;
}
