import { useTranslation } from 'react-i18next';
import type { NightSegment } from '#shared/contracts/stars.js';
import { intlLocale } from '#src/lib/date-words.js';
import { stripLines } from '../model/strip.js';
import type { StarDates } from './star-dates.js';

/** A strip as a sentence: `Pleiades in 2027: Seen after dusk 1 January to 5 May; Hidden …`. */
export function useStripSentence(dates: StarDates): (star: string, strip: readonly NightSegment[]) => string {
  const { t, i18n } = useTranslation(['stars', 'sky']);
  return (star, strip) => {
    const lines = stripLines(strip);
    const states = lines.map((line) => {
      const state = t(`sky:night.${line.state}`).toLocaleLowerCase(intlLocale(i18n.language));
      return lines.length === 1
        ? t('star.stripAllYear', { state })
        : t('star.stripState', { state, range: dates.rangeAt(line.fromDayNumber, line.toDayNumber) });
    });
    return t('star.stripSentence', { star, year: dates.year, states: states.join('; ') });
  };
}
