import { useMemo, type ReactNode } from 'react';
import { Peg } from '../pegs.js';
import { percent, startPercent, type DaySpan } from './day-span.js';
import { BarSurface, type BarMoves, type SurfaceBar } from './bar-surface.js';
import { MarkLane } from './mark-lane.js';
import { MonthLines, MonthScale, type ScaleMonth } from './month-scale.js';
import { packBars, type BarToPlace, type PlacedBar } from './pack-bars.js';
import type { RangeMark } from './ring-row.js';
import { useTextWidth } from './use-text-width.js';
import { useWidth } from '../use-width.js';
import { WindowShape, type WindowDays } from './window-bar.js';
import { BarName, nearestDay, Pairing } from './year-board-parts.js';
import { YearLane, type LaneSegment } from './year-lane.js';

export interface BoardLane {
  key: string;
  name: string;
  icon?: ReactNode;
  /** A star's states through the year. */
  segments?: readonly LaneSegment[] | undefined;
  /** Instead of them: single days with their ranges. */
  marks?: readonly RangeMark[] | undefined;
  /** The lane as a sentence. */
  label: string;
}

export interface BoardBar {
  key: string;
  name: string;
  days: WindowDays;
  kind?: 'work' | 'watch' | undefined;
}

/** The dotted line from a marker's day in its lane down to the chosen window. */
export interface BoardPairing {
  laneKey: string;
  dayNumber: number;
}

export interface YearBoardProps {
  span: DaySpan;
  months: readonly ScaleMonth[];
  lanes: readonly BoardLane[];
  bars: readonly BoardBar[];
  /** What stands beside the bars: "Work and rites". */
  barsName: string;
  /** The bars as a sentence. */
  label: string;
  today?: number | null | undefined;
  chosen?: string | null | undefined;
  pairing?: BoardPairing | null | undefined;
  onChoose?: ((key: string) => void) | undefined;
  /** Lets windows be moved: the whole of one, its beginning or its end. */
  moves?: BarMoves | undefined;
  /** A second scale under the months: Moons, market weeks, another calendar; `lang` is that of its parts. */
  secondScale?: { name: string; parts: readonly ScaleMonth[]; lang?: string | undefined } | undefined;
}

const LANE_HEIGHT = 24;
const LANE_PITCH = 31;
const PEG_ROOM = 28;
const BAR_HEIGHT = 12;
const BAR_PITCH = 38;
const BARS_GAP = 8;
const LABEL_SIZE = 16;
/** Nearer to each other, only lines with a name beside them are drawn. */
const LINES_APART = 12;
/** A longer name is cut; the list says it whole. */
const LABEL_SHARE_MAX = 0.3;
const LABEL_LEAST = 96;

