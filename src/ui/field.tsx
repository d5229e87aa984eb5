import { ChevronDown, TriangleAlert } from 'lucide-react';
import { useId, type ComponentProps, type ReactNode } from 'react';
import { classNames } from './class-names.js';

export interface FieldWords {
  label: ReactNode;
  hint?: ReactNode;
  /** What is not accepted, and what to do; nothing typed is lost. Undefined while all is well. */
  problem?: ReactNode;
}

interface FieldFrameProps extends FieldWords {
  inputId: string;
  className?: string | undefined;
  children: ReactNode;
}

/** Ids that tie a control to its hint and its problem. */
export function describedBy(inputId: string, { hint, problem }: FieldWords): string | undefined {
  const ids = [hint !== undefined && `${inputId}-hint`, isSaid(problem) && `${inputId}-said`].filter(Boolean);
  return ids.length > 0 ? ids.join(' ') : undefined;
}

/** Label above, the control, its hint, and what is said about it. For controls of your own. */
export function FieldFrame({ inputId, label, hint, problem, className, children }: FieldFrameProps) {
  return (
    <div className={classNames('field', className)}>
      <label className="field-label" htmlFor={inputId}>
        {label}
      </label>
      {children}
      <FieldNotes inputId={inputId} hint={hint} problem={problem} />
    </div>
  );
}

export function FieldNotes({ inputId, hint, problem }: Omit<FieldFrameProps, 'label' | 'children'>) {
  return (
    <>
      {hint !== undefined && (
        <span className="field-hint" id={`${inputId}-hint`}>
          {hint}
        </span>
      )}
      <span aria-live="polite">
        {isSaid(problem) && (
          <span className="field-said" id={`${inputId}-said`}>
            <TriangleAlert aria-hidden size={20} />
            <span>{problem}</span>
          </span>
        )}
      </span>
    </>
  );
}

export interface TextFieldProps extends ComponentProps<'input'>, FieldWords {
  /** A small drawing inside, at the start. */
  leadIcon?: ReactNode;
  /** A control inside, at the end: show the password, clear the search. */
  endKey?: ReactNode;
}

/** One line of text. Spread react-hook-form's `register(…)` into it. */
export function TextField({
  label,
  hint,
  problem,
  leadIcon,
  endKey,
  className,
  id,
  ...input
}: TextFieldProps) {
  const ownId = useId();
  const inputId = id ?? ownId;
  const control = (
    <input
      {...input}
      id={inputId}
      className="inp"
      aria-invalid={isSaid(problem) || undefined}
      aria-describedby={describedBy(inputId, { label, hint, problem })}
    />
  );
  const holds = leadIcon !== undefined || endKey !== undefined;
  return (
    <FieldFrame inputId={inputId} label={label} hint={hint} problem={problem} className={className}>
      {holds ? (
        <div
          className={classNames(
            'inp-holder',
            leadIcon !== undefined && 'leads',
            endKey !== undefined && 'ends',
          )}
        >
          {leadIcon}
          {control}
          {endKey}
        </div>
      ) : (
        control
      )}
    </FieldFrame>
  );
}

export type TextAreaFieldProps = ComponentProps<'textarea'> & FieldWords;

export function TextAreaField({ label, hint, problem, className, id, ...input }: TextAreaFieldProps) {
  const ownId = useId();
  const inputId = id ?? ownId;
  return (
    <FieldFrame inputId={inputId} label={label} hint={hint} problem={problem} className={className}>
      <textarea
        rows={4}
        {...input}
        id={inputId}
        className="inp"
        aria-invalid={isSaid(problem) || undefined}
        aria-describedby={describedBy(inputId, { label, hint, problem })}
      />
    </FieldFrame>
  );
}

export type SelectFieldProps = ComponentProps<'select'> & FieldWords;

/** The browser's own list: the best one on a phone. Give it <option>s. */
export function SelectField({ label, hint, problem, className, id, children, ...select }: SelectFieldProps) {
  const ownId = useId();
  const inputId = id ?? ownId;
  return (
    <FieldFrame inputId={inputId} label={label} hint={hint} problem={problem} className={className}>
      <div className="inp-holder">
        <select
          {...select}
          id={inputId}
          className="inp"
          aria-invalid={isSaid(problem) || undefined}
          aria-describedby={describedBy(inputId, { label, hint, problem })}
        >
          {children}
        </select>
        <ChevronDown aria-hidden size={22} />
      </div>
    </FieldFrame>
  );
}

export type TickFieldProps = Omit<ComponentProps<'input'>, 'type'> & FieldWords;

/** Yes or no. */
export function TickField({ label, hint, problem, className, id, ...input }: TickFieldProps) {
  const ownId = useId();
  const inputId = id ?? ownId;
  return (
    <div className={classNames('field', className)}>
      <label className="tick" htmlFor={inputId}>
        <input
          {...input}
          type="checkbox"
          id={inputId}
          aria-invalid={isSaid(problem) || undefined}
          aria-describedby={describedBy(inputId, { label, hint, problem })}
        />
        <span className="tick-box" aria-hidden>
          <svg width="18" height="18" viewBox="0 0 18 18" fill="none" stroke="currentColor" strokeWidth="3">
            <path d="M2.5 9.5 7 14 15.5 4" />
          </svg>
        </span>
        <span>{label}</span>
      </label>
      <FieldNotes inputId={inputId} hint={hint} problem={problem} />
    </div>
  );
}

function isSaid(problem: ReactNode): boolean {
  return problem !== undefined && problem !== null && problem !== false && problem !== '';
}
