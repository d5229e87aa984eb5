import type { ReactNode } from 'react';
import { DrawnSvg, type DrawnProps } from './drawn-icon.js';

const stroke = (d: string, width = 3) => (
  <path
    d={d}
    fill="none"
    stroke="currentColor"
    strokeWidth={width}
    strokeLinecap="round"
    strokeLinejoin="round"
  />
);

/** The places of the rail, and the product's own mark. On a 40-unit square. */
const drawings = {
  /** The Sun's edge over a ridge, three rays. */
  today: (
    <>
      <path d="M10.6 27A9.4 9.4 0 0 1 29.4 27C26.4 29.6 23 27 20 27S13.6 29.6 10.6 27Z" />
      {stroke('M3 31.5C7 27.6 10.6 34.6 15 33C19 31.4 21 31.4 25 33C29.4 34.6 33 27.6 37 31.5', 3.4)}
      {stroke('M20 5V10.6M7.4 10.4 11.2 14.4M32.6 10.4 28.8 14.4')}
    </>
  ),
  /** Stars above a level edge. */
  stars: (
    <>
      <circle cx={9} cy={22} r={3.6} />
      <circle cx={19.4} cy={11} r={3.6} />
      <circle cx={24} cy={24.4} r={3.6} />
      <circle cx={33} cy={15} r={3.6} />
      {stroke('M4 34.4H36', 3.4)}
    </>
  ),
  /** Nine holes, one peg. */
  calendar: (
    <>
      {[8, 20, 32].flatMap((cy) =>
        [8, 20, 32].map((cx) => (
          <circle
            key={`${String(cx)} ${String(cy)}`}
            cx={cx}
            cy={cy}
            r={4}
            fill={cx === 20 && cy === 20 ? 'currentColor' : 'none'}
            stroke="currentColor"
            strokeWidth={2.6}
          />
        )),
      )}
    </>
  ),
  /** An eye. */
  look: (
    <>
      {stroke('M2.6 20C7.4 11.6 13 8 20 8S32.6 11.6 37.4 20C32.6 28.4 27 32 20 32S7.4 28.4 2.6 20Z')}
      <circle cx={20} cy={20} r={5.4} />
    </>
  ),
  /** Two houses side by side. */
  village: <>{stroke('M3 20.5 13.5 9.5 21 17.2M7.4 17V33H33V19M19 17.5 26.5 8.5 37 20.5M20.4 33V24')}</>,
  /** The peg in its hole: Dawnpeg. */
  mark: (
    <>
      <ellipse cx={20} cy={33} rx={9.5} ry={4.8} fill="none" stroke="currentColor" strokeWidth={2.8} />
      <path d="M20 33.4V18" stroke="currentColor" strokeWidth={5.4} />
      <circle cx={20} cy={11.6} r={9} />
    </>
  ),
} as const satisfies Record<string, ReactNode>;

export type RailIconKey = keyof typeof drawings;

export function RailIcon({ place, size = 28, label, className }: DrawnProps & { place: RailIconKey }) {
  return (
    <DrawnSvg size={size} label={label} className={className} box={40}>
      {drawings[place]}
    </DrawnSvg>
  );
}
