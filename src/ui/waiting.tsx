import { Clock, RotateCw, WifiOff } from 'lucide-react';
import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { Button } from './button.js';
import { Care } from './surfaces.js';

const WIDTHS = ['44%', '100%', '82%', '67%'] as const;

/** Grey lines while something loads; said once to a screen reader. */
export function Skeleton({ lines = 3 }: { lines?: number | undefined }) {
  const { t } = useTranslation('common');
  return (
    <div className="skeleton" role="status">
      <span className="for-ears">{t('loading')}</span>
      {Array.from({ length: lines }, (_, index) => (
        <i key={index} style={{ inlineSize: WIDTHS[index % WIDTHS.length] }} />
      ))}
    </div>
  );
}

/** Nothing here yet: one sentence, and the next step. */
export function EmptyState({
  title,
  children,
  action,
}: {
  title: ReactNode;
  children?: ReactNode;
  action?: ReactNode;
}) {
  return (
    <div className="empty-state">
      <svg width="72" height="48" viewBox="0 0 72 48" aria-hidden>
        <ellipse
          cx="36"
          cy="26"
          rx="23"
          ry="11"
          fill="none"
          stroke="currentColor"
          strokeWidth="4.5"
          strokeDasharray="7 5.2"
        />
      </svg>
      <div>
        <p>{title}</p>
        {children !== undefined && <p className="mt-1">{children}</p>}
        {action !== undefined && <div className="mt-3">{action}</div>}
      </div>
    </div>
  );
}

/** Something did not come through: what happened, and trying again. `sentence` comes from the problem words. */
export function TroubleNote({
  title,
  sentence,
  onRetry,
}: {
  title?: ReactNode;
  sentence: ReactNode;
  onRetry?: (() => void) | undefined;
}) {
  const { t } = useTranslation('common');
  return (
    <Care role="alert">
      <p>
        <strong>{title ?? t('trouble.title')}</strong>
      </p>
      <p>{sentence}</p>
      {onRetry && (
        <Button className="mt-2" icon={<RotateCw aria-hidden size={20} />} onClick={onRetry}>
          {t('tryAgain')}
        </Button>
      )}
    </Care>
  );
}

/** One line on top: since when there is no network, and what waits. */
export function OfflineLine({ children }: { children: ReactNode }) {
  return (
    <div className="notice-line" role="status">
      <WifiOff aria-hidden size={20} />
      <span>{children}</span>
    </div>
  );
}

/** What is shown is older than it should be. */
export function StaleLine({
  children,
  onRetry,
}: {
  children: ReactNode;
  onRetry?: (() => void) | undefined;
}) {
  const { t } = useTranslation('common');
  return (
    <div className="notice-line" role="status">
      <Clock aria-hidden size={20} />
      <span>{children}</span>
      {onRetry && (
        <Button look="quiet" onClick={onRetry}>
          {t('tryAgain')}
        </Button>
      )}
    </div>
  );
}
