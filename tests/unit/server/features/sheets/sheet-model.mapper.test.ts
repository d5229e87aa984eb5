import { EMPTY_RECORD } from '#shared/contracts/event-record.js';
import { describe, expect, it } from 'vitest';
import { UPPER_TAZIMEL } from '#server/features/demo/demo-villages.data.js';
import { toSheetModel, type SheetFacts } from '#server/features/sheets/sheet-model.mapper.js';
import type { EntryDates, EntryInput } from '#shared/contracts/calendars.js';
import type { VersionEntryBody, VersionHeader } from '#shared/contracts/versions.js';
import { civilDayOf, moonPhases } from '#shared/sky/index.js';
import type { Phenomenon } from '#shared/sky/index.js';
import type { SheetModel } from '#shared/sheet/sheet-model.js';
import { entryInput } from '#tests/support/calendar-api.js';

const CALENDAR_ID = '6f1c1c39-5a5e-4f6f-9d6e-2f0f6a0a7a01';

const header: VersionHeader = {
  schema: 1,
  calendarId: CALENDAR_ID,
  number: 1,
  year: 2027,
  engineVersion: '1.0.0',
  submittedAt: '2026-12-01T06:00:00.000Z',
  communityName: 'Upper Tazimel',
  villageLanguage: { tag: 'art-x-tazimel', name: 'Tazimeli' },
  officerLanguage: { tag: 'en', name: 'English' },
  weatherContact: 'call 900',
  agricultureContact: 'call 901',
  place: UPPER_TAZIMEL.place,
  markers: [
    {
      markerKey: 'pleiades',
      kind: 'figure',
      name: 'Pleiades',
      designation: 'η Tau',
      hr: 1165,
      vMag: 2.87,
      strip: [],
    },
    {
      markerKey: 'hr7001',
      kind: 'star',
      name: 'Vega',
      designation: 'α Lyr',
      hr: 7001,
      vMag: 0.03,
      strip: [],
    },
    { markerKey: 'hr25', kind: 'star', name: '', designation: 'ε Phe', hr: 25, vMag: 3.88, strip: [] },
  ],
};

function day(gregorian: string) {
  return {
    dayNumber: Math.round(Date.parse(gregorian) / 86_400_000) + 2_440_588,
    gregorian,
    julian: gregorian,
  };
}
function dates(changes: Partial<EntryDates> = {}): EntryDates {
  return {
    starOutcome: 'rises-and-sets',
    phenomenonOutcome: 'dated',
    marker: { expected: day('2027-06-07'), early: day('2027-06-03'), late: day('2027-06-12'), notes: [] },
    window: {
      earliest: '2027-06-10',
      bestFrom: '2027-06-14',
      bestTo: '2027-06-30',
      lastAdvised: '2027-07-05',
      lastAdvisedBy: 'offset',
    },
    warnings: [],
    ...changes,
  };
}
let counter = 0;
function body(content: Partial<EntryInput> = {}, own: Partial<EntryDates> = {}): VersionEntryBody {
  counter += 1;
  return {
    entryId: `00000000-0000-4000-8000-${String(counter).padStart(12, '0')}`,
    content: entryInput(content),
    dates: dates(own),
  };
}
function model(entries: VersionEntryBody[], facts: Partial<SheetFacts> = {}): SheetModel {
  return toSheetModel(
    {
      header,
      entries,
      state: 'published',
      label: '2027-1',
      signerNames: [],
      printDate: '2026-12-01',
      ...facts,
    },
    { layout: 'month-cards', paper: 'A4' },
  );
}
const goesBy = (markerKey: string, phenomenon: Phenomenon, occurrence: 1 | 2 = 1) =>
  ({ type: 'marker', markerKey, phenomenon, occurrence }) as const;
const fixedOn = (month: number, dayOfMonth: number) =>
  ({ type: 'fixed-date', date: { month, day: dayOfMonth }, source: 'Council' }) as const;
const single = (date: string): Partial<EntryDates> => ({
  marker: null,
  starOutcome: null,
  phenomenonOutcome: null,
  window: { earliest: date, bestFrom: date, bestTo: date, lastAdvised: date, lastAdvisedBy: 'offset' },
});

