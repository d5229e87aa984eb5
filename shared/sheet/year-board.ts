import { boardNames } from './board-names.js';
import type { NameGround } from './board-names.js';
import { daysInMonth, isoOf, nextLeapYears } from './civil-days.js';
import { dayHole, laneMiddle, rowBars } from './day-row.js';
import type { DayRow } from './day-row.js';
import { cutLanes, lanesOfRow } from './lanes.js';
import { holesOfMonth, monthTitle, MONTH_NAME } from './month-head.js';
import { moonDisc } from './moon.js';
import { FOOT } from './page-foot.js';
import type { Primitive, SheetPage } from './primitives.js';
import type { SheetModel } from './sheet-model.js';
import { spansOfMonth } from './spans.js';
import { straight } from './strokes.js';
import { capHeightMm, onOneLine, textBlock, textOnBaseline, wrapText } from './text-layout.js';
import type { TextMeasurer, TextStyle } from './text-layout.js';
import { tileFrame } from './tile-frame.js';
import { versionFigure } from './version-figure.js';
import { watermarked } from './watermark.js';
import { legendPages } from './year-legend.js';
import {
  BOARD_PITCH_MM,
  BOARD_ROW_MM,
  boardTiles,
  columnLeft,
  LABEL_COLUMN_MM,
  rowTop,
  TILE_PAGE_HEIGHT_MM,
  TILE_PAGE_WIDTH_MM,
} from './year-tiles.js';
import type { Tile } from './year-tiles.js';

const LANES_TOP_MM = 8.3;
/** Three lanes stand apart; more close up, and four still leave room for a name below. */
const WIDE_LANES_MM = 4.4;
const CLOSE_LANES_MM = 3.7;
const MAX_LANES = 6;
const MOON_DATE: TextStyle = { role: 'moon-date', sizePt: 14, weight: 700 };

/** Nine tiles of the board, then the legend sheets that hang beside it. */
export function yearBoard(model: SheetModel, measurer: TextMeasurer): SheetPage[] {
  const grounds = boardTiles().flatMap((tile) => tileGrounds(model, tile));
  const names = boardNames(model, grounds, measurer);
  const tiles = boardTiles().map((tile): SheetPage => {
    const rows = grounds.filter((ground) => ground.tile.code === tile.code);
    const primitives = [
      ...rows.flatMap((ground) => [...monthRow(model, ground, measurer), ...(names.get(ground) ?? [])]),
      ...edges(tile),
    ];
    const namesMarkers = rows.some(({ lanes }) => lanes.placed.some(({ span }) => span.kind === 'marker'));
    return {
      kind: 'tile',
      name: tile.code,
      width: TILE_PAGE_WIDTH_MM,
      height: TILE_PAGE_HEIGHT_MM,
      month: null,
      trim: tile.trim,
      primitives: watermarked(
        model,
        [...tileFrame(model, tile, namesMarkers, measurer), ...primitives],
        tile.trim,
        measurer,
      ),
    };
  });
  return [...tiles, ...legendPages(model, measurer)];
}

function tileGrounds(model: SheetModel, tile: Tile): NameGround[] {
  return Array.from({ length: tile.lastMonth - tile.firstMonth + 1 }, (_, index) => {
    const month = tile.firstMonth + index;
    const days = daysInMonth(model.year, month);
    const last = Math.min(tile.lastDay, days);
    // Lanes are given out for the whole month, so that a bar goes on at its height over a seam.
    const ofMonth = lanesOfRow(
      spansOfMonth(model.year, month, model.markers, model.entries),
      1,
      days,
      MAX_LANES,
    );
    const used = ofMonth.laneCount + (ofMonth.left.length > 0 ? 1 : 0);
    const holdsIssue = month === 2 && tile.lastDay === 31;
    return {
      tile,
      month,
      lanes: cutLanes(ofMonth, tile.firstDay, last),
      lanesTop: LANES_TOP_MM,
      lanePitchMm: used <= 3 ? WIDE_LANES_MM : CLOSE_LANES_MM,
      // The gap after February holds the issue; no name may stand in it.
      taken: holdsIssue
        ? [{ left: columnLeft(tile, last + 1), right: columnLeft(tile, tile.lastDay) + BOARD_PITCH_MM }]
        : [],
    };
  });
}

/** A line over every row, and under the last. */
function edges(tile: Tile): Primitive[] {
  const left = tile.trim.x;
  const right = left + tile.trim.width;
  return Array.from({ length: tile.lastMonth - tile.firstMonth + 2 }, (_, index) => {
    const y = tile.trim.y + index * BOARD_ROW_MM;
    return straight('row', { x: left, y }, { x: right, y }, 0.4);
  });
}

