import { describe, expect, it } from 'vitest';
import { sheetWords } from '#server/print/sheet-words.js';
import { translate, words } from '#tests/support/sheet/upper-tazimel-sheet.js';

const said = words(2027);

describe('the words of a sheet', () => {
  it('say a range once per month, and hold every date together', () => {
    expect(said.day('2027-06-07')).toBe('7\u00a0June');
    expect(said.range('2027-06-03', '2027-06-12')).toBe('3\u00a0to\u00a012\u00a0June');
    expect(said.range('2027-06-28', '2027-07-02')).toBe('28\u00a0June to 2\u00a0July');
    expect(said.range('2027-06-07', '2027-06-07')).toBe('7\u00a0June');
  });

  it('add the year to a date outside the sheet’s own', () => {
    expect(said.range('2027-12-20', '2028-01-10')).toBe('20\u00a0December to 10\u00a0January\u00a02028');
  });

  it('never give a star’s day without its range', () => {
    expect(
      said.markerSentence({
        phenomenon: 'First morning seen',
        date: '2027-06-07',
        from: '2027-06-03',
        to: '2027-06-12',
      }),
    ).toBe('First morning seen: about 7\u00a0June (3\u00a0to\u00a012\u00a0June).');
    expect(said.markerMayCome({ title: 'Belt', from: '2027-06-30', to: '2027-07-11' })).toBe(
      'Belt: may come between 30\u00a0June and 11\u00a0July',
    );
  });

  it('end a typed sentence once, whoever ended it first', () => {
    expect(said.ifLate('Stop sowing.')).toBe('If late: Stop sowing.');
    expect(said.lookFor({ signs: 'wet soil;', needed: null })).toBe('Look for: wet soil.');
    expect(said.lookFor({ signs: 'wet soil; birds', needed: 2 })).toBe(
      'Look for: wet soil; birds. When 2 of these are in, you decide.',
    );
    expect(said.lookFor({ signs: 'birds', needed: 1 })).toContain('1 of these is in');
  });

  it('say what the circles beside signs are for, and without which sign nothing begins', () => {
    expect(said.tickSigns({ count: 2, mustHave: '' })).toBe('Tick one for each sign that is in.');
    expect(said.tickSigns({ count: 1, mustHave: 'wet soil' })).toBe(
      'Tick it when the sign is in. Not without: wet soil.',
    );
  });

  it('say "last advised", never "safe", with the office that says so', () => {
    expect(said.lastAdvised({ date: '2027-07-05', source: 'agricultural office' })).toBe(
      'Last advised: 5\u00a0July (agricultural office).',
    );
    expect(said.lastAdvised({ date: '2027-07-05', source: '' })).toBe('Last advised: 5\u00a0July.');
  });

  it('leave a line to write on where a contact is missing', () => {
    expect(said.contacts({ weather: '900', agriculture: ' ' })).toMatch(/^Weather service: 900\. .*: _+\.$/u);
  });

  it('name weekdays from Monday, and the village’s months first where it has its own', () => {
    expect([said.weekdayShort(1), said.weekdayShort(7)]).toEqual(['Mon', 'Sun']);
    expect(said.monthName(6)).toEqual({ village: '', officer: 'June' });
    const own = sheetWords({ translate, language: 'en', year: 2027, villageMonths: ['Ŋá'] });
    expect(own.monthName(1)).toEqual({ village: 'Ŋá', officer: 'January' });
    expect(own.monthName(2).village).toBe('');
  });
});
