import { Download } from 'lucide-react';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { TABLE_LANGUAGES, tableTexts } from '#shared/locales/tables.js';
import { keep, readKept } from '#src/lib/device-storage.js';
import { Button } from '#src/ui/button.js';
import { SelectField } from '#src/ui/field.js';
import { isUnread, ownTableLanguage, wordsOfTables } from '../model/table-languages.js';
import { templateCsv } from '../model/template.js';

const KEPT_AT = 'import-template-language';

/** An empty table in a language of the officer's choice, which this device keeps. */
export function TemplateChoice() {
  const { t, i18n } = useTranslation('imports');
  const [language, setLanguage] = useState(() =>
    ownTableLanguage(readKept(KEPT_AT) ?? i18n.resolvedLanguage),
  );
  return (
    <div className="mt-3 grid gap-3">
      <SelectField
        label={t('bring.templateLanguage')}
        hint={isUnread(language) ? t('bring.templateUnread') : undefined}
        value={language}
        onChange={(event) => {
          const next = ownTableLanguage(event.currentTarget.value);
          setLanguage(next);
          keep(KEPT_AT, next);
        }}
      >
        {TABLE_LANGUAGES.map((each) => (
          <option key={each} value={each} lang={each}>
            {tableTexts[each].language}
          </option>
        ))}
      </SelectField>
      <p>
        <Button
          look="quiet"
          icon={<Download aria-hidden size={20} />}
          onClick={() => {
            const { template } = tableTexts[language];
            const { titleOf } = wordsOfTables(language);
            download(template.fileName, templateCsv(titleOf, Object.values(template.lines)));
          }}
        >
          {t('bring.template')}
        </Button>
      </p>
    </div>
  );
}

function download(name: string, text: string): void {
  const address = URL.createObjectURL(new Blob([text], { type: 'text/csv;charset=utf-8' }));
  const link = document.createElement('a');
  link.href = address;
  link.download = name;
  link.click();
  URL.revokeObjectURL(address);
}
