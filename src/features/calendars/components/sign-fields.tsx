import { Search } from 'lucide-react';
import { useId } from 'react';
import { useTranslation } from 'react-i18next';
import { skySignIconKey } from '#shared/sheet/lead-icons.js';
import { useMarkerDayWords } from '#src/lib/marker-day-words.js';
import { useSkySignWords } from '#src/lib/sky-sign-words.js';
import { Button } from '#src/ui/button.js';
import { FieldNotes, SelectField } from '#src/ui/field.js';
import { SignIcon } from '#src/ui/icons/drawn-icon.js';
import { PickGroup } from '#src/ui/pick.js';
import { hasSign } from '../model/entry-draft.js';
import type { FormState } from '../model/form-state.js';

/** The sign of the sky that leads, and which of its two days where a year has two. */
export function SignFields({ form, onSearch }: { form: FormState; onSearch: () => void }) {
  const { t } = useTranslation(['calendars', 'sky']);
  const days = useMarkerDayWords();
  const sign = useSkySignWords();
  const labelId = useId();
  const { draft, change, at, year } = form;
  const { sky } = draft;
  const problem = at('lead.spec.markerKey') ?? at('lead.spec');
  const occurrences = form.sign?.occurrences ?? [];
  return (
    <div className="grid gap-4">
      <div role="group" aria-labelledby={labelId}>
        <p id={labelId} className="field-label">
          {t('form.goesBy')}
        </p>
        <div className="chosen-marker" data-invalid={problem === undefined ? undefined : true}>
          {hasSign(sky) && (
            <p className="flex items-center gap-3">
              <SignIcon sign={skySignIconKey(sky.spec)} size={28} />
              <strong>{sign(sky.spec, form.markers ?? new Map())}</strong>
            </p>
          )}
          <Button
            icon={<Search aria-hidden size={20} />}
            onClick={onSearch}
            data-invalid={problem === undefined ? undefined : true}
          >
            {t(hasSign(sky) ? 'form.changeMarker' : 'form.chooseSign')}
          </Button>
        </div>
        <FieldNotes inputId={labelId} problem={problem} />
      </div>
      {sky.spec.kind === 'moon-phase' && (
        <SelectField
          label={t('form.occurrences', { year })}
          value={String(sky.occurrence)}
          onChange={({ currentTarget: { value } }) => {
            change({ sky: { ...sky, occurrence: Number(value) } });
          }}
        >
          {occurrences.map((one, index) => (
            <option key={one.expected.dayNumber} value={String(index + 1)}>
              {t('form.nth', { nth: index + 1, date: days.about(one) })}
            </option>
          ))}
          {sky.occurrence > occurrences.length && (
            <option value={String(sky.occurrence)}>{t('form.nthNone', { nth: sky.occurrence, year })}</option>
          )}
        </SelectField>
      )}
      {sky.spec.kind !== 'moon-phase' && occurrences.length === 2 && (
        <PickGroup
          label={t('form.occurrence', { year })}
          stacked
          value={sky.occurrence === 1 ? 'first' : 'second'}
          onChange={(which) => {
            change({ sky: { ...sky, occurrence: which === 'first' ? 1 : 2 } });
          }}
          options={(['first', 'second'] as const).map((which, index) => {
            const one = occurrences[index];
            return { value: which, label: t(`form.${which}`, { date: one ? days.about(one) : '' }) };
          })}
        />
      )}
    </div>
  );
}
