import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { AuditEvent } from '#shared/contracts/audit.js';
import type { Calendar, Entry, EntryList } from '#shared/contracts/calendars.js';
import type { CommunityPerson } from '#shared/contracts/people.js';
import type { ElderProgress } from '#shared/contracts/reviews.js';
import { GIVER_BY_ROLE, type Group, type ItemSharing, type SharingInput } from '#shared/contracts/sharing.js';
import type { Version } from '#shared/contracts/versions.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import {
  addEntry,
  beginCalendar,
  entriesOf,
  entryInput,
  openVillage,
  publish,
  readVersion,
  reasonOf,
  says,
  submit,
  versionPath,
  type Village,
} from '#tests/support/calendar-api.js';
import { addGroup, details, sharingPath } from '#tests/support/sharing-api.js';

let api: TestApi;
let village: Village;
let calendar: Calendar;
beforeAll(async () => {
  api = await openTestApi();
});
beforeEach(async () => {
  await api.reset();
  village = await openVillage(api);
  calendar = await beginCalendar(village);
});
afterAll(() => api.close());

describe('kept entries in a draft', () => {
  it('are written by elders, and stand as an empty slot or not at all for everybody else', async () => {
    const { elder, elder2, officer } = village;
    await addEntry(officer, calendar.id);
    await addEntry(elder, calendar.id, { sharingLevel: 'elders' });
    await addEntry(elder, calendar.id, { sharingLevel: 'elders', sharing: details({ trace: 'none' }) });
    expect(await listOf(officer)).toMatchObject({ items: [{ position: 0 }], keptCount: 1 });
    expect((await listOf(elder2)).items.map(({ mine }) => mine)).toEqual([false, false, false]);
    expect((await listOf(elder)).items.map(({ mine }) => mine)).toEqual([false, true, true]);
  });

  it('vanish from the officer who writes one down for an elder, and are that elder’s from then on', async () => {
    const { elder, officer } = village;
    const entry = await addEntry(officer, calendar.id, { sharingLevel: 'elders', giverId: elder.personId });
    expect(await entriesOf(officer, calendar.id)).toEqual([]);
    const path = `/api/calendars/${calendar.id}/entries/${entry.id}`;
    await officer.put(path, { content: entry.content, version: 1 }).expect(404);
    const content = { ...entry.content, notes: 'Told again' };
    expect((await elder.put(path, { content, version: 1 }).expect(200)).body).toMatchObject({ mine: true });
  });

  it('are another elder’s to see and not to write', async () => {
    const entry = await addEntry(village.elder, calendar.id, { sharingLevel: 'elders' });
    const path = `/api/calendars/${calendar.id}/entries/${entry.id}`;
    const answer = await village.elder2.put(path, { content: entry.content, version: 1 });
    expect(reasonOf(answer)).toBe('409 not-the-giver');
  });

  it('make nobody a writer, so that elders who gave one still sign for the village', async () => {
    await addEntry(village.officer, calendar.id);
    await addEntry(village.elder, calendar.id, { sharingLevel: 'elders' });
    const version = await submit(village.officer, calendar.id);
    expect((await publish(village, version)).state).toBe('published');
  });

  it('keep their places when those that are seen change theirs', async () => {
    const { elder, officer } = village;
    const [first, kept, last] = [
      await addEntry(officer, calendar.id, { titleOfficer: 'first' }),
      await addEntry(elder, calendar.id, { titleOfficer: 'kept', sharingLevel: 'elders' }),
      await addEntry(officer, calendar.id, { titleOfficer: 'last' }),
    ];
    const order = `/api/calendars/${calendar.id}/order`;
    await officer.put(order, { entryIds: [last.id, first.id] }).expect(200);
    expect((await entriesOf(elder, calendar.id)).map(({ id }) => id)).toEqual([last.id, kept.id, first.id]);
    expect(reasonOf(await officer.put(order, { entryIds: [last.id, kept.id, first.id] }))).toBe(
      '409 order-differs',
    );
  });

  it('are refused for a group that neither writer nor giver belongs to', async () => {
    const group = await addGroup(village.steward, 'Lamp-makers', [village.elder2]);
    const body = { ...entryInput(), sharingLevel: 'group', sharing: details({ groupId: group.id }) };
    const answer = await village.elder.post(`/api/calendars/${calendar.id}/entries`, body).expect(422);
    expect(answer.body).toMatchObject({ errors: [{ field: 'sharing.groupId', code: 'group-of-giver' }] });
  });
});

