import { describe, expect, it } from 'vitest';
import { markerKeysByName, TABLE_WORDS } from '#server/features/imports/import-words.js';
import type { TableFacts } from '#server/features/imports/table-cells.js';
import { timingOf } from '#server/features/imports/table-timing.js';

const facts: TableFacts = {
  ...{ kinds: TABLE_WORDS.kinds, yes: TABLE_WORDS.yes, codes: TABLE_WORDS.codes, words: TABLE_WORDS.dates },
  ...{ dayOrder: null, calendarYear: 2027, latitudeDeg: 60 },
  markerKeyOf: markerKeysByName([], new Map()),
  ...{ natureSigns: new Map([['birch leaf', 'Birch leaf']]), listedSigns: new Map() },
  ...{ villageKinds: new Map(), villageOperations: new Map() },
};
const leaf = (usualFrom: string, usualTo: string) =>
  timingOf({ when: 'Birch leaf', bestFromDays: '3', usualFrom, usualTo }, facts);

describe('the usual days of a sign of nature', () => {
  it('go over the year’s end where that is short', () => {
    expect(leaf('20 December', '15 January')).toMatchObject({
      problems: [],
      lead: { usual: { from: { month: 12, day: 20 }, to: { month: 1, day: 15 } } },
    });
  });

  it('are asked about at both columns where they are probably the wrong way round', () => {
    expect(leaf('10 June', '20 May').problems).toEqual([
      { column: 'usualFrom', code: 'swapped-first' },
      { column: 'usualTo', code: 'swapped-second' },
    ]);
  });

  it('are taken as they stand where both have their years, and in a table of our own', () => {
    expect(leaf('2027-06-10', '2028-05-20').problems).toEqual([]);
    const own = { leadType: 'nature-sign', leadOther: 'Birch leaf', leadSource: 'Elder A-1' };
    expect(timingOf({ ...own, usualFrom: '06-10', usualTo: '05-20' }, facts)).toMatchObject({
      problems: [],
      lead: { usual: { from: { month: 6, day: 10 }, to: { month: 5, day: 20 } } },
    });
  });

  it('say how long the month is where there is no such day', () => {
    expect(leaf('2027-06-45', '5 July').problems).toEqual([{ column: 'usualFrom', code: 'no-such-day-6' }]);
  });
});
