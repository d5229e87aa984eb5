import { memo } from 'react';
import type { NightState } from '#shared/sky/vocabulary.js';
import { classNames } from '../class-names.js';
import { Peg } from '../pegs.js';
import { percent, startPercent, stretch, type DaySpan } from './day-span.js';

/** A run of nights in the same state; both days belong to it. */
export interface LaneSegment {
  state: NightState;
  fromDayNumber: number;
  toDayNumber: number;
}

export interface YearLaneProps {
  span: DaySpan;
  segments: readonly LaneSegment[];
  /** What the lane shows, as a sentence: the picture for ears. */
  label: string;
  /** 48 on a star's own page, 22 to 24 in the editor, 20 in a table. */
  height?: number | undefined;
  /** Today's peg. It stands above the lane and needs 26 px more. */
  today?: number | null | undefined;
  className?: string | undefined;
}

/** Dusk edge, foot of dawn, and the gap between two states, in pixels. */
const EDGE = 1.25;
const FOOT = 3;
const GAP = 1.5;
/** A state of a few nights must stay visible. */
const LEAST_WIDTH = 4;
const PEG_ROOM = 26;

/** Bands of each state as shares of the night, which runs down: 0 is dusk, 1 is dawn. */
const BANDS: Record<Exclude<NightState, 'hidden'>, readonly (readonly [number, number])[]> = {
  'before-dawn': [[0.5, 1]],
  'all-night': [[0, 1]],
  'rises-and-sets-in-night': [[0.3, 0.7]],
  'after-dusk': [[0, 0.5]],
  'dusk-and-dawn': [
    [0, 0.34],
    [0.66, 1],
  ],
};

/** The nights of a year: months run left to right, the night runs down. Place tells the state, colour helps. */
export const YearLane = memo(function YearLane({
  span,
  segments,
  label,
  height = 48,
  today,
  className,
}: YearLaneProps) {
  const hasPeg = today !== undefined && today !== null && today >= span.first && today <= span.last;
  const top = hasPeg ? PEG_ROOM : 0;
  // Short states are drawn last: their least width may reach over a neighbour, never under it.
  const inOrder = [...segments].sort((a, b) => nights(b) - nights(a));
  return (
    <div className={classNames('picture', className)}>
      <svg role="img" aria-label={label} width="100%" height={top + height}>
        <svg y={top} width="100%" height={height} className="lane-svg">
          <rect className="pic-dusk-edge" width="100%" height={EDGE} />
          {inOrder.map((segment) => (
            <Stretch key={segment.fromDayNumber} segment={segment} span={span} height={height} />
          ))}
          <rect className="pic-foot" y={height - FOOT} width="100%" height={FOOT} />
        </svg>
        {hasPeg && <LanePeg at={percent(startPercent(today + 0.5, span))} footY={top + height} />}
      </svg>
    </div>
  );
});

/**
 * Place of a state along the lane. A gap stands before every state but the first; a state of a few nights keeps its
 * least width, and is held inside the picture at its end.
 */
export function laneBox(
  place: { start: number; width: number },
  isFirst: boolean,
): { x: string; width: string } {
  const gap = isFirst ? 0 : GAP;
  return {
    x: `min(calc(${percent(place.start)} + ${gap}px), calc(100% - ${LEAST_WIDTH}px))`,
    width: `max(${LEAST_WIDTH}px, calc(${percent(place.width)} - ${gap}px))`,
  };
}

function nights(segment: LaneSegment): number {
  return segment.toDayNumber - segment.fromDayNumber;
}

function Stretch({ segment, span, height }: { segment: LaneSegment; span: DaySpan; height: number }) {
  const place = stretch(segment.fromDayNumber, segment.toDayNumber, span);
  if (place === null) return null;
  const style = laneBox(place, segment.fromDayNumber <= span.first);
  const night = height - FOOT;
  if (segment.state === 'hidden') {
    return (
      <>
        <rect style={style} y={EDGE} height={night - EDGE} fill="var(--ground)" />
        <rect className="pic-hidden" style={style} y={EDGE} height={night - EDGE} />
      </>
    );
  }
  return (
    <>
      <rect style={style} y={EDGE} height={night - EDGE} fill="var(--ground)" />
      {BANDS[segment.state].map(([from, to]) => (
        <rect key={from} className="pic-seen" style={style} y={from * night} height={(to - from) * night} />
      ))}
    </>
  );
}

/** Today: a thin stem through the whole lane, so that the day can be read at the foot. */
function LanePeg({ at, footY }: { at: string; footY: number }) {
  return (
    <>
      <line x1={at} x2={at} y1={20} y2={footY} stroke="var(--color-umber)" strokeWidth={3} />
      <Peg x={at} footY={PEG_ROOM} size={0.85} />
    </>
  );
}
