import { sunCrossing, sunriseSkyline } from '../phenomena/sun-day.js';
import { DEG_PER_RAD, RAD_PER_DEG, wrapPi } from '../units/angle.js';
import { dated, occurrenceOf, type SkyMarkerKindRules, solarDaysOf, undated } from './kind.js';
import { passagesOf } from './passages.js';
import { checkName, checkNumber, checkWord } from './spec-checks.js';
import { POINT_NAME_MAX, SUN_EVENTS } from './words.js';

/** The Sun's own width: by as much the air near the horizon and the place of one's feet move it. */
const SUN_WIDTH_DEG = 0.5;

/**
 * The Sun's upper edge over a point of the place's own skyline: cos A = (sin δ − sin φ sin h)/(cos φ cos h), h the
 * skyline's altitude less refraction and radius [Bennett1982]. Two passages a year; near a solstice they run together.
 */
export const sunAzimuth: SkyMarkerKindRules<'sun-azimuth'> = {
  sourceKey: 'Bennett1982',
  rangeReason: 'sun-width',
  check(spec, field) {
    checkWord(`${field}.event`, spec.event, SUN_EVENTS);
    checkNumber(`${field}.azimuthDeg`, spec.azimuthDeg, 0, 360, 'degrees from north through east');
    checkName(`${field}.pointName`, spec.pointName, POINT_NAME_MAX);
  },
  compute(spec, place) {
    const skyline = sunriseSkyline(place.site.skyline);
    const which = spec.event === 'sunrise' ? 'rising' : 'setting';
    const goalRad = spec.azimuthDeg * RAD_PER_DEG;
    const suns = solarDaysOf(place).map((day) => sunCrossing(place.year, place.ground, day, skyline, which));
    const samples = suns.map((sun) => sun && { jdUt: sun.jdUt, valueRad: wrapPi(sun.azimuthRad - goalRad) });
    const passages = passagesOf(samples, {
      toleranceRad: SUN_WIDTH_DEG * RAD_PER_DEG,
      expected: 'nearest',
      neighbours: 'apart',
      touchCounts: true,
    });
    if (passages.length === 0) return undated('azimuth-not-reached', SUN_WIDTH_DEG);
    return dated(
      passages.flatMap((passage) => {
        const sun = suns[passage.expected];
        const degrees = (rad: number | undefined) => (rad === undefined ? null : rad * DEG_PER_RAD);
        return occurrenceOf(place, samples, passage, () => ({
          azimuthDeg: degrees(sun?.azimuthRad),
          altitudeDeg: degrees(sun?.altitudeRad),
        }));
      }),
      SUN_WIDTH_DEG,
    );
  },
};
