import type { ReactNode } from 'react';
import { DrawnSvg, type DrawnProps } from './drawn-icon.js';

const ring = (r = 8, dash?: string) => (
  <circle cx={12} cy={12} r={r} fill="none" stroke="currentColor" strokeWidth={2.6} strokeDasharray={dash} />
);
const line = (d: string, width = 2.4) => (
  <path
    d={d}
    fill="none"
    stroke="currentColor"
    strokeWidth={width}
    strokeLinecap="round"
    strokeLinejoin="round"
  />
);
const pegHead = (filled: boolean) => (
  <>
    <path d="M12 13V22" stroke="currentColor" strokeWidth={3.6} />
    <circle
      cx={12}
      cy={8.6}
      r={filled ? 6.4 : 5.2}
      fill={filled ? 'currentColor' : 'none'}
      stroke="currentColor"
      strokeWidth={filled ? 0 : 2.4}
    />
  </>
);

/** A ring is a place to be, a filled round is done or chosen, a stem makes it the peg. On a 24-unit square. */
const drawings = {
  draft: ring(7.6, '3.6 2.37'),
  'in-review': (
    <>
      {ring(7.8)}
      <path d="M12 4.2A7.8 7.8 0 0 0 12 19.8Z" />
    </>
  ),
  'changes-asked': (
    <>
      {ring(8.6)}
      {line('M7.6 12H16M12.6 8.4 16.2 12 12.6 15.6', 2.2)}
    </>
  ),
  'signed-off': (
    <>
      {ring(8.2)}
      <circle cx={12} cy={12} r={3.7} />
    </>
  ),
  published: pegHead(true),
  replaced: pegHead(false),
  recalled: (
    <>
      {pegHead(false)}
      <path d="M4 22 21 3" stroke="var(--ground)" strokeWidth={5.4} />
      {line('M4.4 21.6 20.4 3.6', 2.4)}
    </>
  ),
  waiting: ring(7.8),
  agreed: (
    <>
      <circle cx={12} cy={12} r={9.4} />
      <path
        d="M7.4 12.4 10.8 15.8 16.8 8.6"
        fill="none"
        stroke="var(--ground)"
        strokeWidth={2.5}
        strokeLinecap="round"
        strokeLinejoin="round"
      />
    </>
  ),
  'two-ways': (
    <>
      <circle cx={6.8} cy={12} r={5.4} />
      <circle cx={16.8} cy={12} r={5.2} fill="var(--ground)" stroke="currentColor" strokeWidth={2.4} />
    </>
  ),
  'not-for-the-board': (
    <>
      {ring(6.4)}
      <path d="M2.6 18.4 21.4 5.6M2.6 5.6 21.4 18.4" stroke="var(--ground)" strokeWidth={5.2} />
      {line('M2.8 18.2 21.2 5.8M2.8 5.8 21.2 18.2', 2.6)}
    </>
  ),
  'not-mine-to-say': (
    <>
      <ellipse cx={7.2} cy={17.4} rx={5.2} ry={3} fill="none" stroke="currentColor" strokeWidth={2.2} />
      <path d="M16.6 10.6 14.2 19" stroke="currentColor" strokeWidth={3} />
      <circle cx={17.6} cy={7} r={4} fill="none" stroke="currentColor" strokeWidth={2.2} />
    </>
  ),
  added: (
    <>
      {ring(8.6)}
      {line('M12 8V16M8 12H16', 2.2)}
    </>
  ),
  removed: (
    <>
      {ring(8.6, '3.4 2')}
      {line('M8 12H16', 2.2)}
    </>
  ),
  'words-only': (
    <>
      {ring(8.6)}
      {line('M8.4 10H15.6M8.4 14H15.6', 2)}
    </>
  ),
  same: (
    <>
      {ring(8.6)}
      <circle cx={12} cy={12} r={1.8} />
    </>
  ),
} as const satisfies Record<string, ReactNode>;

export type StateIconKey = keyof typeof drawings;

/** State of a version, an entry or an answer, as a small ring. Its slits take the colour of `--ground`. */
export function StateIcon({ state, size = 22, label, className }: DrawnProps & { state: StateIconKey }) {
  return (
    <DrawnSvg size={size} label={label} className={className} box={24}>
      {drawings[state]}
    </DrawnSvg>
  );
}
