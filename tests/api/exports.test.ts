import ICAL from 'ical.js';
import Papa from 'papaparse';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createHash } from 'node:crypto';
import { CALENDAR_CSV_COLUMNS } from '#shared/calendar/csv-columns.js';
import { CALENDAR_FILE_PARTS, calendarFile, type CalendarFile } from '#shared/contracts/calendar-file.js';
import { canonicalJson } from '#shared/kernel/canonical-json.js';
import { csvText, csvWords } from '#shared/kernel/csv.js';
import { en } from '#shared/locales/index.js';
import type { Entry } from '#shared/contracts/calendars.js';
import type { Version } from '#shared/contracts/versions.js';
import { TABLE_LANGUAGES } from '#shared/locales/table-languages.js';
import { tableTexts } from '#shared/locales/tables.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import {
  addEntry,
  beginCalendar,
  openVillage,
  publishDraft,
  type Village,
} from '#tests/support/calendar-api.js';
import { addConsent } from '#tests/support/consent-api.js';
import { addGroup, details } from '#tests/support/sharing-api.js';
import { addVariant } from '#tests/support/variant-api.js';

/** What leaves the calendar as a file, read by other people's parsers. */
let api: TestApi;
let village: Village;
let staff: Client;
let calendarId: string;
let published: Version;
let sow: Entry;
let watch: Entry;
beforeAll(async () => {
  api = await openTestApi();
  village = await openVillage(api);
  staff = await api.signIn('staff');
  const { officer, elder } = village;
  calendarId = (await beginCalendar(village)).id;
  sow = await addEntry(officer, calendarId, {
    titleOfficer: '=Sow; long, millet\\',
    caution: 'Mind the seed,\nand the dog; always',
    ifLate: '-5',
    otherSigns: 'ŋɔ́rɛ̃ ɓèŋu '.repeat(20).trim(),
  });
  watch = await addEntry(officer, calendarId, {
    titleOfficer: 'Watch over the year’s end',
    kind: 'safety',
    caution: 'The river rises at night.',
    protectiveWatch: true,
    lead: { type: 'fixed-date', date: { month: 12, day: 28 }, source: 'Water committee' },
    offsets: { earliestDays: 0, bestFromDays: 1, bestToDays: 7, lastAdvisedDays: 9 },
  });
  const noFeed = await addEntry(officer, calendarId, { titleOfficer: 'Not for telephones' });
  await addConsent(officer, 'entry', noFeed.id, { uses: ['keep', 'show', 'print'] });
  await addEntry(elder, calendarId, { titleOfficer: 'Of the elders', sharingLevel: 'elders' });
  const group = await addGroup(village.steward, 'Lamp-makers', [elder, staff]);
  await addEntry(elder, calendarId, {
    ...{ titleOfficer: 'Of the lamp-makers', sharingLevel: 'group' },
    sharing: details({ groupId: group.id }),
  });
  published = await publishDraft(village, calendarId);
  await addEntry(officer, calendarId, { titleOfficer: 'Later in the draft' });
}, 60_000);
afterAll(() => api.close());

const path = (number: string | number, file: string) =>
  `/api/calendars/${calendarId}/versions/${number}/${file}`;
const textOf = async (client: Client, number: string | number, file: string) =>
  (await client.get(path(number, file)).expect(200)).text;