/** The year's strip: lanes of the stars above, windows as bars below, today's peg through all of it. */
export function YearBoard(props: YearBoardProps) {
  const { span, months, lanes, bars, barsName, label, today, chosen, pairing, onChoose, moves } = props;
  const [ref, width] = useWidth(900);
  const textWidth = useTextWidth(LABEL_SIZE);
  const pxPerDay = width / (span.last - span.first + 1);
  const labelMax = Math.max(LABEL_LEAST, width * LABEL_SHARE_MAX);
  const placed = useMemo(
    () => packBars(barsToPlace({ bars, span, pxPerDay, labelMax, textWidth }), width),
    [bars, span, pxPerDay, labelMax, textWidth, width],
  );
  const hasPeg = today !== undefined && today !== null && today >= span.first && today <= span.last;
  const lanesTop = hasPeg ? PEG_ROOM : 6;
  const lanesEnd = lanesTop + lanes.length * LANE_PITCH;
  const barsTop = lanesEnd + BARS_GAP;
  const rows = Math.max(1, ...placed.map(({ row }) => row + 1));
  const height = barsTop + rows * BAR_PITCH + 4;
  const barY = (bar: PlacedBar) => barsTop + bar.row * BAR_PITCH;
  const drawn = useMemo(() => inOrderOfBars(bars, placed), [bars, placed]);
  const chosenOne = drawn.find(({ bar }) => bar.key === chosen);
  const surface = useMemo(
    () =>
      drawn.map(({ bar: { key, name, days, kind }, place: { row } }): SurfaceBar => ({
        ...{ key, name, days, kind },
        topPx: barsTop + row * BAR_PITCH,
      })),
    [drawn, barsTop],
  );
  const keyOrder = useMemo(() => placed.map(({ key }) => key), [placed]);
  const lines = useMemo(
    () => months.filter(({ days, narrow }) => days * pxPerDay >= LINES_APART || narrow !== ''),
    [months, pxPerDay],
  );
  const pairedLane = lanes.findIndex(({ key }) => key === pairing?.laneKey);

  return (
    <div className="year-board">
      <div />
      <MonthScale span={span} months={months} textWidth={textWidth} />
      {props.secondScale && (
        <>
          <div className="year-board-name text-small text-umber-soft" aria-hidden>
            <span title={props.secondScale.name}>{props.secondScale.name}</span>
          </div>
          <MonthScale
            span={span}
            months={props.secondScale.parts}
            lang={props.secondScale.lang}
            textWidth={textWidth}
          />
        </>
      )}
      <div className="year-board-names" aria-hidden style={{ paddingTop: lanesTop }}>
        {lanes.map((lane) => (
          <div key={lane.key} className="year-board-name" style={{ height: LANE_PITCH }}>
            {lane.icon}
            <span title={lane.name}>{lane.name}</span>
          </div>
        ))}
        <div className="text-umber-soft" style={{ paddingTop: BARS_GAP - 4 }}>
          {barsName}
        </div>
      </div>
      <div className="picture" ref={ref} style={{ height }}>
        <MonthLines span={span} months={lines} />
        {lanes.map((lane, index) => (
          <div key={lane.key} className="year-board-lane" style={{ top: lanesTop + index * LANE_PITCH }}>
            {lane.marks ? (
              <MarkLane span={span} marks={lane.marks} label={lane.label} height={LANE_HEIGHT} />
            ) : (
              <YearLane span={span} segments={lane.segments ?? []} label={lane.label} height={LANE_HEIGHT} />
            )}
          </div>
        ))}
        <svg className="year-board-over" role="img" aria-label={label} width="100%" height={height}>
          {chosenOne && (
            <rect
              className="year-board-chosen"
              x={chosenOne.place.fromPx - 6}
              y={barY(chosenOne.place) - 6}
              width={chosenOne.place.toPx - chosenOne.place.fromPx + 12}
              height={BAR_PITCH + 1}
            />
          )}
          {drawn.map(({ bar, place }) => (
            <WindowShape
              key={bar.key}
              span={span}
              days={bar.days}
              kind={bar.kind}
              y={barY(place)}
              height={BAR_HEIGHT}
            />
          ))}
          {pairing && pairedLane >= 0 && chosenOne && (
            <Pairing
              x={percent(startPercent(pairing.dayNumber + 0.5, span))}
              fromY={lanesTop + pairedLane * LANE_PITCH + 2}
              toX={percent(startPercent(nearestDay(chosenOne.bar.days, pairing.dayNumber), span))}
              toY={barY(chosenOne.place) + BAR_HEIGHT / 2}
            />
          )}
          {hasPeg && (
            <>
              <line
                x1={percent(startPercent(today + 0.5, span))}
                x2={percent(startPercent(today + 0.5, span))}
                y1={20}
                y2={lanesEnd - (LANE_PITCH - LANE_HEIGHT)}
                stroke="var(--color-umber)"
                strokeWidth={3}
              />
              <Peg x={percent(startPercent(today + 0.5, span))} footY={PEG_ROOM} size={0.85} />
            </>
          )}
        </svg>
        {drawn.map(({ bar, place }) => (
          <BarName
            key={bar.key}
            barKey={bar.key}
            name={bar.name}
            isChosen={bar.key === chosen}
            maxWidthPx={labelMax}
            leftPx={place.labelStartPx}
            topPx={barY(place) + BAR_HEIGHT + 2}
            onChoose={onChoose}
          />
        ))}
        {moves && onChoose && (
          <BarSurface
            {...{ span, pxPerDay, moves }}
            barHeightPx={BAR_HEIGHT}
            bars={surface}
            keyOrder={keyOrder}
            chosen={chosen ?? null}
            onOpen={onChoose}
          />
        )}
      </div>
    </div>
  );
}

interface DrawnBar {
  bar: BoardBar;
  place: PlacedBar;
}

/**
 * The bars that have a place, in their own order. In that of their days a bar that was moved past another would be taken
 * out of the page and put back, and the handle in somebody's hand would lose the focus.
 */
function inOrderOfBars(bars: readonly BoardBar[], placed: readonly PlacedBar[]): DrawnBar[] {
  const places = new Map(placed.map((place) => [place.key, place]));
  return bars.flatMap((bar) => {
    const place = places.get(bar.key);
    return place === undefined ? [] : [{ bar, place }];
  });
}

interface ToPlace {
  bars: readonly BoardBar[];
  span: DaySpan;
  pxPerDay: number;
  labelMax: number;
  textWidth: (text: string) => number;
}

/** Bars that reach into the span, cut at its ends. */
function barsToPlace({ bars, span, pxPerDay, labelMax, textWidth }: ToPlace): BarToPlace[] {
  return bars
    .filter((bar) => bar.days.lastAdvised >= span.first && bar.days.earliest <= span.last)
    .map((bar) => ({
      key: bar.key,
      startPx: (Math.max(bar.days.earliest, span.first) - span.first) * pxPerDay,
      endPx: (Math.min(bar.days.lastAdvised, span.last) + 1 - span.first) * pxPerDay,
      labelPx: Math.min(labelMax, textWidth(bar.name) + 8),
    }));
}
