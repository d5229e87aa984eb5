import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Calendar, Entry } from '#shared/contracts/calendars.js';
import type { Answer, OwnEntries } from '#shared/contracts/reviews.js';
import type { Group } from '#shared/contracts/sharing.js';
import type { Today } from '#shared/contracts/today.js';
import type { Version } from '#shared/contracts/versions.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import {
  addEntry,
  beginCalendar,
  openVillage,
  publish,
  readVersion,
  reasonOf,
  says,
  submit,
  takeBack,
  versionPath,
  type Village,
} from '#tests/support/calendar-api.js';
import { addRecording } from '#tests/support/attachment-api.js';
import { noteInput } from '#tests/support/notes-api.js';
import { addGroup, details, sharingPath } from '#tests/support/sharing-api.js';

let api: TestApi;
let village: Village;
let observer: Client;
let staff: Client;
let calendar: Calendar;
let group: Group;
let kept: Entry;
let version: Version;

beforeAll(async () => {
  api = await openTestApi();
});
/** Lamp-makers: an elder who gives the entry, an observer and the steward. */
beforeEach(async () => {
  await api.reset();
  village = await openVillage(api);
  [observer, staff] = await Promise.all([api.signIn('observer'), api.signIn('staff')]);
  calendar = await beginCalendar(village);
  group = await addGroup(village.elder, 'Lamp-makers', [village.elder, observer, village.steward]);
  await addEntry(village.officer, calendar.id, { titleOfficer: 'Sow long millet' });
  kept = await addEntry(village.elder, calendar.id, {
    ...{
      titleOfficer: 'Lamp evening',
      crop: '',
      sharingLevel: 'group',
      sharing: details({ groupId: group.id }),
    },
    lead: { type: 'marker', markerKey: 'hr1457', phenomenon: 'heliacal-rising', occurrence: 1 },
  });
  version = await submit(village.officer, calendar.id);
});
afterAll(() => api.close());

