import { type Calendar, dayNumberOf, gregorianOf, julianOf } from './julian-day.js';

/** The first civil year that is counted in the Gregorian calendar; 1582 still is a Julian one throughout. */
export const FIRST_GREGORIAN_YEAR = 1583;

/** A civil year: Gregorian from 1583 on, Julian before. Both days belong to it. */
export interface CivilYear {
  year: number;
  calendar: Calendar;
  firstDay: number;
  lastDay: number;
}

/** First and last day number of a civil year (astronomical numbering). */
export function civilYearOf(year: number): CivilYear {
  const calendar: Calendar = year >= FIRST_GREGORIAN_YEAR ? 'gregorian' : 'julian';
  return {
    year,
    calendar,
    firstDay: dayNumberOf({ year, month: 1, day: 1 }, calendar),
    lastDay: dayNumberOf({ year, month: 12, day: 31 }, calendar),
  };
}

/** Month (1…12) of a day in the calendar of the civil year that it stands beside. */
export function monthOfDay(dayNumber: number, calendar: Calendar): number {
  return (calendar === 'gregorian' ? gregorianOf(dayNumber) : julianOf(dayNumber)).month;
}
