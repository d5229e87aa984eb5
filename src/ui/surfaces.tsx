import { useId, type ComponentProps, type ReactNode } from 'react';
import { TriangleAlert } from 'lucide-react';
import { classNames } from './class-names.js';

export interface BoardProps extends Omit<ComponentProps<'section'>, 'title'> {
  /** Heading of the board; without one the board is a plain group. */
  title?: ReactNode;
  level?: 2 | 3 | undefined;
  /** Stands at the end of the heading's line. */
  beside?: ReactNode;
}

/** The card: chalk, a hairline, a three-pixel foot. Never a board inside a board. */
export function Board({ title, level = 2, beside, className, children, ...rest }: BoardProps) {
  const headingId = useId();
  const Heading = level === 2 ? 'h2' : 'h3';
  const named = title !== undefined && title !== null;
  return (
    <section
      {...rest}
      className={classNames('board', className)}
      aria-labelledby={named ? headingId : undefined}
    >
      {named && (
        <div className="board-title flex flex-wrap items-center justify-between gap-x-3 gap-y-1">
          <Heading id={headingId}>{title}</Heading>
          {beside}
        </div>
      )}
      {children}
    </section>
  );
}

/** Something that is kept beside: a difference, an older text, a note. */
export function Well({ className, children, ...rest }: ComponentProps<'div'>) {
  return (
    <div {...rest} className={classNames('well', className)}>
      {children}
    </div>
  );
}

/** Take care: one or two sentences. `blocked` for what cannot go on. */
export function Care({
  blocked,
  children,
  className,
  ...rest
}: ComponentProps<'div'> & { blocked?: boolean | undefined }) {
  return (
    <div {...rest} className={classNames('care', blocked === true && 'blocked', className)}>
      <TriangleAlert aria-hidden size={26} />
      <div>{children}</div>
    </div>
  );
}
