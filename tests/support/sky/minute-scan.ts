import { AstroTime, e_tilt, SiderealTime } from 'astronomy-engine';

import { prepareStarFrame } from '#shared/sky/stars/star-frame.js';
import { findStar, starIndexOf } from '#shared/sky/stars/star-table.js';
import { sunLongitudeRad } from '#shared/sky/sun/sun-longitude.js';
import { PHENOMENA, type Phenomenon } from '#shared/sky/vocabulary.js';
import type { Air } from '#shared/sky/visibility/air.js';
import { faintestStarMag } from '#shared/sky/visibility/faintest-star.js';

/**
 * The oracle of the model of visibility: every minute of every night of a year is looked at over a level skyline, and
 * the phenomena are read off what was seen. It shares the model's brightness and threshold with the engine, and nothing
 * of crossings, arcs, tables over hills or searches.
 */
export interface MinuteQuestion {
  hr: number;
  latitudeDeg: number;
  longitudeDeg: number;
  year: { firstDay: number; lastDay: number };
  skylineDeg: number;
  /** Up to this altitude a star that shows counts as seen at its rising or setting. */
  nearSkylineDeg: number;
  airOf: (dayNumber: number) => Air;
}

const DEG = Math.PI / 180;
const TAU = 2 * Math.PI;
const JD_J2000 = 2_451_545;
const MINUTES = 1440;
const SIDEREAL_RATE = 1.002_737_909_35;
/** What one night, noon to noon, showed. */
interface Night {
  seen: boolean;
  /** The first minute seen stands low in the east: the star was watched as it rose. */
  risingSeen: boolean;
  settingSeen: boolean;
}

interface Sky {
  sinLatitude: number;
  cosLatitude: number;
}

function placed(
  sky: Sky,
  declination: number,
  hourAngle: number,
): { altitudeDeg: number; azimuthDeg: number } {
  const east = -Math.cos(declination) * Math.sin(hourAngle);
  const north =
    sky.cosLatitude * Math.sin(declination) - sky.sinLatitude * Math.cos(declination) * Math.cos(hourAngle);
  const up =
    sky.sinLatitude * Math.sin(declination) + sky.cosLatitude * Math.cos(declination) * Math.cos(hourAngle);
  const azimuthDeg = Math.atan2(east, north) / DEG;
  return { altitudeDeg: Math.asin(up) / DEG, azimuthDeg: azimuthDeg < 0 ? azimuthDeg + 360 : azimuthDeg };
}

/** Every minute from one local noon to the next. */
function nightOf(
  question: MinuteQuestion,
  dayNumber: number,
  star: { ra: number; dec: number; vMag: number },
): Night {
  const sky = {
    sinLatitude: Math.sin(question.latitudeDeg * DEG),
    cosLatitude: Math.cos(question.latitudeDeg * DEG),
  };
  const noonJdUt = dayNumber - question.longitudeDeg / 360;
  const time = new AstroTime(noonJdUt - JD_J2000);
  const obliquity = e_tilt(time).tobl * DEG;
  const siderealAtNoon = SiderealTime(time) * (TAU / 24) + question.longitudeDeg * DEG;
  const sunAtNoon = sunLongitudeRad(noonJdUt);
  const sunMotion = (sunLongitudeRad(noonJdUt + 1) - sunAtNoon + TAU) % TAU;
  const air = question.airOf(dayNumber);
  const night: Night = { seen: false, risingSeen: false, settingSeen: false };
  for (let minute = 0; minute < MINUTES; minute += 1) {
    const share = minute / MINUTES;
    const sidereal = siderealAtNoon + share * SIDEREAL_RATE * TAU;
    const at = placed(sky, star.dec, sidereal - star.ra);
    if (at.altitudeDeg < question.skylineDeg) continue;
    const longitude = sunAtNoon + share * sunMotion;
    const sunDeclination = Math.asin(Math.sin(obliquity) * Math.sin(longitude));
    const sunRightAscension = Math.atan2(Math.cos(obliquity) * Math.sin(longitude), Math.cos(longitude));
    const sun = placed(sky, sunDeclination, sidereal - sunRightAscension);
    if (sun.altitudeDeg >= 0) continue; // by day nobody looks
    const faintest = faintestStarMag(air, {
      altitudeDeg: at.altitudeDeg,
      sunAltitudeDeg: sun.altitudeDeg,
      azimuthDifferenceDeg: at.azimuthDeg - sun.azimuthDeg,
      moonNl: 0,
    });
    if (faintest < star.vMag) continue;
    const low = at.altitudeDeg <= question.nearSkylineDeg;
    if (!night.seen) night.risingSeen = low && at.azimuthDeg < 180;
    night.settingSeen = low && at.azimuthDeg > 180;
    night.seen = true;
  }
  return night;
}

/** First and last days of a star-year as minute-by-minute looking finds them. */
export function minuteScanYear(question: MinuteQuestion): Record<Phenomenon, number[]> {
  const { firstDay, lastDay } = question.year;
  const index = starIndexOf(question.hr);
  const row = findStar(question.hr);
  if (index === null || !row) throw new Error(`no star ${question.hr}`);
  const place = prepareStarFrame((firstDay + lastDay) / 2).placeOf(index);
  const star = { ra: place.rightAscensionRad, dec: Math.asin(place.sinDeclination), vMag: row.vMag };
  const days = Object.fromEntries(PHENOMENA.map((phenomenon) => [phenomenon, [] as number[]])) as Record<
    Phenomenon,
    number[]
  >;
  let before = nightOf(question, firstDay - 2, star);
  for (let evening = firstDay - 1; evening <= lastDay; evening += 1) {
    const night = nightOf(question, evening, star);
    // A morning belongs to the civil day after its night's evening.
    const morning = evening + 1;
    const inYear = (day: number): boolean => day >= firstDay && day <= lastDay;
    if (!before.seen && night.seen && inYear(morning)) days['heliacal-rising'].push(morning);
    if (before.seen && !night.seen && inYear(evening - 1)) days['heliacal-setting'].push(evening - 1);
    if (before.risingSeen && !night.risingSeen && inYear(evening - 1))
      days['acronychal-rising'].push(evening - 1);
    if (!before.settingSeen && night.settingSeen && inYear(morning)) days['cosmical-setting'].push(morning);
    before = night;
  }
  return days;
}
