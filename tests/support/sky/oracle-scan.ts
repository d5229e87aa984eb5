import { AstroTime, e_tilt, SiderealTime } from 'astronomy-engine';

import { prepareStarFrame } from '#shared/sky/stars/star-frame.js';
import { starIndexOf } from '#shared/sky/stars/star-table.js';
import { sunLongitudeRad } from '#shared/sky/sun/sun-longitude.js';
import type { SkylinePoint } from '#shared/sky/types.js';
import { PHENOMENA, type Phenomenon, type StarOutcome } from '#shared/sky/vocabulary.js';

/**
 * The oracle: a plain scan over every crossing of the year. It knows no closed form, no sidereal line and no table of
 * the Sun: each crossing of the skyline is walked to in small steps, its instant comes from the sidereal time of that
 * very day, and the Sun's depth from its right ascension and declination there. Only the star's place and the Sun's exact
 * longitude are shared with the engine (and are held against ERFA and PyEphem on their own).
 */
export interface ScanQuestion {
  hr: number;
  latitudeDeg: number;
  longitudeDeg: number;
  year: { firstDay: number; lastDay: number };
  skyline: readonly SkylinePoint[];
  /** Needed depth of the Sun in degrees, by side and by the skyline's altitude at the crossing. */
  neededDeg: (side: 'same' | 'opposite', altitudeDeg: number) => number;
}

export interface ScanAnswer {
  outcome: StarOutcome;
  days: Record<Phenomenon, number[]>;
}

const DEG = Math.PI / 180;
const TAU = 2 * Math.PI;
const JD_J2000 = 2_451_545;
const SIDEREAL_DAY = 0.997_269_57;
const STEP = 0.05 * DEG;
/** Arcs may begin and end outside the year; an arc is never longer than a year. */
const MARGIN_DAYS = 370;

function altitudeOnTable(points: readonly SkylinePoint[], azimuthDeg: number): number {
  const sorted = points.filter((point) => point.azimuthDeg < 360).sort((a, b) => a.azimuthDeg - b.azimuthDeg);
  const [first] = sorted;
  const last = sorted.at(-1);
  if (!first || !last) return points[0]?.altitudeDeg ?? 0;
  const ring = [
    { ...last, azimuthDeg: last.azimuthDeg - 360 },
    ...sorted,
    { ...first, azimuthDeg: first.azimuthDeg + 360 },
  ];
  for (let index = 0; index + 1 < ring.length; index += 1) {
    const [left, right] = [ring[index], ring[index + 1]];
    if (!left || !right || azimuthDeg < left.azimuthDeg || azimuthDeg > right.azimuthDeg) continue;
    const share = (azimuthDeg - left.azimuthDeg) / (right.azimuthDeg - left.azimuthDeg);
    return left.altitudeDeg + share * (right.altitudeDeg - left.altitudeDeg);
  }
  throw new Error(`no stretch of the table at ${azimuthDeg}`);
}

interface StarOnPath {
  altitudeDeg: number;
  skylineDeg: number;
}

function starAt(question: ScanQuestion, declination: number, hourAngle: number): StarOnPath {
  const latitude = question.latitudeDeg * DEG;
  const up =
    Math.sin(latitude) * Math.sin(declination) +
    Math.cos(latitude) * Math.cos(declination) * Math.cos(hourAngle);
  const north =
    Math.cos(latitude) * Math.sin(declination) -
    Math.sin(latitude) * Math.cos(declination) * Math.cos(hourAngle);
  const azimuth = Math.atan2(-Math.cos(declination) * Math.sin(hourAngle), north);
  return {
    altitudeDeg: Math.asin(Math.min(1, Math.max(-1, up))) / DEG,
    skylineDeg: altitudeOnTable(question.skyline, (((azimuth / DEG) % 360) + 360) % 360),
  };
}

/** First upward and last downward hour angle between lower culminations, by small steps and halving. */
function hourAngles(
  question: ScanQuestion,
  declination: number,
): { rise: number; set: number } | StarOutcome {
  const clearance = (hourAngle: number): number => {
    const star = starAt(question, declination, hourAngle);
    return star.altitudeDeg - star.skylineDeg;
  };
  const halved = (from: number, to: number): number => {
    let [left, right] = [from, to];
    const leftAbove = clearance(left) >= 0;
    for (let step = 0; step < 40; step += 1) {
      const middle = (left + right) / 2;
      if (clearance(middle) >= 0 === leftAbove) left = middle;
      else right = middle;
    }
    return (left + right) / 2;
  };
  let rise: number | null = null;
  let set: number | null = null;
  const steps = Math.ceil(TAU / STEP);
  let before = clearance(-Math.PI) >= 0;
  for (let step = 1; step <= steps; step += 1) {
    const from = -Math.PI + ((step - 1) * TAU) / steps;
    const to = -Math.PI + (step * TAU) / steps;
    const above = clearance(to) >= 0;
    if (above && !before) rise ??= halved(from, to);
    if (!above && before) set = halved(from, to);
    before = above;
  }
  if (rise === null || set === null) return before ? 'never-sets' : 'never-clears-skyline';
  return { rise, set };
}

