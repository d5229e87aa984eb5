import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import type { SharingDetails, SharingLevel } from '#shared/contracts/sharing.js';
import { useDateWords } from './date-words.js';

/** Any year without a 29 February. */
const PLAIN_YEAR = 2027;

/** Who may see a thing, in a few words: "Elders, told from 1 August to 31 August". */
export function useSharingWords(): (level: SharingLevel, details?: SharingDetails) => string {
  const { t } = useTranslation('sharing');
  const dates = useDateWords();
  return useMemo(
    () => (level, details) => {
      const name = t(`level.${level}.name`);
      const season = details?.tellingSeason ?? null;
      if (season === null) return name;
      const day = (date: { month: number; day: number }) => dates.day({ year: PLAIN_YEAR, ...date });
      return `${name}, ${t('summary.season', { from: day(season.from), to: day(season.to) })}`;
    },
    [t, dates],
  );
}
