import { useTranslation } from 'react-i18next';
import { SelectField } from './field.js';

interface MonthDay {
  month: number;
  day: number;
}

export interface MonthDaySelectProps {
  label: string;
  value: MonthDay;
  onChange: (value: MonthDay) => void;
  /** The twelve months of a year without a 29 February. */
  months: readonly { long: string; days: number }[];
  problem?: string | undefined;
}

/** A day of every year. Choosing a shorter month never leaves a day behind that it does not have. */
export function MonthDaySelect({ label, value, onChange, months, problem }: MonthDaySelectProps) {
  const { t } = useTranslation('common');
  const daysIn = (month: number) => months[month - 1]?.days ?? 31;
  return (
    <fieldset>
      <legend className="field-label">{label}</legend>
      <div className="grid grid-cols-[minmax(0,1fr)_6rem] gap-2">
        <SelectField
          label={<span className="for-ears">{t('date.month')}</span>}
          value={value.month}
          problem={problem}
          onChange={(event) => {
            const month = Number(event.currentTarget.value);
            onChange({ month, day: Math.min(value.day, daysIn(month)) });
          }}
        >
          {months.map((month, index) => (
            <option key={month.long} value={index + 1}>
              {month.long}
            </option>
          ))}
        </SelectField>
        <SelectField
          label={<span className="for-ears">{t('date.dayOfMonth')}</span>}
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
