import { BLOCK_ICON_MM, EVENT_NAME, tagMark } from './word-block.js';
import { daysInMonth, isoOf } from './civil-days.js';
import type { RowLanes } from './lanes.js';
import type { Primitive } from './primitives.js';
import type { IconKey } from './icons.js';
import type { Label, SheetModel } from './sheet-model.js';
import { entryStretches } from './spans.js';
import { joinLabel, leadingMm, textBlock } from './text-layout.js';
import type { TextMeasurer, TextStyle } from './text-layout.js';
import { roundMm } from './units.js';
import { BOARD_PITCH_MM, columnLeft, rowTop } from './year-tiles.js';
import type { Tile } from './year-tiles.js';

/** Top of the names' line, from the top of a month's row. */
export const NAMES_TOP_MM = 23.1;
const BOARD_NAME: TextStyle = { ...EVENT_NAME, leadingEm: 1.38 };
const NAME_TAG: TextStyle = { role: 'tag', sizePt: 20, weight: 700 };
const TAG_MM = 9.4;
const GAP_MM = 2;
const BETWEEN_NAMES_MM = 5;
const STEP_MM = 1;

/** What wants its name on the board, and over which days of which month it may stand. */
interface Wanted {
  readonly kind: 'marker' | 'entry';
  readonly tag: string;
  readonly icon: IconKey;
  readonly titles: Label;
  readonly stays: readonly { readonly month: number; readonly from: number; readonly to: number }[];
}

/** The free ground of one month's row on one tile. */
export interface NameGround {
  readonly tile: Tile;
  readonly month: number;
  readonly lanes: RowLanes;
  /** Of the first lane, from the top of the row. */
  readonly lanesTop: number;
  readonly lanePitchMm: number;
  readonly taken: { readonly left: number; readonly right: number }[];
}

/**
 * Writes names under their bars: in full at full size where a tile's row has room near the bar, else picture and
 * number alone, else nothing but the number on the bar. The legend sheet has every name.
 * Entries come before markers: the board is for the work. Each name stands once.
 */
export function boardNames(
  model: SheetModel,
  grounds: readonly NameGround[],
  measurer: TextMeasurer,
): Map<NameGround, Primitive[]> {
  const drawn = new Map<NameGround, Primitive[]>(grounds.map((ground) => [ground, []]));
  for (const wanted of [...wantedEntries(model), ...wantedMarkers(model)]) {
    const text = joinLabel(wanted.titles);
    const fullWidth = TAG_MM + GAP_MM + BLOCK_ICON_MM + GAP_MM + measurer.widthMm(text, BOARD_NAME);
    const shortWidth = TAG_MM + GAP_MM + BLOCK_ICON_MM;
    const spot = findSpot(grounds, wanted, fullWidth) ?? findSpot(grounds, wanted, shortWidth);
    if (spot === null) continue;
    const inFull = spot.width === fullWidth;
    spot.ground.taken.push({ left: spot.left, right: spot.left + spot.width });
    const top = rowTop(spot.ground.tile, spot.ground.month) + NAMES_TOP_MM;
    const middle = top + leadingMm(BOARD_NAME) / 2;
    drawn.get(spot.ground)?.push(
      ...tagMark(wanted, { left: spot.left, middle, size: TAG_MM }, NAME_TAG, measurer),
      {
        type: 'icon',
        icon: wanted.icon,
        x: roundMm(spot.left + TAG_MM + GAP_MM),
        y: roundMm(middle - BLOCK_ICON_MM / 2),
        size: BLOCK_ICON_MM,
      },
      ...(inFull
        ? [
            textBlock(
              [text],
              { x: spot.left + TAG_MM + BLOCK_ICON_MM + 2 * GAP_MM, top },
              BOARD_NAME,
              measurer,
            ),
          ]
        : []),
    );
  }
  return drawn;
}

