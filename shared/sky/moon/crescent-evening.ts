import { AstroTime, Body, Observer, SearchHourAngle, SearchRiseSet } from 'astronomy-engine';

import type { Skyline } from '../horizon/skyline.js';
import { type DayClock, labelledDay } from '../time/civil-day.js';
import { JD_J2000 } from '../time/julian-day.js';
import { DEG_PER_RAD } from '../units/angle.js';
import type { CrescentWord } from '../vocabulary.js';
import { jointWord, odehV, wordByOdeh, wordByYallop, yallopQ } from './crescent-criteria.js';
import { type MoonAndSun, moonAndSunAt, type MoonSite } from './moon-and-sun.js';
import type { CrescentEvening, CrescentOnSkyline } from './moon-types.js';

/** A place as the Moon's evenings need it. */
export interface MoonGround extends MoonSite {
  skyline: Skyline;
  clock: DayClock;
}

/** The evening, and why it may have no moment to look at. */
export interface EveningSky extends CrescentEvening {
  sun: 'sets' | 'never-sets' | 'never-rises';
}

/** A little before the mean noon, because the Sun's own noon may come a quarter of an hour earlier [equation of time]. */
const BEFORE_NOON_DAYS = 20 / 1440;
/** The best time lies four ninths of the lag after sunset [Yallop1997]. */
const BEST_SHARE = 4 / 9;
/** Longer lags say nothing about twilight any more: far north and south the Moon may not set at all [C]. */
const LONGEST_LAG_DAYS = 3 / 24;
/** The upper edge on the flat horizon, lifted by the air. */
const RISEN_RAD = (-50 / 60) * (Math.PI / 180);

const WORD_BY_SKYLINE: Readonly<Record<CrescentOnSkyline, Readonly<Record<CrescentWord, CrescentWord>>>> = {
  over: { easy: 'easy', 'if-air-is-clear': 'if-air-is-clear', 'not-by-eye': 'not-by-eye' },
  // It stands over the hills only while the sky is lighter than the tests take it.
  'sinks-early': { easy: 'if-air-is-clear', 'if-air-is-clear': 'not-by-eye', 'not-by-eye': 'not-by-eye' },
  behind: { easy: 'not-by-eye', 'if-air-is-clear': 'not-by-eye', 'not-by-eye': 'not-by-eye' },
};

function isOver(skyline: Skyline, { moon }: MoonAndSun): boolean {
  return moon.altitudeRad > skyline.altitudeRad(moon.azimuthRad);
}

function nextSetting(body: Body, site: MoonSite, fromJdUt: number): number | null {
  const observer = new Observer(site.latitudeDeg, site.longitudeDeg, 0);
  const found = SearchRiseSet(body, observer, -1, new AstroTime(fromJdUt - JD_J2000), 1);
  return found && found.ut + JD_J2000;
}

/** The Moon's culmination after an instant, for days on which the Sun stays down. */
function nextCulmination(site: MoonSite, fromJdUt: number): number {
  const observer = new Observer(site.latitudeDeg, site.longitudeDeg, 0);
  const { time } = SearchHourAngle(Body.Moon, observer, 0, new AstroTime(fromJdUt - JD_J2000));
  return time.ut + JD_J2000;
}

/** The two tests at an instant, with what the skyline does to their word. */
function lookedAt(ground: MoonGround, bestJdUt: number, overAtDusk: boolean) {
  const at = moonAndSunAt(bestJdUt, ground);
  const q = yallopQ(at.geocentricArcOfVisionDeg, at.widthByYallopArcmin);
  const v = odehV(at.topocentricArcOfVisionDeg, at.widthByOdehArcmin);
  const skyline: CrescentOnSkyline = isOver(ground.skyline, at)
    ? 'over'
    : overAtDusk
      ? 'sinks-early'
      : 'behind';
  return {
    word: WORD_BY_SKYLINE[skyline][jointWord(wordByYallop(q), wordByOdeh(v))],
    bestJdUt,
    moonAltitudeDeg: at.moon.altitudeRad * DEG_PER_RAD,
    moonAzimuthDeg: at.moon.azimuthRad * DEG_PER_RAD,
    skyline,
    yallopQ: q,
    odehV: v,
  };
}

const UNSEEN = {
  word: 'not-by-eye',
  bestJdUt: null,
  moonAltitudeDeg: null,
  moonAzimuthDeg: null,
  skyline: null,
  yallopQ: null,
  odehV: null,
} as const;

/**
 * The young Moon on one evening. Sunset and moonset are those of a flat horizon, because both tests count from them;
 * the skyline then says whether the Moon still stands over the hills at the best time.
 * @param solarDay day number of the local mean solar day whose evening it is
 */
export function crescentEveningOf(ground: MoonGround, solarDay: number): EveningSky {
  const noonJdUt = solarDay - ground.longitudeDeg / 360;
  const day = labelledDay(ground.clock.dayOf(noonJdUt + 0.25));
  const sunsetJdUt = nextSetting(Body.Sun, ground, noonJdUt - BEFORE_NOON_DAYS);
  if (sunsetJdUt === null) {
    const neither = { ...day, sunsetJdUt, moonsetJdUt: null };
    const noon = moonAndSunAt(noonJdUt, ground);
    if (noon.sun.altitudeRad > RISEN_RAD) return { ...neither, ...UNSEEN, sun: 'never-sets' };
    const bestJdUt = nextCulmination(ground, noonJdUt);
    return { ...neither, ...lookedAt(ground, bestJdUt, false), sun: 'never-rises' };
  }
  const atSunset = moonAndSunAt(sunsetJdUt, ground);
  if (atSunset.moon.altitudeRad < RISEN_RAD) {
    return { ...day, sunsetJdUt, moonsetJdUt: null, ...UNSEEN, sun: 'sets' };
  }
  const moonsetJdUt = nextSetting(Body.Moon, ground, sunsetJdUt);
  const lagDays = Math.min(moonsetJdUt === null ? Infinity : moonsetJdUt - sunsetJdUt, LONGEST_LAG_DAYS);
  const best = lookedAt(ground, sunsetJdUt + BEST_SHARE * lagDays, isOver(ground.skyline, atSunset));
  return { ...day, sunsetJdUt, moonsetJdUt, ...best, sun: 'sets' };
}
