import type { MonthDay } from '#shared/contracts/common.js';
import { useDateWords } from './date-words.js';
import { MonthDaySelect } from '#src/ui/month-day-select.js';

interface MonthDayFieldsProps {
  label: string;
  value: MonthDay;
  onChange: (value: MonthDay) => void;
  problem?: string | undefined;
}

/** Any year without a 29 February: a yearly date exists every year. */
const PLAIN_YEAR = 2027;

/** A day of every year. */
export function MonthDayFields(props: MonthDayFieldsProps) {
  return <MonthDaySelect {...props} months={useDateWords().months(PLAIN_YEAR)} />;
}
