import { sunCrossing, sunriseSkyline } from '../phenomena/sun-day.js';
import { labelledDay } from '../time/civil-day.js';
import { DEG_PER_RAD, TAU } from '../units/angle.js';
import { dated, isInYear, type SkyMarkerKindRules, skyMarkerDay, type SkyMarkerPlace } from './kind.js';
import { checkWord } from './spec-checks.js';
import type { SkyMarkerOccurrence } from './types.js';
import { SUN_SEASONS, type SunSeason } from './words.js';

const LONGITUDE_RAD: Readonly<Record<SunSeason, number>> = {
  'march-equinox': 0,
  'june-solstice': TAU / 4,
  'september-equinox': TAU / 2,
  'december-solstice': (3 * TAU) / 4,
};
/**
 * How far people who watch the Sun's place on the skyline may miss. At a solstice it moves by about 0.1° in five days
 * and stands still to the eye; at an equinox by half its own width a day.
 */
const SOLSTICE_DAYS = 5;
const EQUINOX_DAYS = 2;
const EYE_DEG = 0.5;

function sunriseDirectionDeg(place: SkyMarkerPlace, jdUt: number): number | null {
  const solarDay = Math.round(jdUt + place.ground.longitudeRad / TAU);
  const skyline = sunriseSkyline(place.site.skyline);
  const sun = sunCrossing(place.year, place.ground, solarDay, skyline, 'rising');
  return sun && sun.azimuthRad * DEG_PER_RAD;
}

/** Equinoxes and solstices: the Sun's apparent longitude at a quarter of its circle [BretagnonFrancou1988]. */
export const sunSeason: SkyMarkerKindRules<'sun-season'> = {
  sourceKey: 'BretagnonFrancou1988',
  rangeReason: 'sun-on-skyline',
  check(spec, field) {
    checkWord(`${field}.season`, spec.season, SUN_SEASONS);
  },
  compute({ season }, place) {
    const isSolstice = season.endsWith('solstice');
    const halfDays = isSolstice ? SOLSTICE_DAYS : EQUINOX_DAYS;
    const { year, clock } = place;
    const fromRad = year.sun.longitudeRad(year.civil.firstDay - 2);
    const toRad = year.sun.longitudeRad(year.civil.lastDay + 2);
    const occurrences: SkyMarkerOccurrence[] = [];
    const firstTurn = Math.ceil((fromRad - LONGITUDE_RAD[season]) / TAU);
    for (let turn = firstTurn; LONGITUDE_RAD[season] + turn * TAU <= toRad; turn += 1) {
      const jdUt = year.sun.instantOf(LONGITUDE_RAD[season] + turn * TAU);
      if (!isInYear(place, jdUt)) continue;
      const day = clock.dayOf(jdUt);
      occurrences.push({
        expected: skyMarkerDay(place, jdUt, {
          azimuthDeg: sunriseDirectionDeg(place, jdUt),
          altitudeDeg: null,
        }),
        early: labelledDay(day - halfDays),
        late: labelledDay(day + halfDays),
        notes: isSolstice ? ['standstill'] : [],
      });
    }
    return dated(occurrences, EYE_DEG);
  },
};
