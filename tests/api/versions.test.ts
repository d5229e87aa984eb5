import { createHash } from 'node:crypto';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { CalendarVersionEntity } from '#server/db/entities/calendar-version.entity.js';
import { CommunityEntity } from '#server/db/entities/community.entity.js';
import { VersionEntryEntity } from '#server/db/entities/version-entry.entity.js';
import type { Calendar, EntryInput } from '#shared/contracts/calendars.js';
import type { Version, VersionSummary } from '#shared/contracts/versions.js';
import { canonicalJson } from '#shared/kernel/canonical-json.js';
import { ENGINE_VERSION } from '#shared/sky/index.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import {
  addEntry,
  beginCalendar,
  changePlace,
  entriesOf,
  openVillage,
  outcomes,
  publishDraft,
  readVersion,
  reasonOf,
  signOff,
  submit,
  takeBack,
  versionPath,
  type Village,
} from '#tests/support/calendar-api.js';

let api: TestApi;
let village: Village;
let officer: Client;
let calendar: Calendar;
let versions: string;
beforeAll(async () => {
  api = await openTestApi();
});
beforeEach(async () => {
  await api.reset();
  village = await openVillage(api);
  ({ officer } = village);
  calendar = await beginCalendar(village);
  versions = `/api/calendars/${calendar.id}/versions`;
  await addEntry(officer, calendar.id, { titleOfficer: 'Sow long millet' });
  await addEntry(officer, calendar.id, { titleOfficer: 'Seed check', crop: 'all seed' });
});
afterAll(() => api.close());

const sha256 = (text: string) => createHash('sha256').update(text, 'utf8').digest('hex');
const list = async (client: Client) =>
  ((await client.get(versions).expect(200)).body as { items: VersionSummary[] }).items;
const hashesOf = (version: Version) => version.entries.map(({ hash }) => hash);

async function edit(index: number, changes: Partial<EntryInput>): Promise<void> {
  const entry = (await entriesOf(officer, calendar.id))[index];
  if (!entry) throw new Error(`no entry ${index}`);
  const body = { content: { ...entry.content, ...changes }, version: entry.version };
  await officer.put(`/api/calendars/${calendar.id}/entries/${entry.id}`, body).expect(200);
}

describe('submitting', () => {
  it('freezes the draft with everything that its dates rest on', async () => {
    const version = await submit(officer, calendar.id);
    expect(version).toMatchObject({
      number: 1,
      label: null,
      state: 'in-review',
      submittedBy: 'Beyno',
      publishedAt: null,
      entryCount: 2,
      header: {
        schema: 1,
        number: 1,
        year: 2027,
        engineVersion: ENGINE_VERSION,
        submittedAt: '2026-12-01T06:00:00.000Z',
        communityName: 'Upper Tazimel',
        place: { latitudeDeg: 12, timeZone: 'Africa/Addis_Ababa', thresholdSet: 'three-class' },
        markers: [{ markerKey: 'pleiades', kind: 'figure', name: 'Pleiades', hr: 1165 }],
      },
    });
    expect(version.header.place.skyline).toHaveLength(11);
    const strip = version.header.markers[0]?.strip ?? [];
    const nights = strip.reduce((sum, run) => sum + run.toDayNumber - run.fromDayNumber + 1, 0);
    expect(nights).toBe(365);
    const draft = await entriesOf(officer, calendar.id);
    expect(version.entries.map(({ content, dates }) => ({ content, dates }))).toEqual(
      draft.map(({ content, dates }) => ({ content, dates })),
    );
  });

  it('can be checked with any tool: salted entry hashes, header hash, and one hash over leaves with their ranks', async () => {
    const version = await submit(officer, calendar.id);
    for (const { salt, hash, entryId, content, dates } of version.entries) {
      expect(salt).toMatch(/^[0-9a-f]{32}$/);
      expect(sha256(`${salt}\n${canonicalJson({ entryId, content, dates })}`)).toBe(hash);
    }
    expect(sha256(canonicalJson(version.header))).toBe(version.headerHash);
    const lines = ['dawnpeg-version-2', version.headerHash, ...[...version.leaves].sort()];
    expect(sha256(`${lines.join('\n')}\n`)).toBe(version.hash);
    for (const { rank, hash } of version.entries)
      expect(version.leaves).toContain(sha256(`${rank}\n${hash}`));
    const ranks = version.entries.map(({ rank }) => rank ?? 0);
    expect(ranks).toEqual([...ranks].sort((a, b) => a - b));
    expect(new Set(version.entries.map(({ salt }) => salt)).size).toBe(2);
  });

  it('needs an entry, and the contacts that every print must name', async () => {
    const empty = await beginCalendar(village, 2028);
    expect(reasonOf(await officer.post(`/api/calendars/${empty.id}/versions`))).toBe('409 no-entries');
    const community = { id: officer.communityId };
    await api.dataSource.getRepository(CommunityEntity).update(community, { weatherContact: '' });
    expect(reasonOf(await officer.post(versions))).toBe('409 contacts-missing');
  });

  it('twice at once sends one submission', async () => {
    const answers = await Promise.all([
      officer.post(versions),
      officer.post(versions),
      officer.post(versions),
    ]);
    expect(outcomes(answers)).toEqual(['201', '409 submission-out', '409 submission-out']);
    expect((await list(officer)).map(({ number }) => number)).toEqual([1]);
  });

  it('counts submissions 1, 2, 3… without gaps', async () => {
    await takeBack(officer, await submit(officer, calendar.id));
    expect(reasonOf(await village.elder.post(versions))).toBe('403 not-allowed');
    expect((await submit(officer, calendar.id)).number).toBe(2);
  });
});