describe('what stands across the sheet', () => {
  it.each([
    ['draft', null, 'Draft'],
    ['a submission in review', 'in-review', 'In review'],
    ['one that is signed off', 'signed-off', 'Not yet published'],
    ['a replaced one', 'replaced', 'Replaced'],
    ['a recalled one', 'recalled', 'Recalled'],
  ] as const)('writes across %s what it is', (_what, state, words) => {
    expect(model([body()], { state }).stateWatermark).toBe(words);
  });

  it('writes nothing across what is published', () => {
    expect(model([body()]).stateWatermark).toBeNull();
  });
});

describe('markers on the sheet', () => {
  it('say of a Moon that the year has fewer of them', () => {
    const lead = { type: 'sky', spec: { kind: 'moon-phase', event: 'full' }, occurrence: 13 } as const;
    const sky = { outcome: 'dated', reason: null } as const;
    const sheet = model([body({ lead }, { sky, marker: null, warnings: ['one-occurrence-only'] })]);
    expect(sheet.markers[0]).toMatchObject({ icon: 'moon', whyNoDate: '2027 has fewer of them.' });
  });

  it('stand once each, lettered by date, those without a date last', () => {
    const sheet = model([
      body(
        { lead: goesBy('pleiades', 'heliacal-rising', 2) },
        { marker: null, warnings: ['one-occurrence-only'] },
      ),
      body(),
      body({ titleOfficer: 'Again by the same' }),
      body(
        { lead: goesBy('pleiades', 'heliacal-setting') },
        { marker: { expected: day('2027-05-05'), early: null, late: null, notes: [] } },
      ),
    ]);
    expect(sheet.markers.map(({ letter, light, expected }) => [letter, light, expected])).toEqual([
      ['A', 'dusk', '2027-05-05'],
      ['B', 'dawn', '2027-06-07'],
      ['C', 'dawn', null],
    ]);
    expect(sheet.markers[2]?.whyNoDate).toBe('its star has this day only once in 2027.');
    expect(sheet.markers[1]).toMatchObject({
      icon: 'cluster',
      early: '2027-06-03',
      late: '2027-06-12',
      phenomenon: 'First morning seen',
    });
  });

  it('are named by the star, and never said to return where it is never hidden', () => {
    const sheet = model([
      body(),
      body(
        { lead: goesBy('hr7001', 'heliacal-rising') },
        {
          marker: { expected: day('2027-12-28'), early: null, late: null, notes: [] },
          warnings: ['never-disappears'],
        },
      ),
      body(
        { lead: goesBy('hr25', 'heliacal-setting') },
        { marker: { expected: day('2027-12-29'), early: null, late: null, notes: [] } },
      ),
    ]);
    expect(sheet.markers.map(({ titles }) => titles.officer)).toEqual([
      'Pleiades returns',
      'Vega: first morning seen',
      'ε Phe leaves',
    ]);
  });

  it('take the village’s words from an entry that is nothing but the marker', () => {
    const named = {
      kind: 'marker-only',
      titleVillage: 'Ɓèŋu̍',
      titleOfficer: 'The Cluster comes',
      otherSigns: '',
    } as const;
    const sheet = model([body({ titleOfficer: 'Sow' }), body(named)]);
    expect(sheet.markers.map(({ titles }) => titles)).toEqual([
      { village: 'Ɓèŋu̍', officer: 'The Cluster comes' },
    ]);
    expect(sheet.entries.map(({ titles }) => titles.officer)).toEqual(['Sow']);
  });

  it('keep the caution of such an entry on the board', () => {
    const sheet = model([body({ kind: 'marker-only', otherSigns: '', caution: 'Go in pairs' })]);
    expect(sheet.entries).toMatchObject([{ caution: 'Go in pairs' }]);
  });
});

