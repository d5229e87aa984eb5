import { ChevronDown } from 'lucide-react';
import { useState, type ReactNode, type ToggleEvent } from 'react';

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

interface MoreProps {
  label: ReactNode;
  icon?: ReactNode;
  /** Drawn only once it is opened: for what takes long to draw. */
  lazy?: boolean;
  children: ReactNode;
}

/** Underlined words that open something: a table behind a picture, an explanation. */
export function More({ label, icon, lazy = false, children }: MoreProps) {
  const [wasOpened, setWasOpened] = useState(!lazy);
  return (
    <details
      className="more"
      onToggle={(event: ToggleEvent<HTMLDetailsElement>) => {
        if (event.currentTarget.open) setWasOpened(true);
      }}
    >
      <summary>
        {icon}
        {label}
      </summary>
      {wasOpened && children}
    </details>
  );
}
