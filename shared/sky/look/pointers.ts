import type { HorizontalPlace } from '../horizon/horizontal.js';
import type { MarkerAtPlace } from '../markers/place-year.js';
import { STARS } from '../stars/star-table.js';
import type { Star } from '../types.js';
import { DEG_PER_RAD } from '../units/angle.js';
import { thresholdOf } from '../visibility/threshold-sets.js';
import { bearingRad, separationRad } from './direction.js';
import type { Pointer } from './look-types.js';
import { isSeen, type SightRule } from './sight-rule.js';
import type { SkyAt } from './sky-at.js';

/** Two and a half hands: as far as an arm's length of hands is walked without losing the way. */
const NEAR_DEG = 25;
/** Where nothing bright stands near, one of the brightest stars is better than none. */
const FAR_DEG = 50;
const BRIGHT_MAG = 2.6;
const VERY_BRIGHT_MAG = 1;
/** Closer ones are seen together with it and point nowhere. */
const TOO_CLOSE_DEG = 2;
const MOST = 3;

/**
 * Bright neighbours that can be seen at the same moment, brightest first: the eye starts from them. Only stars that people
 * know by a name.
 */
export function pointersOf(
  marker: MarkerAtPlace,
  rule: SightRule,
  sky: SkyAt,
  star: HorizontalPlace,
): Pointer[] {
  const own = new Set([marker.marker.star?.hr, ...(marker.marker.figure?.memberHrs ?? [])]);
  const seen = STARS.flatMap((each, index) => {
    if (each.vMag > BRIGHT_MAG || own.has(each.hr) || !isNamed(each)) return [];
    const at = sky.starAt(marker.year.stars.placeOf(index));
    const pointer = pointerOf(each, at, star, sky);
    const isUseful =
      pointer.separationDeg >= TOO_CLOSE_DEG &&
      pointer.separationDeg <= (each.vMag <= VERY_BRIGHT_MAG ? FAR_DEG : NEAR_DEG) &&
      pointer.aboveSkylineDeg >= 0 &&
      isSeen(
        ruleFor(marker, rule, each),
        each.vMag,
        at.altitudeRad,
        at.azimuthRad - sky.sunAzimuthRad,
        sky.sunDepressionDeg,
      );
    return isUseful ? [pointer] : [];
  });
  const near = seen.filter(({ separationDeg }) => separationDeg <= NEAR_DEG);
  if (near.length > 0) return near.sort((a, b) => a.vMag - b.vMag).slice(0, MOST);
  return seen.sort((a, b) => a.separationDeg - b.separationDeg).slice(0, 1);
}

function isNamed({ name, bayer, flamsteed, constellation }: Star): boolean {
  return name !== `${bayer === '' ? flamsteed : bayer} ${constellation}`;
}

function ruleFor(marker: MarkerAtPlace, rule: SightRule, star: Star): SightRule {
  return { ...rule, threshold: thresholdOf(marker.settings.thresholdSet, star.vMag, null) };
}

function pointerOf(star: Star, at: HorizontalPlace, marker: HorizontalPlace, sky: SkyAt): Pointer {
  return {
    hr: star.hr,
    name: star.name,
    vMag: star.vMag,
    azimuthDeg: at.azimuthRad * DEG_PER_RAD,
    altitudeDeg: at.altitudeRad * DEG_PER_RAD,
    aboveSkylineDeg: sky.aboveSkylineRad(at) * DEG_PER_RAD,
    separationDeg: separationRad(at, marker) * DEG_PER_RAD,
    bearingDeg: bearingRad(at, marker) * DEG_PER_RAD,
  };
}
