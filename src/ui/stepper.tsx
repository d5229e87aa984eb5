import { Minus, Plus } from 'lucide-react';
import { useEffect, useId, useRef, useState, type KeyboardEvent, type ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { describedBy, FieldFrame } from './field.js';

export interface StepperProps {
  label: ReactNode;
  value: number;
  onChange: (value: number) => void;
  min: number;
  max: number;
  step?: number | undefined;
  /** A larger step for Page Up and Page Down. */
  bigStep?: number | undefined;
  /** How the value reads while nobody types: `3 days`, `110°`. */
  format?: ((value: number) => string) | undefined;
  /** How a typed text becomes a number, where it is more than digits: `44 BC`. Null for none. */
  read?: ((typed: string) => number | null) | undefined;
  hint?: ReactNode;
  problem?: ReactNode;
  closed?: boolean | undefined;
  className?: string | undefined;
  id?: string | undefined;
}

const FIRST_REPEAT_MS = 450;
const REPEAT_MS = 90;

/** A number that is stepped rather than typed; typing stays possible. Holding a button goes on stepping. */
export function Stepper(props: StepperProps) {
  const { label, value, onChange, min, max, step = 1, bigStep = step * 10, format, closed = false } = props;
  const { read = readNumber } = props;
  const { t } = useTranslation('common');
  const ownId = useId();
  const inputId = props.id ?? ownId;
  const [typed, setTyped] = useState<string | null>(null);
  const shown = format?.(value) ?? String(value);

  const moveTo = (next: number) => {
    const tidy = Math.min(max, Math.max(min, tidied(next, step)));
    setTyped(null);
    if (!closed && tidy !== value) onChange(tidy);
  };
  const takeTyped = () => {
    if (typed === null) return;
    const number = read(typed);
    if (number === null) setTyped(null);
    else moveTo(number);
  };
  const onKeyDown = (event: KeyboardEvent) => {
    const moves: Record<string, number> = {
      ArrowUp: value + step,
      ArrowDown: value - step,
      PageUp: value + bigStep,
      PageDown: value - bigStep,
      ...(typed === null ? { Home: min, End: max } : {}),
    };
    const next = moves[event.key];
    if (next !== undefined) {
      event.preventDefault();
      moveTo(next);
    } else if (event.key === 'Enter' && typed !== null) {
      event.preventDefault();
      takeTyped();
    } else if (event.key === 'Escape') setTyped(null);
  };

  return (
    <FieldFrame
      inputId={inputId}
      label={label}
      hint={props.hint}
      problem={props.problem}
      className={props.className}
    >
      <div className="stepper">
        <HoldButton label={t('less')} closed={closed || value <= min} onStep={() => moveTo(value - step)}>
          <Minus aria-hidden size={20} />
        </HoldButton>
        <input
          id={inputId}
          inputMode="decimal"
          autoComplete="off"
          role="spinbutton"
          aria-valuenow={value}
          aria-valuemin={min}
          aria-valuemax={max}
          aria-valuetext={shown}
          aria-invalid={props.problem !== undefined || undefined}
          aria-describedby={describedBy(inputId, { label, hint: props.hint, problem: props.problem })}
          readOnly={closed}
          value={typed ?? shown}
          onFocus={(event) => {
            event.currentTarget.select();
          }}
          onChange={(event) => {
            setTyped(event.currentTarget.value);
          }}
          onBlur={takeTyped}
          onKeyDown={onKeyDown}
        />
        <HoldButton label={t('plus')} closed={closed || value >= max} onStep={() => moveTo(value + step)}>
          <Plus aria-hidden size={20} />
        </HoldButton>
      </div>
    </FieldFrame>
  );
}

interface HoldButtonProps {
  label: string;
  closed: boolean;
  onStep: () => void;
  children: ReactNode;
}

/** Steps once per press and goes on while held. Not in the tab order: the field itself takes the arrow keys. */
function HoldButton({ label, closed, onStep, children }: HoldButtonProps) {
  const newest = useRef({ onStep, closed });
  const timer = useRef<ReturnType<typeof setTimeout> | undefined>(undefined);
  const held = useRef(false);
  useEffect(() => {
    newest.current = { onStep, closed };
  });
  useEffect(
    () => () => {
      clearTimeout(timer.current);
    },
    [],
  );

  const repeat = () => {
    if (newest.current.closed) return;
    held.current = true;
    newest.current.onStep();
    timer.current = setTimeout(repeat, REPEAT_MS);
  };
  const release = () => {
    clearTimeout(timer.current);
  };
  return (
    <button
      type="button"
      tabIndex={-1}
      aria-label={label}
      aria-disabled={closed || undefined}
      onPointerDown={() => {
        held.current = false;
        timer.current = setTimeout(repeat, FIRST_REPEAT_MS);
      }}
      onPointerUp={release}
      onPointerLeave={release}
      onPointerCancel={release}
      onContextMenu={(event) => {
        event.preventDefault();
      }}
      onClick={() => {
        if (!closed && !held.current) onStep();
        held.current = false;
      }}
    >
      {children}
    </button>
  );
}

/** Steps of 0.1 must not drift to 0.30000000000000004. */
function tidied(value: number, step: number): number {
  const decimals = Math.max(0, -Math.floor(Math.log10(step) + 1e-9));
  return Number(value.toFixed(Math.min(decimals + 2, 10)));
}

/** Reads what a person types, with a comma or a point and whatever unit stands behind; null for no number. */
export function readNumber(text: string): number | null {
  const match = /[-−]?\d+(?:[.,]\d+)?/u.exec(text.replace(/[\s\u00a0]/gu, ''));
  return match === null ? null : Number(match[0].replace('−', '-').replace(',', '.'));
}
