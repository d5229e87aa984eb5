import { useTranslation } from 'react-i18next';
import { FIRST_YEAR, LAST_YEAR } from '#shared/sky/vocabulary.js';
import { Stepper } from '#src/ui/stepper.js';
import { readYear } from './civil-year.js';
import { useDateWords } from './date-words.js';

/** Any year that the engine offers: stepped, or typed as people write it, `2027` or `44 BC`. */
export function YearStepper({
  year,
  onChange,
  labelForEars = false,
  className,
}: {
  year: number;
  onChange: (year: number) => void;
  labelForEars?: boolean | undefined;
  className?: string | undefined;
}) {
  const { t } = useTranslation('stars');
  const words = useDateWords();
  return (
    <Stepper
      className={className}
      label={<span className={labelForEars ? 'for-ears' : undefined}>{t('year')}</span>}
      value={year}
      min={FIRST_YEAR}
      max={LAST_YEAR}
      bigStep={100}
      format={words.year}
      read={readYear}
      onChange={onChange}
    />
  );
}
