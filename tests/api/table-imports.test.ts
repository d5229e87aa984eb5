import { randomUUID } from 'node:crypto';
import { readFileSync } from 'node:fs';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { ImportColumn, TableImport, TableInput, TableLine } from '#shared/contracts/imports.js';
import type { Problem } from '#shared/contracts/problem.js';
import { en } from '#shared/locales/index.js';
import { guessColumns, matchedLines } from '#src/features/imports/model/match-columns.js';
import { readTable } from '#src/features/imports/model/read-table.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import {
  addEntry,
  beginCalendar,
  entriesOf,
  openVillage,
  reasonOf,
  submit,
  takeBack,
  type Village,
} from '#tests/support/calendar-api.js';

/** Lines of somebody's table, as entries of a draft. */
let api: TestApi;
let village: Village;
let years = 2030;
beforeAll(async () => {
  api = await openTestApi();
  village = await openVillage(api);
}, 60_000);
afterAll(() => api.close());

const begin = async () => (await beginCalendar(village, (years += 1))).id;
const line = (cells: TableLine['cells'], number = 2): TableLine => ({ line: number, cells });
const SOW = {
  ...{ titleOfficer: 'Sow', kind: 'Farm work', when: 'Pleiades, first morning' },
  ...{ bestFromDays: '7', bestToDays: '23' },
};
const input = (lines: TableLine[], changes: Partial<TableInput> = {}): TableInput => ({
  ...{ key: randomUUID(), dryRun: false, dayOrder: null, lines },
  ...changes,
});
const send = (calendarId: string, body: TableInput, client: Client = village.officer) =>
  client.post(`/api/calendars/${calendarId}/imports/table`, body);
const sent = async (calendarId: string, body: TableInput) =>
  (await send(calendarId, body).expect(200)).body as TableImport;

const titlesOf = (column: ImportColumn) => [
  column === 'when' ? en.imports.column.when : en.files.calendarCsv.column[column],
  ...en.imports.alias[column].split('|'),
];
const linesOf = (text: string) => {
  const table = readTable(text);
  return matchedLines(table, guessColumns(table.titles, titlesOf));
};

describe('a table', () => {
  it('is looked at without a trace: what each line would become, and what is the matter where', async () => {
    const calendarId = await begin();
    const lines = [
      line(SOW, 2),
      line({ titleOfficer: 'Mend', kind: 'farming', bestFrom: '6/7' }, 4),
      line({ kind: 'magic', bestFrom: '31.4.', bestTo: 'June 2' }, 5),
    ];
    const read = await sent(calendarId, input(lines, { dryRun: true }));
    expect(read.added).toBe(1);
    expect(read.lines.map(({ line: number, title, problems }) => [number, title, problems])).toEqual([
      [2, 'Sow', []],
      [4, 'Mend', [{ column: 'bestFrom', code: 'which-first' }]],
      [
        5,
        '',
        [
          { column: 'bestFrom', code: 'no-such-day' },
          { column: 'kind', code: 'unknown-kind' },
          { column: 'titleOfficer', code: 'required' },
        ],
      ],
    ]);
    expect(read.lines[0]?.window?.bestFrom).toMatch(/-06-1\d$/u);
    expect(await entriesOf(village.officer, calendarId)).toEqual([]);
  });

  it('comes in whole or not at all', async () => {
    const calendarId = await begin();
    const refused = await send(calendarId, input([line(SOW), line({ ...SOW, bestToDays: '1' }, 3)]));
    expect((refused.body as Problem).errors).toMatchObject([
      { field: 'lines.1.cells.bestToDays', code: 'window-order' },
    ]);
    expect(await entriesOf(village.officer, calendarId)).toEqual([]);
    const lines = [line(SOW), line({ ...SOW, titleOfficer: 'Sow again' }, 3)];
    expect((await sent(calendarId, input(lines))).added).toBe(2);
  });

  it('comes in once, however often and however much at once it is sent', async () => {
    const calendarId = await begin();
    const body = input([line(SOW)]);
    await Promise.all([sent(calendarId, body), sent(calendarId, body), sent(calendarId, body)]);
    expect(await sent(calendarId, body)).toEqual({ added: 1, lines: [] });
    expect(await entriesOf(village.officer, calendarId)).toHaveLength(1);
    expect(reasonOf(await send(await begin(), body))).toBe('409 key-used');
  });

  it('lands as a draft of the village behind what is there, beliefs with the elders, and nobody has agreed', async () => {
    const calendarId = await begin();
    await addEntry(village.officer, calendarId, { titleOfficer: 'There before' });
    const rite = { ...SOW, titleOfficer: 'First fruits', kind: 'belief/ritual', giver: 'Elder A-3' };
    await sent(calendarId, input([line(SOW), line(rite, 3)]));
    const seen = await entriesOf(village.elder, calendarId);
    expect(
      seen.map(({ content }) => [content.titleOfficer, content.sharingLevel, content.agreedToPrint]),
    ).toEqual([
      ['There before', 'open', false],
      ['Sow', 'village', false],
      ['First fruits', 'elders', false],
    ]);
    expect(JSON.stringify(await entriesOf(village.steward, calendarId))).not.toContain('First fruits');
    const consents = await village.elder
      .get(`/api/communities/${village.elder.communityId}/items/entry/${seen[2]?.id ?? ''}/consents`)
      .expect(200);
    expect(consents.body).toMatchObject({ items: [] });
    const version = await submit(village.officer, calendarId);
    expect(reasonOf(await send(calendarId, input([line(SOW)])))).toBe('409 draft-locked');
    await takeBack(village.officer, version);
  });

  it('is not brought in by those who do not compile, nor past five hundred entries', async () => {
    const calendarId = await begin();
    expect(reasonOf(await send(calendarId, input([line(SOW)]), village.elder))).toBe('403 not-allowed');
    const many = (count: number) => Array.from({ length: count }, (_, index) => line(SOW, index + 2));
    await sent(calendarId, input(many(500)));
    expect(reasonOf(await send(calendarId, input([line(SOW)])))).toBe('409 too-many-entries');
    expect((await send(calendarId, input(many(501))).expect(422)).body).toMatchObject({
      errors: [{ field: 'lines', code: 'too-many' }],
    });
  });

  it('of our own comes back as it was written, whatever the words', async () => {
    const { officer } = village;
    const from = await begin();
    await addEntry(officer, from, {
      ...{ otherSigns: '=1+2', ifLate: '-5' },
      caution: 'Mind, "the" dog;\nand more',
    });
    await addEntry(officer, from, {
      lead: { type: 'fixed-date', date: { month: 12, day: 28 }, source: 'Water committee' },
      offsets: { earliestDays: 0, bestFromDays: 1, bestToDays: 7, lastAdvisedDays: 9 },
      protectiveWatch: true,
    });
    await addEntry(officer, from, {
      lead: { type: 'sky', spec: { kind: 'zenith-sun' }, occurrence: 2 },
      ...{ hasLastDate: true, lastDate: { date: { month: 7, day: 5 }, source: 'Office' } },
    });
    const text = (await officer.get(`/api/calendars/${from}/versions/draft/calendar.csv`).expect(200)).text;
    const into = await begin();
    await sent(into, input(linesOf(text)));
    const plain = async (calendarId: string) =>
      (await entriesOf(officer, calendarId)).map(({ content: { sharingLevel: _level, ...rest } }) => rest);
    expect(await plain(into)).toEqual(await plain(from));
  });
});

