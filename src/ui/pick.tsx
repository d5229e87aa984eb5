import { useId, type ReactNode } from 'react';
import { NavLink, type NavLinkProps } from 'react-router-dom';
import { classNames } from './class-names.js';
import { FieldNotes } from './field.js';

export interface PickOption<T extends string> {
  value: T;
  label: ReactNode;
  note?: ReactNode;
  icon?: ReactNode;
  disabled?: boolean | undefined;
}

export interface PickGroupProps<T extends string> {
  label: ReactNode;
  /** Read aloud but not shown, where the screen already says it. */
  labelForEars?: boolean | undefined;
  options: readonly PickOption<T>[];
  value: T | null;
  onChange: (value: T) => void;
  /** Under one another, full width, with room for a note. */
  stacked?: boolean | undefined;
  hint?: ReactNode;
  problem?: ReactNode;
  className?: string | undefined;
}

/** One of several: a ring, and a peg in it when picked. Arrow keys move as in any group of radio buttons. */
export function PickGroup<T extends string>(props: PickGroupProps<T>) {
  const { label, labelForEars, options, value, onChange, stacked, hint, problem, className } = props;
  const name = useId();
  return (
    <fieldset className={className} aria-describedby={hint !== undefined ? `${name}-hint` : undefined}>
      <legend className={labelForEars === true ? 'for-ears' : 'field-label'}>{label}</legend>
      <div className={classNames('picks', stacked === true && 'stacked')}>
        {options.map((option) => (
          <label key={option.value} className="pick">
            <input
              type="radio"
              name={name}
              value={option.value}
              checked={option.value === value}
              disabled={option.disabled}
              onChange={() => {
                onChange(option.value);
              }}
            />
            <span className="ring" aria-hidden />
            {option.icon}
            <span>
              {option.label}
              {option.note !== undefined && <span className="pick-note">{option.note}</span>}
            </span>
          </label>
        ))}
      </div>
      <FieldNotes inputId={name} hint={hint} problem={problem} />
    </fieldset>
  );
}

/** Tabs that are addresses: the peg stands in the current one. */
export function TabLinks({
  label,
  links,
}: {
  label: string;
  links: readonly { to: string; label: ReactNode; end?: boolean }[];
}) {
  return (
    <nav aria-label={label}>
      <ul className="tabs">
        {links.map((link) => (
          <li key={link.to}>
            <PickLink to={link.to} end={link.end ?? false}>
              {link.label}
            </PickLink>
          </li>
        ))}
      </ul>
    </nav>
  );
}

function PickLink({
  children,
  ...link
}: Omit<NavLinkProps, 'className' | 'children'> & { children: ReactNode }) {
  return (
    <NavLink {...link} className="pick">
      <span className="ring" aria-hidden />
      <span>{children}</span>
    </NavLink>
  );
}
