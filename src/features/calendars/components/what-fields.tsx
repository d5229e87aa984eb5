import { useTranslation } from 'react-i18next';
import { More } from '#src/ui/fold.js';
import { TextAreaField, TextField } from '#src/ui/field.js';
import type { FormState } from '../model/form-state.js';
import { KindFields } from './kind-fields.js';

/** What is done: its name in both languages, its kind and picture, crop, notes and caution. */
export function WhatFields({ form }: { form: FormState }) {
  const { t } = useTranslation('calendars');
  const { draft, change, at, officerLanguage, villageLanguage, isKeepers } = form;
  return (
    <div className="grid gap-4">
      <TextField
        label={t('form.titleOfficer', { language: officerLanguage?.name ?? '…' })}
        lang={officerLanguage?.tag}
        value={draft.titleOfficer}
        problem={at('titleOfficer')}
        onChange={(event) => {
          change({ titleOfficer: event.currentTarget.value });
        }}
      />
      <TextField
        label={t('form.titleVillage', { language: villageLanguage?.name ?? '…' })}
        lang={villageLanguage?.tag}
        className="own-words"
        value={draft.titleVillage}
        problem={at('titleVillage')}
        onChange={(event) => {
          change({ titleVillage: event.currentTarget.value });
        }}
      />
      {!isKeepers && <KindFields form={form} />}
      <TextAreaField
        label={t('form.notes')}
        hint={t('form.notesHint')}
        rows={3}
        value={draft.notes}
        problem={at('notes')}
        onChange={(event) => {
          change({ notes: event.currentTarget.value });
        }}
      />
      {isKeepers ? (
        <More label={t('form.moreOfIt')}>
          <div className="mt-3 grid gap-4">
            <KindFields form={form} />
            <CautionField form={form} />
          </div>
        </More>
      ) : (
        <CautionField form={form} />
      )}
    </div>
  );
}

function CautionField({ form }: { form: FormState }) {
  const { t } = useTranslation('calendars');
  const { draft, change, at } = form;
  return (
    <TextAreaField
      label={t('form.caution')}
      hint={t('form.cautionHint')}
      rows={2}
      value={draft.caution}
      problem={at('caution')}
      onChange={(event) => {
        change({ caution: event.currentTarget.value });
      }}
    />
  );
}