/** `tests/fixtures/demo/demo-events.csv`, a table of another hand, matched by its titles alone. */
describe('the table of the demo', () => {
  const DEMO = readFileSync(new URL('../fixtures/demo/demo-events.csv', import.meta.url), 'utf8');

  it('comes in but for the lines whose anchors no table can say; those are named with the reason', async () => {
    const calendarId = await begin();
    const lines = linesOf(DEMO);
    const read = await sent(calendarId, input(lines, { dryRun: true }));
    const refused = read.lines.filter(({ problems }) => problems.length > 0);
    expect(refused.map(({ title, problems }) => [title, problems.map(({ code }) => code).join()])).toEqual([
      // What was really done, in this year and by somebody.
      ['First weeding', 'unknown-sign-words'],
      ['Second weeding', 'unknown-sign-words'],
      ['Earthing-up', 'unknown-sign-words'],
      // The Sun over a ridge and a star due south at an hour are set up in the editor.
      ['Sun back over the south ridge', 'unknown-sign-words'],
      ['Three-in-a-row due south at nine in the evening', 'unknown-sign-words'],
      ['Order seed potato and oats', 'unknown-sign-words'],
      // Spring comes in March or in September; midsummer is no one day.
      ['Chit seed potato', 'unknown-sign-words'],
      ['Stop using the ice road', 'unknown-sign-words'],
      ['Net and boat overhaul', 'unknown-sign-words'],
      // Birch leaves have no usual days in the table.
      ['Sow oats and fodder', 'unknown-sign-words'],
      ['Plant potato', 'unknown-sign-words'],
      ['Hay', 'unknown-sign-words'],
      ['First star again', 'unknown-sign-words'],
      ['Berry week', 'unknown-sign-words'],
      ['Lift potato before frost', 'unknown-sign-words'],
    ]);
    expect(read.added).toBe(lines.length - refused.length);
    const gone = new Set(refused.map((each) => each.line));
    const rest = lines.filter((each) => !gone.has(each.line));
    expect((await sent(calendarId, input(rest))).added).toBe(rest.length);
    const seen = await entriesOf(village.elder, calendarId);
    const sow = seen.find(({ content }) => content.titleOfficer === 'Sow long millet');
    expect(sow?.content).toMatchObject({
      ...{ kind: 'farm', crop: 'long finger millet (about 130 days)', giver: 'Elder A-1' },
      lead: { type: 'marker', markerKey: 'pleiades', phenomenon: 'heliacal-rising' },
      // Four days between 10 and 14 June, five between 30 June and 5 July.
      offsets: { earliestDays: 3, bestFromDays: 7, bestToDays: 23, lastAdvisedDays: 28 },
      otherSigns: 'Soil wet to a hand depth; weaver birds building; fig tree in new leaf',
    });
    const frost = seen.find(({ content }) => content.titleOfficer === 'Frost watch');
    expect(frost?.content.offsets).toEqual({
      ...{ earliestDays: -12, bestFromDays: -8, bestToDays: 77, lastAdvisedDays: 87 },
    });
  });
});