describe('iCalendar', () => {
  const parsed = (text: string) => new ICAL.Component(ICAL.parse(text) as unknown[]);
  const eventsOf = (text: string) =>
    parsed(text)
      .getAllSubcomponents('vevent')
      .map((component) => new ICAL.Event(component));
  const event = (text: string, { id }: Entry) => {
    const found = eventsOf(text).find(({ uid }) => uid.startsWith(id));
    if (found === undefined) throw new Error('The entry is not in the file.');
    return found;
  };

  it('is read by another program: whole days from best to best, the end after the last of them', async () => {
    const answer = await staff.get(path(published.number, 'calendar.ics')).expect(200);
    expect(answer.headers['content-type']).toBe('text/calendar; charset=utf-8');
    const read = event(answer.text, sow);
    const { window } = sow.dates;
    expect(read.startDate.isDate).toBe(true);
    expect(read.startDate.toString()).toBe(window?.bestFrom);
    const last = read.endDate.clone();
    last.addDuration(ICAL.Duration.fromString('-P1D'));
    expect(last.toString()).toBe(window?.bestTo);
    expect(read.summary).toBe(`${sow.content.titleVillage} · =Sow; long, millet\\`);
    expect(read.description).toContain('Mind the seed,\nand the dog; always');
    expect(read.description).toContain(sow.content.otherSigns);
    expect(read.component.getFirstPropertyValue('categories')).toBe('Farm work');
  });

  it('has the day of the marker once, with its range in words and the caution for eyes', async () => {
    const text = await textOf(staff, published.number, 'calendar.ics');
    const signs = eventsOf(text).filter(({ uid }) => uid.startsWith('sign-'));
    expect(signs).toHaveLength(1);
    expect(signs[0]?.startDate.toString()).toBe(sow.dates.marker?.expected.gregorian);
    expect(signs[0]?.description).toMatch(/about \d+\sJune \(.+\)\.\n.*stop before the Sun shows/su);
  });

  it('goes over the end of the year', async () => {
    const read = event(await textOf(staff, published.number, 'calendar.ics'), watch);
    expect([read.startDate.toString(), read.endDate.toString()]).toEqual(['2027-12-29', '2028-01-05']);
  });

  it('ends every line with CRLF and folds at 75 octets', async () => {
    const text = await textOf(staff, published.number, 'calendar.ics');
    expect(text.replaceAll('\r\n', '')).not.toMatch(/[\r\n]/u);
    expect(Math.max(...text.split('\r\n').map((line) => Buffer.byteLength(line)))).toBeLessThanOrEqual(75);
  });

  it('keeps the UID of a thing and raises SEQUENCE with the version; the draft is tentative', async () => {
    const now = event(await textOf(village.officer, published.number, 'calendar.ics'), sow);
    const draft = event(await textOf(village.officer, 'draft', 'calendar.ics'), sow);
    expect(draft.uid).toBe(now.uid);
    expect(draft.sequence).toBeGreaterThan(now.sequence);
    const status = ({ component }: ICAL.Event) => component.getFirstPropertyValue('status');
    expect([status(now), status(draft)]).toEqual(['CONFIRMED', 'TENTATIVE']);
    await staff.get(path('draft', 'calendar.ics')).expect(404);
  });

  it('keeps nobody’s time busy, and is stamped with when it was sent, however often it is fetched', async () => {
    const [first, again] = [
      await textOf(staff, published.number, 'calendar.ics'),
      await textOf(staff, published.number, 'calendar.ics'),
    ];
    expect(again).toBe(first);
    for (const { component } of eventsOf(first)) {
      expect(component.getFirstPropertyValue('transp')).toBe('TRANSPARENT');
      const stamp = component.getFirstPropertyValue('dtstamp') as ICAL.Time;
      expect(stamp.toJSDate().toISOString().slice(0, 19)).toBe(published.submittedAt.slice(0, 19));
    }
  });

  it('goes by the timing that drives the board, or tells the other one beside it', async () => {
    const { officer, elder3 } = village;
    const other = (await beginCalendar(village, 2029)).id;
    const shown = async (shows: 'entry' | 'variant' | 'both', titleOfficer: string) => {
      const entry = await addEntry(officer, other, { titleOfficer, hasLastDate: false, lastDate: null });
      const variant = await addVariant(elder3, other, entry.id, { sharingLevel: 'village' });
      const variantId = shows === 'variant' ? variant.variantId : null;
      const content = { ...entry.content, board: { shows, variantId, reason: 'As the elders said' } };
      await officer
        .put(`/api/calendars/${other}/entries/${entry.id}`, { content, version: entry.version })
        .expect(200);
      return { entry, variant };
    };
    const led = await shown('variant', 'Led by the other');
    const both = await shown('both', 'Both of them');
    const own = await shown('entry', 'The entry alone');
    const text = (await officer.get(`/api/calendars/${other}/versions/draft/calendar.ics`).expect(200)).text;
    const days = ({ entry }: { entry: Entry }) => event(text, entry).startDate.toString();
    expect(days(led)).toBe(led.variant.dates.window?.bestFrom);
    expect(days(both)).toBe(both.entry.dates.window?.bestFrom);
    expect(days(led)).not.toBe(days(both));
    expect(event(text, both.entry).description).toContain('By another timing: Best days: ');
    expect(event(text, own.entry).description).not.toContain('By another timing');
  });

  it('reminds nobody unless asked to, and then as many days ahead', async () => {
    expect(await textOf(staff, published.number, 'calendar.ics')).not.toContain('VALARM');
    const asked = event(await textOf(staff, published.number, 'calendar.ics?alarmDays=3'), sow);
    const [alarm] = asked.component.getAllSubcomponents('valarm');
    expect(String(alarm?.getFirstPropertyValue('trigger'))).toBe('-P3D');
    const refused = await staff.get(path(published.number, 'calendar.ics?alarmDays=61')).expect(422);
    expect(refused.body).toMatchObject({ type: '/problems/invalid-input' });
  });

  it('holds nothing above the village, whoever asks, and nothing that was not agreed for it', async () => {
    for (const client of [village.elder, village.officer, staff]) {
      const text = await textOf(client, published.number, 'calendar.ics');
      expect(text).not.toMatch(/Of the elders|Of the lamp-makers|Not for telephones/u);
    }
  });
});

