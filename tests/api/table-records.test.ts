import { randomUUID } from 'node:crypto';
import { parse } from 'csv-parse/sync';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { CALENDAR_CSV_COLUMNS } from '#shared/calendar/csv-columns.js';
import type { Entry, EntryInput } from '#shared/contracts/calendars.js';
import { EMPTY_RECORD, type EventRecord } from '#shared/contracts/event-record.js';
import type { TableImport, TableLine } from '#shared/contracts/imports.js';
import { PLAIN_DETAILS } from '#shared/contracts/sharing.js';
import { WRITE_KEY_HEADER } from '#shared/contracts/write-key.js';
import { en } from '#shared/locales/index.js';
import { TABLE_LANGUAGES, type TableLanguage } from '#shared/locales/table-languages.js';
import { tableTexts } from '#shared/locales/tables.js';
import { tableLanguageOf, wordsOfTables } from '#src/features/imports/model/table-languages.js';
import { templateCsv } from '#src/features/imports/model/template.js';
import type { ColumnTexts } from '#src/features/imports/model/column-words.js';
import { guessColumns, matchedLines } from '#src/features/imports/model/match-columns.js';
import { readTable } from '#src/features/imports/model/read-table.js';
import { openTestApi, type TestApi } from '#tests/support/api.js';
import {
  addEntry,
  beginCalendar,
  entriesOf,
  openVillage,
  type Village,
} from '#tests/support/calendar-api.js';
import { wholeRecord } from '#tests/support/event-record.js';
import { sharingPath } from '#tests/support/sharing-api.js';
import { addSign } from '#tests/support/sign-api.js';
import { addWord, changeWords, renaming } from '#tests/support/words-api.js';

/** What an event says beside its name and its days, in a table and back. */
let api: TestApi;
let village: Village;
let years = 2030;
beforeAll(async () => {
  api = await openTestApi();
  village = await openVillage(api);
}, 60_000);
afterAll(() => api.close());

const begin = async () => (await beginCalendar(village, (years += 1))).id;
const linesOf = (text: string) => {
  const table = readTable(text);
  const { titles } = wordsOfTables(tableLanguageOf(table.titles, 'en'));
  return matchedLines(table, guessColumns(table.titles, titles));
};
const send = async (calendarId: string, lines: TableLine[], dryRun = false) => {
  const body = { dryRun, dayOrder: null, natureSigns: [], lines };
  const path = `/api/calendars/${calendarId}/imports/table`;
  return (await village.officer.post(path, body).set(WRITE_KEY_HEADER, randomUUID()).expect(200))
    .body as TableImport;
};
const exported = async (calendarId: string) =>
  (await village.officer.get(`/api/calendars/${calendarId}/versions/draft/calendar.csv`).expect(200)).text;

/** Without what a table never holds: the level, and by which id a sign of its own is marked. */
const plain = ({ content: { sharingLevel: _level, ...content } }: Entry) => {
  const { record } = content;
  if (record === undefined) return content;
  const list = record.signs.list.map(({ ownId: _own, ...sign }) => sign);
  return { ...content, record: { ...record, signs: { ...record.signs, list } } };
};
const NASTY: EventRecord = wholeRecord({
  what: {
    operation: 'other',
    ownOperation: '=Bind "sheaves"; and, more',
    variety: { name: '-5', fromDays: 0, toDays: 1500 },
    land: '| bar \\ and back',
  },
  when: { leadDays: 0, graceDays: 120, repeats: 'every-n-years', everyYears: 3, rule: '+not in a drought' },
  signs: {
    list: [
      {
        ...{ type: 'star-look', name: 'A | bar', look: 'Two\nlines | and \\n a mark;', where: '=1+2' },
        ...{ usual: { from: { month: 12, day: 20 }, to: { month: 1, day: 5 } }, stillSeen: 'no' },
      },
      { type: 'moon', name: '@thin', look: '', where: '', usual: null, stillSeen: null },
    ],
    ...{ needed: 2, mustHave: 1 },
  },
  work: {
    ...{ responsible: '@women', helpers: 'the young', decides: 'ŋɔ́rɛ̃', owns: '\'"' },
    ...{ inputs: 'seed\n=3 baskets', ifEarly: '-1', ifLaterStill: 'then\n\nbeans', askWhom: '١٢' },
    stop: { date: { month: 2, day: 28 }, source: 'Office, "farming"' },
  },
  trust: { confidence: 'being-tried', by: 'A-3', basis: 'trial', sinceYear: -1500 },
  heard: { where: 'upper village', day: '2024-02-29', language: 'Tazi' },
  checked: {
    work: { office: 'Office | farming', name: '=R', day: '2026-02-03' },
    safety: null,
    late: { office: 'O', name: 'N', day: '2000-01-01' },
  },
});

