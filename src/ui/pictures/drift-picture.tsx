import { Peg } from '../pegs.js';
import { percent } from './day-span.js';

/** One year of a line; places down the picture in percent of its height. */
export interface DriftMark {
  /** Percent of the width. */
  x: number;
  early: number | null;
  expected: number;
  late: number | null;
}

export interface DriftPictureProps {
  /** Lines without a break; between them there is no date. */
  runs: readonly (readonly DriftMark[])[];
  side: 'dawn' | 'dusk';
  label: string;
  height: number;
  /** Lines of the scale with their words, in percent. */
  across: readonly { at: number; words: string }[];
  down: readonly { at: number; words: string }[];
  /** The year in use. */
  peg: { x: number; y: number } | null;
}

/** Width of the words at the start, in pixels. */
const GUTTER = 64;

/** A marker's day across the centuries: years to the right, later days further down, the range as a band. */
export function DriftPicture({ runs, side, label, height, across, down, peg }: DriftPictureProps) {
  return (
    <div className="picture drift-picture">
      <div style={{ marginLeft: GUTTER, position: 'relative', height }}>
        <svg role="img" aria-label={label} width="100%" height={height}>
          {across.map(({ at }) => (
            <rect key={at} className="pic-month-line" y={percent(at)} width="100%" height={1.5} />
          ))}
          {down.map(({ at }) => (
            <rect key={at} className="pic-month-line" x={percent(at)} width={1.5} height="100%" />
          ))}
          {/* A box of its own in units of percent: its shapes stretch with the width, their lines do not. */}
          <svg viewBox="0 0 100 100" preserveAspectRatio="none" width="100%" height="100%">
            {runs.map((run, index) => (
              <Run key={index} run={run} side={side} />
            ))}
          </svg>
          {peg !== null && <Peg x={percent(peg.x)} footY={(peg.y * height) / 100} />}
        </svg>
        {across.map(({ at, words }) => (
          <span
            key={at}
            className="on-picture text-umber-soft"
            style={{ top: percent(at), left: -GUTTER, translate: '0 -50%' }}
            aria-hidden
          >
            {words}
          </span>
        ))}
      </div>
      <div className="under-picture" style={{ marginLeft: GUTTER }} aria-hidden>
        {down.map(({ at, words }) => (
          <span key={at} style={{ left: percent(at), translate: at > 96 ? '-100%' : at < 4 ? '0' : '-50%' }}>
            {words}
          </span>
        ))}
      </div>
    </div>
  );
}

function Run({ run, side }: { run: readonly DriftMark[]; side: 'dawn' | 'dusk' }) {
  const at = (x: number, y: number) => `${x.toFixed(2)} ${y.toFixed(2)}`;
  const upper = run.map(({ x, early, expected }) => at(x, early ?? expected));
  const lower = run.map(({ x, late, expected }) => at(x, late ?? expected));
  const middle = run.map(({ x, expected }) => at(x, expected));
  return (
    <>
      <path className={`drift-band ${side}`} d={`M${upper.join('L')}L${lower.reverse().join('L')}Z`} />
      <path className={`drift-line ${side}`} d={`M${middle.join('L')}`} />
    </>
  );
}
