import type { HTMLAttributes } from 'react';
import type { ChartStar } from '#shared/contracts/figures.js';
import { useWidth } from '#src/ui/use-width.js';
import { project, type ChartView, type SkyPoint } from '../model/chart-projection.js';

export interface StarChartProps {
  stars: readonly ChartStar[];
  view: ChartView;
  memberHrs: readonly number[];
  indicatorHr: number | null;
  /** The middle of a patch of sky. */
  patch: SkyPoint | null;
  label: string;
  nameOf: (star: ChartStar) => string;
  /** Marks the middle, where the keys below put and take. */
  hasCrosshair?: boolean;
  /** Handlers that make the picture a surface for a finger. */
  surface?: HTMLAttributes<HTMLDivElement> | undefined;
}

/** The picture's height in pixels; its radius is half of it, or less where the screen is narrow. */
const CHART_HEIGHT = 340;
const NAME_ROOM = 26;
/** Clear of the outer ring of a bright star that leads. */
const NAME_GAP = 17;
/** How wide a patch is drawn; only its middle counts. */
const PATCH_DRAWN_DEG = 3;
/** Besides the figure's own stars, these are named so that people find their way. */
const NAMED_MAG = 1.7;

/** A neighbourhood of the sky on paper: stars as ink, the figure's own in rings, its leading star as a peg's head. */
export function StarChart(props: StarChartProps) {
  const { stars, view, memberHrs, indicatorHr, patch, label, nameOf, hasCrosshair, surface } = props;
  const [ref, width] = useWidth(600);
  const radius = chartRadius(width);
  const px = (at: { x: number; y: number }) => ({
    x: width / 2 + at.x * radius,
    y: CHART_HEIGHT / 2 + at.y * radius,
  });
  const placed = stars.flatMap((star) => {
    const at = project(view, star);
    const point = at === null ? null : px(at);
    const isOutside =
      point === null || point.x < -8 || point.x > width + 8 || point.y < -8 || point.y > CHART_HEIGHT + 8;
    return isOutside ? [] : [{ star, ...point }];
  });
  const patchAt = patch === null ? null : project(view, patch);
  const members = new Set(memberHrs);
  return (
    <div
      {...surface}
      className={surface === undefined ? 'picture star-chart' : 'picture star-chart touchable'}
      ref={ref}
    >
      <svg role="img" aria-label={label} width="100%" height={CHART_HEIGHT} style={{ overflow: 'hidden' }}>
        {patchAt !== null && (
          <circle
            className="chart-patch"
            cx={px(patchAt).x}
            cy={px(patchAt).y}
            r={(PATCH_DRAWN_DEG / view.radiusDeg) * radius}
          />
        )}
        {placed.map(({ star, x, y }) => {
          const size = dotPx(star.vMag);
          return (
            <g key={star.hr}>
              <circle className="chart-star" cx={x} cy={y} r={size} />
              {members.has(star.hr) && <circle className="chart-ring" cx={x} cy={y} r={size + 5} />}
              {star.hr === indicatorHr && <circle className="chart-ring" cx={x} cy={y} r={size + 9} />}
            </g>
          );
        })}
        {hasCrosshair === true && (
          <path
            className="chart-cross"
            d={`M${width / 2 - 22} ${CHART_HEIGHT / 2}h14m16 0h14M${width / 2} ${CHART_HEIGHT / 2 - 22}v14m0 16v14`}
          />
        )}
      </svg>
      {namesThatFit(
        placed,
        (star) => members.has(star.hr) || star.vMag < NAMED_MAG,
        members,
        nameOf,
        width,
      ).map(({ star, x, y }) => (
        <span key={star.hr} className="on-picture" aria-hidden style={{ left: x + NAME_GAP, top: y - 11 }}>
          {nameOf(star)}
        </span>
      ))}
    </div>
  );
}

export function chartRadius(widthPx: number): number {
  return Math.min(widthPx, CHART_HEIGHT) / 2;
}

/** Brighter is larger; the faintest of the table still shows on a copy. */
function dotPx(vMag: number): number {
  return Math.max(1.4, 5.6 - 0.95 * (vMag + 0.5));
}

interface Placed {
  star: ChartStar;
  x: number;
  y: number;
}

/** Names from the figure's own and the brightest down, as long as none lies on another or runs out of the picture. */
function namesThatFit(
  placed: readonly Placed[],
  wants: (star: ChartStar) => boolean,
  members: ReadonlySet<number>,
  nameOf: (star: ChartStar) => string,
  width: number,
): Placed[] {
  const letterPx = 8.5;
  const taken: { x: number; y: number; endX: number }[] = [];
  return placed
    .filter(({ star }) => wants(star))
    .sort(
      (a, b) => Number(members.has(b.star.hr)) - Number(members.has(a.star.hr)) || a.star.vMag - b.star.vMag,
    )
    .filter(({ star, x, y }) => {
      const endX = x + NAME_GAP + nameOf(star).length * letterPx;
      const collides =
        endX > width ||
        y < 12 ||
        y > CHART_HEIGHT - 12 ||
        taken.some((one) => Math.abs(one.y - y) < NAME_ROOM && one.x < endX && x < one.endX);
      if (!collides) taken.push({ x, y, endX });
      return !collides;
    });
}