/** Depth of the Sun's centre below the mathematical horizon, degrees. */
export function sunDepthDeg(jdUt: number, latitudeDeg: number, longitudeDeg: number): number {
  const time = new AstroTime(jdUt - JD_J2000);
  const longitude = sunLongitudeRad(jdUt);
  const obliquity = e_tilt(time).tobl * DEG;
  const declination = Math.asin(Math.sin(obliquity) * Math.sin(longitude));
  const rightAscension = Math.atan2(Math.cos(obliquity) * Math.sin(longitude), Math.cos(longitude));
  const hourAngle = SiderealTime(time) * (TAU / 24) + longitudeDeg * DEG - rightAscension;
  const latitude = latitudeDeg * DEG;
  const up =
    Math.sin(latitude) * Math.sin(declination) +
    Math.cos(latitude) * Math.cos(declination) * Math.cos(hourAngle);
  return -Math.asin(up) / DEG;
}

/** Every return of a local sidereal time between two instants. */
function returnsOf(localSidereal: number, longitudeDeg: number, fromJdUt: number, toJdUt: number): number[] {
  const gap = (jdUt: number): number => {
    const difference =
      localSidereal - longitudeDeg * DEG - SiderealTime(new AstroTime(jdUt - JD_J2000)) * (TAU / 24);
    return (((difference % TAU) + 1.5 * TAU) % TAU) - TAU / 2;
  };
  const instants: number[] = [];
  let jdUt = fromJdUt + (((gap(fromJdUt) + TAU) % TAU) / TAU) * SIDEREAL_DAY;
  while (jdUt <= toJdUt) {
    jdUt += (gap(jdUt) / TAU) * SIDEREAL_DAY;
    instants.push(jdUt);
    jdUt += SIDEREAL_DAY;
  }
  return instants;
}

/** All four phenomena of one star in one year. */
export function scanYear(question: ScanQuestion): ScanAnswer {
  const days = Object.fromEntries(
    PHENOMENA.map((phenomenon) => [phenomenon, [] as number[]]),
  ) as ScanAnswer['days'];
  const { firstDay, lastDay } = question.year;
  const index = starIndexOf(question.hr);
  if (index === null) throw new Error(`no star ${question.hr}`);
  const place = prepareStarFrame((firstDay + lastDay) / 2).placeOf(index);
  const declination = Math.asin(place.sinDeclination);
  const path = hourAngles(question, declination);
  if (typeof path === 'string') return { outcome: path, days };

  const kinds = [
    { hourAngle: path.rise, dawn: ['heliacal-rising', 'same'], dusk: ['acronychal-rising', 'opposite'] },
    { hourAngle: path.set, dawn: ['cosmical-setting', 'opposite'], dusk: ['heliacal-setting', 'same'] },
  ] as const;
  for (const { hourAngle, dawn, dusk } of kinds) {
    const { altitudeDeg } = starAt(question, declination, hourAngle);
    const sidereal = place.rightAscensionRad + hourAngle;
    const instants = returnsOf(
      sidereal,
      question.longitudeDeg,
      firstDay - MARGIN_DAYS,
      lastDay + MARGIN_DAYS,
    );
    const depths = instants.map((jdUt) => sunDepthDeg(jdUt, question.latitudeDeg, question.longitudeDeg));
    const record = (phenomenon: Phenomenon, at: number): void => {
      const day = Math.floor((instants[at] ?? 0) + question.longitudeDeg / 360 + 0.5);
      if (day >= firstDay && day <= lastDay) days[phenomenon].push(day);
    };
    for (let at = 1; at < depths.length; at += 1) {
      const [previous, here] = [depths[at - 1] ?? 0, depths[at] ?? 0];
      const dawnNeeded = question.neededDeg(dawn[1], altitudeDeg);
      const duskNeeded = question.neededDeg(dusk[1], altitudeDeg);
      if (previous < dawnNeeded && here >= dawnNeeded) record(dawn[0], at);
      if (previous >= duskNeeded && here < duskNeeded) record(dusk[0], at - 1);
    }
  }
  return { outcome: 'rises-and-sets', days };
}
