import type { MarkerAtPlace } from '../markers/place-year.js';
import { DEG_PER_RAD } from '../units/angle.js';
import type { LookMoment } from './look-types.js';
import { isSeen, neededForSightDeg, type SightRule } from './sight-rule.js';
import { skyAt } from './sky-at.js';

/** A star's way through one watch. */
export interface LookPath {
  /** Every few minutes, with the moments below among them; in order of time. */
  moments: LookMoment[];
  /** First and last moment at which it is seen; null where it is not. */
  seen: { fromJdUt: number; toJdUt: number } | null;
  /** When it stands best; where it is never seen, when least is missing; null where it is never up. */
  best: LookMoment | null;
}

const SCAN_DAYS = 1 / 1440;
/** Moments further apart are enough for a picture and a table. */
const KEPT_EVERY = 5;
const PRECISION_DAYS = 1 / 86_400;

/** @param span stretch of time, JD UT */
export function lookPathOf(
  marker: MarkerAtPlace,
  rule: SightRule,
  span: { fromJdUt: number; toJdUt: number },
): LookPath {
  const momentAt = (jdUt: number): LookMoment => momentOf(marker, rule, jdUt);
  const count = Math.max(1, Math.ceil((span.toJdUt - span.fromJdUt) / SCAN_DAYS));
  const scanned = Array.from({ length: count + 1 }, (_, index) =>
    momentAt(span.fromJdUt + ((span.toJdUt - span.fromJdUt) * index) / count),
  );
  const seen = seenSpan(scanned, momentAt);
  const middle = seen === null ? null : momentAt((seen.fromJdUt + seen.toJdUt) / 2);
  // A hill may stand in the middle of what is seen.
  const best = middle?.isUp === true ? middle : leastMissing(marker, rule, scanned);
  const named = [seen?.fromJdUt, seen?.toJdUt].flatMap((jdUt) =>
    jdUt === undefined ? [] : [momentAt(jdUt)],
  );
  const kept = scanned.filter((_, index) => index % KEPT_EVERY === 0 || index === count);
  const moments = [...kept, ...named, ...(best === null ? [] : [best])]
    .sort((a, b) => a.jdUt - b.jdUt)
    .filter(({ jdUt }, index, all) => jdUt !== all[index - 1]?.jdUt);
  return { moments, seen, best };
}

function momentOf(marker: MarkerAtPlace, rule: SightRule, jdUt: number): LookMoment {
  const sky = skyAt(marker.year, marker.ground, jdUt);
  const star = sky.starAt(marker.year.stars.placeOf(marker.marker.starRef));
  const above = sky.aboveSkylineRad(star);
  const sunward = star.azimuthRad - sky.sunAzimuthRad;
  const isUp = above >= 0;
  return {
    jdUt,
    azimuthDeg: star.azimuthRad * DEG_PER_RAD,
    altitudeDeg: star.altitudeRad * DEG_PER_RAD,
    aboveSkylineDeg: above * DEG_PER_RAD,
    sunDepressionDeg: sky.sunDepressionDeg,
    isUp,
    isSeen: isUp && isSeen(rule, marker.marker.vMag, star.altitudeRad, sunward, sky.sunDepressionDeg),
  };
}

/** Ends to the second, always on the seen side. */
function seenSpan(scanned: readonly LookMoment[], momentAt: (jdUt: number) => LookMoment): LookPath['seen'] {
  const first = scanned.findIndex((moment) => moment.isSeen);
  if (first < 0) return null;
  const last = scanned.findLastIndex((moment) => moment.isSeen);
  const edge = (seenJdUt: number, hiddenJdUt: number | undefined): number => {
    if (hiddenJdUt === undefined) return seenJdUt;
    let [seen, hidden] = [seenJdUt, hiddenJdUt];
    while (Math.abs(seen - hidden) > PRECISION_DAYS) {
      const middle = (seen + hidden) / 2;
      if (momentAt(middle).isSeen) seen = middle;
      else hidden = middle;
    }
    return seen;
  };
  return {
    fromJdUt: edge(scanned[first]?.jdUt ?? 0, scanned[first - 1]?.jdUt),
    toJdUt: edge(scanned[last]?.jdUt ?? 0, scanned[last + 1]?.jdUt),
  };
}

/** The moment over the skyline at which the Sun comes nearest to the depth that is needed. */
function leastMissing(
  marker: MarkerAtPlace,
  rule: SightRule,
  scanned: readonly LookMoment[],
): LookMoment | null {
  let best: LookMoment | null = null;
  let bestMargin = Number.NEGATIVE_INFINITY;
  for (const moment of scanned) {
    if (!moment.isUp) continue;
    const sky = skyAt(marker.year, marker.ground, moment.jdUt);
    const sunward = moment.azimuthDeg / DEG_PER_RAD - sky.sunAzimuthRad;
    const needed = neededForSightDeg(rule, marker.marker.vMag, moment.altitudeDeg, sunward);
    const margin = moment.sunDepressionDeg - needed;
    if (margin <= bestMargin) continue;
    best = moment;
    bestMargin = margin;
  }
  return best;
}
