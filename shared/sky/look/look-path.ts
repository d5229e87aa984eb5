import type { HorizontalPlace } from '../horizon/horizontal.js';
import type { MarkerAtPlace } from '../markers/place-year.js';
import { DEG_PER_RAD } from '../units/angle.js';
import type { LookMoment } from './look-types.js';
import type { Sight, SightMoment } from './sight-rule.js';
import { skyAt, type SkyAt } from './sky-at.js';

/** A star's way through one watch. */
export interface LookPath {
  /** Every few minutes, with the moments below among them; in order of time. */
  moments: LookMoment[];
  /** First and last moment at which it is seen; null where it is not. */
  seen: { fromJdUt: number; toJdUt: number } | null;
  /** When it stands best; where it is never seen, when least is missing; null where it is never up. */
  best: LookMoment | null;
}

interface ScannedMoment extends LookMoment {
  spareMag: number;
}

const SCAN_DAYS = 1 / 1440;
/** Moments further apart are enough for a picture and a table. */
const KEPT_EVERY = 5;
const PRECISION_DAYS = 1 / 86_400;

/** A star at one moment as its sight asks for it; without the Moon. */
export function sightMoment(sky: SkyAt, at: HorizontalPlace, moonNl = 0): SightMoment {
  return {
    altitudeDeg: at.altitudeRad * DEG_PER_RAD,
    sunAltitudeDeg: -sky.sunDepressionDeg,
    azimuthDifferenceDeg: (at.azimuthRad - sky.sunAzimuthRad) * DEG_PER_RAD,
    moonNl,
  };
}

/** @param span stretch of time, JD UT */
export function lookPathOf(
  marker: MarkerAtPlace,
  sight: Sight,
  span: { fromJdUt: number; toJdUt: number },
): LookPath {
  const momentAt = (jdUt: number): ScannedMoment => momentOf(marker, sight, jdUt);
  const count = Math.max(1, Math.ceil((span.toJdUt - span.fromJdUt) / SCAN_DAYS));
  const scanned = Array.from({ length: count + 1 }, (_, index) =>
    momentAt(span.fromJdUt + ((span.toJdUt - span.fromJdUt) * index) / count),
  );
  const seen = seenSpan(scanned, momentAt);
  const middle = seen === null ? null : momentAt((seen.fromJdUt + seen.toJdUt) / 2);
  // A hill may stand in the middle of what is seen.
  const best = middle?.isUp === true ? middle : leastMissing(scanned);
  const named = [seen?.fromJdUt, seen?.toJdUt].flatMap((jdUt) =>
    jdUt === undefined ? [] : [momentAt(jdUt)],
  );
  const kept = scanned.filter((_, index) => index % KEPT_EVERY === 0 || index === count);
  const moments = [...kept, ...named, ...(best === null ? [] : [best])]
    .sort((a, b) => a.jdUt - b.jdUt)
    .filter(({ jdUt }, index, all) => jdUt !== all[index - 1]?.jdUt);
  return { moments: moments.map(bare), seen, best: best && bare(best) };
}

function momentOf(marker: MarkerAtPlace, sight: Sight, jdUt: number): ScannedMoment {
  const sky = skyAt(marker.year, marker.ground, jdUt);
  const star = sky.starAt(marker.year.stars.placeOf(marker.marker.starRef));
  const above = sky.aboveSkylineRad(star);
  const isUp = above >= 0;
  const spareMag = sight.spareMag(sightMoment(sky, star));
  return {
    jdUt,
    azimuthDeg: star.azimuthRad * DEG_PER_RAD,
    altitudeDeg: star.altitudeRad * DEG_PER_RAD,
    aboveSkylineDeg: above * DEG_PER_RAD,
    sunDepressionDeg: sky.sunDepressionDeg,
    isUp,
    isSeen: isUp && spareMag >= 0,
    spareMag,
  };
}

function bare({ spareMag: _spareMag, ...moment }: ScannedMoment): LookMoment {
  return moment;
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

/** The moment over the skyline at which the star comes nearest to showing. */
function leastMissing(scanned: readonly ScannedMoment[]): ScannedMoment | null {
  let best: ScannedMoment | null = null;
  for (const moment of scanned) {
    if (moment.isUp && (best === null || moment.spareMag > best.spareMag)) best = moment;
  }
  return best;
}
