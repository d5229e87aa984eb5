import { horizontalOf } from '../horizon/horizontal.js';
import { type MarkerAtPlace, markerAtPlace } from '../markers/place-year.js';
import { type ResolvedMarker, resolveMarker } from '../markers/marker-key.js';
import { neededUpThere } from '../markers/night-crossings.js';
import { sunPlaceAt } from '../phenomena/sun-place.js';
import { localSiderealRad } from '../time/sidereal-clock.js';
import type { Figure } from '../types.js';
import { DEG_PER_RAD, RAD_PER_DEG, wrapPi } from '../units/angle.js';
import { SkyRangeError } from '../units/sky-range-error.js';
import {
  dated,
  isInYear,
  occurrenceOf,
  type SkyMarkerFindings,
  type SkyMarkerPlace,
  undated,
} from './kind.js';
import { type DailySample, type Passage, passagesOf } from './passages.js';
import type { SkyMarkerReason } from './words.js';

/** How well the unaided eye judges "due south", "upright" or a height in hand-widths [C: 2° to 3°]. */
export const EYE_DEG = 2.5;
/** Near the pole a star's circle is so small that the eye cannot tell: wider than this no range grows. */
const WIDEST_HOUR_ANGLE_DEG = 15;

/** The star, figure or patch of sky of a spec; throws a SkyRangeError that names the field where there is none. */
export function knownMarker(markerKey: string, field: string, figures: readonly Figure[]): ResolvedMarker {
  const marker = resolveMarker(markerKey, figures);
  if (!marker) {
    throw new SkyRangeError(field, 'Give hr and a number of the star table, or the key of a figure.');
  }
  return marker;
}

/** A star looked at at set moments through the nights of a year. */
export class StarLook {
  readonly marker: MarkerAtPlace;
  private readonly star;

  constructor(
    private readonly place: SkyMarkerPlace,
    markerKey: string,
  ) {
    this.marker = markerAtPlace(place, knownMarker(markerKey, 'spec.markerKey', place.figures));
    this.star = place.year.stars.placeOf(this.marker.marker.starRef);
  }

  /** True where the star's highest point lies south of the zenith. */
  get culminatesInSouth(): boolean {
    return this.star.sinDeclination < this.place.ground.latitude.sin;
  }

  /** Hour angle by which the eye may miss a star's direction: a distance in the sky, so more for stars near the pole. */
  get eyeHourAngleDeg(): number {
    return Math.min(WIDEST_HOUR_ANGLE_DEG, EYE_DEG / Math.max(1e-6, this.star.cosDeclination));
  }

  hourAngleRad(jdUt: number): number {
    const { year, ground } = this.place;
    return wrapPi(localSiderealRad(year.sidereal, jdUt, ground.longitudeRad) - this.star.rightAscensionRad);
  }

  /** Altitude and azimuth without refraction, radians. */
  standingAt(jdUt: number) {
    const { sinDeclination, cosDeclination } = this.star;
    return horizontalOf(this.place.ground.latitude, sinDeclination, cosDeclination, this.hourAngleRad(jdUt));
  }

  /** Why the star cannot be seen at an instant, or null: behind the skyline, or the sky too light for its height. */
  hiddenBecause(jdUt: number): SkyMarkerReason | null {
    const { ground, clock, year } = this.place;
    const { altitudeRad, azimuthRad } = this.standingAt(jdUt);
    if (altitudeRad <= ground.skyline.altitudeRad(azimuthRad)) return 'star-below-skyline';
    const sinDepth = -Math.sin(sunPlaceAt(year, ground, jdUt).altitudeRad);
    return sinDepth < neededUpThere(this.marker, altitudeRad, clock.nightOf(jdUt)) ? 'too-light' : null;
  }

  /** The findings of passages that are looked at; those that fall on a hidden moment do not count. */
  findings(
    samples: readonly (DailySample | null)[],
    toleranceDeg: number,
    counts: (passage: Passage, jdUt: number) => boolean = () => true,
  ): SkyMarkerFindings {
    const { place } = this;
    const passages = passagesOf(samples, {
      toleranceRad: toleranceDeg * RAD_PER_DEG,
      expected: 'nearest',
      neighbours: 'together',
      touchCounts: true,
    });
    const found = [];
    let hidden: SkyMarkerReason | null = null;
    for (const passage of passages) {
      const jdUt = samples[passage.expected]?.jdUt;
      if (jdUt === undefined || !counts(passage, jdUt)) continue;
      const because = this.hiddenBecause(jdUt);
      if (because !== null) hidden ??= because;
      else found.push({ passage, jdUt });
    }
    // A passage that another year shows exists here; one that is hidden is hidden every year.
    if (found.length === 0) {
      const isCut = samples.some((sample) => sample === null);
      return undated(hidden ?? (isCut ? 'too-light' : 'not-in-this-year'), toleranceDeg);
    }
    return dated(
      found
        .filter(({ jdUt }) => isInYear(place, jdUt))
        .flatMap(({ passage }) =>
          occurrenceOf(place, samples, passage, (jdUt) => {
            const { altitudeRad, azimuthRad } = this.standingAt(jdUt);
            return { azimuthDeg: azimuthRad * DEG_PER_RAD, altitudeDeg: altitudeRad * DEG_PER_RAD };
          }),
        ),
      toleranceDeg,
    );
  }
}
