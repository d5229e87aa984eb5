import type { SkyHour, SkyMarkerSpec } from '#shared/sky/index.js';

export interface SkyTexts {
  /** Texts of the namespace `sky`, bound to a language. */
  t: (key: string, values?: Record<string, string | number>) => string;
  /** Code of the nearest of sixteen directions. */
  compassPoint: (azimuthDeg: number) => string;
}

/**
 * How a marker beyond a star's first and last days is called, on screens and on paper: "Belt of Orion due south at 21:00
 * by the Sun". Every kind has whole sentences of its own in `sky.ts`.
 * @param starName the name of the star or figure that the spec goes by; not looked at for the Sun and the nights
 */
export function skySign(spec: SkyMarkerSpec, starName: string, { t, compassPoint }: SkyTexts): string {
  const star = starName;
  switch (spec.kind) {
    case 'culmination':
      return t(`sign.culmination.${spec.twilight}`, { star, depth: spec.depthDeg });
    case 'star-altitude': {
      const values = { star, altitude: spec.altitudeDeg, ...hourValues(spec.at) };
      return t(`sign.star-altitude.${spec.side}.${spec.at.clock}`, values);
    }
    case 'due-meridian':
      return t(`sign.due-meridian.${spec.facing}`, { star, hour: hourText(spec.solarHour) });
    case 'about-pole':
      return t(`sign.about-pole.${spec.position}`, { star, hour: hourText(spec.solarHour) });
    case 'sun-season':
      return t(`sign.sun-season.${spec.season}`);
    case 'sun-azimuth':
      return spec.pointName === ''
        ? t(`sign.sun-azimuth.${spec.event}.plain`, {
            azimuth: spec.azimuthDeg,
            compass: t(`compass.${compassPoint(spec.azimuthDeg)}`),
          })
        : t(`sign.sun-azimuth.${spec.event}.named`, { point: spec.pointName });
    case 'noon-sun':
      return spec.ridgeName === ''
        ? t(`sign.noon-sun.${spec.passage}.plain`)
        : t(`sign.noon-sun.${spec.passage}.named`, { ridge: spec.ridgeName });
    case 'zenith-sun':
      return t('sign.zenith-sun');
    case 'moon-phase':
      return t(`sign.moon-phase.${spec.event}`);
    case 'moon-counted':
      return t(`sign.moon-counted.${spec.event}`, {
        star,
        number: spec.count,
        phenomenon: t(`phenomenon.${spec.phenomenon}`),
      });
    case 'venus-appearance':
      return t(`sign.venus-appearance.${spec.appearance}`);
    case 'dark-night':
      return t(`sign.dark-night.${spec.end}.${spec.depthDeg}`);
  }
}

function hourValues(at: SkyHour): { hour: string; count: number } {
  return at.clock === 'solar-hour'
    ? { hour: hourText(at.solarHour), count: 0 }
    : { hour: '', count: at.minutes };
}

/** `21:00`, `4:30`: the hour by the Sun is said as a clock says it. */
export function hourText(solarHour: number): string {
  const hours = Math.floor(solarHour);
  const minutes = Math.round((solarHour - hours) * 60);
  return `${hours}:${String(minutes).padStart(2, '0')}`;
}
