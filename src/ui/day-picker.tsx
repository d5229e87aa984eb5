import { ChevronLeft, ChevronRight } from 'lucide-react';
import { useEffect, useId, useRef, useState, type KeyboardEvent, type ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import {
  addDays,
  civilDateFromIso,
  dayNumberFromIso,
  daysInMonth,
  isoDateOf,
  dayNumberOf,
} from '#shared/kernel/iso-date.js';
import { IconButton } from './button.js';
import { classNames } from './class-names.js';
import { FieldNotes } from './field.js';

export interface DayPickerProps {
  label: ReactNode;
  /** `YYYY-MM-DD`, or null before the first choice. */
  value: string | null;
  onChange: (day: string) => void;
  /** First and last day that may be picked. */
  min: string;
  max: string;
  today?: string | undefined;
  hint?: ReactNode;
  problem?: ReactNode;
  className?: string | undefined;
}

/** Monday first: the board's weeks begin so. */
const WEEK = [0, 1, 2, 3, 4, 5, 6] as const;
/** 1 January 2024 was a Monday. */
const A_MONDAY = dayNumberOf(2024, 1, 1);

/** A month of the board: a hole for every day; picking puts the peg in. Arrow keys walk, Page Up and Down turn. */
export function DayPicker({
  label,
  value,
  onChange,
  min,
  max,
  today,
  hint,
  problem,
  className,
}: DayPickerProps) {
  const { t, i18n } = useTranslation('common');
  const id = useId();
  const grid = useRef<HTMLDivElement>(null);
  const [focused, setFocused] = useState(() => held(value ?? today ?? min, min, max));
  const [moves, setMoves] = useState(0);
  const { year, month } = civilDateFromIso(focused);
  const locale = i18n.language === 'en' ? 'en-GB' : i18n.language;

  useEffect(() => {
    if (moves > 0) grid.current?.querySelector<HTMLButtonElement>('[tabindex="0"]')?.focus();
  }, [moves]);

  const turn = (months: number) => setFocused(held(monthsLater(focused, months), min, max));
  const onKeyDown = (event: KeyboardEvent) => {
    const rtl = document.documentElement.dir === 'rtl' ? -1 : 1;
    const weekday = weekdayOf(focused);
    const targets: Record<string, string> = {
      ArrowLeft: addDays(focused, -rtl),
      ArrowRight: addDays(focused, rtl),
      ArrowUp: addDays(focused, -7),
      ArrowDown: addDays(focused, 7),
      Home: addDays(focused, -weekday),
      End: addDays(focused, 6 - weekday),
      PageUp: monthsLater(focused, -1),
      PageDown: monthsLater(focused, 1),
    };
    const target = targets[event.key];
    if (target === undefined) return;
    event.preventDefault();
    setFocused(held(target, min, max));
    setMoves(moves + 1);
  };

  const monthName = new Intl.DateTimeFormat(locale, { month: 'long', year: 'numeric', timeZone: 'UTC' });
  const first = isoDateOf(dayNumberOf(year, month, 1));
  return (
    <div className={classNames('day-picker', className)} role="group" aria-labelledby={`${id}-label`}>
      <span className="field-label" id={`${id}-label`}>
        {label}
      </span>
      <div className="flex items-center justify-between gap-2">
        <IconButton
          label={t('monthBefore')}
          closed={first <= min}
          icon={<ChevronLeft aria-hidden className="turns" size={22} />}
          onClick={() => turn(-1)}
        />
        <strong aria-live="polite">{monthName.format(utc(first))}</strong>
        <IconButton
          label={t('monthAfter')}
          closed={monthsLater(first, 1) > max}
          icon={<ChevronRight aria-hidden className="turns" size={22} />}
          onClick={() => turn(1)}
        />
      </div>
      <div className="day-picker-week" aria-hidden>
        {WEEK.map((day) => (
          <span key={day}>{weekdayName(A_MONDAY + day, locale, 'short')}</span>
        ))}
      </div>
      {/* The keys are those of the days inside; the group only hears them. */}
      {/* eslint-disable-next-line jsx-a11y/no-static-element-interactions -- see above */}
      <div className="day-picker-days" ref={grid} onKeyDown={onKeyDown}>
        {Array.from({ length: daysInMonth(year, month) }, (_, index) => {
          const day = addDays(first, index);
          const isOff = day < min || day > max;
          return (
            <button
              key={day}
              type="button"
              className={classNames('day-hole', day === value && 'picked', day === today && 'today')}
              style={index === 0 ? { gridColumnStart: weekdayOf(day) + 1 } : undefined}
              tabIndex={day === focused ? 0 : -1}
              aria-pressed={day === value}
              aria-disabled={isOff || undefined}
              aria-current={day === today ? 'date' : undefined}
              aria-label={dayName(day, locale)}
              onClick={() => {
                if (isOff) return;
                setFocused(day);
                onChange(day);
              }}
            >
              <i aria-hidden />
              {index + 1}
            </button>
          );
        })}
      </div>
      <FieldNotes inputId={id} hint={hint} problem={problem} />
    </div>
  );
}

function held(day: string, min: string, max: string): string {
  return day < min ? min : day > max ? max : day;
}

/** The same day some months later; the last of its month where there is no such day. */
function monthsLater(day: string, months: number): string {
  const { year, month, day: ofMonth } = civilDateFromIso(day);
  const count = year * 12 + (month - 1) + months;
  const [toYear, toMonth] = [Math.floor(count / 12), (count % 12) + 1];
  return isoDateOf(dayNumberOf(toYear, toMonth, Math.min(ofMonth, daysInMonth(toYear, toMonth))));
}

/** 0 for Monday: day numbers count from a Monday. */
function weekdayOf(day: string): number {
  return dayNumberFromIso(day) % 7;
}

function utc(day: string): Date {
  return new Date(`${day}T00:00:00Z`);
}

function weekdayName(dayNumber: number, locale: string, weekday: 'short'): string {
  return new Intl.DateTimeFormat(locale, { weekday, timeZone: 'UTC' }).format(utc(isoDateOf(dayNumber)));
}

function dayName(day: string, locale: string): string {
  return new Intl.DateTimeFormat(locale, {
    weekday: 'long',
    day: 'numeric',
    month: 'long',
    year: 'numeric',
    timeZone: 'UTC',
  }).format(utc(day));
}
