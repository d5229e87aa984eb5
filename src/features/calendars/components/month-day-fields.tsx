import { useTranslation } from 'react-i18next';
import type { MonthDay } from '#shared/contracts/common.js';
import { useDateWords } from '#src/lib/date-words.js';
import { SelectField } from '#src/ui/field.js';

interface MonthDayFieldsProps {
  label: string;
  value: MonthDay;
  onChange: (value: MonthDay) => void;
  problem?: string | undefined;
}

/** Any year without a 29 February: a yearly date exists every year. */
const PLAIN_YEAR = 2027;

/** A day of every year. Choosing a shorter month never leaves a day behind that it does not have. */
export function MonthDayFields({ label, value, onChange, problem }: MonthDayFieldsProps) {
  const { t } = useTranslation('calendars');
  const months = useDateWords().months(PLAIN_YEAR);
  const daysIn = (month: number) => months[month - 1]?.days ?? 31;
  return (
    <fieldset>
      <legend className="field-label">{label}</legend>
      <div className="grid grid-cols-[minmax(0,1fr)_6rem] gap-2">
        <SelectField
          label={<span className="for-ears">{t('form.month')}</span>}
          value={value.month}
          problem={problem}
          onChange={(event) => {
            const month = Number(event.currentTarget.value);
            onChange({ month, day: Math.min(value.day, daysIn(month)) });
          }}
        >
          {months.map((month, index) => (
            <option key={month.dayNumber} value={index + 1}>
              {month.long}
            </option>
          ))}
        </SelectField>
        <SelectField
          label={<span className="for-ears">{t('form.day')}</span>}
          value={value.day}
          onChange={(event) => {
            onChange({ ...value, day: Number(event.currentTarget.value) });
          }}
        >
          {Array.from({ length: daysIn(value.month) }, (_, index) => (
            <option key={index} value={index + 1}>
              {index + 1}
            </option>
          ))}
        </SelectField>
      </div>
    </fieldset>
  );
}
