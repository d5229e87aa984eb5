import { useTranslation } from 'react-i18next';
import { SHARING_LEVELS } from '#shared/contracts/calendars.js';
import { TextAreaField, TextField, TickField } from '#src/ui/field.js';
import { PickGroup } from '#src/ui/pick.js';
import type { FormState } from '../model/form-state.js';

export function SignsFields({ form }: { form: FormState }) {
  const { t } = useTranslation('calendars');
  return (
    <TextAreaField
      label={t('form.otherSigns')}
      hint={t('form.otherSignsHint')}
      rows={3}
      value={form.draft.otherSigns}
      problem={form.at('otherSigns')}
      onChange={(event) => {
        form.change({ otherSigns: event.currentTarget.value });
      }}
    />
  );
}

export function LateFields({ form }: { form: FormState }) {
  const { t } = useTranslation('calendars');
  return (
    <TextAreaField
      label={t('form.ifLate')}
      hint={t('form.ifLateHint')}
      rows={3}
      value={form.draft.ifLate}
      problem={form.at('ifLate')}
      onChange={(event) => {
        form.change({ ifLate: event.currentTarget.value });
      }}
    />
  );
}

/** Whose knowledge it is, what was agreed about it, and who may see it. */
export function WhoseFields({ form }: { form: FormState }) {
  const { t } = useTranslation('calendars');
  const { draft, change, at } = form;
  return (
    <div className="grid gap-4">
      <TextField
        label={t('form.giver')}
        hint={t('form.giverHint')}
        value={draft.giver}
        problem={at('giver')}
        onChange={(event) => {
          change({ giver: event.currentTarget.value });
        }}
      />
      <TickField
        label={t('form.agreedToPrint')}
        hint={t('form.agreedToPrintHint')}
        checked={draft.agreedToPrint}
        problem={at('agreedToPrint')}
        onChange={(event) => {
          change({ agreedToPrint: event.currentTarget.checked });
        }}
      />
      <PickGroup
        label={t('form.sharingLevel')}
        stacked
        value={draft.sharingLevel}
        problem={at('sharingLevel')}
        onChange={(sharingLevel) => {
          change({ sharingLevel });
        }}
        options={SHARING_LEVELS.map((level) => ({
          value: level,
          label: t(`level.${level}`),
          note: t(`level.${level}Note`),
        }))}
      />
    </div>
  );
}
