import type { ReactNode } from 'react';
import { classNames } from '../class-names.js';
import {
  besideAzimuth,
  fittingCompass,
  HAND_DEG,
  labelsLeft,
  labelTops,
  lookView,
  type CompassWord,
  type PathPoint,
} from './look-layout.js';
import {
  NeighbourGlyphs,
  NeighbourNames,
  STAR_SHAPE,
  wholePath,
  type LookNeighbour,
} from './look-neighbours.js';
import { horizonAltitude, SkylinePicture, type HorizonPoint, type SkylineScale } from './skyline.js';

export type { CompassWord, PathPoint } from './look-layout.js';
export type { LookNeighbour } from './look-neighbours.js';

export interface LookLabel extends PathPoint {
  key: string;
  words: ReactNode;
}

export interface LookPictureProps {
  /** Skyline of the place. */
  points: readonly HorizonPoint[];
  /** Where the star stands while it can be seen; drawn thick. Each stretch in order of time. */
  seenPaths: readonly (readonly PathPoint[])[];
  /** Where it stands when it is too light or it is too low; drawn dotted. */
  lightPaths: readonly (readonly PathPoint[])[];
  /** Where the star itself is drawn. */
  star: PathPoint;
  /** Where the path ends because the Sun comes: a bar across it. */
  stop?: PathPoint | undefined;
  /** Bright stars, planets and the Moon around it; what has no room is left out of the picture. */
  neighbours?: readonly LookNeighbour[] | undefined;
  /** Times and words beside the path: live text on top of the picture. */
  labels: readonly LookLabel[];
  /** Compass words along the foot. */
  compass: readonly CompassWord[];
  /** `1 hand`, beside the rod. */
  handWords: string;
  /** Light over the skyline. */
  light?: boolean | undefined;
  /** The picture as a sentence. */
  label: string;
  height?: number | undefined;
  className?: string | undefined;
}

const ROD_X = 14;
const ROD_WIDTH = 20;

/** Where to look: the skyline of the place, the star's path above it, and a rod in half hands beside it. */
export function LookPicture(given: LookPictureProps) {
  const props = aroundStar(given);
  const { points, star, compass, label, height = 210, light = true, className } = props;
  const middleDeg = star.azimuthDeg;
  const highestDeg = Math.max(...wholePath(props).map((point) => point.altitudeDeg));
  return (
    <SkylinePicture
      className={classNames('look', className)}
      points={points}
      view={lookView(points, middleDeg, highestDeg, height)}
      height={height}
      label={label}
      behind={(scale) =>
        light && (
          <DawnLight scale={scale} horizonDeg={horizonAltitude(points, middleDeg)} middleDeg={middleDeg} />
        )
      }
      inFront={(scale) => (
        <>
          <NeighbourGlyphs {...props} scale={scale} />
          {fittingCompass(compass, middleDeg, scale).map(({ azimuthDeg, x }) => (
            <rect
              key={azimuthDeg}
              x={x - 1}
              y={height - 10}
              width={2.5}
              height={10}
              fill="var(--color-chalk)"
            />
          ))}
          <Rod scale={scale} points={points} />
          <Paths {...props} scale={scale} />
        </>
      )}
      onTop={(scale) => <WordsOnTop {...props} scale={scale} />}
    />
  );
}

/** All directions counted from the star, so that nothing jumps where the path runs through north. */
function aroundStar(props: LookPictureProps): LookPictureProps {
  const beside = <T extends PathPoint>(point: T): T => ({
    ...point,
    azimuthDeg: besideAzimuth(point.azimuthDeg, props.star.azimuthDeg),
  });
  return {
    ...props,
    seenPaths: props.seenPaths.map((path) => path.map(beside)),
    lightPaths: props.lightPaths.map((path) => path.map(beside)),
    labels: props.labels.map(beside),
    neighbours: props.neighbours?.map(beside),
    stop: props.stop && beside(props.stop),
  };
}

