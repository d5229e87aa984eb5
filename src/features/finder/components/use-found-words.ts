import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import type { FinderAnswer, FoundMarker } from '#shared/contracts/finder.js';
import type { OccurrenceDays } from '#shared/contracts/stars.js';
import { useDateWords } from '#src/lib/date-words.js';
import { markerName } from '#src/lib/marker-names.js';
import { compassPoint, endOfNight } from '#src/lib/sky-words.js';

/** Under this altitude a skyline reads as level ground. */
const LEVEL_DEG = 0.5;
const THIN_MOON = 0.25;
const HALF_MOON = 0.65;

/** Everything that is said of a marker that was found. */
export interface FoundWords {
  name: (found: FoundMarker) => string;
  phenomenon: (found: FoundMarker) => string;
  /** `Morning of about 7 June`. */
  day: (found: FoundMarker) => string;
  /** `between 3 and 12 June`; says so where an end is missing. */
  range: (days: OccurrenceDays) => string;
  near: (found: FoundMarker) => string;
  /** The same where no heading says what it is near to: `1 day after your day`. */
  nearInFull: (found: Pick<FoundMarker, 'daysAway'>) => string;
  exact: (found: FoundMarker) => string;
  ease: (found: FoundMarker) => string;
  keeps: (found: FoundMarker) => string;
  moon: (found: FoundMarker) => string;
  air: (found: FoundMarker) => string;
  /** Null where no rain and cloud are to be expected. */
  rain: (found: FoundMarker) => string | null;
  where: (found: FoundMarker) => string;
  /** The wanted days, `10 June` or `10 to 20 June`. */
  wanted: (wanted: NonNullable<FinderAnswer['wanted']>) => string;
}

export function useFoundWords(isStretch: boolean): FoundWords {
  const { t, i18n } = useTranslation(['finder', 'sky', 'common']);
  const dates = useDateWords();
  return useMemo(() => {
    const number = new Intl.NumberFormat(i18n.language, { maximumFractionDigits: 0 });
    return {
      name: markerName,
      phenomenon: ({ phenomenon }) => t(`sky:phenomenonTitle.${phenomenon}`),
      day: ({ phenomenon, days }) =>
        t(endOfNight(phenomenon) === 'dawn' ? 'common:date.morningOfAbout' : 'common:date.eveningOfAbout', {
          day: dates.day(days.expected.gregorian),
        }),
      range: ({ early, late }) => {
        if (early !== null && late !== null) return dates.between(early.gregorian, late.gregorian);
        if (late !== null) return t('common:date.notAfter', { to: dates.day(late.gregorian) });
        if (early !== null) return t('common:date.notBefore', { from: dates.day(early.gregorian) });
        return t('common:date.openRange');
      },
      near: ({ daysAway }) => {
        if (daysAway === 0) return t(isStretch ? 'near.within' : 'near.same');
        return t(daysAway < 0 ? 'near.before' : 'near.after', { count: Math.abs(daysAway) });
      },
      nearInFull: ({ daysAway }) => {
        if (daysAway === 0) return t(isStretch ? 'nearInFull.within' : 'nearInFull.same');
        return t(daysAway < 0 ? 'nearInFull.before' : 'nearInFull.after', { count: Math.abs(daysAway) });
      },
      exact: ({ exactness, rangeDays }) =>
        t(`exact.${exactness}`, { days: t('common:days', { count: rangeDays ?? 0 }) }),
      ease: ({ ease, kind }) => t(ease === 'middling' && kind !== 'star' ? 'ease.figure' : `ease.${ease}`),
      keeps: ({ laterDays }) => {
        const fifty = laterDays.at(-1) ?? null;
        if (fifty === null) return t('keeps.lost');
        if (fifty === 0) return t('keeps.same');
        return t(fifty > 0 ? 'keeps.later' : 'keeps.earlier', { count: Math.abs(fifty) });
      },
      moon: ({ moonlight: { isUp, litShare } }) => {
        if (!isUp) return t('moon.down');
        return t(litShare < THIN_MOON ? 'moon.thin' : litShare < HALF_MOON ? 'moon.half' : 'moon.bright');
      },
      air: ({ clarity }) => t(`air.${clarity}`),
      rain: ({ rain }) => (rain === 'none' ? null : t(`rain.${rain}`)),
      where: ({ azimuthDeg, skylineAltitudeDeg }) => {
        const compass = t(`sky:compass.${compassPoint(azimuthDeg)}`);
        return skylineAltitudeDeg < LEVEL_DEG
          ? t('where.level', { compass })
          : t('where.hills', { compass, altitude: number.format(skylineAltitudeDeg) });
      },
      wanted: ({ from, to }) => dates.range(from.gregorian, to.gregorian),
    };
  }, [t, i18n.language, dates, isStretch]);
}
