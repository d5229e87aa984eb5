import { useTranslation } from 'react-i18next';
import { TextField, TickField } from '#src/ui/field.js';
import type { FormState } from '../model/form-state.js';
import { MonthDayFields } from '#src/lib/month-day-fields.js';

/** The office's last date, or the mark of a watch that nothing shortens. */
export function LastDateFields({ form }: { form: FormState }) {
  const { t } = useTranslation('calendars');
  const { draft, change, at } = form;
  return (
    <div className="grid gap-3">
      <TickField
        label={t('form.hasLastDate')}
        hint={t('form.hasLastDateHint')}
        problem={at('hasLastDate') ?? (draft.hasLastDate ? undefined : at('lastDate'))}
        checked={draft.hasLastDate}
        onChange={(event) => {
          change({ hasLastDate: event.currentTarget.checked });
        }}
      />
      {draft.hasLastDate && (
        <div className="grid gap-4 border-s-4 border-hairline ps-4 @min-[34rem]:grid-cols-2">
          <MonthDayFields
            label={t('form.lastDate')}
            value={draft.lastDate.date}
            problem={at('lastDate.date.day') ?? at('lastDate')}
            onChange={(date) => {
              change((now) => ({ lastDate: { ...now.lastDate, date } }));
            }}
          />
          <TextField
            label={t('form.lastSource')}
            hint={t('form.sourceHint')}
            value={draft.lastDate.source}
            problem={at('lastDate.source')}
            onChange={(event) => {
              const source = event.currentTarget.value;
              change((now) => ({ lastDate: { ...now.lastDate, source } }));
            }}
          />
        </div>
      )}
      <TickField
        label={t('form.protectiveWatch')}
        hint={t('form.protectiveWatchHint')}
        problem={at('protectiveWatch')}
        checked={draft.protectiveWatch}
        onChange={(event) => {
          change({ protectiveWatch: event.currentTarget.checked });
        }}
      />
    </div>
  );
}
