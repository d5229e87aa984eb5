import { describe, expect, it } from 'vitest';
import { entryStretches, markerRange, spansOfMonth, touchesYear } from '#shared/sheet/spans.js';
import { entry, marker } from '#tests/support/sheet/upper-tazimel-sheet.js';

const window = (
  earliest: string | null,
  bestFrom: string | null,
  bestTo: string | null,
  latest: string | null,
) => ({
  earliest,
  bestFrom,
  bestTo,
  latest,
});

describe('the stretches of an entry', () => {
  it('are early margin, best days, late margin, without gap or overlap', () => {
    expect(entryStretches(entry())).toEqual([
      { from: '2027-06-10', to: '2027-06-13', look: 'margin' },
      { from: '2027-06-14', to: '2027-06-30', look: 'best' },
      { from: '2027-07-01', to: '2027-07-05', look: 'margin' },
    ]);
  });

  it('leave a margin out where the window has none', () => {
    const only = entry({ window: window('2027-06-14', '2027-06-14', '2027-06-30', '2027-06-30') });
    expect(entryStretches(only)).toEqual([{ from: '2027-06-14', to: '2027-06-30', look: 'best' }]);
  });

  it('never go past the last advised day, not even with their early margin', () => {
    const cut = (date: string) =>
      entryStretches(entry({ lastAdvised: { date, source: 'agricultural office' } })).map(({ to }) => to);
    expect(cut('2027-06-20')).toEqual(['2027-06-13', '2027-06-20']);
    expect(cut('2027-06-12')).toEqual(['2027-06-12']);
    expect(cut('2027-06-09')).toEqual([]);
    expect(cut('2027-08-01').at(-1)).toBe('2027-07-05');
  });

  it('of a protective watch are one open bar that no last date shortens', () => {
    const watch = entry({ isWatch: true, lastAdvised: { date: '2027-06-12', source: 'office' } });
    expect(entryStretches(watch)).toEqual([{ from: '2027-06-10', to: '2027-07-05', look: 'watch' }]);
  });

  it.each([
    [window(null, '2027-06-14', '2027-06-20', null), ['best 2027-06-14 2027-06-20']],
    [window('2027-06-10', null, null, '2027-06-20'), ['margin 2027-06-10 2027-06-20']],
    [
      window('2027-06-10', '2027-06-14', null, '2027-06-20'),
      ['margin 2027-06-10 2027-06-13', 'best 2027-06-14 2027-06-20'],
    ],
    [window(null, null, null, null), []],
  ])('make do with a window that is only partly known', (partial, expected) => {
    expect(
      entryStretches(entry({ window: partial })).map(({ look, from, to }) => `${look} ${from} ${to}`),
    ).toEqual(expected);
  });
});

describe('the spans of a month', () => {
  const winter = entry({ window: window('2027-12-15', '2027-12-20', '2028-01-10', '2028-01-15') });
  const old = entry({ window: window('2026-12-15', '2026-12-20', '2027-01-10', '2027-01-15') });

  it('show a window across the year’s end up to the last day of December', () => {
    const [span] = spansOfMonth(2027, 12, [], [winter]);
    expect(span).toMatchObject({ from: 15, to: 31, begins: true, ends: false });
    expect(span?.parts).toEqual([
      { from: 15, to: 19, look: 'margin' },
      { from: 20, to: 31, look: 'best' },
    ]);
    expect(spansOfMonth(2027, 1, [], [winter])).toEqual([]);
  });

  it('show a window that began last year from the first day of January', () => {
    const [span] = spansOfMonth(2027, 1, [], [old]);
    expect(span).toMatchObject({ from: 1, to: 15, begins: false, ends: true });
    expect(touchesYear(old, 2027)).toBe(true);
    expect(touchesYear(old, 2028)).toBe(false);
  });

  it('put a marker’s point on its expected day, in that month only', () => {
    const belt = marker({ expected: '2027-07-05', early: '2027-06-30', late: '2027-07-11' });
    expect(spansOfMonth(2027, 6, [belt], [])[0]).toMatchObject({
      from: 30,
      to: 30,
      point: null,
      begins: true,
      ends: false,
    });
    expect(spansOfMonth(2027, 7, [belt], [])[0]).toMatchObject({
      from: 1,
      to: 11,
      point: 5,
      begins: false,
      ends: true,
    });
  });

  it('draw no marker without an expected day, and at least that day where the range is missing', () => {
    expect(markerRange(marker({ expected: null }))).toBeNull();
    expect(markerRange(marker({ early: null, late: null }))).toEqual({
      from: '2027-06-07',
      to: '2027-06-07',
    });
  });

  it('wall off a bar on its last advised day, and nowhere else', () => {
    const sow = entry({ lastAdvised: { date: '2027-07-05', source: 'office' } });
    expect(spansOfMonth(2027, 6, [], [sow])[0]?.stop).toBeNull();
    expect(spansOfMonth(2027, 7, [], [sow])[0]?.stop).toBe(5);
    const later = entry({ lastAdvised: { date: '2027-07-20', source: 'office' } });
    expect(spansOfMonth(2027, 7, [], [later])[0]?.stop).toBeNull();
  });

  it('give a single fixed day its diamond', () => {
    const fixed = entry({ window: window(null, null, null, null), fixedDate: '2027-07-05' });
    expect(spansOfMonth(2027, 7, [], [fixed])[0]).toMatchObject({ from: 5, to: 5, point: 5 });
  });
});