describe('entries on the sheet', () => {
  it('carry their window, and the office with its date only where that date counts', () => {
    const last = { hasLastDate: true, lastDate: { date: { month: 7, day: 5 }, source: 'District office' } };
    const window = dates().window;
    if (!window) throw new Error('no window');
    const sheet = model([
      body(last, { window: { ...window, lastAdvisedBy: 'fixed' } }),
      body(last, { window: { ...window, lastAdvised: '2027-07-01' } }),
      body({}),
    ]);
    expect(sheet.entries.map(({ lastAdvised }) => lastAdvised)).toEqual([
      { date: '2027-07-05', source: 'District office' },
      { date: '2027-07-01', source: '' },
      null,
    ]);
    expect(sheet.entries[0]?.window).toEqual({
      earliest: '2027-06-10',
      bestFrom: '2027-06-14',
      bestTo: '2027-06-30',
      latest: '2027-07-05',
    });
  });

  it('show a single day as one, and a fixed date that opens a window as a window', () => {
    const sheet = model([
      body({ lead: fixedOn(3, 1) }, single('2027-03-01')),
      body({ lead: fixedOn(3, 1) }, { ...single('2027-03-01'), window: dates().window }),
    ]);
    expect(sheet.entries.map(({ fixedDate }) => fixedDate)).toEqual(['2027-03-01', null]);
    expect(sheet.markers).toEqual([]);
  });

  it('say in plain words why they have no date', () => {
    const none = (own: Partial<EntryDates>) => ({ marker: null, window: null, ...own });
    const closed = { hasLastDate: true, lastDate: { date: { month: 6, day: 1 }, source: 'District office' } };
    const sheet = model([
      body({}, none({ starOutcome: 'never-sets', phenomenonOutcome: null })),
      body({}, none({ phenomenonOutcome: 'never-dark-enough' })),
      body({}, none({ phenomenonOutcome: 'none-in-this-year' })),
      body(closed, { window: null, warnings: ['window-closed-by-last-date'] }),
    ]);
    expect(sheet.entries.map(({ whyNoDate }) => whyNoDate)).toEqual([
      'the star never sets here, so it has no first or last day.',
      'the nights are too light for it.',
      'its star has no such day in 2027.',
      'the last advised date, 1\u00a0June (District office), comes before its best days.',
    ]);
  });
});