describe('a table of our own', () => {
  it('brings back whatever an entry says, by the village’s words and list of signs', async () => {
    const { officer } = village;
    const word = await addWord(officer, 'operations', { like: 'weed', word: 'Pull the grass' });
    const own = await addWord(officer, 'operations', { like: 'other', word: 'Bind sheaves' });
    await changeWords(officer, 'operations', renaming('harvest', 'Bring in'));
    const sign = await addSign(officer, { name: 'Reeds flower', look: 'White | grey', type: 'plant' });
    const { type, name, look, where, usual, stillSeen } = sign;
    const listed = { type, name, look, where, usual, stillSeen, sharedId: sign.id };
    const work = (what: Partial<EventRecord['what']>): Partial<EntryInput> => ({
      record: { ...EMPTY_RECORD, what: { ...EMPTY_RECORD.what, ...what } },
    });
    const ofVillage = ({ key, word: said }: typeof word) => ({ operationWord: { id: key, word: said } });
    const from = await begin();
    const entries: Partial<EntryInput>[] = [
      { record: wholeRecord() },
      { record: NASTY, caution: '=Mind', kind: 'safety' },
      { record: wholeRecord({ signs: { list: [listed], needed: 1, mustHave: 0 } }) },
      work({ operation: 'weed', ...ofVillage(word) }),
      work({ operation: 'other', ownOperation: 'Bind sheaves', ...ofVillage(own) }),
      work({ operation: 'harvest', operationWord: { word: 'Bring in' } }),
      { record: { ...EMPTY_RECORD, when: { ...EMPTY_RECORD.when, repeats: 'some-years', rule: 'wet' } } },
      {},
    ];
    for (const [index, changes] of entries.entries()) {
      await addEntry(officer, from, { titleOfficer: `Entry ${String(index)}`, ...changes });
    }
    const text = await exported(from);
    const into = await begin();
    await send(into, linesOf(text));
    const before = (await entriesOf(officer, from)).map(plain);
    expect((await entriesOf(officer, into)).map(plain)).toEqual(before);
    expect(before[2]?.record?.signs.list).toEqual([listed]);

    // Another program reads the same cells, and no spreadsheet runs any of them.
    const [titles = [], ...lines]: string[][] = parse(text, { bom: true });
    const cell = (line: number, id: string) =>
      lines[line]?.[CALENDAR_CSV_COLUMNS.findIndex((column) => column.id === id)];
    expect(titles).toHaveLength(CALENDAR_CSV_COLUMNS.length);
    expect([
      cell(0, 'operation'),
      cell(0, 'readyDays'),
      cell(0, 'mustHaveSign'),
      cell(0, 'stopDate'),
    ]).toEqual([...['sow', '14', '1', '07-05']]);
    expect(cell(0, 'checkedWork')).toBe('R. Ansel | Agricultural office | 2027-02-03');
    expect([cell(1, 'sinceYear'), cell(1, 'ifEarly'), cell(1, 'variety')]).toEqual(['-1500', '-1', '-5']);
    expect([cell(1, 'responsible'), cell(1, 'checkedWork')?.slice(0, 3)]).toEqual(["'@women", "'=R"]);
    const runs = lines.flat().filter((each) => /^[=+@]|^-(?!\d+$)/u.test(each));
    expect(runs).toEqual([]);
  });

  it('holds no sign that fewer people see by now', async () => {
    const { officer } = village;
    const sign = await addSign(officer, { name: 'The hidden bird', type: 'bird' });
    const list = [{ type: 'bird' as const, name: 'x', look: '', where: '', usual: null, stillSeen: null }];
    const calendarId = await begin();
    await addEntry(officer, calendarId, {
      record: wholeRecord({
        signs: { list: list.map((each) => ({ ...each, sharedId: sign.id })), needed: 1, mustHave: 0 },
      }),
    });
    expect(await exported(calendarId)).toContain('The hidden bird');
    const path = sharingPath(officer, 'sign', sign.id);
    const { version } = (await officer.get(path).expect(200)).body as { version: number };
    await officer.put(path, { sharing: { level: 'elders', ...PLAIN_DETAILS }, version }).expect(200);
    expect(await exported(calendarId)).not.toContain('The hidden bird');
  });
});

describe.each(TABLE_LANGUAGES)('the empty table in %s', (language: TableLanguage) => {
  it('comes in as its examples say, and what is exported of it comes back equal', async () => {
    const { titleOf } = wordsOfTables(language);
    const { template }: ColumnTexts = tableTexts[language];
    const lines = Object.values(template.lines);
    const from = await begin();
    await send(from, linesOf(templateCsv(titleOf, lines)));
    const into = await begin();
    await send(into, linesOf(await exported(from)));
    const before = (await entriesOf(village.officer, from)).map(plain);
    const after = (await entriesOf(village.officer, into)).map(plain);
    // Which entry is meant is said by its number; ids are each draft's own.
    const withoutId = (contents: typeof before) =>
      contents.map((content) => ({ ...content, lead: { ...content.lead, entryId: '' } }));
    expect(before).toHaveLength(lines.length);
    expect(withoutId(after)).toEqual(withoutId(before));
    expect(before.map(({ titleOfficer }) => titleOfficer)).toEqual(lines.map((each) => each.titleOfficer));
  });
});

