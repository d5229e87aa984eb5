import type { MarkerAtPlace } from '../markers/place-year.js';
import type { Site } from '../types.js';
import { monthOfDay } from '../time/civil-year.js';
import { clarityOfMonth } from '../visibility/clarity.js';
import { airAtPlace } from '../visibility/air.js';
import { type Calibration, calibrationOf } from './calibration.js';
import { lookPathOf, type LookPath } from './look-path.js';
import type { LookOutcome, WatchSide } from '../vocabulary.js';
import type { Look, LookSight } from './look-types.js';
import { moonThen } from './moon-then.js';
import { planetsBeside, type StarThen } from './planets-beside.js';
import { pointersOf } from './pointers.js';
import { type Sight, sightByDates, sightByModel } from './sight.js';
import type { SightRule } from './sight-rule.js';
import { skyAt } from './sky-at.js';
import { watchWindowOf, type WatchWindow } from './watch-window.js';

/**
 * Where and when to look for a marker on one morning or evening of a civil day.
 * @param marker at the place, in the prepared year of the day
 * @param dayNumber the morning's or the evening's civil day
 */
export function lookAt(marker: MarkerAtPlace, site: Site, dayNumber: number, side: WatchSide): Look {
  const { year, ground, settings, clock } = marker;
  const month = monthOfDay(dayNumber, year.civil.calendar);
  const clarity = clarityOfMonth(settings.clarityByMonth, month);
  const rule: SightRule = {
    threshold: marker.threshold,
    sameSideShiftDeg: settings.sameSideShiftDeg,
    oppositeSideShiftDeg: settings.oppositeSideShiftDeg,
    clarity,
  };
  const meanNoonJdUt = dayNumber - site.longitudeDeg / 360;
  const window = watchWindowOf(year, ground, dayNumber - clock.offsetDays(meanNoonJdUt), side);
  const calibration = calibrationOf(marker, site, dayNumber, side);
  const model = (offsetMag: number): Sight =>
    sightByModel(airAtPlace(site, month, clarity), marker.marker.vMag, offsetMag);
  const sight =
    calibration.by === 'model' ? model(calibration.offsetMag) : sightByDates(rule, marker.marker.vMag);
  const path = window.span && lookPathOf(marker, sight, clarity, window.span);
  const plain =
    window.span && calibration.by === 'model'
      ? lookPathOf(marker, model(0), clarity, window.span).seen
      : null;
  const middleJdUt = window.span === null ? meanNoonJdUt : (window.span.fromJdUt + window.span.toJdUt) / 2;
  const bestJdUt = path?.best?.jdUt ?? null;
  const then = bestJdUt === null ? null : thenOf(marker, bestJdUt);
  return {
    markerKey: marker.marker.key,
    dayNumber,
    side,
    outcome: outcomeOf(marker, window, path),
    outcomeDetail: marker.star.detail,
    sunCourse: window.sunCourse,
    clarity,
    limitJdUt: window.limitJdUt,
    watchFromJdUt: window.span?.fromJdUt ?? null,
    watchToJdUt: window.span?.toJdUt ?? null,
    comesUpJdUt: nearestCrossing(marker, 'rising', bestJdUt ?? middleJdUt),
    goesDownJdUt: nearestCrossing(marker, 'setting', bestJdUt ?? middleJdUt),
    seenFromJdUt: path?.seen?.fromJdUt ?? null,
    seenToJdUt: path?.seen?.toJdUt ?? null,
    best: path?.best ?? null,
    path: path?.moments ?? [],
    sight: lookSightOf(calibration, plain),
    pointers: then === null ? [] : pointersOf(marker, rule, then.sky, then.star),
    planets:
      then === null || path === null
        ? []
        : planetsBeside(site, marker.marker.vMag, momentsUp(marker, then, path)),
    moon:
      window.span === null
        ? null
        : moonThen(site, then?.sky ?? skyAt(year, ground, middleJdUt), then?.star ?? null),
  };
}

function lookSightOf(calibration: Calibration, plain: LookPath['seen']): LookSight {
  const set = calibration.by === 'model' ? calibration : null;
  return {
    by: calibration.by,
    because: calibration.by === 'dates' ? calibration.because : null,
    offsetMag: set?.offsetMag ?? null,
    phenomenon: set?.phenomenon ?? null,
    expectedDayNumber: set?.expectedDayNumber ?? null,
    plainFromJdUt: plain?.fromJdUt ?? null,
    plainToJdUt: plain?.toJdUt ?? null,
  };
}

function thenOf(marker: MarkerAtPlace, jdUt: number): StarThen {
  const sky = skyAt(marker.year, marker.ground, jdUt);
  return { sky, star: sky.starAt(marker.year.stars.placeOf(marker.marker.starRef)) };
}

/** The best moment, then the others at which the star is up: a planet may come up while people watch. */
function momentsUp(marker: MarkerAtPlace, best: StarThen, { moments, seen }: LookPath): StarThen[] {
  const others = moments.filter(({ isUp, isSeen }) => (seen === null ? isUp : isSeen));
  const ends = [others.at(-1), others[0]].flatMap((moment) => (moment === undefined ? [] : [moment]));
  return [best, ...ends.map(({ jdUt }) => thenOf(marker, jdUt))];
}

function outcomeOf({ star }: MarkerAtPlace, { span }: WatchWindow, path: LookPath | null): LookOutcome {
  if (star.outcome === 'never-clears-skyline') return 'never-clears-skyline';
  if (span === null || path === null) return 'sun-stays-up';
  if (path.seen !== null) return 'seen';
  return path.best === null ? 'not-up' : 'too-light';
}

/** The star's rising or setting over the skyline that lies nearest to an instant; null where it does neither. */
function nearestCrossing(marker: MarkerAtPlace, kind: 'rising' | 'setting', jdUt: number): number | null {
  const crossing = marker.star.crossings?.[kind];
  if (!crossing) return null;
  const { periodDays } = marker.year.sidereal;
  return crossing.anInstantJdUt + Math.round((jdUt - crossing.anInstantJdUt) / periodDays) * periodDays;
}