function monthRow(model: SheetModel, ground: NameGround, measurer: TextMeasurer): Primitive[] {
  const { tile, month, lanes } = ground;
  const row: DayRow = {
    leftOf: (day) => columnLeft(tile, day),
    pitchMm: BOARD_PITCH_MM,
    top: rowTop(tile, month),
    ringDx: 5.2,
    ringDy: 4.6,
    lanesTop: ground.lanesTop,
    lanePitchMm: ground.lanePitchMm,
  };
  const last = Math.min(tile.lastDay, daysInMonth(model.year, month));
  const primitives: Primitive[] = tile.hasLabels ? monthLabel(model, tile, month, measurer) : [];
  for (let day = tile.firstDay; day <= last; day += 1) {
    const isLeapDay = month === 2 && day === 29;
    primitives.push(
      ...dayHole(row, { date: isoOf(model.year, month, day), number: day, isLeapDay }, measurer),
    );
  }
  primitives.push(...rowBars(row, lanes, measurer));
  if (lanes.left.length > 0) {
    const numbers = `+ ${lanes.left.map(({ tag }) => tag).join(', ')}`;
    const x = columnLeft(tile, tile.firstDay) + 0.4;
    const room = columnLeft(tile, tile.lastDay) + BOARD_PITCH_MM - x - 1;
    const fits = measurer.widthMm(numbers, FOOT) <= room;
    const text = fits ? numbers : model.words.moreBars(lanes.left.length);
    const baseline = laneMiddle(row, lanes.laneCount) + capHeightMm(FOOT.sizePt) / 2;
    primitives.push(textOnBaseline([text], { x, baseline, figures: true }, FOOT, measurer));
  }
  if (month === 2 && tile.lastDay === 31) primitives.push(...issueInTheGap(model, tile, last, measurer));
  return primitives;
}

/** Month, its holes and its Moons, in the column at the left of the board. */
function monthLabel(model: SheetModel, tile: Tile, month: number, measurer: TextMeasurer): Primitive[] {
  const left = tile.trim.x + 1.5;
  const top = rowTop(tile, month);
  const width = LABEL_COLUMN_MM - 4;
  const title = monthTitle(model, month, width, measurer);
  const holes = holesOfMonth(model, month);
  const both = title.other === null ? holes : `${title.other} · ${holes}`;
  const under = measurer.widthMm(both, FOOT) <= width ? both : onOneLine(holes, width, FOOT, measurer);
  const moons = model.moon
    .filter(({ date }) => date.startsWith(isoOf(model.year, month, 1).slice(0, 8)))
    .toSorted((a, b) => (a.date < b.date ? -1 : 1));
  return [
    textOnBaseline([title.large], { x: left, baseline: top + 14.6 }, MONTH_NAME, measurer),
    textBlock([under], { x: left, top: top + 19.8 }, FOOT, measurer),
    ...moons.flatMap(({ phase, date }, index): Primitive[] => {
      const cx = left + 3.4 + index * 15;
      const cy = top + 31.4;
      return [
        moonDisc(phase, model.latitudeDeg, { cx, cy, radius: 3.2 }),
        textOnBaseline(
          [String(Number(date.slice(8)))],
          { x: cx + 4.3, baseline: cy + capHeightMm(MOON_DATE.sizePt) / 2, figures: true },
          MOON_DATE,
          measurer,
        ),
      ];
    }),
  ];
}

/** February leaves a gap: the issue stands there in large figures, and the leap years beside the leap day. */
function issueInTheGap(model: SheetModel, tile: Tile, lastDay: number, measurer: TextMeasurer): Primitive[] {
  const left = columnLeft(tile, lastDay + 1) + 1.5;
  const right = columnLeft(tile, tile.lastDay) + BOARD_PITCH_MM - 1.5;
  const top = rowTop(tile, 2);
  const note =
    lastDay === 29
      ? wrapText(
          model.words.leapYearsShort(nextLeapYears(model.year, 2)),
          right - left,
          FOOT,
          measurer,
        ).slice(0, 2)
      : [];
  return [
    ...(note.length > 0 ? [textBlock(note, { x: left, top: top + 0.9 }, FOOT, measurer)] : []),
    ...versionFigure(model, { left, right, baseline: top + BOARD_ROW_MM - 2.2 }, measurer).primitives,
  ];
}
