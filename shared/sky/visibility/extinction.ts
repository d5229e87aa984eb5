import { RAD_PER_DEG } from '../units/angle.js';

/** What the air of a place and month is made of, for the eye's colours (V band). */
export interface AirState {
  /** −90…90°, north positive. */
  latitudeDeg: number;
  /** −500…9000 m. */
  elevationM: number;
  /** 1…12. */
  month: number;
  /** 0…99 %. */
  relativeHumidityPercent: number;
  temperatureC: number;
  /** Haze as a share of the published term, which was measured among towns. */
  aerosolShare: number;
}

/** Loss of light overhead by kind, magnitudes per airmass. */
export interface ExtinctionParts {
  gasMag: number;
  aerosolMag: number;
  ozoneMag: number;
  waterMag: number;
}

const GAS_SCALE_HEIGHT_M = 8200;
const AEROSOL_SCALE_HEIGHT_M = 1500;
const GAS_AT_SEA_LEVEL_MAG = 0.1066;
const AEROSOL_AT_SEA_LEVEL_MAG = 0.1;
const OZONE_MAG = 0.031;
const WATER_MAG = 0.031 * 0.94;
/** The humidity term has its pole at saturation. */
const MOST_HUMID_PERCENT = 99;

/**
 * Extinction from elevation, latitude, season and humidity [Schaefer1993; the aerosol term with 0.1 as restated in
 * Schaefer2000].
 */
export function extinctionOf(air: AirState): ExtinctionParts {
  const { latitudeDeg, elevationM, month, temperatureC, aerosolShare } = air;
  const latitudeRad = latitudeDeg * RAD_PER_DEG;
  const humidity = Math.min(MOST_HUMID_PERCENT, Math.max(1, air.relativeHumidityPercent)) / 100;
  // The Sun's right ascension to the month is near enough for the seasons of air.
  const sunRad = (month - 3) * 30 * RAD_PER_DEG;
  const swelling = (1 - 0.32 / Math.log(humidity)) ** 1.33;
  const season = 1 + 0.33 * Math.sign(latitudeDeg) * Math.sin(sunRad);
  const overGas = Math.exp(-elevationM / GAS_SCALE_HEIGHT_M);
  return {
    gasMag: GAS_AT_SEA_LEVEL_MAG * overGas,
    aerosolMag:
      aerosolShare *
      AEROSOL_AT_SEA_LEVEL_MAG *
      Math.exp(-elevationM / AEROSOL_SCALE_HEIGHT_M) *
      swelling *
      season,
    ozoneMag: (OZONE_MAG * (3 + 0.4 * (latitudeRad * Math.cos(sunRad) - Math.cos(3 * latitudeRad)))) / 3,
    waterMag: WATER_MAG * humidity * Math.exp(temperatureC / 15) * overGas,
  };
}
