import { describe, expect, it } from 'vitest';
import {
  cropClash,
  draftAdvice,
  driftedDays,
  forSamePeople,
  isInCloudySeason,
  lacksSafetyLine,
  markerRange,
  type AdvisedEntry,
} from '#shared/calendar/advice.js';
import type { EntryWindow } from '#shared/calendar/entry-model.js';
import { dayNumberFromIso } from '#shared/kernel/iso-date.js';

const window = (bestFrom: string, bestTo: string): EntryWindow => ({
  ...{ earliest: bestFrom, bestFrom, bestTo, lastAdvised: bestTo, lastAdvisedBy: 'offset' },
});
const record = (
  operation: string | null,
  responsible = '',
  fromDays: number | null = null,
  toDays = fromDays,
) => ({
  what: { operation, variety: { fromDays, toDays } },
  work: { responsible },
});
function entry(
  id: string,
  days: EntryWindow | null,
  content: Partial<AdvisedEntry['content']> = {},
): AdvisedEntry {
  return {
    id,
    window: days,
    content: { kind: 'farm', crop: 'long millet', caution: '', protectiveWatch: false, ...content },
  };
}

describe('windows of the same people', () => {
  const sow = entry('sow', window('2027-06-14', '2027-06-30'), {
    record: record('sow', 'Women of each house'),
  });
  const mend = (days: EntryWindow, people = 'women of each house ') =>
    entry('mend', days, { record: record('mend-walls', people) });

  it('collide where the one lies wholly within the other, however the people are written', () => {
    const within = mend(window('2027-06-16', '2027-06-20'));
    expect(forSamePeople(sow, [sow, within]).map(({ id }) => id)).toEqual(['mend']);
    expect(forSamePeople(within, [sow, within]).map(({ id }) => id)).toEqual(['sow']);
  });

  it('are not spoken of where they only overlap, or where other people do it', () => {
    expect(forSamePeople(sow, [sow, mend(window('2027-06-20', '2027-07-10'))])).toEqual([]);
    expect(forSamePeople(sow, [sow, mend(window('2027-06-16', '2027-06-20'), 'the youth')])).toEqual([]);
  });

  it('leave a watch alone, which goes on beside other work', () => {
    const watch = entry('watch', window('2027-06-01', '2027-07-30'), {
      ...{ protectiveWatch: true, record: record('guard', 'Women of each house') },
    });
    expect(forSamePeople(sow, [sow, watch])).toEqual([]);
    expect(forSamePeople(watch, [sow, watch])).toEqual([]);
  });
});

describe('a harvest and the length of its crop', () => {
  const sow = entry('sow', window('2027-06-14', '2027-06-30'), { record: record('sow', '', 120, 130) });
  const harvest = (bestFrom: string, crop = 'Long millet') =>
    entry('harvest', window(bestFrom, '2027-12-01'), { crop, record: record('harvest') });

  it('fits from the first day on which what was sown first is ripe', () => {
    expect(cropClash(harvest('2027-10-12'), [sow])).toBeNull();
    expect(cropClash(harvest('2027-10-11'), [sow])).toMatchObject({ advice: 'crop-not-ripe', days: 119 });
  });

  it('fits until what was sown last has its full length', () => {
    expect(cropClash(harvest('2027-11-07'), [sow])).toBeNull();
    expect(cropClash(harvest('2027-11-08'), [sow])).toMatchObject({ advice: 'crop-long-ripe', toDays: 130 });
  });

  it('is asked of the same crop only, and of a harvest after its sowing', () => {
    expect(cropClash(harvest('2027-08-01', 'barley'), [sow])).toBeNull();
    expect(cropClash(harvest('2027-02-01'), [sow])).toBeNull();
  });

  it('is not asked where nobody knows the length', () => {
    const unknown = entry('sow', window('2027-06-14', '2027-06-30'), { record: record('sow') });
    expect(cropClash(harvest('2027-07-01'), [unknown])).toBeNull();
  });
});

describe('a marker in the months of cloud', () => {
  const rainy = Array.from({ length: 12 }, (_, month) => month === 6 || month === 7);
  const range = (from: string, to: string) => ({ from: dayNumberFromIso(from), to: dayNumberFromIso(to) });

  it('is spoken of where its whole range falls into them', () => {
    expect(isInCloudySeason(range('2027-07-04', '2027-07-15'), rainy)).toBe(true);
    expect(isInCloudySeason(range('2027-06-28', '2027-07-08'), rainy)).toBe(false);
    expect(isInCloudySeason(null, rainy)).toBe(false);
  });

  it('has for its range the early and the late day, or its one day', () => {
    const day = (gregorian: string) => ({ gregorian });
    const [expected, early, late] = [day('2027-07-09'), day('2027-07-04'), day('2027-07-15')];
    expect(markerRange({ expected, early, late })).toEqual(range('2027-07-04', '2027-07-15'));
    expect(markerRange({ expected, early: null, late: null })).toEqual(range('2027-07-09', '2027-07-09'));
    expect(markerRange(null)).toBeNull();
  });
});

