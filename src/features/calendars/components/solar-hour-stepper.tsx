import { useTranslation } from 'react-i18next';
import { hourText } from '#shared/calendar/sky-sign.js';
import { SOLAR_HOUR } from '#shared/sky/vocabulary.js';
import { Stepper } from '#src/ui/stepper.js';

/** An hour by the Sun, in quarters; it may be typed as a clock says it. */
export function SolarHourStepper({
  value,
  onChange,
}: {
  value: number;
  onChange: (solarHour: number) => void;
}) {
  const { t } = useTranslation('calendars');
  return (
    <Stepper
      label={t('sign.solarHour')}
      hint={t('sign.solarHourHint')}
      value={value}
      {...SOLAR_HOUR}
      bigStep={1}
      format={hourText}
      read={readHour}
      onChange={onChange}
    />
  );
}

/** `21:30`, `21`, `21.5`; null for anything else. */
function readHour(typed: string): number | null {
  const [, hours, minutes] = /^\s*(\d{1,2})(?::([0-5]\d))?\s*$/u.exec(typed) ?? [];
  if (hours !== undefined) return Number(hours) + Number(minutes ?? 0) / 60;
  const number = Number(typed.replace(',', '.'));
  return Number.isFinite(number) && typed.trim() !== '' ? number : null;
}
