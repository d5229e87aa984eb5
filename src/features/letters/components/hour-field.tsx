import type { ReactNode } from 'react';
import { SelectField } from '#src/ui/field.js';

const HOURS = Array.from({ length: 24 }, (_, hour) => hour);

/** A full hour of the village's clock. */
export function HourField({
  label,
  hour,
  onChange,
}: {
  label: ReactNode;
  hour: number;
  onChange: (hour: number) => void;
}) {
  return (
    <SelectField
      label={label}
      value={hour}
      onChange={(event) => {
        onChange(Number(event.currentTarget.value));
      }}
    >
      {HOURS.map((each) => (
        <option key={each} value={each}>
          {`${String(each).padStart(2, '0')}:00`}
        </option>
      ))}
    </SelectField>
  );
}
