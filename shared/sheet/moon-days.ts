import { dayNumberFromIso } from '../kernel/iso-date.js';
import { capHeightMm, textOnBaseline } from './text-layout.js';
import type { TextMeasurer, TextStyle } from './text-layout.js';
import type { Primitive } from './primitives.js';

/** No Moon is counted longer: a late crescent leaves a day without a number. */
const LAST_MOON_DAY = 30;
const STYLE: TextStyle = { role: 'moon-day', sizePt: 12, weight: 400 };

/**
 * The day of the Moon, 1 to 30, as villages count it from the first crescent; null before the first begin and where
 * a Moon is over and the next one has not come.
 * @param begins days on which a Moon begins, in order, `YYYY-MM-DD`
 */
export function moonDayOf(date: string, begins: readonly string[]): number | null {
  const begin = begins.findLast((each) => each <= date);
  if (begin === undefined) return null;
  const day = dayNumberFromIso(date) - dayNumberFromIso(begin) + 1;
  return day <= LAST_MOON_DAY ? day : null;
}

/** A small number: at the right edge of a day's cell, and in the key. */
export function moonDayMark(
  day: number,
  at: { readonly right: number; readonly middle: number },
  measurer: TextMeasurer,
): Primitive {
  const baseline = at.middle + capHeightMm(STYLE.sizePt) / 2;
  return textOnBaseline(
    [String(day)],
    { x: at.right, baseline, align: 'right', figures: true },
    STYLE,
    measurer,
  );
}
