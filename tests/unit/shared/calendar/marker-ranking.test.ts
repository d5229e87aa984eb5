import { describe, expect, it } from 'vitest';

import type { MarkerCandidate } from '#shared/calendar/marker-candidates.js';
import {
  daysAwayOf,
  easeOf,
  nearestServing,
  nearnessOf,
  rankMarkers,
  type WantedDays,
} from '#shared/calendar/marker-ranking.js';
import { computeMarkerYear, type Crossing, type Occurrence, type Phenomenon } from '#shared/sky/index.js';
import { settingsWith, siteAt } from '#tests/support/sky/builders.js';

const sirius = computeMarkerYear('hr2491', siteAt(30), settingsWith(), 2027);
const model = firstMorning();

function firstMorning(): Occurrence {
  const [first] = sirius.phenomena['heliacal-rising'].occurrences;
  if (!first) throw new Error('Sirius has a first morning at 30° N');
  return first;
}

const DAY = 2_461_600;
const onTheDay: WantedDays = { from: DAY, to: DAY };
const at = (dayNumber: number, starAltitudeDeg = 0): Crossing => ({
  ...model.expected,
  dayNumber,
  starAltitudeDeg,
});

interface Wish {
  day?: number;
  range?: number | null;
  vMag?: number;
  isFigure?: boolean;
  altitudeDeg?: number;
  phenomenon?: Phenomenon;
  notes?: MarkerCandidate['notes'];
}

function candidate(markerKey: string, wish: Wish = {}): MarkerCandidate {
  const { day = DAY, range = 6, vMag = 1, isFigure = false, altitudeDeg = 0, notes = [] } = wish;
  const half = Math.floor((range ?? 0) / 2);
  return {
    markerKey,
    phenomenon: wish.phenomenon ?? 'heliacal-rising',
    vMag,
    isFigure,
    notes,
    occurrenceNumber: 1,
    occurrence: {
      ...model,
      expected: at(day, altitudeDeg),
      early: range === null ? null : at(day - half),
      late: at(day - half + (range ?? 0)),
    },
  };
}

const order = (candidates: MarkerCandidate[], wanted = onTheDay) =>
  rankMarkers(candidates, wanted).map(({ markerKey }) => markerKey);

describe('days away', () => {
  it('count from the nearer end of the wanted days, and are 0 within them', () => {
    const wanted = { from: 100, to: 110 };
    expect([95, 100, 105, 110, 112].map((day) => daysAwayOf(day, wanted))).toEqual([-5, 0, 0, 0, 2]);
  });

  it('fall into steps that are no finer than a sighting scatters', () => {
    expect([0, -2, 3, -5, 10, 20, 21].map(nearnessOf)).toEqual([
      'on-the-day',
      'on-the-day',
      'close',
      'close',
      'near',
      'far',
      null,
    ]);
  });
});

describe('the order of markers', () => {
  it('puts the nearer step first, whatever the range and the brightness', () => {
    expect(
      order([
        candidate('bright-and-sharp', { day: DAY + 3, vMag: -1.4, range: 3 }),
        candidate('dim-and-wide', { day: DAY - 2, vMag: 2.4, range: 20 }),
      ]),
    ).toEqual(['dim-and-wide', 'bright-and-sharp']);
  });

  it('puts the narrower range first within a step', () => {
    expect(
      order([
        candidate('two-weeks', { range: 14, vMag: 0 }),
        candidate('one-week', { day: DAY + 2, range: 7, vMag: 2 }),
      ]),
    ).toEqual(['one-week', 'two-weeks']);
  });

  it('puts what is easier to see first within a step of range', () => {
    expect(
      order([
        candidate('faint', { vMag: 3.5 }),
        candidate('middling', { vMag: 2.2 }),
        candidate('very-bright', { day: DAY + 1, vMag: 0.1 }),
      ]),
    ).toEqual(['very-bright', 'middling', 'faint']);
    expect(easeOf({ vMag: 2.9, isFigure: true })).toBe('middling');
    expect(easeOf({ vMag: 2.9, isFigure: false })).toBe('hard');
  });

  it('puts a return or a last sight before a last rising or a first setting of the same sharpness', () => {
    expect(
      order([
        candidate('last-rising', { phenomenon: 'acronychal-rising', vMag: 0 }),
        candidate('first-setting', { phenomenon: 'cosmical-setting', vMag: 0 }),
        candidate('last-sight', { phenomenon: 'heliacal-setting', vMag: 2 }),
        candidate('return', { vMag: 1 }),
      ]),
    ).toEqual(['return', 'last-sight', 'first-setting', 'last-rising']);
  });

  it('puts the star that clears a hill before the one that must be caught low', () => {
    expect(order([candidate('low'), candidate('high', { altitudeDeg: 6 })])).toEqual(['high', 'low']);
  });

  it('puts behind all others what a calendar cannot lean on, and says why', () => {
    const ranked = rankMarkers(
      [
        candidate('always-there', { vMag: -1, notes: ['never-disappears'] }),
        candidate('light-nights', { vMag: 0, notes: ['lost-in-light-nights'] }),
        candidate('months-wide', { vMag: 0, range: 40, notes: ['weak-marker'] }),
        candidate('open', { vMag: 0, range: null }),
        candidate('far-but-good', { day: DAY + 19, vMag: 3 }),
      ],
      onTheDay,
    );
    expect(ranked[0]).toMatchObject({ markerKey: 'far-but-good', caution: null });
    expect(Object.fromEntries(ranked.slice(1).map((each) => [each.markerKey, each.caution]))).toEqual({
      'always-there': 'never-disappears',
      'light-nights': 'lost-in-light-nights',
      'months-wide': 'weak-marker',
      open: 'open-range',
    });
  });

  it('lets a star that is never hidden serve by its last rising and first setting, which are seen all the same', () => {
    const [ranked] = rankMarkers(
      [candidate('arcturus', { phenomenon: 'acronychal-rising', notes: ['never-disappears'] })],
      onTheDay,
    );
    expect(ranked?.caution).toBeNull();
  });

  it('leaves out what lies more than twenty days away', () => {
    expect(order([candidate('away', { day: DAY - 21 }), candidate('there', { day: DAY - 20 })])).toEqual([
      'there',
    ]);
  });

  it('does not depend on the order in which markers come in', () => {
    const all = [0, 1, 2, 3, 4].flatMap((day) =>
      [0, 2, 3.2].map((vMag) => candidate(`d${day}-${vMag}`, { day: DAY + day, vMag })),
    );
    expect(order([...all].reverse())).toEqual(order(all));
  });
});

describe('the nearest season with a marker', () => {
  it('is the nearest easy one without a caution on either side', () => {
    const { before, after } = nearestServing(
      [
        candidate('faint-near', { day: DAY - 3, vMag: 4 }),
        candidate('weak-near', { day: DAY - 4, range: 50 }),
        candidate('before', { day: DAY - 60 }),
        candidate('long-before', { day: DAY - 90 }),
        candidate('after', { day: DAY + 70, vMag: 2.5 }),
      ],
      onTheDay,
    );
    expect([before?.markerKey, after?.markerKey]).toEqual(['before', 'after']);
  });

  it('is none where there is none', () => {
    expect(nearestServing([candidate('faint', { vMag: 4 })], onTheDay)).toEqual({
      before: null,
      after: null,
    });
  });
});