describe('a line of caution', () => {
  it.each([
    ['safety', { kind: 'safety' }],
    ['a watch', { protectiveWatch: true }],
    ['fire', { record: record('burn') }],
  ])('is missed with %s', (_what, content) => {
    expect(lacksSafetyLine(entry('a', null, content))).toBe(true);
    expect(lacksSafetyLine(entry('a', null, { ...content, caution: 'Go in pairs.' }))).toBe(false);
  });

  it('is not asked of other work', () => {
    expect(lacksSafetyLine(entry('a', null, { record: record('sow') }))).toBe(false);
  });
});

describe('how far a marker moved since people began to go by it', () => {
  it.each([
    ['1627-06-03', '2027-06-07', 4],
    ['1627-06-07', '2027-06-03', -4],
    ['1627-12-30', '2027-01-02', 3],
    ['-0043-01-01', '2027-12-31', -1],
    ['1628-02-29', '2027-02-28', 0],
  ])('from %s to %s by the day of the civil year', (then, now, days) => {
    expect(driftedDays(then, now)).toBe(days);
  });
});

describe('what is told of a whole draft', () => {
  const NO_RAIN = Array.from({ length: 12 }, () => false);
  const inDraft = (one: AdvisedEntry, range: { from: number; to: number } | null = null) => ({
    ...one,
    markerRange: range,
  });
  const sow = entry('sow', window('2027-06-14', '2027-06-30'), { record: record('sow', 'All', 80, 95) });
  const mend = entry('mend', window('2027-06-16', '2027-06-20'), { record: record('mend-walls', 'all') });
  const reap = entry('reap', window('2027-07-01', '2027-07-20'), { record: record('harvest') });

  it('is what each of its entries is told beside the others', () => {
    const told = draftAdvice(
      [sow, mend, reap].map((one) => inDraft(one)),
      NO_RAIN,
    );
    expect([...told]).toEqual([
      ['sow', ['same-people']],
      ['mend', ['same-people']],
      ['reap', ['crop-not-ripe']],
    ]);
  });

  it('speaks of cloud and of a missing caution, and says nothing of an entry without anything to look at', () => {
    const june = { from: dayNumberFromIso('2027-06-10'), to: dayNumberFromIso('2027-06-14') };
    const rain = NO_RAIN.map((_, month) => month === 5);
    const burn = entry('burn', null, { crop: '', record: record('burn') });
    const told = draftAdvice([inDraft(reap, june), inDraft(burn), inDraft({ ...mend, id: 'm' })], rain);
    expect([...told.values()]).toEqual([['cloudy-season'], ['no-safety-line'], []]);
  });

  it('is of the same people and crop as entry by entry, whichever of many windows lie within each other', () => {
    // A small fixed series of days, lengths and kinds of work, so that every case comes about.
    let state = 7;
    const next = (below: number) => {
      state = (state * 48_271) % 2_147_483_647;
      return state % below;
    };
    const day = (offset: number) => new Date(Date.UTC(2027, 0, 1 + offset)).toISOString().slice(0, 10);
    const many = Array.from({ length: 120 }, (_, index) => {
      const from = next(200);
      const days = next(9) === 0 ? null : window(day(from), day(from + next(25)));
      const work = record(
        ['sow', 'plant', 'harvest', 'weed'][next(4)] ?? null,
        ['', 'All', 'all ', 'men'][next(4)],
        60,
      );
      const crop = ['', 'Millet', 'millet '][next(3)] ?? '';
      return inDraft(
        entry(`e${String(index)}`, days, { crop, protectiveWatch: next(8) === 0, record: work }),
      );
    });
    const told = draftAdvice(many, NO_RAIN);
    const beside = many.map((one) => [
      one.id,
      forSamePeople(one, many).length > 0,
      cropClash(one, many)?.advice ?? null,
    ]);
    expect(
      many.map(({ id }) => {
        const of = told.get(id) ?? [];
        return [id, of.includes('same-people'), of.find((each) => each.startsWith('crop-')) ?? null];
      }),
    ).toEqual(beside);
    expect(new Set(beside.map(([, samePeople]) => samePeople)).size).toBe(2);
    expect(new Set(beside.map(([, , clash]) => clash)).size).toBe(3);
  });
});
