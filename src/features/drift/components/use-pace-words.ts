import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';

export interface PaceWords {
  /** `It moves later by about 1.3 days in a century.` */
  sentence: (daysPerCentury: number | null) => string;
  /** `1.3 later`, for a table. */
  short: (daysPerCentury: number | null) => string;
}

/** Slower than this a day keeps its place for a lifetime of lifetimes. */
const STILL = 0.05;

export function usePaceWords(): PaceWords {
  const { t, i18n } = useTranslation('drift');
  return useMemo(() => {
    const number = new Intl.NumberFormat(i18n.language, {
      maximumFractionDigits: 1,
      minimumFractionDigits: 1,
    });
    const exact = new Intl.NumberFormat(i18n.language, {
      maximumFractionDigits: 2,
      minimumFractionDigits: 2,
    });
    return {
      sentence: (pace) => {
        if (pace === null) return t('pace.none');
        if (Math.abs(pace) < STILL) return t('pace.still');
        return t(pace > 0 ? 'pace.later' : 'pace.earlier', { days: number.format(Math.abs(pace)) });
      },
      short: (pace) => {
        if (pace === null) return t('paceUnknown');
        return t(pace >= 0 ? 'paceLater' : 'paceEarlier', { days: exact.format(Math.abs(pace)) });
      },
    };
  }, [t, i18n.language]);
}