describe('whoever keeps an entry', () => {
  it('finds on Today that it waits, whatever their role, until they have answered', async () => {
    expect(await waitsFor(observer)).toEqual([0, 1]);
    await answer(observer).expect(200);
    expect(await waitsFor(observer)).toBeNull();
    expect(await waitsFor(village.steward)).toEqual([0, 1]);
    expect(await waitsFor(staff)).toBeNull();
  });

  it('reads that entry with its marker, its place and its year, and nothing else of the submission', async () => {
    await answer(village.steward, { answer: 'change-this', note: 'Later in the evening' }).expect(200);
    const answered = await observer.get(`${versionPath(version)}/own-entries`).expect(200);
    const { text } = answered;
    const own = answered.body as OwnEntries;
    expect(own).toMatchObject({ year: 2027, placeName: 'Upper terraces' });
    expect(own.items.map(({ entry, answer: given }) => [entry.content.titleOfficer, given])).toEqual([
      ['Lamp evening', null],
    ]);
    expect(own.markers.map(({ markerKey }) => markerKey)).toEqual(['hr1457']);
    expect(Object.keys(own).sort()).toEqual(
      ['items', 'markers', 'officerLanguage', 'placeName', 'villageLanguage', 'year'].sort(),
    );
    for (const hidden of ['millet', 'pleiades', version.hash, 'Later in the evening']) {
      expect(text).not.toContain(hidden);
    }
  });

  it('comes no further into what is in review', async () => {
    expect(reasonOf(await observer.get(versionPath(version)))).toBe('404 not-found');
    expect(reasonOf(await observer.get(`${versionPath(version)}/answers`))).toBe('403 not-allowed');
    const plain = version.entries.find(({ entryId }) => entryId !== kept.id);
    expect(reasonOf(await answer(observer, {}, plain?.entryId))).toBe('404 not-found');
  });

  it('answers with a note, changes it, and takes it back', async () => {
    await answer(observer, { answer: 'change-this' }).expect(422);
    await answer(observer, { answer: 'change-this', note: 'A day later' }).expect(200);
    await answer(observer, { answer: 'agree', note: 'So it was told' }).expect(200);
    expect(await ownAnswer(observer)).toMatchObject({ answer: 'agree', note: 'So it was told' });
    await observer.delete(answerPath()).expect(204);
    expect(await ownAnswer(observer)).toBeNull();
    expect(reasonOf(await observer.delete(answerPath()))).toBe('404 not-found');
  });

  it('may say by voice what should change: their own recording about this entry, and no other', async () => {
    const spoken = await addRecording(observer, kept.id, {
      ...{ subjectType: 'entry', sharingLevel: 'group', sharing: details({ groupId: group.id }) },
    });
    const byVoice = { answer: 'change-this', note: '', recordingId: spoken.id };
    expect((await observer.put(answerPath(), byVoice).expect(200)).body).toMatchObject({
      spoken: { state: 'kept', attachmentId: spoken.id },
    });
    expect((await village.steward.put(answerPath(), byVoice)).status).toBe(422);
    await village.steward.get(`/api/attachments/${spoken.id}`).expect(200);
    await staff.get(`/api/attachments/${spoken.id}`).expect(404);
    const { items } = (await village.elder.get(`${versionPath(version)}/answers`).expect(200)).body as {
      items: Answer[];
    };
    expect(items).toMatchObject([{ note: '', spoken: { attachmentId: spoken.id } }]);
  });

  it('may let their difference stand: then the entry is agreed with a difference', async () => {
    expect(reasonOf(await observer.post(`${answerPath()}/stand`))).toBe('409 no-change-asked');
    await answer(village.steward).expect(200);
    await answer(observer, { answer: 'change-this', note: 'A day later' }).expect(200);
    expect(await idsOf(observer, await publish(village, version))).not.toContain(kept.id);
    const second = await submit(village.officer, calendar.id);
    expect((await observer.post(`${answerPath(kept.id, second)}/stand`).expect(200)).body).toMatchObject({
      answer: 'change-this',
      letStand: true,
    });
    expect(await idsOf(observer, await publish(village, second))).toContain(kept.id);
  });

  it('reads and pins notes beside it, which nobody else sees', async () => {
    const path = `/api/communities/${observer.communityId}/notes`;
    const subject = { subjectType: 'entry', subjectId: kept.id } as const;
    const own = (await ownItems(observer))[0]?.entry;
    await observer.post(path, noteInput({ ...subject, text: 'With two lamps' })).expect(201);
    expect(own?.entryId).toBe(kept.id);
    const query = `${path}?subjectType=entry&subjectId=${kept.id}`;
    const read = async (client: Client) =>
      ((await client.get(query)).body as { items?: { text: string }[] }).items?.map(({ text }) => text);
    expect(await read(village.steward)).toEqual(['With two lamps']);
    expect((await village.officer.get(query)).status).toBe(404);
  });

  it('brings it into the published version with their yes, and keeps it out with their no', async () => {
    await answer(observer).expect(200);
    expect(await idsOf(observer, await publish(village, version))).toContain(kept.id);
    const second = await submit(village.officer, calendar.id);
    await answer(observer, { answer: 'not-for-the-board' }, kept.id, second).expect(200);
    expect(await idsOf(observer, await publish(village, second))).not.toContain(kept.id);
  });

  it('is heard by the elders who keep it with them, and by nobody else', async () => {
    await answer(observer, { answer: 'change-this', note: 'A day later' }).expect(200);
    const heardBy = async (client: Client) =>
      (
        (await client.get(`${versionPath(version)}/answers`).expect(200)).body as { items: Answer[] }
      ).items.map(({ note }) => note);
    expect(await heardBy(village.elder)).toEqual(['A day later']);
    expect(await heardBy(village.elder2)).toEqual([]);
    expect(await heardBy(village.officer)).toEqual([]);
  });
});

