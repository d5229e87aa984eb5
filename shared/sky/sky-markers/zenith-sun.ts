import { sunAtNoon } from '../phenomena/sun-day.js';
import { DEG_PER_RAD, RAD_PER_DEG } from '../units/angle.js';
import { dated, occurrenceOf, type SkyMarkerKindRules, solarDaysOf, undated } from './kind.js';
import { passagesOf } from './passages.js';

/** A shaft or a plumb line tells the overhead Sun to a tenth of a degree: a day, and five near the tropics [C]. */
const SHAFT_DEG = 0.1;

/** The Sun overhead at noon: its declination equals the latitude, |φ| ≤ ε [Šprajc2018]. Two passages a year. */
export const zenithSun: SkyMarkerKindRules<'zenith-sun'> = {
  sourceKey: 'Šprajc2018',
  rangeReason: 'shaft',
  // Nothing but the kind itself stands in the spec.
  check: () => undefined,
  compute(_, place) {
    const { ground, year } = place;
    const latitudeRad = Math.asin(ground.latitude.sin);
    const suns = solarDaysOf(place).map((day) => sunAtNoon(year, ground, day));
    const samples = suns.map(({ jdUt, sinDeclination }) => ({
      jdUt,
      valueRad: Math.asin(sinDeclination) - latitudeRad,
    }));
    const passages = passagesOf(samples, {
      toleranceRad: SHAFT_DEG * RAD_PER_DEG,
      expected: 'nearest',
      neighbours: 'apart',
      touchCounts: true,
    });
    if (passages.length === 0) return undated('sun-never-overhead', SHAFT_DEG);
    return dated(
      passages.flatMap((passage) =>
        occurrenceOf(place, samples, passage, () => ({
          azimuthDeg: null,
          altitudeDeg: (suns[passage.expected]?.altitudeRad ?? 0) * DEG_PER_RAD,
        })),
      ),
      SHAFT_DEG,
    );
  },
};
