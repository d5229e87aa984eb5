import type { MarkerAtPlace } from '../markers/place-year.js';
import { DEG_PER_RAD } from '../units/angle.js';
import type { Clarity } from '../vocabulary.js';
import type { LookMoment } from './look-types.js';
import { extinctionAngleDeg } from './extinction-angle.js';
import type { Sight } from './sight.js';
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

/** A moment with what is to spare in it; only the path knows that. */
interface Scanned extends LookMoment {
  spare: number;
}

/**
 * @param sight whether the sky is dark enough; below the thick air's top the star is not seen whatever it says
 * @param span stretch of time, JD UT
 */
export function lookPathOf(
  marker: MarkerAtPlace,
  sight: Sight,
  clarity: Clarity,
  span: { fromJdUt: number; toJdUt: number },
): LookPath {
  const lowestDeg = extinctionAngleDeg(marker.marker.vMag, clarity);
  const momentAt = (jdUt: number): Scanned => momentOf(marker, sight, lowestDeg, jdUt);
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

function bare({ spare: _spare, ...moment }: Scanned): LookMoment {
  return moment;
}

function momentOf(marker: MarkerAtPlace, sight: Sight, lowestDeg: number, jdUt: number): Scanned {
  const sky = skyAt(marker.year, marker.ground, jdUt);
  const star = sky.starAt(marker.year.stars.placeOf(marker.marker.starRef));
  const above = sky.aboveSkylineRad(star);
  const altitudeDeg = star.altitudeRad * DEG_PER_RAD;
  const spare = sight.spare(sky, star);
  const isUp = above >= 0;
  return {
    jdUt,
    azimuthDeg: star.azimuthRad * DEG_PER_RAD,
    altitudeDeg,
    aboveSkylineDeg: above * DEG_PER_RAD,
    sunDepressionDeg: sky.sunDepressionDeg,
    isUp,
    isSeen: isUp && altitudeDeg >= lowestDeg && spare >= 0,
    spare,
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

/** The moment over the skyline at which the star comes nearest to showing. */
function leastMissing(scanned: readonly Scanned[]): Scanned | null {
  let best: Scanned | null = null;
  for (const moment of scanned) {
    if (moment.isUp && (best === null || moment.spare > best.spare)) best = moment;
  }
  return best;
}
