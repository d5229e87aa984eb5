import { Body, Observer, SearchHourAngle, SearchAltitude } from 'astronomy-engine';
import { describe, expect, it } from 'vitest';
import { latitudeOf } from '#shared/sky/horizon/horizontal.js';
import { levelSkyline, prepareSkyline } from '#shared/sky/horizon/skyline.js';
import { prepareYear } from '#shared/sky/phenomena/prepared-year.js';
import {
  edgeClearanceRad,
  solarInstant,
  sunAtNoon,
  sunCrossing,
  sunriseSkyline,
} from '#shared/sky/phenomena/sun-day.js';

const DEG = Math.PI / 180;
const SECOND = 1 / 86_400;
const year = prepareYear(2027);
const groundAt = (latitudeDeg: number, longitudeDeg: number) => ({
  latitude: latitudeOf(latitudeDeg * DEG),
  longitudeRad: longitudeDeg * DEG,
  skyline: prepareSkyline([]),
});
/** 7 June 2027. */
const DAY = 2_461_564;
const dateOf = (jdUt: number) => new Date((jdUt - 2_440_587.5) * 86_400_000);

describe('the Sun on a solar day', () => {
  it.each([
    [0, 0],
    [52, 13],
    [-35, 150],
    [66, -150],
  ])('culminates when the ephemeris package says so, at %s° latitude', (latitudeDeg, longitudeDeg) => {
    const noon = sunAtNoon(year, groundAt(latitudeDeg, longitudeDeg), DAY);
    const from = dateOf(solarInstant(groundAt(latitudeDeg, longitudeDeg), DAY, 6));
    const observer = new Observer(latitudeDeg, longitudeDeg, 0);
    const theirs = SearchHourAngle(Body.Sun, observer, 0, from).time.ut + 2_451_545;
    expect(Math.abs(noon.jdUt - theirs)).toBeLessThan(20 * SECOND);
  });

  it('passes a depth below the horizon when the package says so, to a minute at middle latitudes', () => {
    const observer = new Observer(48, 16, 0);
    const theirs = SearchAltitude(
      Body.Sun,
      observer,
      -1,
      dateOf(solarInstant(groundAt(48, 16), DAY, 12)),
      1,
      -12,
    );
    const ours = sunCrossing(year, groundAt(48, 16), DAY, levelSkyline(-12 * DEG), 'setting');
    expect(Math.abs((ours?.jdUt ?? 0) - ((theirs?.ut ?? 0) + 2_451_545))).toBeLessThan(60 * SECOND);
  });

  it('neither rises nor sets in the polar day', () => {
    expect(sunCrossing(year, groundAt(72, 0), DAY, levelSkyline(0), 'rising')).toBeNull();
  });

  it('shows its edge on a skyline exactly when its centre crosses the lowered one', () => {
    const points = [
      { azimuthDeg: 0, altitudeDeg: 2 },
      { azimuthDeg: 90, altitudeDeg: 6 },
      { azimuthDeg: 200, altitudeDeg: 1 },
    ];
    const ground = { ...groundAt(48, 16), skyline: prepareSkyline(points) };
    const sun = sunCrossing(year, ground, DAY, sunriseSkyline(points), 'rising');
    // Between the points the lift is interpolated: a few hundredths of a degree.
    expect(sun && Math.abs(edgeClearanceRad(ground, sun))).toBeLessThan(0.05 * DEG);
  });
});
