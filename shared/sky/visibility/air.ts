import type { Clarity } from '../vocabulary.js';
import { aerosolAirmass, gasAirmass, ozoneAirmass, wholeAirmass } from './airmass.js';
import { type ExtinctionParts, extinctionOf } from './extinction.js';

/** Air as the model of visibility needs it. */
export interface Air {
  /** Loss of light overhead, magnitudes per airmass, all kinds together. */
  magPerAirmass: number;
  /** Magnitudes that a star loses at a true altitude in degrees. */
  dimmingMag(altitudeDeg: number): number;
}

/** Air of one kind, known by its extinction alone [Rozenberg1966]. */
export function plainAir(magPerAirmass: number): Air {
  return { magPerAirmass, dimmingMag: (altitudeDeg) => magPerAirmass * wholeAirmass(altitudeDeg) };
}

/** Air in layers: haze lies lowest and weighs most near the horizon [Schaefer1993]. */
export function layeredAir({ gasMag, aerosolMag, ozoneMag, waterMag }: ExtinctionParts): Air {
  return {
    magPerAirmass: gasMag + aerosolMag + ozoneMag + waterMag,
    dimmingMag: (altitudeDeg) =>
      (gasMag + waterMag) * gasAirmass(altitudeDeg) +
      aerosolMag * aerosolAirmass(altitudeDeg) +
      ozoneMag * ozoneAirmass(altitudeDeg),
  };
}

/**
 * Extinction that the three words stand for at sea level. A step of 0.05 moves the needed difference between star and
 * Sun by about a degree, which is what the words add to every threshold.
 */
export const EXTINCTION_OF_CLARITY: Readonly<Record<Clarity, number>> = {
  clear: 0.2,
  ordinary: 0.25,
  hazy: 0.3,
};

/** With these and the share below, mean air at sea level comes to EXTINCTION_OF_CLARITY within 0.015. */
const HUMIDITY_PERCENT: Readonly<Record<Clarity, number>> = { clear: 20, ordinary: 50, hazy: 70 };
const OPEN_COUNTRY_AEROSOL_SHARE = 0.45;
/** Only the water term knows the temperature; ten degrees move the whole by 0.02. */
const TEMPERATURE_C = 15;

/** The air of a place in a month with what it may be on a clearer and on a hazier day, magnitudes per airmass. */
export interface AirSpan {
  clearerMag: number;
  usualMag: number;
  hazierMag: number;
}

/**
 * A day may be clearer or hazier than its month by half of what lies between the words clear and hazy at that place: little
 * on a high mountain, one word to either side at sea level.
 * @param month 1…12
 */
export function airSpanAtPlace(
  place: { latitudeDeg: number; elevationM: number },
  month: number,
  clarity: Clarity,
): AirSpan {
  const magOf = (word: Clarity): number => airAtPlace(place, month, word).magPerAirmass;
  const usualMag = magOf(clarity);
  const halfMag = (magOf('hazy') - magOf('clear')) / 2;
  return { clearerMag: usualMag - halfMag, usualMag, hazierMag: usualMag + halfMag };
}

/**
 * The air of a place in a month.
 * @param month 1…12
 */
export function airAtPlace(
  place: { latitudeDeg: number; elevationM: number },
  month: number,
  clarity: Clarity,
): Air {
  return layeredAir(
    extinctionOf({
      latitudeDeg: place.latitudeDeg,
      elevationM: place.elevationM,
      month,
      relativeHumidityPercent: HUMIDITY_PERCENT[clarity],
      temperatureC: TEMPERATURE_C,
      aerosolShare: OPEN_COUNTRY_AEROSOL_SHARE,
    }),
  );
}
