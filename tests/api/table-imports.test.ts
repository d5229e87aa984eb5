import { randomUUID } from 'node:crypto';
import { readFileSync } from 'node:fs';
import Papa from 'papaparse';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { TableImport, TableInput, TableLine } from '#shared/contracts/imports.js';
import type { Problem } from '#shared/contracts/problem.js';
import { CalendarEntity } from '#server/db/entities/calendar.entity.js';
import { EntryEntity } from '#server/db/entities/entry.entity.js';
import { CALENDAR_CSV_COLUMNS } from '#shared/calendar/csv-columns.js';
import { daysBetween } from '#shared/kernel/iso-date.js';
import { WRITE_KEY_HEADER } from '#shared/contracts/write-key.js';
import { wordsOfTables } from '#src/features/imports/model/table-languages.js';
import { guessColumns, matchedLines } from '#src/features/imports/model/match-columns.js';
import { readTable } from '#src/features/imports/model/read-table.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import {
  addEntry,
  beginCalendar,
  changePlace,
  entriesOf,
  openVillage,
  reasonOf,
  submit,
  takeBack,
  type Village,
} from '#tests/support/calendar-api.js';
import { addVariant } from '#tests/support/variant-api.js';

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
  ...{ dryRun: false, dayOrder: null, natureSigns: [], lines },
  ...changes,
});
const send = (calendarId: string, body: TableInput, client: Client = village.officer, key = randomUUID()) =>
  client.post(`/api/calendars/${calendarId}/imports/table`, body).set(WRITE_KEY_HEADER, key);
const sent = async (calendarId: string, body: TableInput, key = randomUUID()) =>
  (await send(calendarId, body, village.officer, key).expect(200)).body as TableImport;

const { titles } = wordsOfTables('en');
const linesOf = (text: string) => {
  const table = readTable(text);
  return matchedLines(table, guessColumns(table.titles, titles));
};

