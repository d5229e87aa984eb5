import { createHash, randomUUID } from 'node:crypto';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { CalendarFile } from '#shared/contracts/calendar-file.js';
import type { Entry } from '#shared/contracts/calendars.js';
import type { FileImport } from '#shared/contracts/imports.js';
import type { Problem } from '#shared/contracts/problem.js';
import type { Lesson, SeasonReview } from '#shared/contracts/season-reviews.js';
import { WRITE_KEY_HEADER } from '#shared/contracts/write-key.js';
import { canonicalJson } from '#shared/kernel/canonical-json.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import {
  addEntry,
  beginCalendar,
  beginTwin,
  entriesOf,
  openVillage,
  publishDraft,
  reasonOf,
  submit,
  type Village,
} from '#tests/support/calendar-api.js';
import { addPicture } from '#tests/support/attachment-api.js';
import { addConsent } from '#tests/support/consent-api.js';
import { details } from '#tests/support/sharing-api.js';
import { addVariant } from '#tests/support/variant-api.js';

/** A calendar's own file, back in a draft of its village. */
let api: TestApi;
let village: Village;
let fromId: string;
let intoId: string;
let sow: Entry;
beforeAll(async () => {
  api = await openTestApi();
});
beforeEach(async () => {
  await api.reset();
  village = await openVillage(api);
  fromId = (await beginCalendar(village)).id;
  intoId = (await beginTwin(api, village)).id;
  sow = await addEntry(village.officer, fromId, { giverId: village.elder.personId });
});
afterAll(() => api.close());

const exported = async (calendarId: string, number = 'draft') =>
  (await village.officer.get(`/api/calendars/${calendarId}/versions/${number}/calendar.json`).expect(200))
    .body as CalendarFile;
const send = (client: Client, file: unknown, { into = intoId, key = randomUUID(), dryRun = false } = {}) =>
  client
    .upload(
      `/api/calendars/${into}/imports/file`,
      { dryRun },
      Buffer.from(typeof file === 'string' ? file : JSON.stringify(file)),
    )
    .set(WRITE_KEY_HEADER, key);
const bringIn = async (file: unknown, options = {}) =>
  (await send(village.officer, file, options).expect(200)).body as FileImport;
const draftOf = (calendarId = intoId) => entriesOf(village.officer, calendarId);

