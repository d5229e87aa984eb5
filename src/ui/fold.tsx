import { ChevronDown } from 'lucide-react';
import type { ReactNode, ToggleEvent } from 'react';

export interface FoldProps {
  title: ReactNode;
  /** What is inside, in one line; shown while the fold is closed. */
  line?: ReactNode;
  open?: boolean | undefined;
  onToggle?: ((open: boolean) => void) | undefined;
  children: ReactNode;
}

/** A part of a form that closes to one line. */
export function Fold({ title, line, open, onToggle, children }: FoldProps) {
  return (
    <details
      className="fold"
      open={open}
      onToggle={(event: ToggleEvent<HTMLDetailsElement>) => {
        onToggle?.(event.currentTarget.open);
      }}
    >
      <summary>
        <span>{title}</span>
        {line !== undefined && <span className="fold-line">{line}</span>}
        <ChevronDown aria-hidden size={22} />
      </summary>
      <div className="fold-body">{children}</div>
    </details>
  );
}

/** Underlined words that open something: a table behind a picture, an explanation. */
export function More({ label, icon, children }: { label: ReactNode; icon?: ReactNode; children: ReactNode }) {
  return (
    <details className="more">
      <summary>
        {icon}
        {label}
      </summary>
      {children}
    </details>
  );
}
