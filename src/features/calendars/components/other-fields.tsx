import { useTranslation } from 'react-i18next';
import { GIVER_BY_ROLE, PLAIN_DETAILS } from '#shared/contracts/sharing.js';
import { PersonSelect, SharingFields } from '#src/lib/sharing-fields.js';
import { TextAreaField, TextField } from '#src/ui/field.js';
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

/** What an elder's own entry can be; everything wider is the officer's to write. */
const KEPT_LEVELS = ['group', 'elders', 'sealed'] as const;

/** Whose knowledge it is, and who may see it. */
export function WhoseFields({ form }: { form: FormState }) {
  const { t } = useTranslation(['calendars', 'sharing']);
  const { draft, change, at } = form;
  return (
    <div className="grid gap-4">
      {draft.giver === GIVER_BY_ROLE ? (
        <p>{t('sharing:byRoleOnly')}</p>
      ) : (
        <TextField
          label={t('form.giver')}
          hint={t('form.giverHint')}
          value={draft.giver}
          problem={at('giver')}
          onChange={(event) => {
            change({ giver: event.currentTarget.value });
          }}
        />
      )}
      {draft.kind === 'belief' && <p>{t('form.beliefPrint')}</p>}
      {!form.isKeepers && (
        <PersonSelect
          label={t('sharing:giver')}
          hint={t('sharing:giverHint')}
          nobody={t('sharing:giverMe')}
          value={draft.giverId ?? null}
          problem={at('giverId')}
          onChange={(giverId) => {
            change({ giverId });
          }}
        />
      )}
      <SharingFields
        levels={form.isKeepers ? KEPT_LEVELS : undefined}
        label={t('form.sharingLevel')}
        value={{ level: draft.sharingLevel, details: draft.sharing ?? PLAIN_DETAILS }}
        problem={(field) => at(field === 'level' ? 'sharingLevel' : `sharing.${field}`)}
        onChange={({ level, details }) => {
          change({ sharingLevel: level, sharing: details });
        }}
      />
    </div>
  );
}
