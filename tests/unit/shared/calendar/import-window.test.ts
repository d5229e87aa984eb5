import { describe, expect, it } from 'vitest';
import { dateCell, type ImportDateFacts } from '#shared/calendar/import-dates.js';
import { LONGEST_OVER_YEARS_END_DAYS, WINDOW_DAYS, windowOfCells } from '#shared/calendar/import-window.js';
import { TABLE_WORDS } from '#server/features/imports/import-words.js';

const FACTS: ImportDateFacts = {
  words: TABLE_WORDS.dates,
  dayOrder: null,
  calendarYear: 2027,
  markerKeyOf: new Map([
    ['pleiades', 'pleiades'],
    ['sirius', 'hr2491'],
  ]),
  natureSigns: new Map([['birch leaf', 'Birch leaf']]),
  latitudeDeg: 60,
};
const read = (text: string) => dateCell(text, FACTS);

describe('the days of a line', () => {
  const line = (cells: Partial<Record<string, string>>, numbers: Partial<Record<string, number>> = {}) => {
    const cell = (name: string) => read(cells[name] ?? '');
    const number = (name: string) => numbers[`${name}Days`] ?? null;
    const [earliest, bestFrom, bestTo, lastAdvised] = WINDOW_DAYS;
    return windowOfCells({
      when: cell('when'),
      days: {
        ...{ earliest: cell(earliest), bestFrom: cell(bestFrom) },
        ...{ bestTo: cell(bestTo), lastAdvised: cell(lastAdvised) },
      },
      offsetsDays: {
        ...{ earliestDays: number(earliest), bestFromDays: number(bestFrom) },
        ...{ bestToDays: number(bestTo), lastAdvisedDays: number(lastAdvised) },
      },
    });
  };
  const offsets = (
    earliestDays: number,
    bestFromDays: number,
    bestToDays: number,
    lastAdvisedDays: number,
  ) => ({
    ...{ earliestDays, bestFromDays, bestToDays, lastAdvisedDays },
  });
  const rising = { type: 'star', markerKey: 'pleiades', phenomenon: 'heliacal-rising' };

  it('count from a sign with margins from plain days beside', () => {
    const days = { earliest: '06-10', bestFrom: '06-14', bestTo: '06-30', lastAdvised: '07-05' };
    const found = line({ when: 'Pleiades, first dawn', ...days }, { bestFromDays: 7, bestToDays: 23 });
    expect(found).toEqual({ problems: [], lead: rising, offsets: offsets(3, 7, 23, 28) });
  });

  it('count from the sign that the days themselves name', () => {
    const found = line({ bestFrom: 'Pleiades first morning +7', bestTo: 'Pleiades first morning +23' });
    expect(found).toEqual({ problems: [], lead: rising, offsets: offsets(7, 7, 23, 23) });
    expect(line({ when: 'Pleiades first morning +7' })).toMatchObject({ offsets: offsets(7, 7, 7, 7) });
  });

  it('go by the first best day where no sign is named, over the end of the year, too', () => {
    const found = line({ earliest: '12-20', bestFrom: '12-28', bestTo: '01-05', lastAdvised: '01-10' });
    expect(found).toEqual({
      ...{ problems: [], lead: { type: 'day', date: { month: 12, day: 28 } } },
      offsets: offsets(-8, 0, 8, 13),
    });
    expect(line({ bestFrom: 'June dekad 2' })).toMatchObject({ offsets: offsets(0, 0, 9, 9) });
    expect(line({ when: '07-05', bestFrom: '07-03', bestTo: '07-05' })).toMatchObject({
      ...{ lead: { date: { month: 7, day: 5 } }, offsets: offsets(-2, -2, 0, 0) },
    });
  });

  const swapped = (first: string, second: string) => [
    { column: first, problem: 'swapped-first' },
    { column: second, problem: 'swapped-second' },
  ];

  it.each([
    [{ bestFrom: '10 May', bestTo: '3 May' }, 'bestFrom', 'bestTo'],
    [{ earliest: '10 May', bestFrom: '3 May', bestTo: '20 May' }, 'earliest', 'bestFrom'],
    [{ bestFrom: '3 May', bestTo: '20 May', lastAdvised: '12 May' }, 'bestTo', 'lastAdvised'],
    [{ bestFrom: '10 May', lastAdvised: '3 May' }, 'bestFrom', 'lastAdvised'],
    [{ when: '10 May', bestTo: '3 May' }, 'when', 'bestTo'],
    [{ when: '10 May', bestFrom: '5 May', bestTo: '7 May' }, 'when', 'bestTo'],
    [{ when: 'Pleiades first morning +7', bestFrom: '10 May', bestTo: '3 May' }, 'bestFrom', 'bestTo'],
    [{ bestFrom: '2027-05-10', bestTo: '2027-05-03' }, 'bestFrom', 'bestTo'],
  ])('are asked about at both columns where they are probably the wrong way round: %j', (cells, one, two) => {
    expect(line(cells).problems).toEqual(swapped(one, two));
  });

  it('may go over the year’s end for half a year, and further where both years are said', () => {
    expect(LONGEST_OVER_YEARS_END_DAYS).toBe(183);
    const toOf = (bestFrom: string, bestTo: string) => line({ bestFrom, bestTo });
    expect(toOf('20 Dec', '15 Jan')).toMatchObject({ problems: [], offsets: offsets(0, 0, 26, 26) });
    expect(toOf('1 Oct', '2 April')).toMatchObject({ problems: [], offsets: offsets(0, 0, 183, 183) });
    expect(toOf('1 Oct', '3 April').problems).toEqual(swapped('bestFrom', 'bestTo'));
    expect(toOf('2027-10-01', '2028-05-31')).toMatchObject({ problems: [], offsets: { bestToDays: 242 } });
    // Within one year they may last as long as they do.
    expect(toOf('1 Jan', '31 Dec')).toMatchObject({ problems: [], offsets: { bestToDays: 364 } });
  });

  it('are not measured where numbers say how long', () => {
    const days = { bestFrom: '10 May', bestTo: '3 May' };
    expect(line({ when: 'Pleiades first morning', ...days }, { bestFromDays: 7, bestToDays: 23 })).toEqual({
      ...{ problems: [], lead: rising, offsets: offsets(7, 7, 23, 23) },
    });
  });

  it('begin with the first of ten days and end with the last, whatever leads', () => {
    const days = { bestFrom: 'June dekad 2', bestTo: 'June dekad 2' };
    expect(line(days)).toMatchObject({ offsets: offsets(0, 0, 9, 9) });
    expect(line({ when: 'Pleiades first morning +7', ...days })).toMatchObject({
      offsets: offsets(7, 7, 16, 16),
    });
  });

  it('say what is missing or does not go together', () => {
    expect(line({}).problems).toEqual([{ column: 'bestFrom', problem: 'date-missing' }]);
    expect(line({ when: 'Pleiades, first dawn' }).problems).toEqual([
      { column: 'bestFromDays', problem: 'days-missing' },
    ]);
    const two = line({ bestFrom: 'Pleiades first dawn +1', bestTo: 'Sirius first dawn +1' });
    expect(two.problems).toEqual([{ column: 'bestTo', problem: 'mixed-dates' }]);
    expect(line({ bestFrom: '31.4.', bestTo: 'soon' }).problems).toEqual([
      { column: 'bestFrom', problem: 'no-such-day-4' },
      { column: 'bestTo', problem: 'unknown-sign-words' },
    ]);
  });
});
