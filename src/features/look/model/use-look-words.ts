import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import type { OccurrenceDays } from '#shared/contracts/stars.js';
import { halfHands, handsFigure } from '#shared/kernel/hands.js';
import { useDateWords } from '#src/lib/date-words.js';
import { compassPoint } from '#src/lib/sky-words.js';

/** Directions, heights and days as this feature says them. */
export interface LookWords {
  /** `east-north-east`. */
  compass: (azimuthDeg: number) => string;
  /** `1½ hands`. */
  hands: (angleDeg: number) => string;
  /** `about 7 June, between 3 and 12 June`; with the year where it is another than the given one. */
  about: (days: OccurrenceDays, year: number) => string;
}

export function useLookWords(): LookWords {
  const { t } = useTranslation(['look', 'sky', 'common']);
  const dates = useDateWords();
  return useMemo(
    () => ({
      compass: (azimuthDeg) => t(`sky:compass.${compassPoint(azimuthDeg)}`),
      hands: (angleDeg) => {
        const hands = halfHands(angleDeg);
        if (hands === 0) return t('hands.none');
        return hands === 0.5 ? t('hands.half') : t('hands.some', { count: hands, hands: handsFigure(hands) });
      },
      about: ({ expected, early, late }, year) => {
        const sameYear = Number(expected.gregorian.slice(0, 4)) === year;
        if (sameYear || early === null || late === null) {
          return dates.aboutWithin(expected.gregorian, early?.gregorian ?? null, late?.gregorian ?? null);
        }
        return t('season.aboutInYear', {
          day: dates.day(expected.gregorian, 'year'),
          between: dates.between(early.gregorian, late.gregorian),
        });
      },
    }),
    [t, dates],
  );
}
