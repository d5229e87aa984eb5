import { useId } from 'react';
import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import { ENTRY_KINDS } from '#shared/contracts/calendars.js';
import { useRoles } from '#src/lib/community.js';
import { paths } from '#src/lib/paths.js';
import { chosenValue, useWordLists, wordOptions } from '#src/lib/word-lists.js';
import { SelectField, TextField } from '#src/ui/field.js';
import type { FormState } from '../model/form-state.js';
import { IconField } from './icon-field.js';

/** Kind and crop in the village's words, and the picture. */
export function KindFields({ form }: { form: FormState }) {
  const { t } = useTranslation(['calendars', 'words']);
  const { draft, change, at } = form;
  const lists = useWordLists();
  const cropsId = useId();
  const isOfficer = useRoles().is('officer');
  const chosen = { code: draft.kind, word: draft.kindWord };
  const kinds = wordOptions(lists?.kinds, ENTRY_KINDS, (kind) => t(`kind.${kind}`), chosen);
  return (
    <>
      <div className="grid gap-4 @min-[34rem]:grid-cols-2">
        <SelectField
          label={t('form.kind')}
          value={chosenValue(chosen)}
          problem={at('kind') ?? at('kindWord.id')}
          onChange={(event) => {
            const option = kinds.find(({ value }) => value === event.currentTarget.value);
            if (option) change({ kind: option.code, kindWord: option.word });
          }}
        >
          {kinds.map(({ value, label }) => (
            <option key={value} value={value}>
              {label}
            </option>
          ))}
        </SelectField>
        <div>
          <TextField
            label={t('form.crop')}
            list={cropsId}
            value={draft.crop}
            problem={at('crop')}
            onChange={(event) => {
              change({ crop: event.currentTarget.value });
            }}
          />
          <datalist id={cropsId}>
            {(lists?.crops.items ?? [])
              .filter(({ isHidden }) => !isHidden)
              .map(({ key, word }) => (
                <option key={key} value={word} />
              ))}
          </datalist>
        </div>
      </div>
      {isOfficer && (
        <p className="text-small">
          <Link to={paths.villageWords()}>{t('words:entry.link')}</Link>
        </p>
      )}
      <IconField form={form} />
    </>
  );
}
