import type { FieldPath, UseFormReturn } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import type { CommunityInput } from '#shared/contracts/people.js';
import { useDateWords } from '#src/lib/date-words.js';
import { SelectField, TextField } from '#src/ui/field.js';
import { Board } from '#src/ui/surfaces.js';

export interface SettingsPartProps {
  form: UseFormReturn<CommunityInput, unknown, CommunityInput>;
  at: (field: FieldPath<CommunityInput>) => string | undefined;
}

export function NameFields({ form, at }: SettingsPartProps) {
  const { t } = useTranslation('people');
  return (
    <Board title={t('settings.names')}>
      <div className="grid gap-4">
        <TextField {...form.register('name')} label={t('settings.name')} problem={at('name')} />
        <TextField
          {...form.register('villageLanguage.name')}
          label={t('settings.villageLanguage')}
          problem={at('villageLanguage.name')}
        />
        <TextField
          {...form.register('villageLanguage.tag')}
          label={t('settings.villageTag')}
          hint={t('settings.tagHint')}
          problem={at('villageLanguage.tag')}
        />
        <TextField
          {...form.register('officerLanguage.name')}
          label={t('settings.officerLanguage')}
          problem={at('officerLanguage.name')}
        />
        <TextField
          {...form.register('officerLanguage.tag')}
          label={t('settings.officerTag')}
          problem={at('officerLanguage.tag')}
        />
      </div>
    </Board>
  );
}

export function YearStartFields({ form, at }: SettingsPartProps) {
  const { t } = useTranslation('people');
  const dates = useDateWords();
  const whole = { valueAsNumber: true } as const;
  return (
    <Board title={t('settings.yearStart')}>
      <div className="grid gap-4">
        <div className="grid grid-cols-2 gap-4">
          <TextField
            {...form.register('yearStart.date.day', whole)}
            label={t('settings.yearStartDay')}
            problem={at('yearStart.date.day')}
            inputMode="numeric"
          />
          <SelectField
            {...form.register('yearStart.date.month', whole)}
            label={t('settings.yearStartMonth')}
            problem={at('yearStart.date.month')}
          >
            {dates.months(2027).map((month, index) => (
              <option key={month.long} value={index + 1}>
                {month.long}
              </option>
            ))}
          </SelectField>
        </div>
        <TextField
          {...form.register('yearStart.note')}
          label={t('settings.yearStartNote')}
          problem={at('yearStart.note')}
        />
      </div>
    </Board>
  );
}

export function ContactFields({ form, at }: SettingsPartProps) {
  const { t } = useTranslation('people');
  return (
    <Board title={t('settings.contacts')}>
      <div className="grid gap-4">
        <p className="text-umber-soft">{t('settings.contactsHint')}</p>
        <TextField
          {...form.register('weatherContact')}
          label={t('settings.weather')}
          problem={at('weatherContact')}
        />
        <TextField
          {...form.register('agricultureContact')}
          label={t('settings.agriculture')}
          problem={at('agricultureContact')}
        />
      </div>
    </Board>
  );
}
