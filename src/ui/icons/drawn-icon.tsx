import type { ReactNode } from 'react';
import { ICON_BOX_UNITS, ICONS, type IconKey } from '#shared/sheet/icons.js';

interface DrawnProps {
  /** Height and width: pixels, or a length such as `10mm`. */
  size?: number | string | undefined;
  /** Said aloud; without one the icon is decoration, because a word stands beside it. */
  label?: string | undefined;
  className?: string | undefined;
}

/** One of our own signs for events, signs and markers; paper and screen draw from the same source. */
export function SignIcon({ sign, size = 32, label, className }: DrawnProps & { sign: IconKey }) {
  const { fill, strokes } = ICONS[sign];
  return (
    <DrawnSvg size={size} label={label} className={className} box={ICON_BOX_UNITS}>
      {fill !== '' && <path d={fill} fillRule="evenodd" />}
      {strokes.map((stroke) => (
        <path
          key={stroke.d}
          d={stroke.d}
          fill="none"
          stroke="currentColor"
          strokeWidth={stroke.width}
          strokeLinecap="round"
          strokeLinejoin="round"
        />
      ))}
    </DrawnSvg>
  );
}

/** Frame of every drawn icon: black ink, square, silent unless it has a label. */
export function DrawnSvg({
  size = 24,
  label,
  className,
  box,
  children,
}: DrawnProps & { box: number; children: ReactNode }) {
  const spoken = label === undefined ? { 'aria-hidden': true } : { role: 'img', 'aria-label': label };
  return (
    <svg
      {...spoken}
      width={size}
      height={size}
      viewBox={`0 0 ${String(box)} ${String(box)}`}
      fill="currentColor"
      className={className}
    >
      {children}
    </svg>
  );
}

export type { DrawnProps };