describe('a table', () => {
  it('is looked at without a trace: what each line would become, and what is the matter where', async () => {
    const calendarId = await begin();
    const lines = [
      line(SOW, 2),
      line({ titleOfficer: 'Mend', kind: 'farming', bestFrom: '6/7' }, 4),
      line({ kind: 'magic', bestFrom: '31.4.', bestTo: 'May 2' }, 5),
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
          { column: 'bestFrom', code: 'no-such-day-4' },
          { column: 'bestTo', code: 'day-or-ten-days' },
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
    const key = randomUUID();
    const again = () => sent(calendarId, body, key);
    await Promise.all([again(), again(), again()]);
    expect(await again()).toEqual({ added: 1, lines: [] });
    expect(await entriesOf(village.officer, calendarId)).toHaveLength(1);
    const other = input([line({ ...SOW, titleOfficer: 'Reap' })]);
    expect(reasonOf(await send(calendarId, other, village.officer, key))).toBe('409 write-key-used');
    expect(reasonOf(await send(await begin(), body, village.officer, key))).toBe('409 write-key-used');
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
    const refused = await village.officer.post(`/api/calendars/${calendarId}/versions`);
    expect((refused.body as Problem).names).toEqual(['Sow', 'First fruits']);
    await api.dataSource.getRepository(EntryEntity).update({ calendarId }, { isOlder: true });
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
    await addEntry(officer, from, { lead: { type: 'none', way: 'nature-sign' } });
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
  const DEMO = linesOf(readFileSync(new URL('../fixtures/demo/demo-events.csv', import.meta.url), 'utf8'));
  const BIRCH = 'Birch leaf the size of a thumbnail';
  const of = (letter: string) => DEMO.filter(({ cells }) => (cells.number ?? '').startsWith(letter));
  /** As the village is whose lines they are: spring comes in another month on the other side of the Earth. */
  const at = async (latitudeDeg: number) => {
    await changePlace(api, village.placeId, { latitudeDeg });
    return begin();
  };
  const refusedOf = ({ lines }: TableImport) =>
    lines
      .filter(({ problems }) => problems.length > 0)
      .map(({ title, problems }) => [title, problems.map(({ code }) => code).join()]);
  afterAll(() => changePlace(api, village.placeId, { latitudeDeg: 12 }));

  it('comes in but for three lines that do not say which work they count from, and one that goes by a log', async () => {
    const tazimel = await at(12);
    const vardesca = await at(-14);
    const tholmere = await at(66);
    const look = (calendarId: string, letter: string, natureSigns: string[] = []) =>
      sent(calendarId, input(of(letter), { dryRun: true, natureSigns }));
    // There are two sowings and three plantings in the table.
    expect(refusedOf(await look(tazimel, 'A'))).toEqual([
      ['First weeding', 'which-entry'],
      ['Second weeding', 'which-entry'],
    ]);
    expect(refusedOf(await look(vardesca, 'B'))).toEqual([['Earthing-up', 'which-entry']]);
    // No list knows these words until somebody says that a leaf is a sign of nature; a log and a notice are none.
    expect(refusedOf(await look(tholmere, 'C'))).toEqual([
      ['Stop using the ice road', 'unknown-sign-words'],
      ['Sow oats and fodder', 'unknown-sign-words'],
      ['Plant potato', 'unknown-sign-words'],
    ]);
    const north = await look(tholmere, 'C', [BIRCH]);
    expect(refusedOf(north)).toEqual([['Stop using the ice road', 'unknown-sign-words']]);
    expect(north.lines.map(({ lead }) => lead && ('spec' in lead ? lead.spec : lead.type))).toEqual([
      { kind: 'noon-sun', passage: 'back', ridgeName: '2-degree ridge' },
      { kind: 'due-meridian', markerKey: 'orion-belt', facing: 'south', solarHour: 21 },
      { kind: 'due-meridian', markerKey: 'orion-belt', facing: 'south', solarHour: 21 },
      { kind: 'sun-season', season: 'march-equinox' },
      null,
      { kind: 'dark-night', end: 'last', depthDeg: 6 },
      ...['nature-sign', 'nature-sign'],
      { kind: 'sun-season', season: 'june-solstice' },
      { kind: 'dark-night', end: 'first', depthDeg: 6 },
      { kind: 'dark-night', end: 'first', depthDeg: 6 },
      { kind: 'dark-night', end: 'first', depthDeg: 15 },
      'marker',
    ]);
    expect(north.lines.find(({ title }) => title === 'Plant potato')?.lead).toMatchObject({
      name: BIRCH,
      // The best days less as many days as they come after the leaf: 30 May less five, 12 June less eighteen.
      usual: { from: { month: 5, day: 25 }, to: { month: 5, day: 25 } },
    });
  });

  it('comes in whole once each line says from which work it is counted', async () => {
    const calendarId = await at(12);
    const lines = of('A').map((each) =>
      each.cells.when === 'Actual sowing date'
        ? line({ ...each.cells, when: 'actual date of A04' }, each.line)
        : each,
    );
    expect((await sent(calendarId, input(lines))).added).toBe(lines.length);
    const seen = await entriesOf(village.elder, calendarId);
    const sow = seen.find(({ content }) => content.titleOfficer === 'Sow long millet');
    expect(sow?.content).toMatchObject({
      ...{ kind: 'farm', crop: 'long finger millet (about 130 days)', giver: 'Elder A-1' },
      lead: { type: 'marker', markerKey: 'pleiades', phenomenon: 'heliacal-rising' },
      // Four days between 10 and 14 June, five between 30 June and 5 July.
      offsets: { earliestDays: 3, bestFromDays: 7, bestToDays: 23, lastAdvisedDays: 28 },
      otherSigns: 'Soil wet to a hand depth; weaver birds building; fig tree in new leaf',
    });
    const weed = seen.find(({ content }) => content.titleOfficer === 'First weeding');
    expect(weed?.content.lead).toEqual({ type: 'entry-actual', entryId: sow?.id });
    expect(weed?.dates.warnings).toContain('waits-for-actual-day');
  });
});

describe('a line that counts from other work', () => {
  const SPREAD = { ...SOW, titleOfficer: 'Spread', number: '1' };
  const after = (when: string) => ({ ...SOW, titleOfficer: 'After it', when });
  const codesOf = async (calendarId: string, lines: TableLine[]) =>
    (await sent(calendarId, input(lines, { dryRun: true }))).lines.map(({ problems }) =>
      problems.map(({ column, code }) => `${column} ${code}`).join(),
    );

  it('names a line by number or title, or an entry of the draft, and is told its days before anything is kept', async () => {
    const calendarId = await begin();
    const before = await addEntry(village.officer, calendarId, { titleOfficer: 'Plough' });
    const lines = [line(SPREAD), line(after('end of Spread')), line(after('planned date of Plough'))];
    const read = await sent(calendarId, input(lines, { dryRun: true }));
    const [spread, hung, ofDraft] = read.lines;
    expect(daysBetween(spread?.window?.bestTo ?? '', hung?.window?.bestFrom ?? '')).toBe(7);
    expect(daysBetween(before.dates.window?.bestFrom ?? '', ofDraft?.window?.bestFrom ?? '')).toBe(7);
    expect((await sent(calendarId, input(lines))).added).toBe(3);
  });

  it('is refused where it names none or several, hangs on itself, or on what fewer people will see', async () => {
    const calendarId = await begin();
    const twice = { ...SPREAD, number: '2' };
    expect(await codesOf(calendarId, [line(SPREAD), line(twice), line(after('end of Spread'))])).toEqual([
      ...['', ''],
      'when which-entry',
    ]);
    const circle = [line({ ...after('end of 2'), number: '1' }), line({ ...after('end of 1'), number: '2' })];
    expect(await codesOf(calendarId, circle)).toEqual(['when anchor-circle', 'when anchor-circle']);
    const rite = { ...SPREAD, kind: 'belief' };
    expect(await codesOf(calendarId, [line(rite), line(after('end of 1'))])).toEqual([
      '',
      'when anchor-kept',
    ]);
  });

  it('of our own table comes back as it was, with other timings beside and the choice of the board', async () => {
    const { officer, elder3 } = village;
    const from = await begin();
    const sow = await addEntry(officer, from, { notes: 'Ask the committee' });
    const { variantId } = await addVariant(elder3, from, sow.id);
    await officer
      .put(`/api/calendars/${from}/entries/${sow.id}`, {
        content: { ...sow.content, board: { shows: 'variant', variantId, reason: '=It came first' } },
        version: sow.version,
      })
      .expect(200);
    const lead = { type: 'entry-planned', entryId: sow.id, day: 'bestTo' } as const;
    const weed = await addEntry(officer, from, { titleOfficer: 'Weed', lead });
    await addEntry(officer, from, {
      titleOfficer: 'Weed again',
      lead: { type: 'entry-actual', entryId: weed.id },
    });
    const usual = { from: { month: 5, day: 20 }, to: { month: 6, day: 2 } };
    await addEntry(officer, from, {
      ...{ titleOfficer: 'By the leaf', sharingLevel: 'village' },
      lead: { type: 'nature-sign', name: 'Birch leaf', usual, source: 'Elder A-1' },
    });
    const spec = { kind: 'moon-counted', markerKey: 'pleiades', phenomenon: 'heliacal-rising' } as const;
    await addEntry(officer, from, {
      ...{ titleOfficer: 'By the Moon', sharingLevel: 'village' },
      lead: { type: 'sky', spec: { ...spec, event: 'full', count: 2 }, occurrence: 1 },
    });
    const exported = async (calendarId: string) =>
      (await officer.get(`/api/calendars/${calendarId}/versions/draft/calendar.csv`).expect(200)).text;
    const text = await exported(from);
    expect(linesOf(text)).toHaveLength(6);
    // A calendar of the same year at the same place, so that every day is the same, too.
    await api.dataSource.getRepository(CalendarEntity).update({ id: from }, { year: 1999 });
    const into = (await beginCalendar(village, years)).id;
    expect((await sent(into, input(linesOf(text)))).added).toBe(5);
    const withoutLevel = (csv: string) =>
      Papa.parse<string[]>(csv, { delimiter: ',' }).data.map((cells) =>
        cells.filter((_, index) => CALENDAR_CSV_COLUMNS[index]?.id !== 'level'),
      );
    expect(withoutLevel(await exported(into))).toEqual(withoutLevel(text));
  });
});
