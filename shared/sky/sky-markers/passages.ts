/**
 * Finds the days on which a quantity that is looked at once a day passes through zero, and how long before and after
 * the eye could not tell it from zero. One way of finding serves every marker that is "reached" (a star at the
 * meridian, the Sun at a point of the skyline) or "passed" (noon Sun over a ridge, darkness of the nights).
 */

/** What is looked at on one day; null where the moment does not exist (no such twilight, no sunrise). */
export interface DailySample {
  jdUt: number;
  /** Radians from the goal. */
  valueRad: number;
}

export interface PassageRule {
  /** How far from zero the quantity still passes for reached, radians. */
  toleranceRad: number;
  /** The nearest day, or the day on which the value is not below zero. */
  expected: 'nearest' | 'not-below';
  /** Passages whose ranges meet: two that share the turning day between them, or a single slow one. */
  neighbours: 'apart' | 'together';
  /** Does coming within the tolerance without passing count? */
  touchCounts: boolean;
}

/** Indexes into the samples. */
export interface Passage {
  /** Which way the quantity passes; null where it only comes near. */
  goes: 'up' | 'down' | null;
  expected: number;
  /** Null where the samples break off before the range ends. */
  early: number | null;
  late: number | null;
  /** The quantity turns round inside the range: near a solstice, or a star that stands still at dusk. */
  turns: boolean;
}

/** No eye looks twice a day, so no range is shorter than a day to either side. */
const LEAST_DAYS = 1;
/** A jump that no slow quantity makes: the angle passed through its own seam. */
const SEAM_RAD = Math.PI;

type Samples = readonly (DailySample | null)[];

interface Range {
  goes: Passage['goes'];
  expected: number;
  early: number;
  late: number;
  turns: boolean;
}

/** @param samples one a day, without gaps in the counting of days */
export function passagesOf(samples: Samples, rule: PassageRule): Passage[] {
  const crossed = crossings(samples, rule);
  const touched = rule.touchCounts ? touches(samples, crossed, rule) : [];
  const ranges = [...crossed, ...touched].sort((left, right) => left.expected - right.expected);
  const told = rule.neighbours === 'together' ? together(ranges) : apart(samples, ranges);
  return told.map(({ goes, expected, early, late, turns }) => ({
    goes,
    expected,
    early: samples[early] ? early : null,
    late: samples[late] ? late : null,
    turns,
  }));
}

function crossings(samples: Samples, rule: PassageRule): Range[] {
  const found: Range[] = [];
  for (let index = 1; index < samples.length; index += 1) {
    const before = samples[index - 1]?.valueRad;
    const after = samples[index]?.valueRad;
    if (before === undefined || after === undefined) continue;
    if (before < 0 === after < 0 || Math.abs(after - before) > SEAM_RAD) continue;
    const isUp = after >= 0;
    const takesAfter = rule.expected === 'not-below' ? isUp : Math.abs(after) <= Math.abs(before);
    found.push(rangeAround(samples, takesAfter ? index : index - 1, isUp ? 'up' : 'down', rule));
  }
  return found;
}

/** Days to either side within the tolerance; a day without a sample ends the range and is its end. */
function rangeAround(samples: Samples, expected: number, goes: Passage['goes'], rule: PassageRule): Range {
  const reach = (step: 1 | -1): number => {
    let index = expected;
    for (;;) {
      const next = samples[index + step];
      if (!next) return index + step;
      const least = Math.abs(index + step - expected) <= LEAST_DAYS;
      if (!least && Math.abs(next.valueRad) > rule.toleranceRad) return index;
      index += step;
    }
  };
  return { goes, expected, early: reach(-1), late: reach(1), turns: false };
}

/** Spells within the tolerance in which nothing is passed: the quantity turns round just short of the goal. */
function touches(samples: Samples, crossed: readonly Range[], rule: PassageRule): Range[] {
  const isNear = (index: number): boolean =>
    Math.abs(samples[index]?.valueRad ?? Number.POSITIVE_INFINITY) <= rule.toleranceRad;
  const found: Range[] = [];
  for (let index = 1; index < samples.length; index += 1) {
    if (!isNear(index) || isNear(index - 1) || !samples[index - 1]) continue;
    let last = index;
    while (isNear(last + 1)) last += 1;
    if (!samples[last + 1]) continue;
    const isCrossed = crossed.some(({ expected }) => expected >= index - 1 && expected <= last + 1);
    if (!isCrossed)
      found.push({ ...rangeAround(samples, closest(samples, index, last), null, rule), turns: true });
    index = last;
  }
  return found;
}

function closest(samples: Samples, from: number, to: number): number {
  let best = from;
  for (let index = from; index <= to; index += 1) {
    if (sizeAt(samples, index) < sizeAt(samples, best)) best = index;
  }
  return best;
}

/** The day between two passages on which the quantity is furthest from the goal. */
function turningDay(samples: Samples, from: number, to: number): number {
  let best = from;
  for (let index = from; index <= to; index += 1) {
    if (sizeAt(samples, index) > sizeAt(samples, best)) best = index;
  }
  return best;
}

function sizeAt(samples: Samples, index: number): number {
  return Math.abs(samples[index]?.valueRad ?? 0);
}

function apart(samples: Samples, ranges: readonly Range[]): Range[] {
  const told = ranges.map((range) => ({ ...range }));
  for (let index = 1; index < told.length; index += 1) {
    const left = told[index - 1];
    const right = told[index];
    if (!left || !right || left.late < right.early) continue;
    const turning = turningDay(samples, left.expected, right.expected);
    left.late = Math.max(left.expected, Math.min(left.late, turning));
    right.early = Math.min(right.expected, Math.max(right.early, turning));
    left.turns = right.turns = true;
  }
  return told;
}

function together(ranges: readonly Range[]): Range[] {
  const groups: Range[][] = [];
  for (const range of ranges) {
    const group = groups.at(-1);
    const reached = Math.max(...(group ?? []).map(({ late }) => late));
    if (group && range.early <= reached) group.push(range);
    else groups.push([range]);
  }
  return groups.flatMap((group) => {
    const middle = group[Math.floor((group.length - 1) / 2)];
    if (!middle) return [];
    return [
      {
        goes: middle.goes,
        expected: middle.expected,
        early: Math.min(...group.map(({ early }) => early)),
        late: Math.max(...group.map(({ late }) => late)),
        turns: group.length > 1 || middle.turns,
      },
    ];
  });
}
