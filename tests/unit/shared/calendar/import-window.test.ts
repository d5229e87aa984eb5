import { describe, expect, it } from 'vitest';
import { dateCell, type ImportDateFacts } from '#shared/calendar/import-dates.js';
import { WINDOW_DAYS, windowOfCells } from '#shared/calendar/import-window.js';
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

  it('say what is missing or does not go together', () => {
    expect(line({}).problems).toEqual([{ column: 'bestFrom', problem: 'date-missing' }]);
    expect(line({ when: 'Pleiades, first dawn' }).problems).toEqual([
      { column: 'bestFromDays', problem: 'days-missing' },
    ]);
    const two = line({ bestFrom: 'Pleiades first dawn +1', bestTo: 'Sirius first dawn +1' });
    expect(two.problems).toEqual([{ column: 'bestTo', problem: 'mixed-dates' }]);
    expect(line({ bestFrom: '31.4.', bestTo: 'soon' }).problems).toEqual([
      { column: 'bestFrom', problem: 'no-such-day' },
      { column: 'bestTo', problem: 'unknown-sign-words' },
    ]);
  });
});
