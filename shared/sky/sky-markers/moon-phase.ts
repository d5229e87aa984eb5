import { moonDayOf } from '../moon/moon-year.js';
import { keptMoonYearOf } from '../moon/moon-year-cache.js';
import { MOON_EVENTS } from '../moon/words.js';
import { dated, type SkyMarkerKindRules, undated } from './kind.js';
import { isOfYear, moonOccurrence } from './moon-occurrence.js';
import { checkWord } from './spec-checks.js';

/** Every new Moon, first crescent or full Moon of the year [Yallop1997; Odeh2004 for the crescent]. */
export const moonPhase: SkyMarkerKindRules<'moon-phase'> = {
  sourceKey: 'Yallop1997',
  rangeReason: 'moon-days',
  check(spec, field) {
    checkWord(`${field}.event`, spec.event, MOON_EVENTS);
  },
  compute({ event }, place) {
    const { lunations } = keptMoonYearOf(place.site, place.settings, place.year.civil.year);
    const occurrences = lunations.flatMap((lunation) => {
      const moon = moonDayOf(lunation, event);
      if (!moon || !isOfYear(place, moon)) return [];
      return [moonOccurrence(lunation, moon, moon.early, moon.late)];
    });
    if (occurrences.length === 0) return undated('crescent-not-seen', 0);
    return dated(occurrences, 0);
  },
};
