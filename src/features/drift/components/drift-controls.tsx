import { useTranslation } from 'react-i18next';
import { FIRST_YEAR, LAST_YEAR, type Phenomenon } from '#shared/sky/vocabulary.js';
import { readYear } from '#src/lib/civil-year.js';
import { useDateWords } from '#src/lib/date-words.js';
import { SelectField } from '#src/ui/field.js';
import { More } from '#src/ui/fold.js';
import { PickGroup } from '#src/ui/pick.js';
import { Stepper } from '#src/ui/stepper.js';
import { STRETCHES, stretchOf, type DriftView, type Stretch } from '../model/drift-years.js';

/** The four days in the order of the star's page. */
const DAYS: readonly Phenomenon[] = [
  'heliacal-rising',
  'heliacal-setting',
  'acronychal-rising',
  'cosmical-setting',
];

/** Which day, and which years. */
export function DriftControls({
  view,
  onChange,
}: {
  view: DriftView;
  onChange: (patch: Partial<DriftView>) => void;
}) {
  const { t } = useTranslation(['drift', 'sky']);
  const words = useDateWords();
  return (
    <div className="mb-4 grid gap-3">
      <div className="flex flex-wrap items-end gap-3">
        <SelectField
          className="min-w-0 flex-[0_1_18rem]"
          label={t('which')}
          value={view.phenomenon}
          onChange={(event) => {
            onChange({ phenomenon: event.currentTarget.value as Phenomenon });
          }}
        >
          {DAYS.map((phenomenon) => (
            <option key={phenomenon} value={phenomenon}>
              {t(`sky:phenomenonTitle.${phenomenon}`)}
            </option>
          ))}
        </SelectField>
        <PickGroup
          label={t('stretch')}
          value={stretchOf(view)}
          onChange={(stretch) => {
            onChange(STRETCHES[stretch]);
          }}
          options={(Object.keys(STRETCHES) as Stretch[]).map((value) => ({
            value,
            label: t(`stretches.${value}`),
          }))}
        />
      </div>
      <More label={t('own')}>
        <div className="flex flex-wrap gap-3">
          <Stepper
            label={t('from')}
            value={view.from}
            min={FIRST_YEAR}
            max={view.to - 1}
            step={10}
            bigStep={100}
            format={words.year}
            read={readYear}
            onChange={(from) => {
              onChange({ from });
            }}
          />
          <Stepper
            label={t('to')}
            value={view.to}
            min={view.from + 1}
            max={LAST_YEAR}
            step={10}
            bigStep={100}
            format={words.year}
            read={readYear}
            onChange={(to) => {
              onChange({ to });
            }}
          />
        </div>
      </More>
    </div>
  );
}
