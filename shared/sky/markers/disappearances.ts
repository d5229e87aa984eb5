import { highestTravelRad } from '../phenomena/ecliptic-zenith.js';
import { PHENOMENON_FACTS } from '../phenomena/phenomenon-facts.js';
import type { SkylineCrossing } from '../phenomena/skyline-crossing.js';
import { TAU, wrapTau } from '../units/angle.js';
import type { Phenomenon } from '../vocabulary.js';
import { type ExpectedCrossing, expectedInTurn } from './expected-crossing.js';
import type { MarkerAtPlace } from './place-year.js';

/**
 * The star's disappearances behind the Sun around the prepared year. Rising and setting arcs are paired by following
 * the ecliptic continuously from the star's rising to its setting; a difference modulo a year cannot tell a star that
 * hides for a month from one that is seen at dusk and at dawn for a month.
 */
export class Disappearances {
  readonly first: number;
  readonly last: number;
  private readonly settingOffsetRad: number;

  constructor(
    private readonly marker: MarkerAtPlace,
    private readonly crossings: { rising: SkylineCrossing; setting: SkylineCrossing },
  ) {
    const { rising, setting } = crossings;
    const { year, ground, window } = marker;
    const upRad = wrapTau(setting.siderealRad - rising.siderealRad);
    const setsAtRad = rising.siderealRad + upRad;
    // The evening end of a setting arc lies before the Sun's next highest point, hence one turn less.
    this.settingOffsetRad = highestTravelRad(year, ground.latitude, rising.siderealRad, setsAtRad) - TAU;
    this.first = Math.floor((window.fromRad - rising.highestRad) / TAU) - 1;
    this.last = Math.floor((window.toRad - rising.highestRad) / TAU) + 1;
  }

  /**
   * One of the four phenomena around a disappearance: the settings that end with it, the risings that begin after it.
   * @param index from `first` to `last`
   */
  expected(index: number, phenomenon: Phenomenon): ExpectedCrossing {
    const facts = PHENOMENON_FACTS[phenomenon];
    const risingHighestRad = this.crossings.rising.highestRad + index * TAU;
    return facts.crossing === 'rising'
      ? expectedInTurn(this.marker, this.crossings.rising, facts, risingHighestRad)
      : expectedInTurn(this.marker, this.crossings.setting, facts, risingHighestRad + this.settingOffsetRad);
  }
}
