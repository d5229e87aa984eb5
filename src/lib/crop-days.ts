import { useCallback } from 'react';
import { useTranslation } from 'react-i18next';
import type { ListedWord } from '#shared/contracts/word-lists.js';

/** How long a crop takes, in words; nothing where the list does not say it. */
export function useCropDays(): (crop: Pick<ListedWord, 'fromDays' | 'toDays'>) => string {
  const { t } = useTranslation('words');
  return useCallback(
    ({ fromDays, toDays }) => {
      if (fromDays !== null && toDays !== null) return t('row.days', { from: fromDays, to: toDays });
      if (fromDays !== null) return t('row.daysFrom', { count: fromDays });
      return toDays === null ? '' : t('row.daysTo', { count: toDays });
    },
    [t],
  );
}
