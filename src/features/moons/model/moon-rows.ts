import type { MoonRow, MoonRule, MoonTable } from '#shared/contracts/moons.js';

/** A Moon as a row of holes, from its new Moon to the day before the next one. */
export interface MoonPictureRow {
  moon: MoonRow;
  first: number;
  last: number;
  /** Day numbers within the row; null where they fall outside or do not exist. */
  crescentDay: number | null;
  fullDay: number;
  /** Where the month begins, if it begins in this row. */
  beginsDay: number | null;
  /** The sign from which months are counted, if its day falls in this row. */
  sign: { early: number | null; expected: number; late: number | null } | null;
  /** The local year that begins here; of the first row, the one that runs. */
  opensYear: number | null;
}

/** The last row has no next new Moon in the table: a Moon lasts thirty days at most. */
const LONGEST_MOON_DAYS = 30;

export function moonRowsOf({ moons, rule }: Pick<MoonTable, 'moons' | 'rule'>): MoonPictureRow[] {
  return moons.map((moon, index) => {
    const first = moon.newMoon.dayNumber;
    const last = (moons[index + 1]?.newMoon.dayNumber ?? first + LONGEST_MOON_DAYS) - 1;
    const inside = (day: number | undefined): number | null =>
      day !== undefined && day >= first && day <= last ? day : null;
    const opens = moon.month !== null && (index === 0 || (moon.month.number === 1 && !moon.month.thirteenth));
    return {
      moon,
      first,
      last,
      crescentDay: inside(moon.firstCrescent.expected?.dayNumber),
      fullDay: moon.fullMoon.dayNumber,
      beginsDay: inside(moon.month?.begins.dayNumber),
      sign: signWithin(rule, first, last),
      opensYear: opens ? (moon.month?.localYear ?? null) : null,
    };
  });
}

function signWithin(rule: MoonRule | null, first: number, last: number): MoonPictureRow['sign'] {
  const sign = rule?.signs.find(({ expected }) => expected.dayNumber >= first && expected.dayNumber <= last);
  if (!sign) return null;
  return {
    early: sign.early && sign.early.dayNumber,
    expected: sign.expected.dayNumber,
    late: sign.late && sign.late.dayNumber,
  };
}

/** What the numbering makes of the year. */
export interface MonthCount {
  /** Local years of which the table holds the month that was put in, with its Moon. */
  thirteenth: MoonRow | null;
  /** The local year that has most of its months in the table. */
  localYear: number | null;
  /** The sign is so near the turn of a Moon that people's eyes decide. */
  nearEdgeYear: number | null;
  /** In some month the new Moon had to stand in for the crescent. */
  crescentMissing: boolean;
}

export function monthCountOf({ moons, rule }: Pick<MoonTable, 'moons' | 'rule'>): MonthCount {
  const months = moons.flatMap(({ month }) => month ?? []);
  const counts = new Map<number, number>();
  for (const { localYear } of months) counts.set(localYear, (counts.get(localYear) ?? 0) + 1);
  const [most] = [...counts].sort((left, right) => right[1] - left[1]);
  const nearEdge = months.find(({ signNearEdge }) => signNearEdge);
  return {
    thirteenth: moons.find(({ month }) => month?.thirteenth === true) ?? null,
    localYear: most?.[0] ?? null,
    nearEdgeYear: nearEdge?.localYear ?? null,
    crescentMissing: rule !== null && months.some(({ beginsBy }) => beginsBy !== rule.begins),
  };
}

/** The first Moon whose crescent is still to come. */
export function nextCrescent(moons: readonly MoonRow[], today: number): MoonRow | null {
  const last = ({ firstCrescent: { late, expected } }: MoonRow): number =>
    (late ?? expected)?.dayNumber ?? Number.NEGATIVE_INFINITY;
  return moons.find((moon) => last(moon) >= today) ?? null;
}