/** Everything that is said stands here as live text, so that it grows with the reader's letters. */
function WordsOnTop(props: LookPictureProps & { scale: SkylineScale }) {
  const { points, star, labels, compass, handWords, scale } = props;
  const path = wholePath(props);
  const tops = labelTops(labels, points, scale, path);
  const left = labelsLeft(path, scale);
  return (
    <>
      <span
        className="on-picture"
        style={{ left: ROD_X + ROD_WIDTH + 16, top: rodTickY(scale, points) - 10 }}
      >
        {handWords}
      </span>
      {labels.map((each, index) => (
        <span key={each.key} className="on-picture" style={{ left, top: tops[index] }}>
          {each.words}
        </span>
      ))}
      <NeighbourNames {...props} />
      <div className="under-picture">
        {fittingCompass(compass, star.azimuthDeg, scale).map(({ azimuthDeg, words, left }) => (
          <span key={azimuthDeg} style={{ left }}>
            {words}
          </span>
        ))}
      </div>
    </>
  );
}

function DawnLight({
  scale,
  horizonDeg,
  middleDeg,
}: {
  scale: SkylineScale;
  horizonDeg: number;
  middleDeg: number;
}) {
  const edge = scale.y(horizonDeg + 0.45 * HAND_DEG);
  const crown = scale.y(horizonDeg + 0.95 * HAND_DEG);
  const middle = scale.x(middleDeg);
  return (
    <path
      className="pic-dawnlight"
      d={`M0 ${String(scale.height)}V${String(edge)}Q${String(middle)} ${String(crown)} ${String(scale.width)} ${String(edge)}V${String(scale.height)}Z`}
    />
  );
}

function rodTickY(scale: SkylineScale, points: readonly HorizonPoint[]): number {
  return rodFootY(scale, points) - handPx(scale);
}

function rodFootY(scale: SkylineScale, points: readonly HorizonPoint[]): number {
  const pxPerDeg = handPx(scale) / HAND_DEG;
  const leftAzimuth = (ROD_X + ROD_WIDTH / 2) / pxPerDeg;
  // Inverse of scale.x at the rod: both axes have the same scale.
  const zero = -scale.x(0) / pxPerDeg;
  return scale.y(horizonAltitude(points, zero + leftAzimuth));
}

function handPx(scale: SkylineScale): number {
  return scale.y(0) - scale.y(HAND_DEG);
}

/** Three half hands, dark and light in turn, with a tick at one hand. */
function Rod({ scale, points }: { scale: SkylineScale; points: readonly HorizonPoint[] }) {
  const foot = rodFootY(scale, points);
  const half = handPx(scale) / 2;
  return (
    <>
      {[0, 1, 2].map((step) => (
        <rect
          key={step}
          x={ROD_X}
          y={foot - (step + 1) * half}
          width={ROD_WIDTH}
          height={half}
          fill={step % 2 === 0 ? 'var(--color-umber)' : 'var(--color-chalk)'}
          stroke="var(--color-umber)"
          strokeWidth={2}
        />
      ))}
      <rect
        x={ROD_X - 4}
        y={foot - 2 * half - 1.5}
        width={ROD_WIDTH + 16}
        height={3}
        fill="var(--color-umber)"
      />
    </>
  );
}

function Paths({ seenPaths, lightPaths, star, stop, scale }: LookPictureProps & { scale: SkylineScale }) {
  const line = (path: readonly PathPoint[]) =>
    path
      .map((point) => `${scale.x(point.azimuthDeg).toFixed(1)} ${scale.y(point.altitudeDeg).toFixed(1)}`)
      .join('L');
  const at = { x: scale.x(star.azimuthDeg), y: scale.y(star.altitudeDeg) };
  return (
    <>
      {lightPaths.map((path) => (
        <path
          key={line(path)}
          d={`M${line(path)}`}
          fill="none"
          stroke="var(--color-indigo)"
          strokeWidth={3.5}
          strokeDasharray="1 8"
          strokeLinecap="round"
        />
      ))}
      {seenPaths.map((path) => (
        <path
          key={line(path)}
          d={`M${line(path)}`}
          fill="none"
          stroke="var(--color-indigo)"
          strokeWidth={7}
          strokeLinejoin="round"
        />
      ))}
      {stop && (
        <rect
          x={scale.x(stop.azimuthDeg) - 16}
          y={scale.y(stop.altitudeDeg) - 3}
          width={32}
          height={6}
          fill="var(--color-rust)"
        />
      )}
      <path
        d={STAR_SHAPE}
        transform={`translate(${String(at.x)} ${String(at.y)})`}
        fill="var(--color-indigo)"
        stroke="var(--color-chalk)"
        strokeWidth={2.5}
        paintOrder="stroke"
      />
    </>
  );
}
