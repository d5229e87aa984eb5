import { latitudeOf } from '../horizon/horizontal.js';
import { prepareSkyline } from '../horizon/skyline.js';
import type { PreparedYear } from '../phenomena/prepared-year.js';
import { type Ground, type StarAtPlace, starAtPlace } from '../phenomena/skyline-crossing.js';
import { type DayClock, dayClockOf } from '../time/civil-day.js';
import type { Site, VisibilitySettings } from '../types.js';
import { RAD_PER_DEG } from '../units/angle.js';
import { type AirSpan, airSpanAtPlace } from '../visibility/air.js';
import { type Threshold, thresholdOf } from '../visibility/threshold-sets.js';
import type { Clarity } from '../vocabulary.js';
import type { ResolvedMarker } from './marker-key.js';

/** A place in a prepared year. */
export interface PlaceYear {
  year: PreparedYear;
  ground: Ground;
  clock: DayClock;
  settings: VisibilitySettings;
  /** The air of a month, 1…12; made when it is asked for. */
  airSpanOf: (month: number, clarity: Clarity) => AirSpan;
  /** The Sun's longitudes between which a phenomenon may belong to the civil year. */
  window: { fromRad: number; toRad: number };
}

/** Days by which a month's clarity may carry an event away from the day computed without it. */
const CLARITY_REACH_DAYS = 60;
/** Half a crossing to either side, the offset of the widest time zone, and a day of grace. */
const EDGE_DAYS = 3;

export function placeYearOf(year: PreparedYear, site: Site, settings: VisibilitySettings): PlaceYear {
  const { firstDay, lastDay } = year.civil;
  const steady = settings.clarityByMonth.every((clarity) => clarity === 'ordinary');
  const reachDays = steady ? EDGE_DAYS : CLARITY_REACH_DAYS;
  return {
    year,
    window: {
      fromRad: year.sun.longitudeRad(firstDay - reachDays),
      toRad: year.sun.longitudeRad(lastDay + reachDays),
    },
    ground: {
      latitude: latitudeOf(site.latitudeDeg * RAD_PER_DEG),
      longitudeRad: site.longitudeDeg * RAD_PER_DEG,
      skyline: prepareSkyline(site.skyline),
    },
    clock: dayClockOf(site.timeZone, site.longitudeDeg),
    settings,
    airSpanOf: airSpansOf(site),
  };
}

function airSpansOf(site: Site): PlaceYear['airSpanOf'] {
  const made = new Map<string, AirSpan>();
  return (month, clarity) => {
    const key = `${clarity} ${month}`;
    const span = made.get(key) ?? airSpanAtPlace(site, month, clarity);
    made.set(key, span);
    return span;
  };
}

/** A marker at a place in a prepared year: its path over the skyline and its threshold. */
export interface MarkerAtPlace extends PlaceYear {
  marker: ResolvedMarker;
  star: StarAtPlace;
  threshold: Threshold;
}

export function markerAtPlace(placeYear: PlaceYear, marker: ResolvedMarker): MarkerAtPlace {
  // Written out, not spread: this runs once per star of the table.
  return {
    year: placeYear.year,
    ground: placeYear.ground,
    clock: placeYear.clock,
    settings: placeYear.settings,
    airSpanOf: placeYear.airSpanOf,
    window: placeYear.window,
    marker,
    star: starAtPlace(placeYear.year, placeYear.ground, marker.starRef),
    threshold: thresholdOf(placeYear.settings.thresholdSet, marker.vMag, marker.override),
  };
}
