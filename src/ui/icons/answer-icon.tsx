import type { ReactNode } from 'react';
import { DrawnSvg, type DrawnProps } from './drawn-icon.js';

const hole = (cx: number, rx: number, dashed = false) => (
  <ellipse
    cx={cx}
    cy={40}
    rx={rx}
    ry={rx * 0.5}
    fill="none"
    stroke="currentColor"
    strokeWidth={3}
    strokeDasharray={dashed ? '4 3.2' : undefined}
  />
);

/** The four answers of an elder, of equal weight: what happens to the peg. On a 48-unit square. */
const drawings = {
  /** The peg is in its hole. */
  agree: (
    <>
      {hole(24, 11)}
      <path d="M24 40V22" stroke="currentColor" strokeWidth={6} />
      <circle cx={24} cy={14} r={11} />
    </>
  ),
  /** The peg goes to another hole. */
  'change-this': (
    <>
      {hole(11.5, 8.6, true)}
      {hole(36, 9)}
      <path d="M36 40V26" stroke="currentColor" strokeWidth={5.2} />
      <circle cx={36} cy={19.4} r={9} />
      <path
        d="M11.5 31V19.5C11.5 13.5 14.6 10.8 21 10.8M16.8 5.6 22 10.8 16.8 16"
        fill="none"
        stroke="currentColor"
        strokeWidth={3.2}
        strokeLinecap="round"
        strokeLinejoin="round"
      />
    </>
  ),
  /** The hole is boarded up. */
  'not-for-the-board': (
    <>
      <circle cx={24} cy={24} r={13} fill="none" stroke="currentColor" strokeWidth={3.4} />
      <g stroke="var(--ground)" strokeWidth={2.4}>
        <path d="M-.5 -3.4H45V3.4H-.5Z" transform="translate(5.6 38) rotate(-38)" />
        <path d="M-.5 -3.4H45V3.4H-.5Z" transform="translate(5.6 10) rotate(38)" />
      </g>
      <g fill="var(--ground)">
        <circle cx={10.5} cy={13.8} r={1.3} />
        <circle cx={37.5} cy={34.2} r={1.3} />
        <circle cx={10.5} cy={34.2} r={1.3} />
        <circle cx={37.5} cy={13.8} r={1.3} />
      </g>
    </>
  ),
  /** The hole stays free; the peg is somebody else's. */
  'not-mine-to-say': (
    <>
      {hole(13.5, 11)}
      <path d="M34.6 25.5 29.6 43" stroke="currentColor" strokeWidth={5.4} />
      <circle cx={37} cy={16} r={8.2} fill="none" stroke="currentColor" strokeWidth={3.4} />
    </>
  ),
} as const satisfies Record<string, ReactNode>;

export type AnswerIconKey = keyof typeof drawings;

export function AnswerIcon({ answer, size = 40, label, className }: DrawnProps & { answer: AnswerIconKey }) {
  return (
    <DrawnSvg size={size} label={label} className={className} box={48}>
      {drawings[answer]}
    </DrawnSvg>
  );
}