describe('kept entries in review and publication', () => {
  async function keptAndPlain(
    changes: Parameters<typeof addEntry>[2],
  ): Promise<{ kept: Entry; version: Version }> {
    await addEntry(village.officer, calendar.id);
    const kept = await addEntry(village.elder, calendar.id, changes);
    return { kept, version: await submit(village.officer, calendar.id) };
  }
  const answerPath = (version: Version, { id }: Entry) => `${versionPath(version)}/entries/${id}/answer`;

  it('count in the progress of those who see them, and in nobody else’s', async () => {
    const { version } = await keptAndPlain({ sharingLevel: 'elders' });
    const of = async (client: Client, who: Client) => {
      const answers = await client.get(`${versionPath(version)}/answers`).expect(200);
      return (answers.body as { progress: ElderProgress[] }).progress.find(
        ({ elderId }) => elderId === who.personId,
      )?.of;
    };
    expect(await of(village.elder2, village.elder2)).toBe(2);
    expect(await of(village.officer, village.elder2)).toBe(1);
  });

  it('go with the published version once one of their people other than the writer agreed', async () => {
    const { kept, version } = await keptAndPlain({ sharingLevel: 'elders' });
    await village.elder2.put(answerPath(version, kept), says()).expect(200);
    const published = await publish(village, version);
    expect(await idsOf(village.elder3, published)).toContain(kept.id);
    expect(await idsOf(village.officer, published)).not.toContain(kept.id);
  });

  it('stay out of it where only the writer agreed, or one of their people objects', async () => {
    const { kept, version } = await keptAndPlain({ sharingLevel: 'elders' });
    await village.elder.put(answerPath(version, kept), says()).expect(200);
    expect(await idsOf(village.elder, await publish(village, version))).not.toContain(kept.id);
    const second = await submit(village.officer, calendar.id);
    await village.elder2.put(answerPath(second, kept), says()).expect(200);
    await village.elder3.put(answerPath(second, kept), says({ answer: 'not-for-the-board' })).expect(200);
    expect(await idsOf(village.elder, await publish(village, second))).not.toContain(kept.id);
  });

  it('need no other word than the giver’s where nobody else may see them', async () => {
    const { kept, version } = await keptAndPlain({ sharingLevel: 'sealed' });
    await village.elder.put(answerPath(version, kept), says()).expect(200);
    expect(await idsOf(village.elder, await publish(village, version))).toContain(kept.id);
  });

  it('leave no hole in positions, counts or hash for those who do not see them', async () => {
    const { version } = await keptAndPlain({ sharingLevel: 'sealed' });
    await addEntryAfter(version);
    const seen = await readVersion(village.officer, await submit(village.officer, calendar.id));
    expect(seen.entries.map(({ position }) => position)).toEqual([0, 1]);
    expect(seen).toMatchObject({ entryCount: 2, keptCount: 0, withdrawnCount: 0 });
    expect(seen.leaves).toHaveLength(16);
  });

  async function addEntryAfter(version: Version): Promise<void> {
    await village.officer
      .post(`${versionPath(version)}/changes-asked`, { reason: 'taken-back', note: '' })
      .expect(200);
    await addEntry(village.officer, calendar.id, { titleOfficer: 'Weed' });
  }
});

