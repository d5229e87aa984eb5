import { createHash, randomUUID } from 'node:crypto';
import { readdirSync } from 'node:fs';
import path from 'node:path';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Attachment } from '#shared/contracts/attachments.js';
import type { CalendarFile } from '#shared/contracts/calendar-file.js';
import type { Entry } from '#shared/contracts/calendars.js';
import type { TakeAlong } from '#shared/contracts/exports.js';
import type { FileImport } from '#shared/contracts/imports.js';
import type { Problem } from '#shared/contracts/problem.js';
import { WRITE_KEY_HEADER } from '#shared/contracts/write-key.js';
import { canonicalJson } from '#shared/kernel/canonical-json.js';
import { WAITING_FILES } from '#server/app.js';
import { openTestApi, TEST_NOW, type Client, type TestApi } from '#tests/support/api.js';
import { addPicture, addRecording } from '#tests/support/attachment-api.js';
import { bytesOf } from '#tests/support/bytes-of.js';
import {
  addEntry,
  beginCalendar,
  beginTwin,
  entriesOf,
  openVillage,
  publishDraft,
  reasonOf,
  submit,
  takeBack,
  type Village,
} from '#tests/support/calendar-api.js';
import { addConsent } from '#tests/support/consent-api.js';
import { webm } from '#tests/support/media.js';
import { firstPlace } from '#tests/support/place-api.js';
import { details } from '#tests/support/sharing-api.js';
import { unzipped, zipped, type ZippedFile } from '#tests/support/zip.js';

/** Voices and pictures that travel with a calendar's own file. */
let api: TestApi;
let village: Village;
let fromId: string;
let intoId: string;
let sow: Entry;
let voice: Attachment;
beforeAll(async () => {
  api = await openTestApi();
});
const furnish = async () => {
  await api.reset();
  village = await openVillage(api);
  fromId = (await beginCalendar(village)).id;
  intoId = (await beginTwin(api, village)).id;
  const { officer, elder } = village;
  sow = await addEntry(officer, fromId, { giverId: elder.personId });
  const ofSow = { subjectType: 'entry', sharingLevel: 'village' } as const;
  const sharing = details({ naming: 'role' });
  voice = await addRecording(elder, sow.id, { ...ofSow, title: 'As it was told', sharing }, ['one', 'two']);
  // Later by a moment: lists are in the order in which things were added.
  api.clock.set(new Date(TEST_NOW.getTime() + 60_000));
  await addPicture(elder, sow.id, { ...ofSow, title: 'The first furrow' });
};
afterAll(() => api.close());

const versionOf = (calendarId: string, file: string, number = 'draft') =>
  `/api/calendars/${calendarId}/versions/${number}/${file}`;
const archiveOf = (calendarId = fromId, client = village.officer) =>
  bytesOf(client, versionOf(calendarId, 'calendar.zip'));
const jsonOf = async (calendarId: string) =>
  (await bytesOf(village.officer, versionOf(calendarId, 'calendar.json'))).toString();
const send = (file: Buffer, { dryRun = false, client = village.officer, key = randomUUID() } = {}) =>
  client.upload(`/api/calendars/${intoId}/imports/file`, { dryRun }, file).set(WRITE_KEY_HEADER, key);
const bringIn = async (file: Buffer, options = {}) =>
  (await send(file, options).expect(200)).body as FileImport;
const heard = async (client: Client, entryId: string) => {
  const query = `?subjectType=entry&subjectId=${entryId}`;
  const list = await client.get(`/api/communities/${client.communityId}/attachments${query}`).expect(200);
  return (list.body as { items: Attachment[] }).items;
};
const drafted = () => entriesOf(village.officer, intoId);
const keptFiles = async () => {
  const keys: string[] = [];
  for await (const key of api.storage.keys()) keys.push(key);
  return keys.toSorted();
};
/** Files that wait for the end of a call. */
const waiting = () => readdirSync(path.join(api.dataDir, WAITING_FILES));

