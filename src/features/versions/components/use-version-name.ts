import { useTranslation } from 'react-i18next';
import type { VersionSummary } from '#shared/contracts/versions.js';

/** `2027-1` once it was published, `Submission 3` before. */
export function useVersionName(): (version: Pick<VersionSummary, 'label' | 'number'>) => string {
  const { t } = useTranslation('versions');
  return ({ label, number }) => label ?? t('name.submission', { number });
}