describe('a frozen version', () => {
  it('reads back bit for bit, whatever becomes of draft, place and village', async () => {
    const published = await publishDraft(village, calendar.id);
    const before = await readVersion(village.steward, published);
    await edit(0, { titleOfficer: 'Something else' });
    const [first] = await entriesOf(officer, calendar.id);
    await officer.delete(`/api/calendars/${calendar.id}/entries/${first?.id ?? ''}`).expect(204);
    await changePlace(api, village.placeId, { name: 'Elsewhere', latitudeDeg: 60, skyline: [] });
    const community = { id: officer.communityId };
    await api.dataSource
      .getRepository(CommunityEntity)
      .update(community, { name: 'Renamed', weatherContact: 'Call 1' });
    api.restart();
    const steward = await api.signIn('steward');
    expect(await readVersion(steward, published)).toEqual(before);
  });

  it('keeps the hash of what did not change, so that answers to it stay; the rest gets a new one', async () => {
    const first = await submit(officer, calendar.id);
    await takeBack(officer, first);
    await edit(1, { notes: 'Three trays' });
    const second = await submit(officer, calendar.id);
    expect(hashesOf(second)[0]).toBe(hashesOf(first)[0]);
    expect(hashesOf(second)[1]).not.toBe(hashesOf(first)[1]);
    expect(second.hash).not.toBe(first.hash);
    await takeBack(officer, second);
    await edit(1, { notes: '' });
    expect(hashesOf(await submit(officer, calendar.id))).toEqual(hashesOf(first));
  });

  it('gets new hashes where its dates moved although no word changed', async () => {
    const first = await submit(officer, calendar.id);
    await takeBack(officer, first);
    await changePlace(api, village.placeId, { sameSideShiftDeg: 2 });
    const second = await submit(officer, calendar.id);
    const sowing = (version: Version) => version.entries[0]?.dates.marker?.expected.dayNumber ?? 0;
    expect(sowing(second)).toBeGreaterThan(sowing(first));
    expect(hashesOf(second)[0]).not.toBe(hashesOf(first)[0]);
  });

  it('keeps the hash of an entry that only moved or whose neighbour changed', async () => {
    const first = await submit(officer, calendar.id);
    await takeBack(officer, first);
    const entryIds = first.entries.map(({ entryId }) => entryId).reverse();
    await officer.put(`/api/calendars/${calendar.id}/order`, { entryIds }).expect(200);
    // The same crop and the same days as the first entry: a warning in the draft, but no change of either.
    await addEntry(officer, calendar.id, { titleOfficer: 'The same again' });
    const second = await submit(officer, calendar.id);
    expect(hashesOf(second).slice(0, 2)).toEqual(hashesOf(first).reverse());
    expect((await entriesOf(officer, calendar.id)).some(({ dates }) => dates.warnings.length > 0)).toBe(true);
    expect(second.entries.flatMap(({ dates }) => dates.warnings)).toEqual([]);
  });

  it.each([
    [
      'an entry',
      async () => {
        const rows = api.dataSource.getRepository(VersionEntryEntity);
        const [row] = await rows.find();
        await rows.update(
          { id: row?.id ?? '' },
          { bodyText: (row?.bodyText ?? '').replace('Soil wet', 'Soil dry') },
        );
      },
    ],
    [
      'the header',
      async () => {
        const rows = api.dataSource.getRepository(CalendarVersionEntity);
        const [row] = await rows.find();
        await rows.update(
          { id: row?.id ?? '' },
          { headerText: (row?.headerText ?? '').replace('2027', '2028') },
        );
      },
    ],
    [
      'the order',
      async () => {
        const rows = api.dataSource.getRepository(VersionEntryEntity);
        await rows.update({ position: 0 }, { position: 7 });
      },
    ],
  ])('is not shown once somebody changed %s past the product', async (_, tamper) => {
    const version = await submit(officer, calendar.id);
    await tamper();
    await officer.get(versionPath(version)).expect(500);
  });
});

