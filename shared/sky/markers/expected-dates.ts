import { levelSkyline } from '../horizon/skyline.js';
import type { PreparedYear } from '../phenomena/prepared-year.js';
import { PHENOMENON_FACTS } from '../phenomena/phenomenon-facts.js';
import { STARS } from '../stars/star-table.js';
import type {
  DepthAtCrossingCase,
  DepthAtCrossingYear,
  ExpectedDates,
  Site,
  VisibilitySettings,
} from '../types.js';
import { RAD_PER_DEG } from '../units/angle.js';
import { type Clarity, PHENOMENA, type Phenomenon } from '../vocabulary.js';
import { expectedAroundYear } from './expected-crossing.js';
import { markerKeyOf, type ResolvedMarker } from './marker-key.js';
import { type MarkerAtPlace, markerAtPlace, placeYearOf } from './place-year.js';

/** Expected days only, without ranges and descriptions. */

const ALL_YEAR_ORDINARY: readonly Clarity[] = new Array<Clarity>(12).fill('ordinary');

function expectedDays(marker: MarkerAtPlace, phenomenon: Phenomenon): number[] {
  const facts = PHENOMENON_FACTS[phenomenon];
  const crossing = marker.star.crossings?.[facts.crossing];
  if (!crossing) return [];
  const { firstDay, lastDay } = marker.year.civil;
  const days: number[] = [];
  for (const { jdUt } of expectedAroundYear(marker, crossing, facts)) {
    if (jdUt === null) continue;
    const day = marker.clock.dayOf(jdUt);
    if (day >= firstDay && day <= lastDay) days.push(day);
  }
  return days;
}

const bareMarkers: readonly ResolvedMarker[] = STARS.map((star, starRef) => ({
  key: markerKeyOf(star.hr),
  star,
  figure: null,
  starRef,
  vMag: star.vMag,
  override: null,
}));
const allHrs: readonly number[] = STARS.map((star) => star.hr);

/** The whole table at a place: the first expected day of each phenomenon. */
export function expectedDatesOf(year: PreparedYear, site: Site, settings: VisibilitySettings): ExpectedDates {
  const placeYear = placeYearOf(year, site, settings);
  const dayNumbers = new Int32Array(bareMarkers.length * PHENOMENA.length);
  let cell = 0;
  for (const bare of bareMarkers) {
    const marker = markerAtPlace(placeYear, bare);
    for (const phenomenon of PHENOMENA) {
      dayNumbers[cell] = expectedDays(marker, phenomenon)[0] ?? 0;
      cell += 1;
    }
  }
  return { hrs: allHrs, dayNumbers };
}

/**
 * Dates by the depth at the crossing with thresholds exactly as given, over a level skyline, in local mean solar time.
 * @param marker the star of the case
 */
export function depthAtCrossingOf(
  year: PreparedYear,
  marker: ResolvedMarker,
  question: DepthAtCrossingCase,
): DepthAtCrossingYear {
  const site: Site = {
    latitudeDeg: question.latitudeDeg,
    longitudeDeg: question.longitudeDeg,
    elevationM: 0,
    timeZone: null,
    skyline: [],
  };
  const placeYear = placeYearOf(year, site, {
    thresholdSet: 'three-class',
    sameSideShiftDeg: 0,
    oppositeSideShiftDeg: 0,
    clarityByMonth: ALL_YEAR_ORDINARY,
    skylineRule: 'depth-at-crossing',
  });
  const override = {
    sameSideDeg: question.thresholdsDeg.sameSide,
    oppositeSideDeg: question.thresholdsDeg.oppositeSide,
    source: 'as given',
  };
  const ground = { ...placeYear.ground, skyline: levelSkyline(question.skylineDeg * RAD_PER_DEG) };
  const atPlace = markerAtPlace({ ...placeYear, ground }, { ...marker, override });
  const { outcome, detail } = atPlace.star;
  if (outcome !== 'rises-and-sets') return { outcome, outcomeDetail: detail, dayNumbers: null };
  return {
    outcome,
    outcomeDetail: detail,
    dayNumbers: {
      'heliacal-rising': expectedDays(atPlace, 'heliacal-rising'),
      'cosmical-setting': expectedDays(atPlace, 'cosmical-setting'),
      'acronychal-rising': expectedDays(atPlace, 'acronychal-rising'),
      'heliacal-setting': expectedDays(atPlace, 'heliacal-setting'),
    },
  };
}
