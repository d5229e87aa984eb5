import {
  civilDateFromIso,
  dayOfYear,
  daysInMonth,
  isLeapYear,
  type IsoDate,
} from '#shared/kernel/iso-date.js';

/** One hole of a board. */
export interface BoardDay {
  date: IsoDate;
  /** Number of the day in its year: 1…365, or 366 in a leap year. */
  hole: number;
  /** Row of a board with a row for each month, 1…12. */
  row: number;
  /** Place in the row, 1…31. */
  column: number;
  /** 29 February: its ring is dashed, because the wall keeps the board for other years too. */
  leapDay: boolean;
}

export function boardDayOf(date: IsoDate): BoardDay {
  const { month, day } = civilDateFromIso(date);
  return { date, hole: dayOfYear(date), row: month, column: day, leapDay: month === 2 && day === 29 };
}

/** Every hole of a year's board in order: 365, or 366 in a leap year. */
export function boardDaysOf(year: number): BoardDay[] {
  const days: BoardDay[] = [];
  const yearText = String(year).padStart(4, '0');
  for (let month = 1; month <= 12; month += 1) {
    for (let day = 1; day <= daysInMonth(year, month); day += 1) {
      days.push({
        date: `${yearText}-${String(month).padStart(2, '0')}-${String(day).padStart(2, '0')}`,
        hole: days.length + 1,
        row: month,
        column: day,
        leapDay: isLeapYear(year) && month === 2 && day === 29,
      });
    }
  }
  return days;
}