describe('the life of a submission', () => {
  it('ends when the officer takes it back; that is final and opens the draft', async () => {
    const version = await submit(officer, calendar.id);
    const body = { reason: 'elder-asked', note: 'The sowing star' };
    const asked = (await officer.post(`${versionPath(version)}/changes-asked`, body).expect(200))
      .body as Version;
    expect(asked).toMatchObject({ state: 'changes-asked', stateNote: 'The sowing star', gaps: [] });
    expect(asked.may).toMatchObject({ answer: false, askChanges: false, publish: false, recall: false });
    expect(reasonOf(await officer.post(`${versionPath(version)}/changes-asked`, body))).toBe(
      '409 not-in-review',
    );
    expect((await officer.get(`/api/calendars/${calendar.id}`)).body).toMatchObject({ locked: false });
  });

  it('may be taken back after sign-off, but a signed-off one stays out until then', async () => {
    const version = await submit(officer, calendar.id);
    expect(await signOff(village, version)).toMatchObject({ state: 'signed-off' });
    expect(reasonOf(await officer.post(versions))).toBe('409 submission-out');
    expect(await takeBack(officer, version)).toMatchObject({ state: 'changes-asked' });
    expect(reasonOf(await officer.post(`${versionPath(version)}/publish`))).toBe('409 not-signed-off');
  });

  it('leads to publishing only through sign-off, by the officer', async () => {
    const version = await submit(officer, calendar.id);
    expect(reasonOf(await officer.post(`${versionPath(version)}/publish`))).toBe('409 not-signed-off');
    await signOff(village, version);
    await village.steward.post(`${versionPath(version)}/publish`).expect(403);
    api.clock.set(new Date('2026-12-03T18:00:00Z'));
    expect((await officer.post(`${versionPath(version)}/publish`).expect(200)).body).toMatchObject({
      state: 'published',
      label: '2027-1',
      publishedAt: '2026-12-03T18:00:00.000Z',
      hash: version.hash,
    });
  });

  it('makes the version before it replaced and counts the label up', async () => {
    await publishDraft(village, calendar.id);
    await edit(0, { notes: 'Corrected' });
    const second = await publishDraft(village, calendar.id);
    expect(second.label).toBe('2027-2');
    expect((await list(officer)).map(({ number, label, state }) => [number, label, state])).toEqual([
      [2, '2027-2', 'published'],
      [1, '2027-1', 'replaced'],
    ]);
    expect((await officer.get(`/api/calendars/${calendar.id}`)).body).toMatchObject({
      published: { number: 2, label: '2027-2' },
    });
  });

  it('ends by recall with a reason; no earlier version comes back, and labels are not used again', async () => {
    const first = await publishDraft(village, calendar.id);
    const recall = `${versionPath(first)}/recall`;
    await officer.post(recall, { note: ' ' }).expect(422);
    expect((await officer.post(recall, { note: 'Wrong last date' }).expect(200)).body).toMatchObject({
      state: 'recalled',
      label: '2027-1',
      stateNote: 'Wrong last date',
    });
    expect(reasonOf(await officer.post(recall, { note: 'Again' }))).toBe('409 not-published');
    expect((await officer.get(`/api/calendars/${calendar.id}`)).body).toMatchObject({ published: null });
    await edit(0, { notes: 'Corrected' });
    expect(await publishDraft(village, calendar.id)).toMatchObject({ label: '2027-2' });
    expect(await readVersion(officer, first)).toMatchObject({ state: 'recalled' });
  });

  it('is published once when two officers press at once', async () => {
    const version = await signOff(village, await submit(officer, calendar.id));
    const path = `${versionPath(version)}/publish`;
    const answers = await Promise.all([officer.post(path), officer.post(path)]);
    expect(outcomes(answers)).toEqual(['200', '409 not-signed-off']);
    expect((await list(officer))[0]).toMatchObject({ label: '2027-1', state: 'published' });
  });

  it('is either published or taken back when both happen at once', async () => {
    const version = await signOff(village, await submit(officer, calendar.id));
    const answers = await Promise.all([
      officer.post(`${versionPath(version)}/publish`),
      officer.post(`${versionPath(version)}/changes-asked`, { reason: 'taken-back', note: '' }),
    ]);
    expect(answers.filter(({ status }) => status === 200)).toHaveLength(1);
    const { state } = await readVersion(officer, version);
    expect((answers.find(({ status }) => status === 200)?.body as Version).state).toBe(state);
  });

  it('leaves one published version when the next is published while this one is recalled', async () => {
    const first = await publishDraft(village, calendar.id);
    await edit(0, { notes: 'Corrected' });
    const second = await signOff(village, await submit(officer, calendar.id));
    const answers = await Promise.all([
      officer.post(`${versionPath(second)}/publish`),
      officer.post(`${versionPath(first)}/recall`, { note: 'Wrong' }),
    ]);
    expect(answers[0].status).toBe(200);
    const states = (await list(officer)).map(({ state }) => state);
    expect(states).toEqual(['published', answers[1].status === 200 ? 'recalled' : 'replaced']);
    expect((await officer.get(`/api/calendars/${calendar.id}`)).body).toMatchObject({
      published: { number: 2 },
    });
  });
});

