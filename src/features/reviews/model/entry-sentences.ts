import { useTranslation } from 'react-i18next';
import type { MonthDay } from '#shared/contracts/common.js';
import type { FrozenMarker, VersionEntryBody } from '#shared/contracts/versions.js';
import { skyMarkerTimeOf } from '#shared/sky/vocabulary.js';
import { useDateWords, type DateWords } from '#src/lib/date-words.js';
import { markerName } from '#src/lib/marker-names.js';
import { isStarLead } from '#shared/calendar/entry-model.js';
import { useCountedWords } from '#src/lib/counted-words.js';
import { useEntryWords, type NamesByKey } from '#src/lib/entry-words.js';
import { useSkySignWords } from '#src/lib/sky-sign-words.js';
import { endOfNight } from '#src/lib/sky-words.js';

const NO_NAMES: NamesByKey = new Map();

export interface EntrySentences {
  /** When the star comes, or why there is no day; or which fixed date leads. */
  lead: string;
  /** How many days after it the work begins; null without a window. */
  begins: string | null;
  lastAdvised: string | null;
  /** From which days it is counted, where no computed day and no fixed date leads. */
  counted: string | null;
}

/** An entry's timing in whole sentences, without a bare date. */
export function useEntrySentences(
  { content, dates }: VersionEntryBody,
  markers: readonly FrozenMarker[],
  year: number,
): EntrySentences {
  const { t } = useTranslation(['reviews', 'sky']);
  const words = useDateWords();
  const sign = useSkySignWords();
  const leadWords = useEntryWords();
  const counted = useCountedWords();
  const { lead, offsets } = content;
  const { window } = dates;

  const leadSentence = () => {
    if (lead.type === 'fixed-date') {
      return t('reviews:fixed', { day: words.day(isoIn(year, lead.date)), source: lead.source });
    }
    if (lead.type === 'sky') {
      const name = sign(lead.spec, new Map(markers.map((one) => [one.markerKey, one])));
      if (dates.marker === null) {
        return t('reviews:noSignDate', {
          sign: name,
          reason: t(`sky:noSign.${dates.sky?.reason ?? 'not-in-this-year'}`),
        });
      }
      return t(`reviews:sign.${skyMarkerTimeOf(lead.spec)}`, {
        sign: name,
        day: words.day(dates.marker.expected.gregorian),
        between: rangeWords(dates.marker, words),
      });
    }
    if (!isStarLead(lead)) return leadWords.leadAlone(content, NO_NAMES);
    const found = markers.find(({ markerKey }) => markerKey === lead.markerKey);
    const marker = found ? markerName(found) : lead.markerKey;
    const phenomenon = t(`sky:phenomenon.${lead.phenomenon}`);
    if (dates.marker === null) return t('reviews:noMarkerDate', { marker, phenomenon });
    return t(`reviews:${endOfNight(lead.phenomenon)}`, {
      marker,
      phenomenon,
      day: words.day(dates.marker.expected.gregorian),
      between: rangeWords(dates.marker, words),
    });
  };
  const rangeWords = ({ early, late }: NonNullable<VersionEntryBody['dates']['marker']>, say: DateWords) => {
    if (early && late) return say.between(early.gregorian, late.gregorian);
    if (late) return t('reviews:notAfter', { day: say.day(late.gregorian) });
    if (early) return t('reviews:notBefore', { day: say.day(early.gregorian) });
    return t('reviews:openRange');
  };
  const begins = () => {
    const count = offsets.bestFromDays;
    if (count === 0) return t('reviews:beginsSame');
    return count > 0 ? t('reviews:begins', { count }) : t('reviews:beginsBefore', { count: -count });
  };

  return {
    lead: leadSentence(),
    counted: dates.counted === undefined ? null : counted(dates.counted),
    begins: window === null || lead.type === 'fixed-date' || dates.counted !== undefined ? null : begins(),
    lastAdvised:
      window === null
        ? null
        : window.lastAdvisedBy === 'fixed' && content.lastDate !== null
          ? t('reviews:lastByOffice', { day: words.day(window.lastAdvised), source: content.lastDate.source })
          : t('reviews:lastAdvised', { day: words.day(window.lastAdvised) }),
  };
}

function isoIn(year: number, { month, day }: MonthDay) {
  return { year, month, day };
}
