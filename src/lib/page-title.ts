import { useEffect } from 'react';
import { useTranslation } from 'react-i18next';

/** Names the browser's tab, which is also what a screen reader says first on a new page. */
export function usePageTitle(page: string): void {
  const { t } = useTranslation('common');
  useEffect(() => {
    document.title = t('pageTitle', { page });
  }, [page, t]);
}
