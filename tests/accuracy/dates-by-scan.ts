import {
  type DepthAtCrossingCase,
  depthAtCrossingYear,
  type Phenomenon,
  PHENOMENA,
  STARS,
} from '#shared/sky/index.js';
import { civilYearOf } from '#shared/sky/time/civil-year.js';
import { randomFrom } from '#tests/support/seeded-random.js';
import { jsonFixture } from '#tests/support/sky/fixtures.js';
import { scanYear } from '#tests/support/sky/oracle-scan.js';

/** Dates against scans over every crossing of the year: the engine's day minus the scan's. */

type Days = Readonly<Record<Phenomenon, readonly number[]>>;

/** Pairs of the same phenomenon; where only one side has a date in the year, the other's lies just outside it. */
function differences(engine: Days | null | undefined, scan: Days | undefined): number[] {
  return PHENOMENA.flatMap((phenomenon) => {
    const [ours, theirs] = [engine?.[phenomenon] ?? [], scan?.[phenomenon] ?? []];
    return ours.length === theirs.length ? ours.map((day, index) => day - (theirs[index] ?? NaN)) : [];
  });
}

/** The cases of an independent scan with ERFA's stars and PyEphem's Sun. */
export function independentScanDays(): number[] {
  const { cases } = jsonFixture('reference-dates.json') as {
    cases: (DepthAtCrossingCase & { dayNumbers?: Days })[];
  };
  return cases.flatMap(({ dayNumbers, ...question }) =>
    differences(depthAtCrossingYear(question).dayNumbers, dayNumbers),
  );
}

const OWN_CASES = 80;
const SEED = 20_270_101;

/** Random stars, places, years, thresholds and level hills against the tests' own plain scan. */
export function ownScanDays(): number[] {
  const random = randomFrom(SEED);
  const between = (min: number, max: number): number => min + Math.floor(random() * (max - min + 1));
  return Array.from({ length: OWN_CASES }, () => {
    const star = STARS[between(0, STARS.length - 1)];
    const question: DepthAtCrossingCase = {
      hr: star?.hr ?? 0,
      latitudeDeg: between(-65, 65),
      longitudeDeg: between(-180, 180),
      year: between(-3000, 3000),
      skylineDeg: between(0, 9),
      thresholdsDeg: { sameSide: between(8, 17), oppositeSide: between(6, 12) },
    };
    const scan = scanYear({
      hr: question.hr,
      latitudeDeg: question.latitudeDeg,
      longitudeDeg: question.longitudeDeg,
      year: civilYearOf(question.year),
      skyline: [{ azimuthDeg: 0, altitudeDeg: question.skylineDeg }],
      neededDeg: (side) => question.thresholdsDeg[side === 'same' ? 'sameSide' : 'oppositeSide'],
    });
    return differences(depthAtCrossingYear(question).dayNumbers, scan.days);
  }).flat();
}
