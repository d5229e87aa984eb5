import {
  SKYLINE_ALTITUDE_MAX_DEG,
  SKYLINE_ALTITUDE_MIN_DEG,
  type SkylinePoint,
} from '#shared/contracts/places.js';
import { horizonAltitude, type SkylineView } from '#src/ui/pictures/skyline.js';

/** Neighbours stay at least this far apart, so that no two rings lie on each other. */
export const LEAST_GAP_DEG = 1;
export const DIRECTION_STEP_DEG = 1;
export const HEIGHT_STEP_DEG = 0.5;

/** Between which directions a point may move: its neighbours, or the full turn. */
export function directionLimits(
  points: readonly SkylinePoint[],
  index: number,
): { min: number; max: number } {
  const before = points[index - 1];
  const after = points[index + 1];
  return {
    min: before === undefined ? 0 : roundTo(before.azimuthDeg + LEAST_GAP_DEG, 0.1),
    max: after === undefined ? 359 : roundTo(after.azimuthDeg - LEAST_GAP_DEG, 0.1),
  };
}

/** Moves one point as far as its neighbours and the limits of a skyline let it. The order never changes. */
export function movePoint(
  points: readonly SkylinePoint[],
  index: number,
  to: Partial<SkylinePoint>,
): SkylinePoint[] {
  const { min, max } = directionLimits(points, index);
  return points.map((point, each) => {
    if (each !== index) return point;
    // Neighbours from a table may stand closer than our own gap: then the point keeps its direction.
    const turns = to.azimuthDeg !== undefined && min <= max;
    return {
      azimuthDeg: turns ? clamp(to.azimuthDeg ?? 0, min, max) : point.azimuthDeg,
      altitudeDeg: clamp(
        to.altitudeDeg ?? point.altitudeDeg,
        SKYLINE_ALTITUDE_MIN_DEG,
        SKYLINE_ALTITUDE_MAX_DEG,
      ),
    };
  });
}

/** Adds a point on the line after the given one, in the middle of the gap. Null where there is no room. */
export function addPointAfter(
  points: readonly SkylinePoint[],
  index: number,
): { points: SkylinePoint[]; index: number } | null {
  const here = points[index];
  if (here === undefined) return { points: eightPoints(), index: 2 };
  const next = points[index + 1]?.azimuthDeg ?? (points[0]?.azimuthDeg ?? 0) + 360;
  const azimuthDeg = Math.round((here.azimuthDeg + next) / 2) % 360;
  const farEnough = points.every((point) => turnBetween(point.azimuthDeg, azimuthDeg) >= LEAST_GAP_DEG);
  if (!farEnough) return null;
  const added = { azimuthDeg, altitudeDeg: roundTo(horizonAltitude(points, azimuthDeg), 0.1) };
  const list = [...points, added].sort((a, b) => a.azimuthDeg - b.azimuthDeg);
  return { points: list, index: list.indexOf(added) };
}

/** A point that was taken away, back in its place; it wins over one that stands there by now. */
export function putBack(points: readonly SkylinePoint[], point: SkylinePoint): SkylinePoint[] {
  return [...points.filter((each) => each.azimuthDeg !== point.azimuthDeg), point].sort(
    (a, b) => a.azimuthDeg - b.azimuthDeg,
  );
}

/** A level skyline to begin with: one point in each of the eight winds. */
export function eightPoints(): SkylinePoint[] {
  return Array.from({ length: 8 }, (_, index) => ({ azimuthDeg: index * 45, altitudeDeg: 0 }));
}

/** How high and how low a picture of this skyline reaches, and where its dotted lines are. */
export function heightScale(points: readonly SkylinePoint[]): {
  topDeg: number;
  bottomDeg: number;
  levelsDeg: number[];
} {
  const heights = points.map((point) => point.altitudeDeg);
  const highest = Math.max(6, ...heights);
  const lowest = Math.min(0, ...heights);
  const step = highest <= 9 ? 2 : highest <= 24 ? 5 : 10;
  const topDeg = Math.ceil((highest + step * 0.75) / step) * step;
  const levelsDeg = [];
  for (let level = step; level < topDeg; level += step) levelsDeg.push(level);
  return { topDeg, bottomDeg: lowest - step / 2, levelsDeg };
}

export type Half = 'east' | 'west';

/** The whole turn, or one half of it on a phone. */
export function turnView(half: Half | null): Pick<SkylineView, 'fromAzimuthDeg' | 'toAzimuthDeg'> {
  if (half === 'east') return { fromAzimuthDeg: 0, toAzimuthDeg: 180 };
  if (half === 'west') return { fromAzimuthDeg: 180, toAzimuthDeg: 360 };
  return { fromAzimuthDeg: 0, toAzimuthDeg: 360 };
}

export function halfOf(azimuthDeg: number): Half {
  return azimuthDeg <= 180 ? 'east' : 'west';
}

/** Where a point stands in a view; north stands at both ends of the whole turn. Null outside. */
export function placesInView(
  azimuthDeg: number,
  view: Pick<SkylineView, 'fromAzimuthDeg' | 'toAzimuthDeg'>,
): number[] {
  return [azimuthDeg, azimuthDeg + 360].filter((at) => at >= view.fromAzimuthDeg && at <= view.toAzimuthDeg);
}

const RAD = Math.PI / 180;
const OBLIQUITY_DEG = 23.44;

/**
 * Part of the skyline over which the Sun comes up in the course of a year, and with it the stars of the dawn:
 * from the June sunrise to the December one. The setting part is its mirror image (360° − azimuth).
 * Beyond the polar circles the Sun rises all round.
 */
export function sunriseAzimuths(latitudeDeg: number): { fromDeg: number; toDeg: number } {
  const share = Math.sin(OBLIQUITY_DEG * RAD) / Math.cos(latitudeDeg * RAD);
  if (share >= 1) return { fromDeg: 0, toDeg: 180 };
  const fromDeg = Math.acos(share) / RAD;
  return { fromDeg, toDeg: 180 - fromDeg };
}

function turnBetween(a: number, b: number): number {
  const turn = Math.abs(a - b) % 360;
  return Math.min(turn, 360 - turn);
}

function clamp(value: number, min: number, max: number): number {
  return Math.min(max, Math.max(min, value));
}

export function roundTo(value: number, step: number): number {
  return Number((Math.round(value / step) * step).toFixed(2)) + 0;
}
