import { useTranslation } from 'react-i18next';
import type { SkylinePoint } from '#shared/contracts/places.js';
import { compassPoint } from '#src/lib/sky-words.js';
import { degreesText } from '../model/degrees.js';
import { directionWords, handsHigh } from '../model/direction-words.js';

/** Words for directions and heights of a skyline. */
export interface SkylineWords {
  degrees: (valueDeg: number) => string;
  /** `east`, `a little south of east`, `east-south-east`. */
  direction: (azimuthDeg: number) => string;
  /** `About a third of a hand`. */
  hands: (altitudeDeg: number) => string;
  /** The whole picture in one sentence. */
  sentence: (points: readonly SkylinePoint[], placeName: string) => string;
}

export function useSkylineWords(): SkylineWords {
  const { t, i18n } = useTranslation(['places', 'sky']);
  const degrees = (valueDeg: number) => degreesText(valueDeg, i18n.language);
  const direction = (azimuthDeg: number) => {
    const { point, leansTo } = directionWords(azimuthDeg);
    const wind = t(`sky:compass.${point}`);
    return leansTo === null ? wind : t('skyline.leans', { wind, side: t(`sky:compass.${leansTo}`) });
  };
  return {
    degrees,
    direction,
    hands: (altitudeDeg) => {
      const hands = handsHigh(altitudeDeg);
      if (hands.key === 'level') return t('skyline.handLevel');
      if (hands.key === 'below') return t('skyline.handBelow');
      if (hands.key === 'part') return t(`skyline.handPart.${hands.part}`);
      return t('skyline.hands', { count: hands.count });
    },
    sentence: (points, place) => {
      const [highest, lowest] = extremes(points);
      if (highest === undefined || lowest === undefined) return t('skyline.pictureFlat', { place });
      return t('skyline.picture', {
        place,
        highest: degrees(highest.altitudeDeg),
        where: t(`sky:compass.${compassPoint(highest.azimuthDeg)}`),
        lowest: degrees(lowest.altitudeDeg),
        lowestWhere: t(`sky:compass.${compassPoint(lowest.azimuthDeg)}`),
      });
    },
  };
}

function extremes(points: readonly SkylinePoint[]): [SkylinePoint | undefined, SkylinePoint | undefined] {
  const byHeight = [...points].sort((a, b) => a.altitudeDeg - b.altitudeDeg);
  return [byHeight.at(-1), byHeight[0]];
}
