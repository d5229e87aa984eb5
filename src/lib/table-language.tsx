import { useState, type ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import {
  READ_TABLE_LANGUAGES,
  TABLE_LANGUAGE_NAMES,
  TABLE_LANGUAGES,
  type TableLanguage,
} from '#shared/locales/table-languages.js';
import { SelectField } from '#src/ui/field.js';
import { keep, readKept } from './device-storage.js';

const KEPT_AT = 'table-language';

/** The person's own language where there are tables in it, else the first. */
export function ownTableLanguage(own: unknown): TableLanguage {
  return TABLE_LANGUAGES.find((language) => language === own) ?? TABLE_LANGUAGES[0];
}

interface TableLanguageFieldProps {
  label: string;
  /** Beside a language whose words nobody who speaks it has read yet. */
  unreadHint: ReactNode;
  value: TableLanguage;
  onChange: (language: TableLanguage) => void;
}

/** In which language a table is; this device keeps the choice. */
export function useTableLanguage(): Pick<TableLanguageFieldProps, 'value' | 'onChange'> {
  const { i18n } = useTranslation();
  const [value, setValue] = useState(() => ownTableLanguage(readKept(KEPT_AT) ?? i18n.resolvedLanguage));
  return {
    value,
    onChange: (language) => {
      setValue(language);
      keep(KEPT_AT, language);
    },
  };
}

export function TableLanguageField({ label, unreadHint, value, onChange }: TableLanguageFieldProps) {
  return (
    <SelectField
      label={label}
      hint={READ_TABLE_LANGUAGES.includes(value) ? undefined : unreadHint}
      value={value}
      onChange={(event) => {
        onChange(ownTableLanguage(event.currentTarget.value));
      }}
    >
      {TABLE_LANGUAGES.map((each) => (
        <option key={each} value={each} lang={each}>
          {TABLE_LANGUAGE_NAMES[each]}
        </option>
      ))}
    </SelectField>
  );
}