describe('a file that comes back', () => {
  it('loses nothing: what is exported again is the same but for ids and stamps', async () => {
    const { officer, elder, elder3 } = village;
    const { variantId } = await addVariant(elder3, fromId, sow.id);
    const content = {
      ...sow.content,
      board: { shows: 'variant' as const, variantId, reason: 'It came first for three years' },
    };
    await officer
      .put(`/api/calendars/${fromId}/entries/${sow.id}`, { content, version: sow.version })
      .expect(200);
    await addEntry(officer, fromId, {
      titleOfficer: 'Weed',
      lead: { type: 'entry-planned', entryId: sow.id, day: 'bestTo' },
      sharingLevel: 'village',
      ifLate: '=-5, "quoted"\nand more',
    });
    const lead = { type: 'none', way: 'entry-actual' } as const;
    await addEntry(officer, fromId, { titleOfficer: 'Thresh', lead });
    const feast = await addEntry(officer, fromId, {
      ...{ titleOfficer: 'Feast', kind: 'belief', giver: 'Hidden', giverId: elder.personId },
      sharing: details({ naming: 'role' }),
    });
    const said = { uses: ['keep', 'show', 'print', 'feed'] as const, giverId: elder.personId };
    await addConsent(officer, 'entry', feast.id, { ...said, uses: [...said.uses] });
    const before = await exported(fromId);
    expect(before.entries).toHaveLength(4);
    expect(await bringIn(before)).toMatchObject({ added: 4, refused: 0 });
    const after = await exported(intoId);
    expect(plain(after)).toEqual(plain(before));
    expect(new Set([...before.entries, ...after.entries].map(({ entryId }) => entryId)).size).toBe(8);
  });

  it('lists voices and pictures with their checksums and levels, and says that they stay behind', async () => {
    const { elder } = village;
    const picture = (title: string, sharingLevel: 'village' | 'elders') =>
      addPicture(elder, sow.id, { subjectType: 'entry', title, sharingLevel });
    await picture('The first furrow', 'village');
    await picture('Of the elders', 'elders');
    const file = await exported(fromId);
    const [listed] = file.media;
    expect(file.media).toHaveLength(1);
    expect(listed).toMatchObject({
      entryId: sow.id,
      kind: 'picture',
      title: 'The first furrow',
      level: 'village',
    });
    const path = `/api/attachments/${listed?.attachmentId ?? ''}/parts/${String(listed?.parts[0]?.part)}`;
    const bytes = (await elder.get(path).expect(200)).body as Buffer;
    expect(createHash('sha256').update(bytes).digest('hex')).toBe(listed?.parts[0]?.sha256);
    expect(await bringIn(file)).toMatchObject({ added: 1, mediaLeft: 1 });
    expect((await exported(intoId)).media).toEqual([]);
    await addConsent(village.officer, 'entry', sow.id, { uses: ['keep', 'show', 'print', 'feed'] });
    expect((await exported(fromId)).media).toEqual([]);
  });

  it('comes in from the forms before there was such a list, and before the year’s lessons went along', async () => {
    const { season: _said, checksums: all, ...second } = await exported(fromId);
    const { season: _seal, ...checksums } = all;
    expect(await bringIn({ ...second, schemaVersion: 2, checksums })).toMatchObject({ added: 1 });
    const { media: _none, ...older } = second;
    const { media: _sum, ...sums } = checksums;
    expect(await bringIn({ ...older, schemaVersion: 1, checksums: sums })).toMatchObject({ added: 1 });
    const touched = { ...older, schemaVersion: 1, checksums: { ...sums, entries: '0'.repeat(64) } };
    expect(reasonOf(await send(village.officer, touched))).toBe('409 file-changed');
  });

  it('is a draft: nobody has agreed to it, and whoever brought it in has written to it', async () => {
    const published = await publishDraft(village, fromId);
    await bringIn(await exported(fromId, String(published.number)));
    const version = await submit(village.officer, intoId);
    expect(version).toMatchObject({ state: 'in-review', signatures: [], label: null });
    expect(version.gaps).not.toEqual([]);
  });

  it('comes behind what stands there, once, however often it is sent', async () => {
    await addEntry(village.officer, intoId, { titleOfficer: 'There before' });
    const file = await exported(fromId);
    const key = randomUUID();
    const sent = await Promise.all([bringIn(file, { key }), bringIn(file, { key })]);
    expect(sent.map(({ added }) => added)).toEqual([1, 1]);
    await submit(village.officer, intoId);
    expect(await bringIn(file, { key })).toMatchObject({ added: 1 });
    expect((await draftOf()).map(({ content }) => content.titleOfficer)).toEqual([
      'There before',
      'Sow long millet',
    ]);
    expect(reasonOf(await send(village.officer, file, { key, into: fromId }))).toBe('409 write-key-used');
    const other = await exported(intoId);
    expect(reasonOf(await send(village.officer, other, { key }))).toBe('409 write-key-used');
    expect(reasonOf(await send(village.officer, file))).toBe('409 draft-locked');
  });

  it('is tried first without a trace', async () => {
    expect(await bringIn(await exported(fromId), { dryRun: true })).toEqual({
      ...{ added: 1, refused: 0, mediaLeft: 0, seasonAdded: 0, seasonLeft: 0 },
      ...{ voices: 0, pictures: 0, unfit: [] },
      from: { year: 2027, placeName: 'Upper terraces', label: null },
    });
    expect(await draftOf()).toEqual([]);
  });
});

