import { useTranslation } from 'react-i18next';
import { useWidth } from './use-width.js';
import { classNames } from './class-names.js';

/** A count as pegs in holes: signs in, answers in. */
export function CountPegs({
  done,
  total,
  label,
}: {
  done: number;
  total: number;
  label?: string | undefined;
}) {
  const { t } = useTranslation('common');
  return (
    <span className="count-pegs" role="img" aria-label={label ?? t('pegsDone', { done, total })}>
      {Array.from({ length: total }, (_, index) => (
        <i key={index} className={classNames(index < done && 'full')} />
      ))}
    </span>
  );
}

export interface ProgressPegsProps {
  total: number;
  /** Where the peg stands, counted from 0; null for nowhere. */
  current: number | null;
  isDone: (index: number) => boolean;
  label: string;
}

/** Progress along a row of holes: filled rounds are done, the one with a stem is "here". */
export function ProgressPegs({ total, current, isDone, label }: ProgressPegsProps) {
  const [ref, width] = useWidth(320);
  // Beyond sixty the holes would melt together on a phone; then neighbours share a hole.
  const holes = Math.min(total, MOST_HOLES);
  const share = total / holes;
  const here = current === null ? null : Math.min(holes - 1, Math.floor(current / share));
  const radius = Math.min(6, (width / holes) * 0.36);
  return (
    <div className="picture" ref={ref}>
      <svg width="100%" height={34} role="img" aria-label={label}>
        {Array.from({ length: holes }, (_, hole) => (
          <circle
            key={hole}
            cx={middleOf(hole, holes)}
            cy={25}
            r={radius}
            strokeWidth={radius > 4 ? 2 : 1.5}
            className={classNames('pic-hole', entriesOf(hole, share, total).every(isDone) && 'full')}
          />
        ))}
        {here !== null && <Peg x={middleOf(here, holes)} footY={26} size={radius > 4 ? 1 : 0.75} />}
      </svg>
    </div>
  );
}

const MOST_HOLES = 60;

function middleOf(hole: number, holes: number): string {
  return `${((hole + 0.5) / holes) * 100}%`;
}

/** What a hole stands for: one thing, or several neighbours where there are more things than holes. */
function entriesOf(hole: number, share: number, total: number): number[] {
  const first = Math.floor(hole * share);
  const end = Math.min(total, Math.max(first + 1, Math.floor((hole + 1) * share)));
  return Array.from({ length: end - first }, (_, index) => first + index);
}

/** The peg: a filled round with a short stem. `footY` is where the stem ends. */
export function Peg({ x, footY, size = 1 }: { x: string; footY: number; size?: number | undefined }) {
  const stem = 14 * size;
  const head = 9 * size;
  return (
    <>
      <line
        x1={x}
        x2={x}
        y1={footY - stem - head}
        y2={footY}
        stroke="var(--color-umber)"
        strokeWidth={5 * size}
      />
      <circle cx={x} cy={footY - stem - head + 6 * size} r={head} className="pic-peg" />
    </>
  );
}
