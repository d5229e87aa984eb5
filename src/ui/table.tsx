import { ArrowDown, ArrowUp } from 'lucide-react';
import type { ComponentProps, ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { classNames } from './class-names.js';

export interface TableProps extends ComponentProps<'table'> {
  /** What the table shows; read aloud first. */
  caption: ReactNode;
  captionForEars?: boolean | undefined;
  /** Cells stand in the middle of their row. */
  middle?: boolean | undefined;
}

/** The table shell: scrolls sideways by itself when it must, by keyboard too. */
export function Table({ caption, captionForEars = true, middle, className, children, ...rest }: TableProps) {
  return (
    <div
      className="table-scroll"
      // A part that scrolls must be reachable by keyboard; axe asks for exactly this.
      // eslint-disable-next-line jsx-a11y/no-noninteractive-tabindex -- see above
      tabIndex={0}
      role="group"
      aria-label={typeof caption === 'string' ? caption : undefined}
    >
      <table {...rest} className={classNames('tbl', middle === true && 'middle', className)}>
        <caption className={captionForEars ? 'for-ears' : 'text-start'}>{caption}</caption>
        {children}
      </table>
    </div>
  );
}

export type SortDirection = 'asc' | 'desc' | false;

/** Head of a column that sorts. Give `ariaSort(direction)` to the <th>. */
export function SortKey({
  label,
  direction,
  onSort,
  children,
}: {
  label: string;
  direction: SortDirection;
  onSort: () => void;
  children?: ReactNode;
}) {
  const { t } = useTranslation('common');
  const key = direction === 'asc' ? 'sortUp' : direction === 'desc' ? 'sortDown' : 'sortNone';
  return (
    <button type="button" className="sort-key" aria-label={t(key, { column: label })} onClick={onSort}>
      <span>{children ?? label}</span>
      {direction === 'asc' && <ArrowDown aria-hidden size={18} />}
      {direction === 'desc' && <ArrowUp aria-hidden size={18} />}
    </button>
  );
}

export function ariaSort(direction: SortDirection): 'ascending' | 'descending' | 'none' {
  return direction === 'asc' ? 'ascending' : direction === 'desc' ? 'descending' : 'none';
}
