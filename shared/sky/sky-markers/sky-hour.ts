import { solarInstant, sunCrossing, sunriseSkyline } from '../phenomena/sun-day.js';
import { SkyRangeError } from '../units/sky-range-error.js';
import type { SkyMarkerPlace } from './kind.js';
import { checkNumber, checkSolarHour, checkWord } from './spec-checks.js';
import type { SkyHour } from './types.js';
import { CLOCK_MINUTES, SKY_CLOCKS } from './words.js';

const MINUTES_PER_DAY = 1440;

/**
 * The instant of a clock on each solar day; null where the Sun does not rise or set. Sunrise and sunset are those of a
 * flat horizon, as almanacs and the radio give them: upper edge, standard refraction.
 */
export function instantsOf(at: SkyHour, place: SkyMarkerPlace): (solarDay: number) => number | null {
  const { year, ground } = place;
  if (at.clock === 'solar-hour') return (solarDay) => solarInstant(ground, solarDay, at.solarHour);
  const flat = sunriseSkyline([]);
  const [which, days] =
    at.clock === 'after-sunset'
      ? (['setting', at.minutes / MINUTES_PER_DAY] as const)
      : (['rising', -at.minutes / MINUTES_PER_DAY] as const);
  return (solarDay) => {
    const sun = sunCrossing(year, ground, solarDay, flat, which);
    return sun && sun.jdUt + days;
  };
}

export function checkSkyHour(field: string, at: SkyHour): void {
  if (typeof at !== 'object') throw new SkyRangeError(field, 'Give a clock and its time.');
  checkWord(`${field}.clock`, at.clock, SKY_CLOCKS);
  if (at.clock === 'solar-hour') checkSolarHour(`${field}.solarHour`, at.solarHour);
  else checkNumber(`${field}.minutes`, at.minutes, CLOCK_MINUTES.min, CLOCK_MINUTES.max, 'minutes');
}
