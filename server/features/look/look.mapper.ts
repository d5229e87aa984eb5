import type {
  Look,
  LookAlternative,
  LookCrossing,
  LookMoment,
  LookMoon,
  LookPlanet,
  LookPointer,
  LookSeason,
  LookSight,
} from '#shared/contracts/look.js';
import { isoDateOf } from '#shared/kernel/iso-date.js';
import { ENGINE_VERSION } from '#shared/sky/index.js';
import type {
  Look as SkyLook,
  LookMoment as SkyMoment,
  LookSight as SkySight,
  MoonThen,
  Phenomenon,
  PlanetBeside,
  Pointer,
} from '#shared/sky/index.js';
import type { VillagePlace } from '../places/places.service.js';
import { localTimeOf, type PlaceClock } from '../stars/local-time.service.js';
import { markerNamesOf } from '../stars/marker-names.service.js';

const MINUTES_PER_DAY = 1440;

export interface LookFacts {
  place: VillagePlace;
  phenomenon: Phenomenon;
  sky: SkyLook;
  season: LookSeason;
  alternative: LookAlternative | null;
}

/** Times are rounded so that nobody looks too early at dusk or too long at dawn. */
export function toLook({ place, phenomenon, sky, season, alternative }: LookFacts): Look {
  const time = (jdUt: number | null, rounding: 'down' | 'up' = 'down') =>
    jdUt === null ? null : localTimeOf(jdUt, place, rounding);
  return {
    placeId: place.id,
    placeName: place.name,
    latitudeDeg: place.latitudeDeg,
    skyline: place.skyline,
    marker: markerNamesOf(sky.markerKey, place.figures),
    phenomenon,
    side: sky.side,
    date: isoDateOf(sky.dayNumber),
    dayNumber: sky.dayNumber,
    outcome: sky.outcome,
    outcomeDetail: sky.outcomeDetail,
    sunCourse: sky.sunCourse,
    clarity: sky.clarity,
    limitAt: time(sky.limitJdUt, sky.side === 'dawn' ? 'down' : 'up'),
    watchFromAt: time(sky.watchFromJdUt, 'up'),
    watchToAt: time(sky.watchToJdUt),
    comesUp: toCrossing(sky.comesUpJdUt, sky, place),
    goesDown: toCrossing(sky.goesDownJdUt, sky, place),
    ...spanAt(sky.seenFromJdUt, sky.seenToJdUt, place),
    seenMinutes: seenMinutesOf(sky),
    best: sky.best && toMoment(sky.best, place),
    path: sky.path.map((moment) => toMoment(moment, place)),
    sight: toSight(sky.sight, place),
    pointers: sky.pointers.map(toPointer),
    planets: sky.planets.map((planet) => toPlanet(planet, place)),
    moon: sky.moon && toMoon(sky.moon),
    season,
    alternative,
    engineVersion: ENGINE_VERSION,
  };
}

/** Whole minutes within a stretch of time; the minute of its end where it holds none. */
function spanAt(
  fromJdUt: number | null,
  toJdUt: number | null,
  clock: PlaceClock,
): { seenFromAt: string | null; seenToAt: string | null } {
  if (fromJdUt === null || toJdUt === null) return { seenFromAt: null, seenToAt: null };
  const seenToAt = localTimeOf(toJdUt, clock, 'down');
  const isShort = (toJdUt - fromJdUt) * MINUTES_PER_DAY < 1;
  return { seenFromAt: isShort ? seenToAt : localTimeOf(fromJdUt, clock, 'up'), seenToAt };
}

function toSight(
  { by, because, offsetMag, phenomenon, expectedDayNumber, plainFromJdUt, plainToJdUt }: SkySight,
  clock: PlaceClock,
): LookSight {
  const { seenFromAt, seenToAt } = spanAt(plainFromJdUt, plainToJdUt, clock);
  return {
    by,
    because,
    offsetMag,
    phenomenon,
    expectedDate: expectedDayNumber === null ? null : isoDateOf(expectedDayNumber),
    plainFromAt: seenFromAt,
    plainToAt: seenToAt,
  };
}

function seenMinutesOf({ seenFromJdUt, seenToJdUt }: SkyLook): number {
  return seenFromJdUt === null || seenToJdUt === null
    ? 0
    : Math.max(1, Math.round((seenToJdUt - seenFromJdUt) * MINUTES_PER_DAY));
}

function toCrossing(
  jdUt: number | null,
  { watchFromJdUt, watchToJdUt }: SkyLook,
  clock: PlaceClock,
): LookCrossing | null {
  if (jdUt === null || watchFromJdUt === null || watchToJdUt === null) return null;
  const when = jdUt < watchFromJdUt ? 'before-watch' : jdUt > watchToJdUt ? 'after-watch' : 'in-watch';
  return { localTime: localTimeOf(jdUt, clock), when };
}

function toMoment(moment: SkyMoment, clock: PlaceClock): LookMoment {
  const { jdUt, azimuthDeg, altitudeDeg, aboveSkylineDeg, sunDepressionDeg, isUp, isSeen } = moment;
  const localTime = localTimeOf(jdUt, clock);
  return { localTime, azimuthDeg, altitudeDeg, aboveSkylineDeg, sunDepressionDeg, isUp, isSeen };
}

function toPointer({ vMag: _vMag, ...pointer }: Pointer): LookPointer {
  return pointer;
}

function toPlanet({ jdUt, ...planet }: PlanetBeside, clock: PlaceClock): LookPlanet {
  return { ...planet, localTime: localTimeOf(jdUt, clock) };
}

function toMoon({ vMag: _vMag, ...moon }: MoonThen): LookMoon {
  return moon;
}
