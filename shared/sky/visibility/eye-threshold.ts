/**
 * Faintest star that an unaided eye finds before a bright ground [Hecht1947; Knoll1946, as joined in Schaefer1993]:
 * one law for eyes used to the dark, one for brighter skies; the two meet within 7 % at the change.
 */
const CHANGE_NL = 1500;
const DARK_EYE = { candleFeet: 10 ** -9.8, perNl: 10 ** -1.9 };
const BRIGHT_EYE = { candleFeet: 10 ** -8.35, perNl: 10 ** -5.9 };
const FOOT_CANDLE_ZERO_MAG = -16.57;

/**
 * @param brightnessNl of the sky behind the star, nanolamberts, 0 or more
 * @param acuity sharpness of the eye, 1 for 20/20
 * @returns visual magnitude at the eye, extinction not taken off
 */
export function faintestMag(brightnessNl: number, acuity = 1): number {
  const law = brightnessNl < CHANGE_NL ? DARK_EYE : BRIGHT_EYE;
  const candleFeet = law.candleFeet * (1 + Math.sqrt(law.perNl * brightnessNl)) ** 2;
  return FOOT_CANDLE_ZERO_MAG - 2.5 * Math.log10(candleFeet) + 5 * Math.log10(acuity);
}
