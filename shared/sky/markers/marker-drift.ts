import { type PreparedYear, prepareYear } from '../phenomena/prepared-year.js';
import type {
  DriftDay,
  DriftEpoch,
  DriftTurn,
  MarkerDrift,
  Occurrence,
  Site,
  VisibilitySettings,
} from '../types.js';
import { DEG_PER_RAD, wrapTau } from '../units/angle.js';
import { FIRST_YEAR, LAST_YEAR, PHENOMENA, type Phenomenon } from '../vocabulary.js';
import type { ResolvedMarker } from './marker-key.js';
import { basisOf } from './marker-year.js';
import { phenomenonInYear } from './phenomenon-in-year.js';
import { markerAtPlace, placeYearOf } from './place-year.js';

/**
 * A marker across the centuries. Each epoch is solved by itself: the few instants of its four phenomena with their
 * ranges, no nights, no strip; the Sun's table of a year is only filled where those instants lie.
 */

/** Mean length of the Gregorian year in days. */
const GREGORIAN_YEAR_DAYS = 365.2425;
const YEARS_PER_CENTURY = 100;

export class DriftSolver {
  constructor(
    private readonly marker: ResolvedMarker,
    private readonly site: Site,
    private readonly settings: VisibilitySettings,
  ) {}

  /** The years in the order in which they are given; turns are sought between neighbours. */
  solve(years: readonly number[]): MarkerDrift {
    const epochs = years.map((year) => this.epoch(year));
    const [first = FIRST_YEAR] = years;
    const placeYear = placeYearOf(prepareYear(first), this.site, this.settings);
    return {
      markerKey: this.marker.key,
      epochs,
      daysPerCentury: forEachPhenomenon((phenomenon) => daysPerCenturyOf(epochs, phenomenon)),
      turns: PHENOMENA.flatMap((phenomenon) => this.turns(epochs, phenomenon)),
      basis: basisOf(markerAtPlace(placeYear, this.marker)),
    };
  }

  private epoch(year: number): DriftEpoch {
    const prepared = prepareYear(year);
    const marker = markerAtPlace(placeYearOf(prepared, this.site, this.settings), this.marker);
    return {
      year,
      outcome: marker.star.outcome,
      outcomeDetail: marker.star.detail,
      phenomena: forEachPhenomenon((phenomenon) => {
        const { outcome, occurrences } = phenomenonInYear(marker, phenomenon);
        return { outcome, occurrences: occurrences.map((each) => driftDay(prepared, each)) };
      }),
    };
  }

  private turns(epochs: readonly DriftEpoch[], phenomenon: Phenomenon): DriftTurn[] {
    const turns: DriftTurn[] = [];
    for (let index = 1; index < epochs.length; index += 1) {
      const [before, after] = [epochs[index - 1], epochs[index]];
      if (!before || !after) continue;
      const wasThere = this.exists(before, phenomenon);
      if (wasThere !== this.exists(after, phenomenon)) {
        turns.push(this.turnBetween(phenomenon, wasThere, before, after));
      }
    }
    return turns;
  }

  /** The year in which the state changes, by halving. */
  private turnBetween(
    phenomenon: Phenomenon,
    wasThere: boolean,
    before: DriftEpoch,
    after: DriftEpoch,
  ): DriftTurn {
    let [from, to] = [before, after];
    while (to.year - from.year > 1) {
      const middle = this.epoch(Math.floor((from.year + to.year) / 2));
      if (this.exists(middle, phenomenon) === wasThere) from = middle;
      else to = middle;
    }
    const without = wasThere ? to : from;
    return {
      phenomenon,
      change: wasThere ? 'ceases' : 'begins',
      year: to.year,
      outcome: without.outcome,
      outcomeDetail: without.outcomeDetail,
    };
  }

  /**
   * A civil year without an occurrence is no end: the day has slipped over New Year. The neighbouring year then tells.
   */
  private exists(epoch: DriftEpoch, phenomenon: Phenomenon): boolean {
    if (epoch.outcome !== 'rises-and-sets') return false;
    const { outcome } = epoch.phenomena[phenomenon];
    if (outcome !== 'none-in-this-year') return outcome === 'dated';
    const neighbour = this.epoch(epoch.year < LAST_YEAR ? epoch.year + 1 : epoch.year - 1);
    return neighbour.phenomena[phenomenon].outcome === 'dated';
  }
}

function driftDay(prepared: PreparedYear, occurrence: Occurrence): DriftDay {
  const longitudeRad = prepared.sun.longitudeRad(occurrence.expected.jdUt);
  return { ...occurrence, sunLongitudeDeg: wrapTau(longitudeRad) * DEG_PER_RAD };
}

/** Mean pace between the first and the last dated epoch, later in the Gregorian year counted positive. */
function daysPerCenturyOf(epochs: readonly DriftEpoch[], phenomenon: Phenomenon): number | null {
  let start: { jdUt: number; year: number } | null = null;
  let last = { jdUt: 0, year: 0 };
  let movedDays = 0;
  for (const { year, phenomena } of epochs) {
    const jdUt = phenomena[phenomenon].occurrences[0]?.expected.jdUt;
    if (jdUt === undefined) continue;
    if (start === null) start = { jdUt, year };
    else movedDays += gregorianShiftDays(last.jdUt, jdUt);
    last = { jdUt, year };
  }
  if (start === null || last.year === start.year) return null;
  return (movedDays * YEARS_PER_CENTURY) / (last.year - start.year);
}

/**
 * How many days later in the Gregorian year the second instant falls, −183 to 183.
 * @param fromJdUt Julian Day (UT)
 * @param toJdUt Julian Day (UT), any number of years away
 */
export function gregorianShiftDays(fromJdUt: number, toJdUt: number): number {
  const apart = toJdUt - fromJdUt;
  return apart - Math.round(apart / GREGORIAN_YEAR_DAYS) * GREGORIAN_YEAR_DAYS;
}

function forEachPhenomenon<T>(make: (phenomenon: Phenomenon) => T): Record<Phenomenon, T> {
  return {
    'heliacal-rising': make('heliacal-rising'),
    'cosmical-setting': make('cosmical-setting'),
    'acronychal-rising': make('acronychal-rising'),
    'heliacal-setting': make('heliacal-setting'),
  };
}