describe('a calendar that is taken along with its files', () => {
  beforeAll(furnish);

  it('holds the very same JSON, and each file that it lists under its checksum', async () => {
    const [calendar, ...files] = await unzipped(await archiveOf());
    expect(String(calendar?.content)).toBe(await jsonOf(fromId));
    const { media } = JSON.parse(String(calendar?.content)) as CalendarFile;
    const listed = media.flatMap(({ parts }) => parts.map(({ sha256 }) => sha256));
    expect(files.map(({ path: name }) => name.slice('files/'.length, -'.webm'.length))).toHaveLength(3);
    for (const { path: name, content } of files) {
      const sum = createHash('sha256').update(content).digest('hex');
      expect(name).toMatch(new RegExp(`^files/${sum}\\.(webm|jpg)$`, 'u'));
      expect(listed).toContain(sum);
    }
  });

  it('holds no more than everybody of the village may hear, whoever takes it; the rest is counted for who knows of it', async () => {
    const { officer, elder } = village;
    const told = 'Told to elders alone';
    await addRecording(elder, sow.id, { subjectType: 'entry', title: 'Kept' }, [told]);
    const kept = await addPicture(elder, sow.id, { subjectType: 'entry', title: 'Not agreed' });
    await addConsent(officer, 'attachment', kept.id, { uses: ['keep', 'show'] });
    const along = async (client: Client) =>
      (await client.get(versionOf(fromId, 'files')).expect(200)).body as TakeAlong;
    expect(await along(officer)).toMatchObject({ voices: 1, pictures: 1, stays: 1 });
    expect(await along(elder)).toMatchObject({ voices: 1, pictures: 1, stays: 2 });
    const { bytes } = await along(officer);
    for (const client of [officer, elder]) {
      const zip = await archiveOf(fromId, client);
      expect(zip.includes(told)).toBe(false);
      expect(zip.includes('Not agreed')).toBe(false);
      expect(zip.includes('I agree')).toBe(false);
      expect(zip.length).toBeGreaterThan(bytes);
    }
  });

  it('goes along from a published version, for whoever reads it', async () => {
    const { number } = await publishDraft(village, fromId);
    const staff = await api.signIn('staff');
    const zip = await bytesOf(staff, versionOf(fromId, 'calendar.zip', String(number)));
    expect(await unzipped(zip)).toHaveLength(4);
    await staff.get(versionOf(fromId, 'calendar.zip')).expect(404);
    await staff.get(versionOf(fromId, 'files')).expect(404);
    const head = await staff.head(versionOf(fromId, 'calendar.zip', String(number))).expect(200);
    expect(head.headers['content-length']).toBe(String(zip.length));
  });
});

