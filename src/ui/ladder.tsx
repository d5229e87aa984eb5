import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { classNames } from './class-names.js';

export interface Rung {
  key: string;
  /** The day, in words. */
  title: ReactNode;
  /** Days from the rung before; nothing is drawn for 0 or on the first rung. */
  daysSinceLast: number;
  /** The peg stands here. At most one rung of a ladder. */
  here?: boolean | undefined;
  children?: ReactNode;
}

/** Days shown one by one; longer gaps are drawn as a week of holes and the number. */
const SMALL_HOLES_MAX = 10;

/** A hole before every entry, a small hole for each day between, and the number: the oldest form of a board. */
export function Ladder({ rungs, label }: { rungs: readonly Rung[]; label: string }) {
  const { t } = useTranslation('common');
  return (
    <ol className="ladder" aria-label={label}>
      {rungs.map((rung, index) => (
        <li key={rung.key}>
          {index > 0 && rung.daysSinceLast > 0 && (
            <>
              <span />
              <span className="between">
                <span className="days-between" aria-hidden>
                  {Array.from({ length: Math.min(rung.daysSinceLast, SMALL_HOLES_MAX) }, (_, day) => (
                    <i key={day} />
                  ))}
                  {rung.daysSinceLast > SMALL_HOLES_MAX && '…'}
                </span>
                {t('dayGap', { count: rung.daysSinceLast })}
              </span>
            </>
          )}
          <span className={classNames('rung', rung.here === true && 'here')} aria-hidden />
          <div className="rung-body">
            <strong>{rung.title}</strong>
            {rung.children}
          </div>
        </li>
      ))}
    </ol>
  );
}