describe('changing who may see a thing', () => {
  let entryId: string;
  let path: string;
  beforeEach(async () => {
    entryId = (
      await addEntry(village.officer, calendar.id, {
        sharingLevel: 'village',
        giverId: village.elder.personId,
      })
    ).id;
    path = sharingPath(village.elder, 'entry', entryId);
  });

  it('holds at once where it is tighter, by any elder, for draft and old versions alike', async () => {
    const published = await publish(village, await submit(village.officer, calendar.id));
    expect(await idsOf(village.officer, published)).toContain(entryId);
    await change(village.elder2, { level: 'elders' }).expect(200);
    expect(await idsOf(village.officer, published)).not.toContain(entryId);
    expect(await entriesOf(village.officer, calendar.id)).toEqual([]);
    const [own] = await entriesOf(village.elder, calendar.id);
    expect(own?.content.sharingLevel).toBe('elders');
  });

  it('waits for giver and steward where it is wider, in whatever order they speak', async () => {
    await change(village.elder, { level: 'elders' }).expect(200);
    const asked = (await change(village.elder2, { level: 'open' }, 2).expect(200)).body as ItemSharing;
    expect(asked).toMatchObject({
      sharing: { level: 'elders' },
      asked: { giverAgreed: false, stewardAgreed: false },
    });
    const afterSteward = (await village.steward.post(`${path}/agreement`).expect(200)).body as ItemSharing;
    expect(afterSteward).toMatchObject({ sharing: { level: 'elders' }, asked: { stewardAgreed: true } });
    expect(reasonOf(await village.elder2.post(`${path}/agreement`))).toBe('409 giver-and-steward');
    const afterGiver = (await village.elder.post(`${path}/agreement`).expect(200)).body as ItemSharing;
    expect(afterGiver).toMatchObject({ sharing: { level: 'open' }, asked: null });
  });

  it('tells the steward which level waits for their word, and nothing of the thing', async () => {
    await change(village.elder, { level: 'elders' }).expect(200);
    expect(reasonOf(await village.steward.get(path))).toBe('404 not-found');
    await change(village.elder, { level: 'village' }, 2).expect(200);
    const waiting = await village.steward
      .get(`/api/communities/${village.steward.communityId}/wider-asked`)
      .expect(200);
    expect(waiting.body).toMatchObject({
      items: [{ itemId: entryId, asked: { sharing: { level: 'village' } } }],
    });
    expect(waiting.text).not.toContain('Sow long millet');
  });

  it('can be dropped again by giver, steward or whoever asked', async () => {
    await change(village.elder, { level: 'elders' }).expect(200);
    await change(village.elder2, { level: 'open' }, 2).expect(200);
    expect((await village.steward.delete(`${path}/agreement`).expect(200)).body).toMatchObject({
      asked: null,
    });
    expect(reasonOf(await village.elder.post(`${path}/agreement`))).toBe('409 nothing-asked');
  });

  it('is not done by editing the entry, where it would be wider', async () => {
    const entryPath = `/api/calendars/${calendar.id}/entries/${entryId}`;
    const [row] = await entriesOf(village.officer, calendar.id);
    const content = { ...row?.content, sharingLevel: 'open' };
    const answer = await village.officer.put(entryPath, { content, version: 1 }).expect(422);
    expect(answer.body).toMatchObject({
      errors: [{ field: 'content.sharingLevel', code: 'wider-needs-two' }],
    });
  });

  it('answers 409 with what is there now when somebody changed it meanwhile', async () => {
    await change(village.elder, { level: 'elders' }).expect(200);
    const answer = await change(village.elder2, { level: 'sealed' }, 1).expect(409);
    expect(answer.body).toMatchObject({ type: '/problems/stale', current: { sharing: { level: 'elders' } } });
  });

  it('is nothing for observers and staff, who see it and cannot change it', async () => {
    const observer = await api.signIn('observer');
    expect(reasonOf(await change(observer, { level: 'sealed' }))).toBe('409 not-the-giver');
  });

  function change(client: Client, sharing: Partial<SharingInput>, version = 1) {
    return client.put(path, { sharing: { level: 'village', ...details(), ...sharing }, version });
  }
});

