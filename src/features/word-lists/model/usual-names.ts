import { useCallback } from 'react';
import { useTranslation } from 'react-i18next';
import { ENTRY_KINDS } from '#shared/contracts/calendars.js';
import { OPERATIONS } from '#shared/contracts/event-record.js';
import type { ListedWord, WordListName } from '#shared/contracts/word-lists.js';

/** What a built-in code is usually called; nothing for words of the village's own. */
export function useUsualName(list: WordListName): (code: ListedWord['like']) => string {
  const { t } = useTranslation(['calendars', 'record']);
  return useCallback(
    (code) => {
      if (list === 'kinds') {
        const kind = ENTRY_KINDS.find((one) => one === code);
        return kind === undefined ? '' : t(`calendars:kind.${kind}`);
      }
      const operation = OPERATIONS.find((one) => one === code);
      return operation === undefined ? '' : t(`record:operation.${operation}`);
    },
    [t, list],
  );
}
