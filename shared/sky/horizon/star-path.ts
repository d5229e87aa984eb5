import type { StarPlace } from '../stars/star-frame.js';
import type { StarOutcome, StarOutcomeDetail } from '../vocabulary.js';
import { type Latitude } from './horizontal.js';
import type { Skyline } from './skyline.js';
import { tableCrossings } from './table-crossings.js';

/** What a star's daily path does at a skyline. Hour angles in radians, [−π, π], west positive. */
export interface StarPath {
  outcome: StarOutcome;
  detail: StarOutcomeDetail | null;
  /** Both are 0 unless the outcome is `rises-and-sets`. */
  riseHourAngleRad: number;
  setHourAngleRad: number;
}

const NEVER_SETS: StarPath = { outcome: 'never-sets', detail: null, riseHourAngleRad: 0, setHourAngleRad: 0 };
const NEVER_RISES: StarPath = { ...NEVER_SETS, outcome: 'never-clears-skyline', detail: 'never-rises' };
const BELOW_SKYLINE: StarPath = { ...NEVER_SETS, outcome: 'never-clears-skyline', detail: 'below-skyline' };

/**
 * The crossings of a skyline by a star's true altitude (no refraction). On a level skyline they come from the cosine
 * formula; with a table from the whole path: rising is the first upward crossing after the lower culmination, setting
 * the last downward crossing before the next one.
 */
export function starPathOf(latitude: Latitude, place: StarPlace, skyline: Skyline): StarPath {
  const base = latitude.sin * place.sinDeclination;
  const swing = latitude.cos * place.cosDeclination;
  if (base + swing <= Math.sin(skyline.lowestRad)) return base + swing < 0 ? NEVER_RISES : BELOW_SKYLINE;
  if (base - swing >= Math.sin(skyline.highestRad)) return NEVER_SETS;
  if (skyline.level) {
    const hourAngle = Math.acos((Math.sin(skyline.lowestRad) - base) / swing);
    return {
      outcome: 'rises-and-sets',
      detail: null,
      riseHourAngleRad: -hourAngle,
      setHourAngleRad: hourAngle,
    };
  }
  const crossings = tableCrossings(latitude, place, skyline);
  if (crossings === 'always-above') return NEVER_SETS;
  if (crossings === 'always-below') return base + swing < 0 ? NEVER_RISES : BELOW_SKYLINE;
  return { outcome: 'rises-and-sets', detail: null, ...crossings };
}