describe('how the giver is named', () => {
  it('is as they wish, in drafts, versions and beside the level, for everybody but themselves', async () => {
    const { elder, elder2, officer } = village;
    const changes = { giver: 'Elder A-1', giverId: elder.personId, sharingLevel: 'village' } as const;
    const byRole = await addEntry(officer, calendar.id, { ...changes, sharing: details({ naming: 'role' }) });
    await addEntry(officer, calendar.id, { ...changes, sharing: details({ naming: 'not-named' }) });
    const giversFor = async (client: Client) => [
      (await entriesOf(client, calendar.id)).map(({ content }) => content.giver),
    ];
    expect(await giversFor(officer)).toEqual([[GIVER_BY_ROLE, '']]);
    expect(await giversFor(elder)).toEqual([['Elder A-1', 'Elder A-1']]);
    const version = await submit(officer, calendar.id);
    const read = await readVersion(elder2, version);
    expect(read.entries.map(({ content }) => [content.giver, content.giverId])).toEqual([
      [GIVER_BY_ROLE, null],
      ['', null],
    ]);
    const beside = await officer.get(sharingPath(officer, 'entry', byRole.id)).expect(200);
    expect(beside.body).toMatchObject({ giverId: null, giverName: '' });
  });

  it('is not lost when somebody writes on what shows them no name', async () => {
    const { elder, officer } = village;
    const { id } = await addEntry(officer, calendar.id, {
      ...{ giver: 'Elder A-1', giverId: elder.personId, sharingLevel: 'village' },
      sharing: details({ naming: 'role' }),
    });
    const [seen] = await entriesOf(officer, calendar.id);
    const content = { ...seen?.content, notes: 'After the first rain' };
    await officer.put(`/api/calendars/${calendar.id}/entries/${id}`, { content, version: 1 }).expect(200);
    const [own] = await entriesOf(elder, calendar.id);
    expect(own?.content).toMatchObject({
      ...{ giver: 'Elder A-1', giverId: elder.personId, notes: 'After the first rain' },
    });
  });
});

describe('groups', () => {
  it('are founded by steward or elder; then only their own people say who belongs to them', async () => {
    const { steward, elder, elder2 } = village;
    const group = await addGroup(steward, 'Lamp-makers', [elder]);
    expect(group).toMatchObject({ memberCount: 1, members: null, isMember: false });
    const path = `/api/communities/${steward.communityId}/groups/${group.id}`;
    const body = { name: 'Lamp-makers', memberIds: [steward.personId, elder.personId], version: 1 };
    expect(reasonOf(await steward.put(path, body))).toBe('409 not-of-the-group');
    const memberIds = [elder.personId, elder2.personId];
    const changed = (await elder.put(path, { ...body, memberIds }).expect(200)).body as Group;
    expect(changed.members?.map(({ id }) => id).sort()).toEqual([...memberIds].sort());
  });

  it('have people of this village only', async () => {
    const stranger = await api.signIn('officer2');
    const body = { name: 'Menders', memberIds: [stranger.personId] };
    await village.steward.post(`/api/communities/${village.steward.communityId}/groups`, body).expect(422);
  });
});

describe('roles', () => {
  it('do not lead above the levels: a steward does not make themselves an elder', async () => {
    const people = `/api/communities/${village.steward.communityId}/people`;
    const { items } = (await village.steward.get(people).expect(200)).body as { items: CommunityPerson[] };
    const own = items.find(({ id }) => id === village.steward.personId);
    const answer = await village.steward.put(`${people}/${own?.id ?? ''}`, {
      roles: ['steward', 'elder'],
      version: own?.version,
    });
    expect(reasonOf(answer)).toBe('409 not-yourself');
  });
});

describe('the records', () => {
  it('say once a day who read what is kept, without its words, and only to those who see it', async () => {
    await addEntry(village.elder, calendar.id, { sharingLevel: 'elders', titleOfficer: 'The quiet evening' });
    await entriesOf(village.elder2, calendar.id);
    await entriesOf(village.elder2, calendar.id);
    expect(await readsSeenBy(village.elder)).toEqual(['The quiet evening']);
    expect(await readsSeenBy(village.officer)).toEqual([null]);
    const rows: unknown = await api.dataSource.query('SELECT details FROM audit_event');
    expect(JSON.stringify(rows)).not.toContain('quiet');
  });

  it('are silent about what leaves no trace', async () => {
    await addEntry(village.elder, calendar.id, { sharingLevel: 'sealed' });
    const { text } = await village.steward
      .get(`/api/communities/${village.steward.communityId}/audit`)
      .expect(200);
    expect(text).not.toContain('entry-added');
  });

  async function readsSeenBy(client: Client): Promise<(string | null)[]> {
    const records = await client.get(`/api/communities/${client.communityId}/audit`).expect(200);
    return (records.body as { items: AuditEvent[] }).items
      .filter(({ action }) => action === 'kept-read')
      .map(({ subjectName }) => subjectName);
  }
});

async function listOf(client: Client): Promise<EntryList> {
  return (await client.get(`/api/calendars/${calendar.id}/entries`).expect(200)).body as EntryList;
}

async function idsOf(client: Client, version: Version): Promise<string[]> {
  return (await readVersion(client, version)).entries.map(({ entryId }) => entryId);
}