describe('an entry in review', () => {
  it('is nobody’s to answer here who does not keep it, and looks like nothing at all', async () => {
    const nothing = async (client: Client, number: number) =>
      (await client.get(versionPath({ ...version, number }) + '/own-entries').expect(200)).body as OwnEntries;
    expect(await nothing(staff, version.number)).toEqual(await nothing(staff, 99));
    expect((await nothing(village.officer, version.number)).items).toEqual([]);
    expect(reasonOf(await answer(staff))).toBe('404 not-found');
    expect(reasonOf(await answer(village.officer))).toBe('404 not-found');
  });

  it('is not its writer’s to agree to, where somebody else keeps it with them', async () => {
    expect(await ownItems(village.elder)).toEqual([]);
    expect(reasonOf(await answer(village.elder))).toBe('404 not-found');
  });

  it('is not answered by a villager because its telling season is open to the village', async () => {
    await takeBack(village.officer, version);
    const season = { from: { month: 1, day: 1 }, to: { month: 12, day: 31 } };
    const told = await addEntry(village.elder, calendar.id, {
      ...{ sharingLevel: 'village', sharing: details({ tellingSeason: season }) },
    });
    const second = await submit(village.officer, calendar.id);
    expect(reasonOf(await answer(observer, {}, told.id, second))).toBe('404 not-found');
  });

  it('is its giver’s and successor’s where it is sealed, also when an officer wrote it down', async () => {
    await takeBack(village.officer, version);
    const sealed = await addEntry(village.officer, calendar.id, {
      ...{ sharingLevel: 'sealed', giverId: observer.personId },
      sharing: details({ successorId: staff.personId }),
    });
    const second = await submit(village.officer, calendar.id);
    expect(reasonOf(await answer(village.officer, {}, sealed.id, second))).toBe('404 not-found');
    await answer(staff, {}, sealed.id, second).expect(200);
    expect(await idsOf(observer, await publish(village, second))).toContain(sealed.id);
  });

  it('stops being theirs to answer once it is not in review any more, and with their place in the group', async () => {
    const path = `/api/communities/${observer.communityId}/groups/${group.id}`;
    const memberIds = [village.elder.personId, village.steward.personId];
    await village.elder.put(path, { name: group.name, memberIds, version: group.version }).expect(200);
    expect(reasonOf(await answer(observer))).toBe('404 not-found');
    await takeBack(village.officer, version);
    expect(reasonOf(await answer(village.steward))).toBe('409 not-in-review');
    expect(await ownItems(village.steward)).toEqual([]);
  });

  it('keeps what its people said among them when it becomes the village’s', async () => {
    await answer(observer, { answer: 'not-for-the-board', note: 'Not for all' }).expect(200);
    const path = sharingPath(village.elder, 'entry', kept.id);
    const sharing = { level: 'village', ...details() };
    await village.elder.put(path, { sharing, version: 1 }).expect(200);
    await village.steward.post(`${path}/agreement`).expect(200);
    const { items } = (await village.officer.get(`${versionPath(version)}/answers`).expect(200)).body as {
      items: Answer[];
    };
    expect(items).toEqual([]);
    const gaps = (await readVersion(village.officer, version)).gaps.map(({ code }) => code);
    expect(gaps).toContain('entry-without-agree');
    expect(gaps).not.toContain('not-for-board-stands');
  });
});

function answerPath(entryId = kept.id, of = version): string {
  return `${versionPath(of)}/own-entries/${entryId}/answer`;
}

function answer(client: Client, changes = {}, entryId = kept.id, of = version) {
  const { answer: word, note } = says(changes);
  return client.put(answerPath(entryId, of), { answer: word, note });
}

async function ownItems(client: Client): Promise<OwnEntries['items']> {
  return ((await client.get(`${versionPath(version)}/own-entries`).expect(200)).body as OwnEntries).items;
}

async function ownAnswer(client: Client) {
  return (await ownItems(client))[0]?.answer;
}

async function waitsFor(client: Client): Promise<[number, number] | null> {
  const today = await client.get(`/api/communities/${client.communityId}/today`).expect(200);
  const found = (today.body as Today).waiting.find(({ kind }) => kind === 'answer-own-entries');
  return found === undefined ? null : [found.done, found.of];
}

async function idsOf(client: Client, of: Version): Promise<string[]> {
  return (await readVersion(client, of)).entries.map(({ entryId }) => entryId);
}
