import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import type { AirOccurrence, ModelDay, RangeWidth } from '#shared/contracts/air.js';
import type { CivilDay, OccurrenceDays } from '#shared/contracts/stars.js';
import { CLARITIES } from '#shared/sky/vocabulary.js';
import { civilDate } from '#src/lib/civil-year.js';
import { useDateWords } from '#src/lib/date-words.js';
import { dayNumberOf } from '#src/lib/days.js';
import { anchorOf } from '../model/air-days.js';

/** Dates and sentences of this page, in the calendar of the year on screen. */
export interface AirWords {
  /** `about 7 June, between 3 and 12 June`. */
  about: (days: OccurrenceDays) => string;
  day: (day: CivilDay) => string;
  /** A day number near the days of an occurrence. */
  dayAt: (occurrence: AirOccurrence, dayNumber: number) => string;
  /** The model's day with its minutes; without them where they say nothing. */
  modelDay: (day: ModelDay, side: 'dawn' | 'dusk', withMinutes: boolean) => string;
  /** Where the width of a range comes from. */
  width: (width: RangeWidth) => string;
  /** The picture for ears. */
  picture: (occurrence: AirOccurrence, side: 'dawn' | 'dusk', star: string) => string;
}

export function useAirWords(year: number): AirWords {
  const { t, i18n } = useTranslation('air');
  const words = useDateWords();
  return useMemo(() => {
    const number = new Intl.NumberFormat(i18n.language, { maximumFractionDigits: 1 });
    const date = (day: CivilDay) => civilDate(day, year);
    const about = ({ expected, early, late }: OccurrenceDays) =>
      words.aboutWithin(date(expected), early && date(early), late && date(late));
    const day = (value: CivilDay) => words.day(date(value));
    /** Any day beside a labelled one; a leap day between them in an ancient year is a day off in the words only. */
    const numberBeside = (occurrence: AirOccurrence, dayNumber: number): number => {
      const anchor = anchorOf(occurrence);
      return anchor ? dayNumberOf(date(anchor)) + dayNumber - anchor.dayNumber : dayNumber;
    };
    return {
      about,
      day,
      dayAt: (occurrence, dayNumber) => words.day(numberBeside(occurrence, dayNumber), 'short'),
      modelDay: (model, side, withMinutes) =>
        withMinutes
          ? t(`modelDay.${side}`, { day: day(model), count: model.minutes })
          : t(`modelDayPlain.${side}`, { day: day(model) }),
      width: ({ halfWidthDeg, byScatterDeg, byModelDeg }) =>
        t(byModelDeg > byScatterDeg ? 'width.model' : 'width.scatter', {
          half: number.format(halfWidthDeg),
          scatter: number.format(byScatterDeg),
          model: number.format(byModelDeg),
        }),
      picture: (occurrence, side, star) => {
        const { nights, byModel, rule } = occurrence;
        const airs = CLARITIES.map((clarity) => {
          const model = byModel[clarity];
          const air = t(`air.${clarity}`);
          return model === null ? t('laneUnseen', { air }) : t(`laneSeen.${side}`, { air, day: day(model) });
        });
        return t(`minutesLabel.${side}`, {
          star,
          range: words.range(
            numberBeside(occurrence, nights[0]?.dayNumber ?? 0),
            numberBeside(occurrence, nights.at(-1)?.dayNumber ?? 0),
          ),
          airs: airs.join(' '),
          rule: rule === null ? t('laneNoRule') : t('laneRule', { about: about(rule) }),
        });
      },
    };
  }, [t, i18n.language, words, year]);
}
