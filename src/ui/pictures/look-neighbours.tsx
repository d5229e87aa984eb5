import type { ReactNode } from 'react';
import {
  labelsLeft,
  labelTops,
  linePatch,
  placeNeighbours,
  type Patch,
  type PathPoint,
  type PlacedNeighbour,
} from './look-layout.js';
import type { HorizonPoint, SkylineScale } from './skyline.js';

/** Something bright beside the star: a star to start from, a planet, the Moon. */
export interface LookNeighbour extends PathPoint {
  key: string;
  kind: 'star' | 'planet' | 'moon';
  words: string;
}

interface NeighbourProps {
  points: readonly HorizonPoint[];
  star: PathPoint;
  seenPaths: readonly (readonly PathPoint[])[];
  lightPaths: readonly (readonly PathPoint[])[];
  labels: readonly (PathPoint & { words: ReactNode })[];
  neighbours?: readonly LookNeighbour[] | undefined;
  scale: SkylineScale;
}

/** Four long rays, four short: the same star as the drawn sign. */
export const STAR_SHAPE =
  'M0-13 2.6-4.2 9.2-9.2 4.2-2.6 13 0 4.2 2.6 9.2 9.2 2.6 4.2 0 13-2.6 4.2-9.2 9.2-4.2 2.6-13 0-4.2-2.6-9.2-9.2-2.6-4.2Z';

/** A small star, a full disc for a planet, a ring for the Moon: told apart by shape and by the name beside them. */
export function NeighbourGlyphs(props: NeighbourProps) {
  return placed(props).map(({ neighbour: { key, kind }, at: { x, y } }) => (
    <g key={key} transform={`translate(${x.toFixed(1)} ${y.toFixed(1)})`}>
      {kind === 'star' && <path d={STAR_SHAPE} transform="scale(.6)" fill="var(--color-umber)" />}
      {kind === 'planet' && <circle r={5} fill="var(--color-umber)" />}
      {kind === 'moon' && (
        <circle r={7} fill="var(--color-chalk)" stroke="var(--color-umber)" strokeWidth={2.5} />
      )}
    </g>
  ));
}

export function NeighbourNames(props: NeighbourProps) {
  return placed(props).map(({ neighbour, at }) =>
    at.words === null ? null : (
      <span
        key={neighbour.key}
        className="on-picture text-umber-soft"
        style={
          at.words === 'right'
            ? { left: at.x + 13, top: at.y - 10 }
            : { left: at.x - 13, top: at.y - 10, transform: 'translateX(-100%)' }
        }
      >
        {neighbour.words}
      </span>
    ),
  );
}

function placed(props: NeighbourProps): { neighbour: LookNeighbour; at: PlacedNeighbour }[] {
  const { points, neighbours = [], scale } = props;
  const places = placeNeighbours(neighbours, points, scale, takenBy(props));
  return neighbours.flatMap((neighbour, index) => {
    const at = places[index];
    return at ? [{ neighbour, at }] : [];
  });
}

/** All points of the path, the star itself among them. */
export function wholePath(props: Pick<NeighbourProps, 'star' | 'seenPaths' | 'lightPaths'>): PathPoint[] {
  return [props.star, ...props.seenPaths.flat(), ...props.lightPaths.flat()];
}

/** The rod with its word, the star itself, and the times beside the path. */
function takenBy(props: NeighbourProps): Patch[] {
  const { points, star, labels, scale } = props;
  const path = wholePath(props);
  const tops = labelTops(labels, points, scale, path);
  const left = labelsLeft(path, scale);
  return [
    // The rod is one and a half hands high; its word stands beside it.
    { left: 0, top: scale.height * 0.25, width: 110, height: scale.height * 0.75 },
    { left: scale.x(star.azimuthDeg) - 16, top: scale.y(star.altitudeDeg) - 16, width: 32, height: 32 },
    ...labels.map(({ words }, index) =>
      linePatch(typeof words === 'string' ? words : ''.padEnd(18), left, tops[index] ?? 0),
    ),
  ];
}
