import type { ReactNode } from 'react';
import { classNames } from './class-names.js';

export type ChipTone = 'plain' | 'moss' | 'rust' | 'ochre' | 'solid';

/** A state: a small drawing says it, a word repeats it. Colour only helps. */
export function Chip({
  tone = 'plain',
  icon,
  children,
}: {
  tone?: ChipTone | undefined;
  icon?: ReactNode;
  children: ReactNode;
}) {
  return (
    <span className={classNames('chip', tone !== 'plain' && tone)}>
      {icon}
      <span>{children}</span>
    </span>
  );
}