describe('the rest of the sheet', () => {
  it('dates the Moon by the village’s clock, within the year', () => {
    const { moon } = model([body()]);
    const { timeZone, longitudeDeg } = header.place;
    const isoOf = ({ year, month, day: dayOfMonth }: { year: number; month: number; day: number }) =>
      [year, month, dayOfMonth].map((part) => String(part).padStart(2, '0')).join('-');
    const phases = moonPhases(2027).map(({ quarter, jdUt }) => ({
      phase: quarter,
      date: isoOf(civilDayOf(jdUt, timeZone, longitudeDeg).gregorian),
      utcDate: isoOf(civilDayOf(jdUt, 'Etc/UTC', 0).gregorian),
    }));
    const inYear = phases.filter(({ date }) => date.startsWith('2027-'));
    expect(moon).toEqual(inYear.map(({ phase, date }) => ({ phase, date })));
    // Three hours of each day belong to the next day here, so some of the fifty must differ.
    expect(inYear.filter(({ date, utcDate }) => date !== utcDate).length).toBeGreaterThan(2);
  });

  it('counts the Moon’s days from evenings after each new Moon, from before the year to its end', () => {
    const { moon, moonBegins } = model([body()]);
    expect(moonBegins[0]?.slice(0, 4)).toBe('2026');
    const daysBetween = (from: string, to: string) => (Date.parse(to) - Date.parse(from)) / 86_400_000;
    for (const { date } of moon.filter(({ phase }) => phase === 'new').slice(0, -1)) {
      const begin = moonBegins.find((each) => each >= date) ?? '';
      // A crescent is seen one to three evenings after the new Moon.
      expect(daysBetween(date, begin)).toBeGreaterThanOrEqual(0);
      expect(daysBetween(date, begin)).toBeLessThanOrEqual(3);
    }
  });

  it('names who signed, the place, the contacts and what the dates rest on', () => {
    expect(model([body()], { signerNames: ['Elder A-1', 'Ostrel', 'Elder A-1'] })).toMatchObject({
      signedBy: 'Elder A-1 and Ostrel',
      placeName: 'Upper terraces',
      contacts: { weather: 'call 900', agriculture: 'call 901' },
      basis: [
        'Dates: Sun’s depth by the three-class rule (Ideler 1819, in Vogt 1920), air of each month, this skyline, engine 1.0.0.',
      ],
      label: '2027-1',
    });
  });

  it('has its fixed words wholly in one language: English where ours has no texts', () => {
    const officerLanguage = { tag: 'sw', name: 'Kiswahili' };
    const sheet = toSheetModel(
      {
        header: { ...header, officerLanguage },
        entries: [body()],
        state: 'published',
        label: '2027-1',
        signerNames: [],
        printDate: '2026-12-01',
      },
      { layout: 'year-board', paper: 'A4' },
    );
    expect(sheet.words.monthName(6).officer).toBe('June');
    expect(sheet.officerLanguage).toBe('en');
  });

  it('names the work from whose day something is counted, where that is on the board', () => {
    const sow = body({ titleOfficer: 'Sow' });
    const waiting: Partial<EntryDates> = { marker: null, window: null, warnings: ['waits-for-actual-day'] };
    const weed = body({ lead: { type: 'entry-actual', entryId: sow.entryId } }, waiting);
    expect(model([sow, weed]).entries[1]?.whyNoDate).toBe(
      'its days are counted from the day of “Sow”, once that is done.',
    );
    expect(model([weed]).entries[0]?.whyNoDate).toBe('its days are counted once the work before it is done.');
  });

  it('says what a mended board says otherwise than the one before it, and nothing of what is not printed', () => {
    const sow = body({ titleOfficer: 'Sow' });
    const weed = body({ titleOfficer: 'Weed' });
    const store = body({ titleOfficer: 'Store' });
    const window = { ...sow.dates.window, bestFrom: '2027-06-16', lastAdvisedBy: 'offset' } as const;
    const moved = {
      ...sow,
      dates: dates({ window: { ...dates().window, ...window } as EntryDates['window'] }),
    };
    const entries = [
      moved,
      { ...weed, content: { ...weed.content, ifLate: 'Sow beans' } },
      { ...store, content: { ...store.content, sharingLevel: 'village' as const } },
      body({ titleOfficer: 'Fish' }),
    ];
    const gone = body({ titleOfficer: 'Burn' });
    const before = { label: '2027-1', entries: [sow, weed, store, gone] };
    const { changes } = model(entries, { label: '2027-2', before });
    // Days keep to their months with spaces that do not break.
    expect(changes?.title).toBe('Changed since 2027-1');
    expect(changes?.lines.map((line) => line.replaceAll('\u00a0', ' '))).toEqual([
      'Sow: best 16 to 30 June; before, 14 to 30 June',
      'Weed: other words or signs, same days',
      'Fish: new',
      'Burn: taken off the board',
    ]);
    expect(model([sow], { before: { label: '2027-1', entries: [sow] } })).not.toHaveProperty('changes');
  });
});

describe('who checked an entry’s texts', () => {
  const office = { office: 'Agricultural office', name: 'R. Ansel' };
  const checkedOn = (work: string, late: string) => ({
    ...EMPTY_RECORD,
    checked: { work: { ...office, day: work }, safety: null, late: { ...office, day: late } },
  });

  it('is said once where it was one and the same person on one day', () => {
    const [entry] = model([body({ record: checkedOn('2027-02-03', '2027-02-03') })]).entries;
    expect(entry?.checked).toEqual([{ ...office, date: '2027-02-03', texts: ['work', 'late'] }]);
  });

  it('is said for each day, in words that name office, person and day', () => {
    const sheet = model([body({ record: checkedOn('2027-02-03', '2026-11-20') })]);
    expect((sheet.entries[0]?.checked ?? []).map((check) => sheet.words.checkedBy(check))).toEqual([
      'Checked (work and days): R. Ansel, Agricultural office, 3\u00a0February\u00a02027.',
      'Checked (if late): R. Ansel, Agricultural office, 20\u00a0November\u00a02026.',
    ]);
  });

  it('is not spoken of where nobody checked anything', () => {
    expect(model([body()]).entries[0]?.checked).toEqual([]);
  });
});

describe('the day on which to stop', () => {
  it('stands with whose word it is, in the calendar’s year', () => {
    const stop = { date: { month: 7, day: 5 }, source: 'Agricultural office' };
    const record = { ...EMPTY_RECORD, work: { ...EMPTY_RECORD.work, stop } };
    const sheet = model([body({ record })]);
    const printed = sheet.entries[0]?.stop;
    expect(printed && sheet.words.stopOn(printed)).toBe('Stop on 5\u00a0July (Agricultural office).');
  });
});
