import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import type { FirstCrescent, MoonRow } from '#shared/contracts/moons.js';
import { type DateWords, useDateWords } from '#src/lib/date-words.js';

/** Moons as sentences. */
export interface MoonWords {
  dates: DateWords;
  /** `Month 3`, `Thirteenth month`, `Moon of 8 March`. */
  name: (row: MoonRow) => string;
  /** `3`, `13th`, `8 Mar`: beside a row of the picture. */
  shortName: (row: MoonRow) => string;
  /** Every sentence about a first crescent: the evening, its range, where to look, what stands beside it. */
  crescent: (crescent: FirstCrescent) => string[];
}

export function useMoonWords(): MoonWords {
  const { t } = useTranslation(['moons', 'sky']);
  const dates = useDateWords();
  return useMemo(() => {
    const name = ({ month, newMoon }: MoonRow): string => {
      if (month === null) return t('picture.moonFrom', { day: dates.day(newMoon.gregorian) });
      return month.thirteenth ? t('picture.thirteenth') : t('picture.month', { number: month.number });
    };
    const shortName = ({ month, newMoon }: MoonRow): string => {
      if (month === null) return dates.day(newMoon.gregorian, 'short');
      return month.thirteenth
        ? t('picture.thirteenthShort')
        : t('picture.monthShort', { number: month.number });
    };
    const crescent = ({ outcome, expected, early, late, notes }: FirstCrescent): string[] => {
      if (outcome !== 'dated' || !expected) {
        return [t(`crescent.none.${outcome === 'dated' ? 'stays-too-low' : outcome}`)];
      }
      const isEasy = expected.word === 'easy';
      const day = dates.day(expected.gregorian);
      const lines: string[] = [t(isEasy ? 'crescent.easy' : 'crescent.clear', { day })];
      if (early && early.dayNumber < expected.dayNumber) {
        lines.push(t('crescent.clearBefore', { day: dates.day(early.gregorian) }));
      }
      if (late && late.dayNumber > expected.dayNumber) {
        const key = isEasy ? 'crescent.lateInHaze' : 'crescent.easyAfter';
        lines.push(t(key, { day: dates.day(late.gregorian) }));
      }
      return [...lines, ...notes.map((note) => t(`crescent.note.${note}`))];
    };
    return { dates, name, shortName, crescent };
  }, [t, dates]);
}
