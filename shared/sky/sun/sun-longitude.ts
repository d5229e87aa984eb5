import { AstroTime, SunPosition } from 'astronomy-engine';

import { JD_J2000 } from '../time/julian-day.js';
import { RAD_PER_DEG, wrapTau } from '../units/angle.js';

const DAYS_PER_MILLENNIUM = 365_250;

/**
 * Terms of the Earth's longitude that grow with the cube of time and that astronomy-engine's shortened series leaves
 * out: amplitude (rad), phase (rad), speed (rad per Julian millennium) [BretagnonFrancou1988; Meeus1998 app. III].
 * They reach 0.02° at −3000 and are nothing in the present centuries.
 */
const CUBIC_TERMS = [
  [289e-8, 5.844, 6283.076],
  [17e-8, 5.49, 12_566.15],
] as const;

/**
 * The Sun's apparent ecliptic longitude: true equinox of date, light time and aberration included, radians in [0, 2π).
 * Against PyEphem's full VSOP87 (tests/reference/against-ephem.test.ts): 0.001° from 1066 to 3000, 0.02° at −3000,
 * where the two follow different precessions. The Sun's latitude, under 0.0003°, is taken as zero everywhere.
 * @param jdUt Julian Day (UT), years −3000 to 3000
 */
export function sunLongitudeRad(jdUt: number): number {
  const time = new AstroTime(jdUt - JD_J2000);
  const millennia = time.tt / DAYS_PER_MILLENNIUM;
  let left = 0;
  for (const [amplitude, phase, speed] of CUBIC_TERMS)
    left += amplitude * Math.cos(phase + speed * millennia);
  return wrapTau(SunPosition(time).elon * RAD_PER_DEG + left * millennia ** 3);
}
