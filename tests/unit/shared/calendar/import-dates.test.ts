import { describe, expect, it } from 'vitest';
import { dateCell, type DateCell, type ImportDateFacts } from '#shared/calendar/import-dates.js';
import { en } from '#shared/locales/index.js';
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
const FIRST_MORNING = { markerKey: 'pleiades', phenomenon: 'heliacal-rising' };
const DUE_SOUTH = {
  ...{ type: 'sky', occurrence: 1 },
  spec: { kind: 'due-meridian', markerKey: 'pleiades', facing: 'south', solarHour: 21 },
};
type Tree = { readonly [part: string]: string | Tree };
const leavesOf = (tree: Tree): string[] =>
  Object.values(tree).flatMap((value) => (typeof value === 'string' ? [value] : leavesOf(value)));
const read = (text: string, changes: Partial<ImportDateFacts> = {}): DateCell =>
  dateCell(text, { ...FACTS, ...changes });
const day = (month: number, first: number, last = first, year: number | null = null) => ({
  ...{ kind: 'day', year, first: { month, day: first }, last: { month, day: last } },
});
const problem = (code: string) => ({ kind: 'problem', problem: code });

describe('a cell that says when', () => {
  it.each([
    ['2027-06-14', day(6, 14, 14, 2027)],
    ['06-14', day(6, 14)],
    ['14.6.', day(6, 14)],
    ['14. 6. 2027', day(6, 14, 14, 2027)],
    ['14/6', day(6, 14)],
    ['6/14', day(6, 14)],
    ['6/6', day(6, 6)],
    ['14 June', day(6, 14)],
    ['14. Jun.', day(6, 14)],
    ['june 14', day(6, 14)],
    ['June 14, 2027', day(6, 14, 14, 2027)],
    ['Fixed date: 07-05', day(7, 5)],
    ['2 June', day(6, 2)],
    ['  ', { kind: 'empty' }],
  ])('reads %j as a day', (text, expected) => {
    expect(read(text)).toEqual(expected);
  });

  it.each([
    ['first ten days of June', day(6, 1, 10)],
    ['1st ten days of June', day(6, 1, 10)],
    ['1st dekad of June', day(6, 1, 10)],
    ['June dekad 2', day(6, 11, 20)],
    ['Feb. dekad 3', day(2, 21, 28)],
    ['last ten days of June', day(6, 21, 30)],
    ['D17', day(6, 11, 20)],
    ['D36', day(12, 21, 31)],
    ['D37', problem('no-such-ten-days')],
  ])('reads %j as a ten-day part', (text, expected) => {
    expect(read(text)).toEqual(expected);
  });

  it.each([
    ['June 01, 2027', day(6, 1, 1, 2027)],
    ['June 1st', day(6, 1)],
    ['1st of June', day(6, 1)],
    ['June 4', day(6, 4)],
    ['June 0', problem('no-such-day-6')],
    ['May 1', problem('day-or-ten-days')],
    ['May 2', problem('day-or-ten-days')],
    ['Dec. 3', problem('day-or-ten-days')],
    ['Fixed date: May 1', problem('day-or-ten-days')],
  ])('takes %j for one day only where it can be nothing else', (text, expected) => {
    expect(read(text)).toEqual(expected);
  });

  it('asks which comes first where it can be both, and goes by the answer', () => {
    expect(read('6/7')).toEqual(problem('which-first'));
    expect(read('6/7', { dayOrder: 'day-first' })).toEqual(day(7, 6));
    expect(read('6/7', { dayOrder: 'month-first' })).toEqual(day(6, 7));
  });

  it('takes days of the calendar’s year, and of the next for a window over its end', () => {
    expect(read('2028-01-05')).toEqual(day(1, 5, 5, 2028));
    expect(read('2026-06-14')).toEqual(problem('other-year'));
    expect(read('2029-06-14')).toEqual(problem('other-year'));
  });

  it('knows no day that is not in every year', () => {
    for (const [text, month] of [
      ['02-29', 2],
      ['31.4.', 4],
      ['0 June', 6],
      ['2027-06-45', 6],
    ] as const) {
      expect(read(text)).toEqual(problem(`no-such-day-${month}`));
    }
    for (const text of ['13-01', '2027-00-10', '2027-13-45', '14/15']) {
      expect(read(text)).toEqual(problem('no-such-month'));
    }
  });

  it.each([
    ['Pleiades first morning +7', 'pleiades', 'heliacal-rising', 7],
    ['The  Pleiades, first morning seen', 'pleiades', 'heliacal-rising', 0],
    ['pleiades, first morning setting − 3', 'pleiades', 'cosmical-setting', -3],
    ['SIRIUS: last dusk -10', 'hr2491', 'heliacal-setting', -10],
  ])('reads %j as days from a sign', (text, markerKey, phenomenon, offsetDays) => {
    expect(read(text)).toEqual({ kind: 'sign', sign: { type: 'star', markerKey, phenomenon }, offsetDays });
  });

  const sky = (spec: object, occurrence = 1) => ({ type: 'sky', spec, occurrence });
  it.each([
    ['June solstice +3', sky({ kind: 'sun-season', season: 'june-solstice' }), 3],
    ['Pleiades due south at 21:00 by the Sun', DUE_SOUTH, 0],
    ['pleiades DUE SOUTH at 21.00 local sun time −4', DUE_SOUTH, -4],
    [
      'Noon Sun back over South Ridge',
      sky({ kind: 'noon-sun', passage: 'back', ridgeName: 'South Ridge' }),
      0,
    ],
    ['Full Moon 4', sky({ kind: 'moon-phase', event: 'full' }, 4), 0],
    [
      'Last star night (Sun no deeper than 6 degrees)',
      sky({ kind: 'dark-night', end: 'last', depthDeg: 6 }),
      0,
    ],
    [
      'New Moon number 2 from the Pleiades, first morning seen',
      sky({ ...{ kind: 'moon-counted', event: 'new' }, ...FIRST_MORNING, count: 2 }),
      0,
    ],
    [
      'Sunrise in the east-north-east, at 70°',
      sky({ kind: 'sun-azimuth', event: 'sunrise', azimuthDeg: 70, pointName: '' }),
      0,
    ],
    ['actual date of A-04', { type: 'entry', name: 'A-04', day: 'actual' }, 0],
    ['End of Sow the first field + 10', { type: 'entry', name: 'Sow the first field', day: 'bestTo' }, 10],
    ['birch leaf +2', { type: 'nature', name: 'Birch leaf' }, 2],
    ['sign of nature: Geese go north', { type: 'nature', name: 'Geese go north' }, 0],
  ])('reads %j as another sign', (text, sign, offsetDays) => {
    expect(read(text)).toEqual({ kind: 'sign', sign, offsetDays });
  });

  it('reads back every name that the product itself gives to a sign of the sky', () => {
    const names = leavesOf(en.sky.sign).map((text) =>
      text
        .replace('{{star}}', 'Pleiades')
        .replace('{{phenomenon}}', en.sky.phenomenon['heliacal-rising'])
        .replace('{{hour}}', '4:30')
        .replace('{{point}}', 'the notch')
        .replace('{{ridge}}', 'the ridge')
        .replace('{{compass}}', 'east')
        .replace(/\{\{\w+\}\}/gu, '6'),
    );
    const unread = names.filter((name) => read(name).kind !== 'sign');
    // A point on the skyline alone does not say where it is.
    expect(unread).toEqual(['Sunrise over the notch', 'Sunset over the notch']);
    expect(read('Sunrise over the notch')).toEqual(problem('direction-missing'));
  });

  it('takes spring for what it is on that side of the Earth, and asks near the equator', () => {
    const season = (latitudeDeg: number, text = 'Spring equinox') => read(text, { latitudeDeg });
    expect(season(40)).toMatchObject({ sign: { spec: { season: 'march-equinox' } } });
    expect(season(-40)).toMatchObject({ sign: { spec: { season: 'september-equinox' } } });
    expect(season(-40, 'Midsummer day')).toMatchObject({ sign: { spec: { season: 'december-solstice' } } });
    expect(season(12)).toEqual(problem('which-season'));
  });

  it('says what is the matter with the rest', () => {
    expect(read('Weaver star, first dawn')).toEqual(problem('unknown-star-name'));
    expect(read('when the fig has leaves')).toEqual(problem('unknown-sign-words'));
    expect(read('Pleiades')).toEqual(problem('unknown-sign-words'));
    for (const text of ['14', '1.2.3.4', '20270614']) expect(read(text)).toEqual(problem('date-not-read'));
  });
});