describe('what the year taught', () => {
  const review = (calendarId: string) => `/api/calendars/${calendarId}/season-review`;
  const lookedBack = async (client: Client, calendarId: string) =>
    (await client.get(review(calendarId)).expect(200)).body as SeasonReview;
  const told = ({ entries, lessons, decisions }: SeasonReview) =>
    [{ titleOfficer: '', lessons, decisions }, ...entries].map((about) => ({
      about: about.titleOfficer,
      lessons: about.lessons.map(({ id: _id, ...rest }) => rest),
      decisions: about.decisions.map(({ id: _id, ...rest }) => rest),
    }));
  const lookBack = async () => {
    const { elder, officer, steward } = village;
    const say = (client: Client, entryId: string | null, text: string) =>
      client.post(`${review(fromId)}/lessons`, { entryId, text }).expect(201);
    const lesson = (await say(elder, sow.id, 'The rain came late')).body as Lesson;
    await say(steward, null, 'A "dry" year;\n=and more');
    const decision = { entryId: sow.id, kind: 'later', text: '' };
    await officer.post(`${review(fromId)}/decisions`, decision).expect(201);
    await officer
      .post(`${review(fromId)}/decisions`, { entryId: null, kind: 'own-words', text: 'Meet earlier' })
      .expect(201);
    return lesson;
  };

  it('comes back beside its entries, word for word, in the names of those who said it', async () => {
    await lookBack();
    const before = await exported(fromId);
    expect([before.season.lessons.length, before.season.decisions.length]).toEqual([2, 2]);
    expect(JSON.stringify(before.season)).not.toMatch(/Elder A|Officer A|authorId/u);
    expect(await bringIn(before, { dryRun: true })).toMatchObject({ seasonAdded: 4, seasonLeft: 0 });
    expect((await lookedBack(village.officer, intoId)).lessons).toEqual([]);
    const key = randomUUID();
    const first = await bringIn(before, { key });
    expect(first).toMatchObject({ added: 1, seasonAdded: 4, seasonLeft: 0 });
    expect(await bringIn(before, { key })).toEqual(first);
    for (const client of [village.officer, village.elder]) {
      expect(told(await lookedBack(client, intoId))).toEqual(told(await lookedBack(client, fromId)));
    }
    // The clock stands still: what was said at one moment has no order.
    const byText = (a: { text: string }, b: { text: string }) => a.text.localeCompare(b.text);
    const withoutIds = ({ season: { lessons, decisions } }: CalendarFile) => [
      lessons.toSorted(byText).map(({ lessonId: _id, entryId, ...rest }) => [entryId === null, rest]),
      decisions.toSorted(byText).map(({ decisionId: _id, entryId, ...rest }) => [entryId === null, rest]),
    ];
    expect(withoutIds(await exported(intoId))).toEqual(withoutIds(before));
    // Of the year it is said already; the entry comes a second time, and what was said of it too.
    expect(await bringIn(before)).toMatchObject({ seasonAdded: 2, seasonLeft: 2 });
  });

  it('goes into no other year, and leaves out what its writer took out or what went with its entry', async () => {
    const { elder, officer } = village;
    const lesson = await lookBack();
    const other = await addEntry(officer, fromId, { titleOfficer: 'Mend', giverId: elder.personId });
    const about = { entryId: other.id, text: 'Walls fell' };
    await elder.post(`${review(fromId)}/lessons`, about).expect(201);
    const file = await exported(fromId);
    const next = (await beginCalendar(village, 2028)).id;
    expect(await bringIn(file, { into: next })).toMatchObject({ added: 2, seasonAdded: 0, seasonLeft: 5 });
    await elder.delete(`${review(fromId)}/lessons/${lesson.id}`).expect(204);
    const item = `/api/communities/${elder.communityId}/items/entry/${other.id}`;
    await elder.post(`${item}/withdrawal`, { leavesTrace: false, askedById: null }).expect(204);
    expect(await bringIn(file)).toMatchObject({ added: 1, refused: 1, seasonAdded: 3, seasonLeft: 2 });
    expect(JSON.stringify(await lookedBack(elder, intoId))).not.toMatch(/rain came late|Walls fell/u);
  });

  it('takes nobody’s word from the file: made-up words come in nowhere, and a changed part is refused', async () => {
    await lookBack();
    const file = await exported(fromId);
    const { season } = file;
    const written = season.lessons.map((each) => ({ ...each, text: 'Never said' }));
    const foreign = [...written, { ...written[0], lessonId: randomUUID() } as never];
    const changed = { ...file, season: { ...season, lessons: foreign } };
    expect(reasonOf(await send(village.officer, changed))).toBe('409 file-changed');
    expect(await bringIn(sealed(changed))).toMatchObject({ seasonAdded: 4, seasonLeft: 1 });
    expect(JSON.stringify(await lookedBack(village.elder, intoId))).not.toContain('Never said');
  });

  it('is in no file of those who read no drafts', async () => {
    await lookBack();
    const { number } = await publishDraft(village, fromId);
    const staff = await api.signIn('staff');
    const path = `/api/calendars/${fromId}/versions/${String(number)}/calendar.json`;
    const { season } = (await staff.get(path).expect(200)).body as CalendarFile;
    expect(season).toEqual({ lessons: [], decisions: [] });
    expect((await exported(fromId, String(number))).season.lessons).toHaveLength(2);
  });
});

