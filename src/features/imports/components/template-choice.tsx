import { Download } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { tableTexts } from '#shared/locales/tables.js';
import { TableLanguageField, useTableLanguage } from '#src/lib/table-language.js';
import { Button } from '#src/ui/button.js';
import { wordsOfTables } from '../model/table-languages.js';
import { templateCsv } from '../model/template.js';

/** An empty table in a language of the officer's choice, which this device keeps. */
export function TemplateChoice() {
  const { t } = useTranslation('imports');
  const language = useTableLanguage();
  return (
    <div className="mt-3 grid gap-3">
      <TableLanguageField
        label={t('bring.templateLanguage')}
        unreadHint={t('bring.templateUnread')}
        {...language}
      />
      <p>
        <Button
          look="quiet"
          icon={<Download aria-hidden size={20} />}
          onClick={() => {
            const { template } = tableTexts[language.value];
            const { titleOf } = wordsOfTables(language.value);
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
