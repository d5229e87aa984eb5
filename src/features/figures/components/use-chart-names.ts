import { useCallback } from 'react';
import { useTranslation } from 'react-i18next';
import type { ChartStar } from '#shared/contracts/figures.js';

/** How a star is called where it is picked: its name, else letter or number with the constellation. */
export function useChartNames(): (star: Pick<ChartStar, 'name' | 'designation' | 'hr'>) => string {
  const { t } = useTranslation('figures');
  return useCallback(
    ({ name, designation, hr }) => {
      if (name !== '') return name;
      return designation === '' ? t('hr', { hr }) : designation;
    },
    [t],
  );
}