describe('one that comes back', () => {
  beforeEach(furnish);

  it('loses nothing: exported again it is the same file but for ids and stamps, with the same bytes', async () => {
    const before = await archiveOf();
    const earlier = await keptFiles();
    const looked = await bringIn(before, { dryRun: true });
    expect(looked).toMatchObject({ added: 1, voices: 1, pictures: 1, mediaLeft: 0, unfit: [] });
    expect(await keptFiles()).toEqual(earlier);
    expect(await drafted()).toEqual([]);
    expect(await bringIn(before)).toEqual(looked);
    const after = await archiveOf(intoId);
    const [first, ...files] = await unzipped(before);
    const [second, ...again] = await unzipped(after);
    expect(plain(second)).toBe(plain(first));
    expect(again).toEqual(files);
    expect(waiting()).toEqual([]);
  });

  it('is whose it was, for whom it was, with its spoken agreement and what was written out', async () => {
    const { officer, elder } = village;
    const words = { kind: 'words', language: 'art-x-tazimel', text: 'Sow when they rise', version: null };
    await officer.put(`/api/attachments/${voice.id}/words`, { ...words, checkedBySpeaker: true }).expect(200);
    await bringIn(await archiveOf());
    const [landed] = await drafted();
    for (const client of [officer, elder]) {
      const known = await heard(client, sow.id);
      const back = await heard(client, landed?.id ?? '');
      expect(back.map(withoutIds)).toEqual(known.map(withoutIds));
      expect(back[0]?.parts.map(({ part }) => part)).toEqual([0, 1, 2]);
    }
    const [again] = await heard(officer, landed?.id ?? '');
    for (const part of [0, 1, 2]) {
      const bytesIn = (id: string): Promise<Buffer> =>
        bytesOf(officer, `/api/attachments/${id}/parts/${String(part)}`);
      expect(await bytesIn(again?.id ?? '')).toEqual(await bytesIn(voice.id));
    }
  });

  it('comes once, however often it is sent, and keeps no file twice', async () => {
    const zip = await archiveOf();
    const key = randomUUID();
    const sent = await Promise.all([bringIn(zip, { key }), bringIn(zip, { key })]);
    expect(sent[1]).toEqual(sent[0]);
    // The calendar is sent away meanwhile, and the same sending comes once more.
    const version = await submit(village.officer, intoId);
    expect(await bringIn(zip, { key })).toEqual(sent[0]);
    await takeBack(village.officer, version);
    // Clip, two parts, picture and its small one: of the first, and of the one that came back.
    expect(await keptFiles()).toHaveLength(10);
  });

  it('goes when it is taken back where it was given, its sound alone as well, and what is kept since stays out', async () => {
    const { elder } = village;
    const zip = await archiveOf();
    await elder
      .put(`/api/attachments/${voice.id}/words`, {
        ...{ kind: 'words', language: 'en', text: 'Sow', version: null, checkedBySpeaker: true },
      })
      .expect(200);
    await bringIn(zip);
    const [landed] = await drafted();
    const item = `/api/communities/${elder.communityId}/items/attachment/${voice.id}`;
    await elder.post(`${item}/sound-removal`, { askedById: null }).expect(204);
    const [silent] = await heard(elder, landed?.id ?? '');
    expect(silent).toMatchObject({ hasWordsAlone: true, parts: [] });
    expect(await bringIn(zip, { dryRun: true })).toMatchObject({ voices: 0, pictures: 1, mediaLeft: 1 });
    await elder.post(`${item}/withdrawal`, { leavesTrace: false, askedById: null }).expect(204);
    expect((await heard(elder, landed?.id ?? '')).map(({ kind }) => kind)).toEqual(['picture']);
    const whole = `/api/communities/${elder.communityId}/items/entry/${sow.id}/withdrawal`;
    await elder.post(whole, { leavesTrace: false, askedById: null }).expect(204);
    expect(await keptFiles()).toEqual([]);
    expect(await bringIn(zip)).toMatchObject({ added: 0, refused: 1, voices: 0, mediaLeft: 2 });
    expect(await keptFiles()).toEqual([]);
  });
});

