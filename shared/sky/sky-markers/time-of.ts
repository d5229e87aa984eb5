import type { SkyMarkerSpec } from './types.js';
import type { SkyMarkerTime } from './words.js';

/** The part of the civil day to which a marker's days belong. Hours before noon are mornings. */
export function skyMarkerTimeOf(spec: SkyMarkerSpec): SkyMarkerTime {
  switch (spec.kind) {
    case 'culmination':
      return spec.twilight === 'dusk' ? 'evening' : 'morning';
    case 'star-altitude':
      if (spec.at.clock === 'solar-hour') return timeOfHour(spec.at.solarHour);
      return spec.at.clock === 'after-sunset' ? 'evening' : 'morning';
    case 'due-meridian':
    case 'about-pole':
      return timeOfHour(spec.solarHour);
    case 'sun-azimuth':
      return spec.event === 'sunrise' ? 'morning' : 'evening';
    case 'noon-sun':
    case 'zenith-sun':
      return 'noon';
    case 'dark-night':
      return 'night';
    case 'moon-phase':
    case 'moon-counted':
      return spec.event === 'first-crescent' ? 'evening' : 'day';
    case 'venus-appearance':
      return spec.appearance === 'morning-first' || spec.appearance === 'morning-last'
        ? 'morning'
        : 'evening';
    case 'sun-season':
      return 'day';
  }
}

function timeOfHour(solarHour: number): SkyMarkerTime {
  return solarHour < 12 ? 'morning' : 'evening';
}