function findSpot(
  grounds: readonly NameGround[],
  wanted: Wanted,
  width: number,
): { ground: NameGround; left: number; width: number } | null {
  for (const stay of wanted.stays) {
    for (const ground of grounds) {
      const { tile } = ground;
      if (ground.month !== stay.month || stay.from > tile.lastDay || stay.to < tile.firstDay) continue;
      const from = columnLeft(tile, Math.max(stay.from, tile.firstDay));
      const to = columnLeft(tile, Math.min(stay.to, tile.lastDay)) + BOARD_PITCH_MM;
      const left = nearestFree(ground, { from, to }, width);
      if (left !== null) return { ground, left, width };
    }
  }
  return null;
}

/** The free place nearest to the beginning of the bar that still stands under some of the bar. */
function nearestFree(
  ground: NameGround,
  bar: { readonly from: number; readonly to: number },
  width: number,
): number | null {
  const { tile, taken } = ground;
  const min = columnLeft(tile, tile.firstDay) + 1;
  const max = columnLeft(tile, tile.lastDay) + BOARD_PITCH_MM - 1 - width;
  let best: number | null = null;
  for (let left = min; left <= max; left += STEP_MM) {
    if (left + width <= bar.from + 4 || left >= bar.to - 4) continue;
    if (
      taken.some(
        (other) => left < other.right + BETWEEN_NAMES_MM && left + width > other.left - BETWEEN_NAMES_MM,
      )
    ) {
      continue;
    }
    if (lanesBottom(ground, left, left + width) > NAMES_TOP_MM + 0.1) continue;
    if (best === null || Math.abs(left - bar.from - 1) < Math.abs(best - bar.from - 1)) best = left;
  }
  return best;
}

/** How far down the bars over a stretch reach, from the top of the row. */
function lanesBottom(ground: NameGround, left: number, right: number): number {
  const { tile, lanes } = ground;
  const over = lanes.placed.filter(
    (span) => columnLeft(tile, span.from) < right && columnLeft(tile, span.to) + BOARD_PITCH_MM > left,
  );
  // The names of bars left over stand below the lowest lane, anywhere along the row.
  const rest = lanes.left.length > 0 ? lanes.laneCount + 1 : 0;
  const lowest = Math.max(rest, ...over.map((span) => span.lane + 1));
  return ground.lanesTop + lowest * ground.lanePitchMm;
}

function wantedEntries(model: SheetModel): Wanted[] {
  return model.entries.map((entry) => {
    const main = entryStretches(entry).filter(({ look }) => look !== 'margin');
    const fixed = entry.fixedDate === null ? [] : [{ from: entry.fixedDate, to: entry.fixedDate }];
    const any = main.length > 0 || fixed.length > 0 ? [...main, ...fixed] : entryStretches(entry);
    return {
      kind: 'entry',
      tag: String(entry.number),
      icon: entry.icon,
      titles: entry.titles,
      stays: any.flatMap(({ from, to }) => staysOf(model.year, from, to)),
    };
  });
}

function wantedMarkers(model: SheetModel): Wanted[] {
  return model.markers.map((marker) => ({
    kind: 'marker',
    tag: marker.letter,
    icon: marker.icon,
    titles: marker.titles,
    stays: marker.expected === null ? [] : staysOf(model.year, marker.expected, marker.expected),
  }));
}

/** A stretch of dates as days of the months of the year. */
function staysOf(year: number, from: string, to: string): Wanted['stays'] {
  return Array.from({ length: 12 }, (_, index) => index + 1).flatMap((month) => {
    const last = daysInMonth(year, month);
    const monthFrom = isoOf(year, month, 1);
    const monthTo = isoOf(year, month, last);
    if (from > monthTo || to < monthFrom) return [];
    return [
      {
        month,
        from: from < monthFrom ? 1 : Number(from.slice(8)),
        to: to > monthTo ? last : Number(to.slice(8)),
      },
    ];
  });
}
