import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import type { ImportColumn } from '#shared/contracts/imports.js';
import type { ExampleLine } from './template.js';

/** How columns are called, what else they may be called, and the lines of the template. */
export interface ImportColumnWords {
  titleOf: (column: ImportColumn) => string;
  titlesOf: (column: ImportColumn) => readonly string[];
  examples: readonly ExampleLine[];
}

type CsvGiven = Exclude<ImportColumn, 'when'>;

export function useImportColumnWords(): ImportColumnWords {
  const { t } = useTranslation(['imports', 'files']);
  return useMemo(() => {
    const titleOf = (column: ImportColumn) =>
      column === 'when'
        ? t('imports:column.when')
        : t(`files:calendarCsv.column.${column satisfies CsvGiven}`);
    const { bySign, byDay } = {
      bySign: {
        titleOfficer: t('imports:template.bySign.title'),
        kind: t('imports:template.bySign.kind'),
        when: t('imports:template.bySign.when'),
        bestFromDays: t('imports:template.bySign.bestFromDays'),
        bestToDays: t('imports:template.bySign.bestToDays'),
        otherSigns: t('imports:template.bySign.otherSigns'),
      },
      byDay: {
        titleOfficer: t('imports:template.byDay.title'),
        kind: t('imports:template.byDay.kind'),
        bestFrom: t('imports:template.byDay.bestFrom'),
        bestTo: t('imports:template.byDay.bestTo'),
      },
    };
    return {
      titleOf,
      titlesOf: (column) => [titleOf(column), ...t(`imports:alias.${column}`).split('|')],
      examples: [bySign, byDay],
    };
  }, [t]);
}
