import { useCallback } from 'react';
import { useTranslation } from 'react-i18next';
import { GIVER_BY_ROLE } from '#shared/contracts/sharing.js';

/** Who wrote or told something, in words, also where they are not named to the reader. */
export function useWriterWords(): (name: string) => string {
  const { t } = useTranslation('sharing');
  const giverWords = useGiverWords();
  return useCallback((name) => giverWords(name) || t('panel.unnamed'), [t, giverWords]);
}

/** Who gave a thing, in words: a name, "an elder of the village" where they wish no name, nothing where nobody is told. */
export function useGiverWords(): (giver: string) => string {
  const { t } = useTranslation('sharing');
  return useCallback((giver) => (giver === GIVER_BY_ROLE ? t('panel.byRole') : giver), [t]);
}
