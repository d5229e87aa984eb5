import type { ReactNode } from 'react';
import { classNames } from '../class-names.js';
import { useWidth } from '../use-width.js';

/** One point of a skyline. Azimuth 0…360° from north through east. */
export interface HorizonPoint {
  azimuthDeg: number;
  altitudeDeg: number;
}

/** The part of the horizon that is shown. `toAzimuthDeg` may exceed 360 to run through north. */
export interface SkylineView {
  fromAzimuthDeg: number;
  toAzimuthDeg: number;
  /** Altitude at the upper and the lower edge of the picture. */
  topDeg: number;
  bottomDeg: number;
}

/** Turns directions into pixels of the picture. */
export interface SkylineScale {
  width: number;
  height: number;
  x: (azimuthDeg: number) => number;
  y: (altitudeDeg: number) => number;
}

export interface SkylinePictureProps {
  points: readonly HorizonPoint[];
  /** Fixed, or made for the width in pixels that the picture gets. */
  view: SkylineView | ((width: number) => SkylineView);
  height: number;
  label: string;
  /** Dotted lines at these altitudes; 0 is drawn white across the ground. */
  levelsDeg?: readonly number[] | undefined;
  /** Drawn behind the ground, inside the SVG: dawn light, a star's path. */
  behind?: ((scale: SkylineScale) => ReactNode) | undefined;
  /** Drawn in front of the ground, inside the SVG. */
  inFront?: ((scale: SkylineScale) => ReactNode) | undefined;
  /** Live text and controls on top, placed in pixels: never text inside the SVG. */
  onTop?: ((scale: SkylineScale) => ReactNode) | undefined;
  className?: string | undefined;
}

/** The skyline of a place as a silhouette, straight between its points as the engine reckons it. */
export function SkylinePicture(props: SkylinePictureProps) {
  const { points, height, label, levelsDeg = [], behind, inFront, onTop, className } = props;
  const [ref, width] = useWidth(600);
  const view = typeof props.view === 'function' ? props.view(width) : props.view;
  const scale = scaleOf(view, width, height);
  const outline = horizonWithin(points, view)
    .map((point) => `${scale.x(point.azimuthDeg).toFixed(1)} ${scale.y(point.altitudeDeg).toFixed(1)}`)
    .join('L');
  return (
    <div className={classNames('picture', className)} ref={ref}>
      <svg role="img" aria-label={label} width="100%" height={height} style={{ overflow: 'hidden' }}>
        {behind?.(scale)}
        {levelsDeg.map(
          (level) =>
            level !== 0 && (
              <line
                key={level}
                x1={0}
                x2="100%"
                y1={scale.y(level)}
                y2={scale.y(level)}
                stroke="var(--color-edge)"
                strokeWidth={1}
                strokeDasharray="2 6"
              />
            ),
        )}
        <path
          className="pic-ground"
          d={`M0 ${String(height)}L${outline}L${String(width)} ${String(height)}Z`}
        />
        {levelsDeg.includes(0) && (
          <line
            x1={0}
            x2="100%"
            y1={scale.y(0)}
            y2={scale.y(0)}
            stroke="var(--color-chalk)"
            strokeWidth={1.5}
            strokeDasharray="4 4"
          />
        )}
        {inFront?.(scale)}
      </svg>
      {onTop?.(scale)}
    </div>
  );
}

function scaleOf(view: SkylineView, width: number, height: number): SkylineScale {
  const turn = view.toAzimuthDeg - view.fromAzimuthDeg;
  const rise = view.topDeg - view.bottomDeg;
  return {
    width,
    height,
    x: (azimuthDeg) => ((azimuthDeg - view.fromAzimuthDeg) / turn) * width,
    y: (altitudeDeg) => ((view.topDeg - altitudeDeg) / rise) * height,
  };
}

/** Corners of the horizon within a view, its two edges included; flat at 0° without points. */
export function horizonWithin(
  points: readonly HorizonPoint[],
  view: Pick<SkylineView, 'fromAzimuthDeg' | 'toAzimuthDeg'>,
): HorizonPoint[] {
  const { fromAzimuthDeg, toAzimuthDeg } = view;
  const inside = points
    .flatMap((point) =>
      [-360, 0, 360].map((turn) => ({ azimuthDeg: point.azimuthDeg + turn, altitudeDeg: point.altitudeDeg })),
    )
    .filter((point) => point.azimuthDeg > fromAzimuthDeg && point.azimuthDeg < toAzimuthDeg)
    .sort((a, b) => a.azimuthDeg - b.azimuthDeg);
  return [
    { azimuthDeg: fromAzimuthDeg, altitudeDeg: horizonAltitude(points, fromAzimuthDeg) },
    ...inside,
    { azimuthDeg: toAzimuthDeg, altitudeDeg: horizonAltitude(points, toAzimuthDeg) },
  ];
}

/** Altitude of the horizon at an azimuth: straight between the two neighbouring points, round through north. */
export function horizonAltitude(points: readonly HorizonPoint[], azimuthDeg: number): number {
  const sorted = [...points].sort((a, b) => a.azimuthDeg - b.azimuthDeg);
  const [first] = sorted;
  const last = sorted.at(-1);
  if (!first || !last) return 0;
  const wanted = ((azimuthDeg % 360) + 360) % 360;
  const next = sorted.findIndex((point) => point.azimuthDeg >= wanted);
  const after = next >= 0 ? sorted[next] : undefined;
  const before = next > 0 ? sorted[next - 1] : undefined;
  const right = after ?? { ...first, azimuthDeg: first.azimuthDeg + 360 };
  const left = before ?? (next < 0 ? last : { ...last, azimuthDeg: last.azimuthDeg - 360 });
  const turn = right.azimuthDeg - left.azimuthDeg;
  if (turn === 0) return right.altitudeDeg;
  return left.altitudeDeg + ((wanted - left.azimuthDeg) / turn) * (right.altitudeDeg - left.altitudeDeg);
}
