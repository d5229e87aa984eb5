import { aboutPole } from './about-pole.js';
import { culmination } from './culmination.js';
import { darkNight } from './dark-night.js';
import { dueMeridian } from './due-meridian.js';
import type { AnyKindRules } from './kind.js';
import { moonCounted } from './moon-counted.js';
import { moonPhase } from './moon-phase.js';
import { noonSun } from './noon-sun.js';
import { starAltitude } from './star-altitude.js';
import { sunAzimuth } from './sun-azimuth.js';
import { sunSeason } from './sun-season.js';
import { venusAppearance } from './venus-appearance.js';
import { zenithSun } from './zenith-sun.js';

/** Every kind of marker. A new kind is a file beside this one, a spec in `types.ts`, a word in `words.ts` and a line here. */
export const KINDS: AnyKindRules = {
  culmination,
  'star-altitude': starAltitude,
  'due-meridian': dueMeridian,
  'about-pole': aboutPole,
  'sun-season': sunSeason,
  'sun-azimuth': sunAzimuth,
  'noon-sun': noonSun,
  'zenith-sun': zenithSun,
  'dark-night': darkNight,
  'moon-phase': moonPhase,
  'moon-counted': moonCounted,
  'venus-appearance': venusAppearance,
};