describe('one that does not fit', () => {
  beforeAll(furnish);

  const fileOf = (files: readonly ZippedFile[], holds: string) =>
    files.find(({ content }) => content.includes(holds))?.path ?? '';

  it.each([
    ['missing', 'without a file', null],
    ['other-content', 'with another voice in its place', webm({ note: 'never said' })],
    ['no-such-file', 'with a page in its place', Buffer.from('<script>alert(1)</script>')],
  ] as const)('is named before and refused after, and nothing is kept: %s', async (fault, _what, content) => {
    const files = await unzipped(await archiveOf());
    const spoken = fileOf(files, 'two');
    const others = files.filter((file) => file.path !== spoken);
    const zip = await zipped(content === null ? others : [...others, { path: spoken, content }]);
    const earlier = await keptFiles();
    expect(await bringIn(zip, { dryRun: true })).toMatchObject({
      ...{ voices: 0, pictures: 1, mediaLeft: 0 },
      unfit: [{ kind: 'recording', title: 'As it was told', fault }],
    });
    expect(reasonOf(await send(zip))).toBe('409 files-do-not-fit');
    expect(await keptFiles()).toEqual(earlier);
    expect([await drafted(), waiting()]).toEqual([[], []]);
  });

  it('puts no words into anybody’s mouth: a voice of another hand is refused, with checksums that fit, too', async () => {
    const [calendar, ...files] = await unzipped(await archiveOf());
    const made = webm({ note: 'never said' });
    const file = JSON.parse(String(calendar?.content)) as CalendarFile;
    const sum = createHash('sha256').update(made).digest('hex');
    const media = file.media.map((medium) => ({
      ...medium,
      parts: medium.parts.map((part) => (medium.kind === 'picture' ? part : { ...part, sha256: sum })),
    }));
    const seal = createHash('sha256').update(canonicalJson(media)).digest('hex');
    const forged = { ...file, media, checksums: { ...file.checksums, media: seal } };
    const json = { path: 'calendar.json', content: JSON.stringify(forged) };
    const zip = await zipped([json, ...files, { path: `files/${sum}.webm`, content: made }]);
    expect(await bringIn(zip, { dryRun: true })).toMatchObject({ unfit: [{ fault: 'other-content' }] });
    expect(reasonOf(await send(zip))).toBe('409 files-do-not-fit');
  });

  it('is refused as a whole, with the field and what to do, before anything is unpacked', async () => {
    const [calendar, ...files] = await unzipped(await archiveOf());
    if (calendar === undefined) throw new Error('The ZIP is empty.');
    const sum = 'a'.repeat(64);
    const link = { path: `files/${sum}.webm`, content: '/etc/passwd', mode: 0o120777 };
    const bomb = { path: `files/${sum}.webm`, content: Buffer.alloc(4_000_000) };
    const outside = await zipped([calendar, ...files, { path: `xx/${sum}`, content: 'x' }]);
    const whole = await archiveOf();
    const bad = [
      ['archive-holds-other', Buffer.from(outside.toString('latin1').replaceAll('xx/', '../'), 'latin1')],
      ['archive-holds-other', await zipped([calendar, link])],
      ['archive-holds-other', await zipped([calendar, { path: 'voices.html', content: '<p>' }])],
      ['archive-too-large', await zipped([calendar, bomb])],
      ['archive-unreadable', whole.subarray(0, whole.length - 200)],
      ['not-a-calendar-file', await zipped([{ path: 'calendar.json', content: '{}' }])],
    ] as const;
    const earlier = await keptFiles();
    for (const [code, zip] of bad) {
      const answer = await send(zip, { dryRun: true }).expect(422);
      expect((answer.body as Problem).errors).toMatchObject([{ field: 'file', code }]);
    }
    expect([await keptFiles(), waiting()]).toEqual([earlier, []]);
  });

  it('brings nothing into another village, where a voice or a face is a name', async () => {
    const theirs = await api.signIn('officer2');
    const place = await firstPlace(theirs);
    const into = await beginCalendar({ ...village, officer: theirs, placeId: place.id });
    const imports = `/api/calendars/${into.id}/imports/file`;
    const refused = await theirs.upload(imports, { dryRun: true }, await archiveOf());
    expect(reasonOf(refused)).toBe('409 file-of-other-village');
    expect((refused.body as Problem).detail).toMatch(/no voice or face/u);
  });

  it('keeps nothing where the calendar cannot take it', async () => {
    const zip = await archiveOf();
    await addEntry(village.officer, intoId, { titleOfficer: 'There before' });
    await submit(village.officer, intoId);
    const earlier = await keptFiles();
    expect(reasonOf(await send(zip))).toBe('409 draft-locked');
    expect([await keptFiles(), waiting()]).toEqual([earlier, []]);
  });
});

/** The file as it is, ids by the order in which they come, without stamps and the sums over both. */
function plain(calendar: ZippedFile | undefined): string {
  const { checksums: _sums, source, ...file } = JSON.parse(String(calendar?.content)) as CalendarFile;
  const text = JSON.stringify({ ...file, source: { ...source, exportedAt: '' } });
  const ids = [...new Set(text.match(/[0-9a-f]{8}(?:-[0-9a-f]{4}){3}-[0-9a-f]{12}/gu))];
  return ids.reduce((all, id, index) => all.replaceAll(id, `#${String(index)}`), text);
}

function withoutIds({ id: _id, clientId: _client, subjectId: _subject, words, ...rest }: Attachment) {
  return { ...rest, words: words.map(({ version: _version, ...said }) => said) };
}