describe('what was taken back or is kept since', () => {
  it('stays out, with what counts its days from it; how many is said, and not which', async () => {
    const { elder, officer } = village;
    await addEntry(officer, fromId, {
      titleOfficer: 'Weed',
      lead: { type: 'entry-planned', entryId: sow.id, day: 'bestTo' },
    });
    await addEntry(officer, fromId, { titleOfficer: 'Mend' });
    const file = await exported(fromId);
    const item = `/api/communities/${elder.communityId}/items/entry/${sow.id}`;
    await elder.post(`${item}/withdrawal`, { leavesTrace: false, askedById: null }).expect(204);
    const answer = await send(officer, file).expect(200);
    expect(answer.body).toMatchObject({ added: 1, refused: 2 });
    expect(JSON.stringify(answer.body)).not.toMatch(/Sow|Weed/u);
    expect((await draftOf()).map(({ content }) => content.titleOfficer)).toEqual(['Mend']);
  });

  it('stays out where it is paused, narrower or no longer agreed to', async () => {
    const { elder, officer } = village;
    const narrow = await addEntry(officer, fromId, { giverId: elder.personId });
    const refused = await addEntry(officer, fromId);
    const file = await exported(fromId);
    const items = `/api/communities/${elder.communityId}/items/entry`;
    await elder.post(`${items}/${sow.id}/pause`, { askedById: null }).expect(204);
    const { version } = (await elder.get(`${items}/${narrow.id}/sharing`).expect(200)).body as {
      version: number;
    };
    const sharing = { level: 'elders', ...details() };
    await elder.put(`${items}/${narrow.id}/sharing`, { sharing, version }).expect(200);
    await addConsent(officer, 'entry', refused.id, { answer: 'refused', uses: [] });
    expect(await bringIn(file)).toMatchObject({ added: 0, refused: 3 });
  });

  it('goes from where it was brought in when it is taken back where it came from', async () => {
    await bringIn(await exported(fromId));
    const item = `/api/communities/${village.elder.communityId}/items/entry/${sow.id}`;
    await village.elder.post(`${item}/withdrawal`, { leavesTrace: false, askedById: null }).expect(204);
    expect(await draftOf()).toEqual([]);
  });
});

describe('a file that does not fit', () => {
  it('is told by its form, its checksum, its village or its kind; nothing comes in', async () => {
    const file = await exported(fromId);
    const newer = await send(village.officer, { ...file, schemaVersion: 4 });
    expect(reasonOf(newer)).toBe('409 other-file-version');
    expect((newer.body as Problem).names).toEqual(['4']);
    const [first] = file.entries;
    const touched = { ...file, entries: [{ ...first, entryId: randomUUID() }] };
    expect(reasonOf(await send(village.officer, touched))).toBe('409 file-changed');
    const lone = JSON.stringify(file).replace('Sow long millet', '\\ud800');
    expect(reasonOf(await send(village.officer, lone))).toBe('409 file-changed');
    const elsewhere = sealed({ ...file, source: { ...file.source, calendarId: randomUUID() } });
    expect(reasonOf(await send(village.officer, elsewhere))).toBe('409 file-of-other-village');
    const extra = sealed({ ...file, entries: [{ ...first, secret: 1 } as never] });
    for (const bad of [extra, 'PK no JSON', { format: 'another' }, '[]']) {
      const answer = await send(village.officer, bad).expect(422);
      expect((answer.body as Problem).errors).toMatchObject([{ field: 'file', code: 'not-a-calendar-file' }]);
    }
    expect(await draftOf()).toEqual([]);
  });

  it('brings no belief to the whole village, and no name and no yes of its own making', async () => {
    const file = await exported(fromId);
    const [first] = file.entries;
    if (first === undefined) throw new Error('The file is empty.');
    const content = { ...first.content, kind: 'belief' as const, agreedToPrint: true, giverId: randomUUID() };
    await bringIn(sealed({ ...file, entries: [{ ...first, entryId: randomUUID(), content }] }));
    expect(await entriesOf(village.steward, intoId)).toEqual([]);
    const [seen] = await entriesOf(village.elder, intoId);
    expect(seen?.content).toMatchObject({ sharingLevel: 'elders', agreedToPrint: false });
    expect(seen?.content).not.toHaveProperty('giverId');
  });
});

/** With checksums that fit, as somebody would make them who writes a file of their own. */
function sealed(file: CalendarFile): CalendarFile {
  const sum = (part: unknown) => createHash('sha256').update(canonicalJson(part)).digest('hex');
  const { source, header, entries, media, season } = file;
  const checksums = {
    ...{ source: sum(source), header: sum(header), entries: sum(entries) },
    ...{ media: sum(media), season: sum(season) },
  };
  return { ...file, checksums };
}

/** Ids by the order in which they come, and no stamps. */
function plain({ header, entries }: CalendarFile): unknown {
  const { calendarId: _id, number: _number, submittedAt: _at, ...rest } = header;
  const ids = entries.flatMap(({ entryId, variants = [] }) => [
    entryId,
    ...variants.map(({ variantId }) => variantId),
  ]);
  const text = ids.reduce(
    (all, id, index) => all.replaceAll(id, `#${String(index)}`),
    JSON.stringify(entries),
  );
  return { header: rest, entries: JSON.parse(text) as unknown };
}
