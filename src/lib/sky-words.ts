import { COMPASS_POINTS, type CompassPoint, type Phenomenon } from '#shared/sky/vocabulary.js';

/** Which end of the night a phenomenon belongs to: its dates say "morning of" or "evening of". */
export function endOfNight(phenomenon: Phenomenon): 'dawn' | 'dusk' {
  return phenomenon === 'heliacal-rising' || phenomenon === 'cosmical-setting' ? 'dawn' : 'dusk';
}

/** The nearest of sixteen compass points; azimuth from north through east. Words: `sky:compass.<point>`. */
export function compassPoint(azimuthDeg: number): CompassPoint {
  const turned = ((azimuthDeg % 360) + 360) % 360;
  return COMPASS_POINTS[Math.round(turned / 22.5) % 16] ?? 'n';
}