describe('CSV', () => {
  const tableOf = (text: string) => {
    const { data, errors, meta } = Papa.parse<string[]>(text, { skipEmptyLines: true });
    expect([errors, meta.linebreak]).toEqual([[], '\r\n']);
    const [titles = [], ...lines] = data;
    expect(titles).toEqual(CALENDAR_CSV_COLUMNS.map(({ id }) => en.files.calendarCsv.column[id]));
    return lines.map((cells) =>
      Object.fromEntries(CALENDAR_CSV_COLUMNS.map(({ id }, index) => [id, csvWords(cells[index] ?? '')])),
    );
  };

  it('gives back to another program exactly what stands in the calendar', async () => {
    const answer = await staff.get(path(published.number, 'calendar.csv?mark=no')).expect(200);
    expect(answer.headers['content-type']).toBe('text/csv; charset=utf-8');
    const [line, second] = tableOf(answer.text);
    const { titleVillage, titleOfficer, caution, otherSigns } = sow.content;
    const { window, marker } = sow.dates;
    expect(line).toMatchObject({
      ...{ titleVillage, titleOfficer, caution, otherSigns, ifLate: '-5', kind: 'farm', level: '' },
      ...{ earliest: window?.earliest, bestFrom: window?.bestFrom, bestTo: window?.bestTo },
      ...{ lastAdvised: window?.lastAdvised, signExpected: marker?.expected.gregorian },
      ...{ signEarly: marker?.early?.gregorian, signLate: marker?.late?.gregorian },
      ...{ leadType: 'marker', leadMarker: 'pleiades', leadOccurrence: '1', bestFromDays: '7' },
    });
    expect(second).toMatchObject({
      ...{ leadType: 'fixed-date', leadDate: '12-28', leadSource: 'Water committee' },
      ...{ protectiveWatch: 'yes', earliestDays: '0' },
    });
  });

  it('is titled in the language that is asked for; what stands in the lines is the same', async () => {
    const csv = (language: string) =>
      textOf(village.officer, 'draft', `calendar.csv?mark=no&language=${language}`);
    const [, ...english] = Papa.parse<string[]>(await csv('en'), { delimiter: ',' }).data;
    const about = CALENDAR_CSV_COLUMNS.flatMap(({ part }, index) => (part === 'about' ? [index] : []));
    const plain = (lines: string[][]) => lines.map((line) => line.filter((_, at) => !about.includes(at)));
    for (const language of TABLE_LANGUAGES) {
      const { column, file } = tableTexts[language];
      const [titles, ...lines] = Papa.parse<string[]>(await csv(language), { delimiter: ',' }).data;
      expect(titles).toEqual(CALENDAR_CSV_COLUMNS.map(({ id }) => column[id]));
      expect(plain(lines)).toEqual(plain(english));
      expect(lines[0]).toEqual(expect.arrayContaining([file.state.draft, file.caution]));
    }
  });

  it('runs no formula in a spreadsheet and leaves numbers alone', async () => {
    const text = await textOf(staff, published.number, 'calendar.csv?mark=no');
    expect(text).toContain(',"\'=Sow; long, millet\\",');
    expect(text).toContain(',-5,');
    const words = ['=1', "'=1", "''@x", '-5', '+3.25', '-5 days', '\t', "'plain", 'a"b,c\nd', ''];
    expect(Papa.parse<string[]>(csvText([words])).data[0]?.map(csvWords)).toEqual(words);
  });

  it('begins with the sign of UTF-8 unless that is not wanted', async () => {
    const bytes = async (query: string) =>
      Buffer.from((await staff.get(path(published.number, `calendar.csv${query}`)).expect(200)).text);
    const mark = Buffer.from('\ufeff');
    expect((await bytes('')).subarray(0, 3).equals(mark)).toBe(true);
    expect((await bytes('?mark=no')).subarray(0, 3).equals(mark)).toBe(false);
  });

  it('says the level to whoever compiles and reviews, marks the draft, and holds what the telephone may hold', async () => {
    const lines = tableOf(await textOf(village.officer, 'draft', 'calendar.csv?mark=no'));
    expect(lines.map(({ titleOfficer, level, issue }) => [titleOfficer, level, issue])).toEqual([
      ['=Sow; long, millet\\', 'open', 'draft'],
      ['Watch over the year’s end', 'open', 'draft'],
      ['Later in the draft', 'open', 'draft'],
    ]);
    await staff.get(path('draft', 'calendar.csv')).expect(404);
  });
});

describe('JSON', () => {
  it('is whole: its own form, every part with a checksum that another hand can make again', async () => {
    const answer = await staff.get(path(published.number, 'calendar.json')).expect(200);
    expect(answer.headers['content-type']).toContain('application/json');
    const file = calendarFile.parse(answer.body);
    for (const part of CALENDAR_FILE_PARTS) {
      const text = canonicalJson((answer.body as CalendarFile)[part]);
      expect(createHash('sha256').update(text).digest('hex')).toBe(file.checksums[part]);
    }
    expect(file.source).toMatchObject({ calendarId, number: published.number, versionHash: published.hash });
    expect(file.entries.map(({ content }) => content)).toEqual([sow.content, watch.content]);
    expect(file.source.cautions.join()).toContain('Never look at the Sun');
  });

  it('holds what other files hold, whoever asks, and the draft for those who see it', async () => {
    const text = await textOf(village.elder, 'draft', 'calendar.json');
    expect(text).toContain('Later in the draft');
    expect(text).not.toMatch(/Of the elders|Of the lamp-makers|Not for telephones|salt/u);
    await staff.get(path('draft', 'calendar.json')).expect(404);
  });
});
