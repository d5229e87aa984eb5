import { useCallback } from 'react';
import { useTranslation } from 'react-i18next';
import { GIVER_BY_ROLE } from '#shared/contracts/sharing.js';

/** Who gave a thing, in words: a name, "an elder of the village" where they wish no name, nothing where nobody is told. */
export function useGiverWords(): (giver: string) => string {
  const { t } = useTranslation('sharing');
  return useCallback((giver) => (giver === GIVER_BY_ROLE ? t('panel.byRole') : giver), [t]);
}