describe('who sees which version', () => {
  it('is staff and observers once it was published, also when it is replaced or recalled', async () => {
    const staff = await api.signIn('staff');
    const observer = await api.signIn('observer');
    const taken = await submit(officer, calendar.id);
    await takeBack(officer, taken);
    const first = await submit(officer, calendar.id);
    for (const client of [staff, observer]) {
      await client.get(versionPath(taken)).expect(404);
      await client.get(versionPath(first)).expect(404);
      expect(await list(client)).toEqual([]);
    }
    await signOff(village, first);
    await observer.get(versionPath(first)).expect(404);
    await officer.post(`${versionPath(first)}/publish`).expect(200);
    const seen = await readVersion(observer, first);
    expect(seen).toMatchObject({ label: '2027-1', entryCount: 2 });
    expect(Object.values(seen.may).some((allowed) => allowed === true)).toBe(false);
    await edit(0, { notes: 'Corrected' });
    const second = await publishDraft(village, calendar.id);
    expect((await list(staff)).map(({ label }) => label)).toEqual(['2027-2', '2027-1']);
    await officer.post(`${versionPath(second)}/recall`, { note: 'Wrong' }).expect(200);
    expect((await list(staff)).map(({ state }) => state)).toEqual(['recalled', 'replaced']);
    await readVersion(staff, second);
  });

  it('is nobody of another village', async () => {
    const version = await publishDraft(village, calendar.id);
    const stranger = await api.signIn('officer2');
    await stranger.get(versions).expect(404);
    await stranger.get(versionPath(version)).expect(404);
    await stranger.post(`${versionPath(version)}/recall`, { note: 'Mine' }).expect(404);
  });

  it('is told from numbers only; a number that is none answers 404 or 422', async () => {
    await officer.get(`${versions}/7`).expect(404);
    await officer.get(`${versions}/draft`).expect(422);
    await officer.get(`${versions}/0`).expect(422);
    await officer.get(`${versions}/1x`).expect(422);
  });
});
