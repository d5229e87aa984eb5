import type { DaySpan } from './day-span.js';

/** A part of a scale: a month, a Moon, a week, a day. `lib/date-words` makes those of the civil year: `months(year)`. */
export interface ScaleMonth {
  dayNumber: number;
  days: number;
  short: string;
  /** Where there is little room. Without one it is left to the parts beside it, and its line with it. */
  narrow: string;
  /** A name that may be cut at its end: people know theirs. */
  mayCut?: boolean;
}

export interface FittedPart {
  dayNumber: number;
  days: number;
  /** Empty where nothing fits. */
  text: string;
}

export interface FittedScale {
  isNarrow: boolean;
  parts: FittedPart[];
}

/** Padding and line before a name, pixels. */
const AIR_PX = 6;
/** A name that is cut to less says nothing. */
const CUT_LEAST_PX = 44;
/** Where more than one in so many does not fit, all are shortened: names of one scale look alike. */
const ONE_IN = 4;

type TextWidth = (text: string) => number;

/**
 * What is written at the parts of a scale: the name, or something shorter, and never half of it. Parts that reach over the
 * ends of the span have the room that is left of them.
 */
export function fitScale(
  months: readonly ScaleMonth[],
  span: DaySpan,
  widthPx: number,
  textWidth: TextWidth,
): FittedScale {
  const pxPerDay = widthPx / (span.last - span.first + 1);
  const shown = months.map((month) => ({ month, ...within(month, span) })).filter(({ days }) => days > 0);
  const fits = (text: string, days: number, airPx = AIR_PX) => textWidth(text) + airPx <= days * pxPerDay;
  const cut = ({ mayCut, short }: ScaleMonth, days: number) =>
    mayCut === true && days * pxPerDay >= CUT_LEAST_PX ? short : '';
  const letter = ({ narrow }: ScaleMonth, days: number) => (fits(narrow, days, 0) ? narrow : '');

  const plain = shown.filter(({ month, days }) => month.mayCut !== true && days === month.days);
  if (!areMany(plain, ({ month, days }) => !fits(month.short, days))) {
    const parts = shown.map(({ month, dayNumber, days }) => {
      const text = fits(month.short, days) ? month.short : cut(month, days) || letter(month, days);
      return { dayNumber, days, text };
    });
    return { isNarrow: false, parts };
  }
  const named = shown
    .filter(({ month }) => month.narrow !== '')
    .map((part, index, all) => {
      const next = all[index + 1]?.dayNumber ?? span.last + 1;
      return { ...part, days: next - part.dayNumber };
    });
  const isCrowded = areMany(named, ({ month, days }) => letter(month, days) === '');
  return {
    isNarrow: true,
    parts:
      named.length === 0 || isCrowded
        ? shown.map(({ dayNumber, days }) => ({ dayNumber, days, text: '' }))
        : named.map(({ month, dayNumber, days }) => ({ dayNumber, days, text: letter(month, days) })),
  };
}

function within({ dayNumber, days }: ScaleMonth, span: DaySpan): { dayNumber: number; days: number } {
  const first = Math.max(dayNumber, span.first);
  return { dayNumber: first, days: Math.min(dayNumber + days - 1, span.last) - first + 1 };
}

function areMany<T>(all: readonly T[], isSo: (one: T) => boolean): boolean {
  return all.filter(isSo).length * ONE_IN > all.length;
}