describe('a table of another hand', () => {
  const SOW = {
    ...{ titleOfficer: 'Sow', kind: 'farm', when: 'Pleiades, first morning', bestFromDays: '7' },
  };
  const read = async (cells: TableLine['cells']) => {
    const calendarId = await begin();
    const { lines } = await send(calendarId, [{ line: 2, cells: { ...SOW, ...cells } }], true);
    return lines[0]?.problems.map(({ column, code }) => `${column} ${code}`);
  };

  it('says its work and signs in words', async () => {
    const calendarId = await begin();
    const cells = {
      ...{
        operation: 'weeding',
        repeats: '',
        everyYears: '4',
        confidence: 'Fairly sure',
        basis: 'tradition',
      },
      ...{
        signs: 'Bird | weaver | | | 20 May | June dekad 1\nsoil|wet',
        mustHaveSign: 'WET',
        heardDay: '3 March 2025',
      },
      ...{
        checkedSafety: 'R. Ansel | Office | 3.3.2026',
        stopDate: 'first ten days of July',
        stopSource: 'Office',
      },
    };
    await send(calendarId, [{ line: 2, cells: { ...SOW, ...cells } }]);
    const [entry] = await entriesOf(village.officer, calendarId);
    expect(entry?.content.record).toMatchObject({
      what: { operation: 'weed' },
      when: { repeats: 'every-n-years', everyYears: 4 },
      signs: {
        list: [
          { type: 'bird', name: 'weaver', usual: { from: { month: 5, day: 20 }, to: { month: 6, day: 10 } } },
          { type: 'soil', name: 'wet', usual: null },
        ],
        mustHave: 1,
      },
      work: { stop: { date: { month: 7, day: 10 }, source: 'Office' } },
      trust: { confidence: 'fair', basis: 'handed-down' },
      heard: { day: '2025-03-03' },
      checked: { safety: { name: 'R. Ansel', office: 'Office', day: '2026-03-03' } },
    });
  });

  it.each([
    [{ operation: 'fly' }, 'operation unknown-operation'],
    [{ operation: 'something else' }, 'ownOperation required'],
    [{ readyDays: 'soon' }, 'readyDays whole-days'],
    [{ varietyFromDays: '90', varietyToDays: '80' }, 'varietyToDays days-order'],
    [{ repeats: 'often' }, 'repeats unknown-repeats'],
    [{ repeats: 'only in some years' }, 'repeatRule required'],
    [{ everyYears: '1' }, 'everyYears years-apart'],
    [{ signs: 'weaver bird' }, 'signs sign-parts'],
    [{ signs: 'dragon | weaver' }, 'signs unknown-sign-kind'],
    [{ signs: 'bird | weaver | | | 20 May' }, 'signs sign-parts'],
    [{ signs: 'bird | weaver | | | 31.4. | 1.5.' }, 'signs no-such-day-4'],
    [{ signs: 'bird | weaver | | | 5 June | 20 May' }, 'signs swapped-usual'],
    [{ signs: 'bird | weaver | | | 20 May | June 1' }, 'signs day-or-ten-days'],
    [{ stopDate: 'July 1', stopSource: 'Office' }, 'stopDate day-or-ten-days'],
    [{ signs: 'bird | weaver | | | | | perhaps' }, 'signs unknown-still-seen'],
    [{ signs: 'bird | weaver', signsNeeded: '2' }, 'signsNeeded signs-needed'],
    [{ signs: 'bird | weaver', mustHaveSign: '2' }, 'mustHaveSign which-sign'],
    [{ stopDate: '1 July' }, 'stopSource stop-needs-source'],
    [{ stopSource: 'Office' }, 'stopDate stop-needs-date'],
    [{ confidence: '80 %' }, 'confidence unknown-confidence'],
    [{ basis: 'gut' }, 'basis unknown-basis'],
    [{ heardDay: '29 February 2025' }, 'heardDay not-a-past-day'],
    [{ heardDay: '3 March' }, 'heardDay not-a-past-day'],
    [{ checkedWork: 'R. Ansel' }, 'checkedWork check-parts'],
  ])('is told at %j: %s', async (cells, problem) => {
    expect(await read(cells)).toEqual([problem]);
    const code = problem.split(' ')[1] ?? '';
    expect(en.problems.field).toHaveProperty(code);
  });
});
