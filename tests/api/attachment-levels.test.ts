import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Attachment } from '#shared/contracts/attachments.js';
import type { AuditEvent } from '#shared/contracts/audit.js';
import type { Problem } from '#shared/contracts/problem.js';
import type { ItemSharing } from '#shared/contracts/sharing.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import {
  addPicture,
  addRecording,
  attachmentInput,
  attachmentsPath,
  recordingInput,
} from '#tests/support/attachment-api.js';
import {
  addEntry,
  beginCalendar,
  openVillage,
  publishDraft,
  reasonOf,
  says,
  submit,
  versionPath,
} from '#tests/support/calendar-api.js';
import { addFigure } from '#tests/support/figure-api.js';
import { addGroup, details, sharingPath } from '#tests/support/sharing-api.js';
import { plainPicture, webm } from '#tests/support/media.js';

let api: TestApi;
let officer: Client;
let elder: Client;
let elder2: Client;
let figureId: string;
let virus = false;
beforeAll(async () => {
  api = await openTestApi({ scan: () => Promise.resolve(!virus) });
});
afterAll(() => api.close());
beforeEach(async () => {
  virus = false;
  await api.reset();
  [officer, elder, elder2] = await Promise.all([
    api.signIn('officer'),
    api.signIn('elder'),
    api.signIn('elder2'),
  ]);
  figureId = (await addFigure(officer)).id;
});

async function keptFiles(): Promise<number> {
  const keys: string[] = [];
  for await (const key of api.storage.keys()) keys.push(key);
  return keys.length;
}
const listed = async (client: Client, subjectType = 'figure', subjectId = figureId) =>
  (
    (
      await client
        .get(`${attachmentsPath(client)}?subjectType=${subjectType}&subjectId=${subjectId}`)
        .expect(200)
    ).body as { items: Attachment[] }
  ).items;
const fieldsOf = (answer: { body: unknown }) =>
  (answer.body as Problem).errors?.map(({ field, code }) => `${field} ${code}`);

describe('who sees it', () => {
  it('the elders’ recordings are not there for anybody else, whatever they know', async () => {
    const { id } = await addRecording(elder, figureId);
    const unknown = await officer.get('/api/attachments/0190a3a0-0000-7000-8000-000000000000');
    for (const way of [
      `/api/attachments/${id}`,
      `/api/attachments/${id}/parts/1`,
      `/api/attachments/${id}/parts/0`,
    ]) {
      const answer = await officer.get(way);
      expect({ ...(answer.body as Problem), requestId: '' }).toEqual({
        ...(unknown.body as Problem),
        requestId: '',
      });
    }
    expect(await listed(officer)).toEqual([]);
    expect(await listed(elder2)).toMatchObject([{ id }]);
    expect(reasonOf(await officer.delete(`/api/attachments/${id}`))).toBe('404 not-found');
  });

  it('one of which only the consent has come is its sender’s alone', async () => {
    await addRecording(elder, figureId, { sharingLevel: 'village' }, []);
    expect([(await listed(elder)).length, (await listed(elder2)).length]).toEqual([1, 0]);
  });

  it('the spoken consent is for those who keep the village’s word', async () => {
    const { id } = await addRecording(elder, figureId, { sharingLevel: 'village' });
    const observer = await api.signIn('observer');
    expect((await observer.get(`/api/attachments/${id}/parts/0`)).status).toBe(404);
    expect((await listed(observer))[0]?.parts.map(({ part }) => part)).toEqual([1]);
    expect((await officer.get(`/api/attachments/${id}/parts/0`)).status).toBe(200);
  });

  it('it is gone with the figure, and back with it', async () => {
    const { id } = await addPicture(elder, figureId);
    const figure = `/api/communities/${officer.communityId}/figures/${figureId}`;
    await officer.delete(figure).expect(204);
    expect((await elder.get(`/api/attachments/${id}`)).status).toBe(404);
    await officer.post(`${figure}/restore`).expect(200);
    expect((await elder.get(`/api/attachments/${id}`)).status).toBe(200);
  });

  it('on an entry it is for those who see drafts until the entry is published', async () => {
    const village = await openVillage(api);
    const calendar = await beginCalendar(village);
    const entry = await addEntry(officer, calendar.id);
    const { id } = await addPicture(officer, entry.id, { subjectType: 'entry' });
    const observer = await api.signIn('observer');
    expect((await observer.get(`/api/attachments/${id}`)).status).toBe(404);
    expect(await listed(elder, 'entry', entry.id)).toHaveLength(1);
    await publishDraft(village, calendar.id);
    expect((await observer.get(`/api/attachments/${id}`)).status).toBe(200);
  });

  it('on an elder’s answer it is for the review', async () => {
    const village = await openVillage(api);
    const calendar = await beginCalendar(village);
    const entry = await addEntry(officer, calendar.id);
    const version = await submit(officer, calendar.id);
    const answerPath = `${versionPath(version)}/entries/${entry.id}/answer`;
    const answer = (await elder.put(answerPath, says()).expect(200)).body as { id: string };
    const { id } = await addRecording(elder, answer.id, { subjectType: 'answer', sharingLevel: 'village' });
    expect((await officer.get(`/api/attachments/${id}`)).status).toBe(200);
    expect((await (await api.signIn('observer')).get(`/api/attachments/${id}`)).status).toBe(404);
  });

  it('it belongs to a marker of the sky or of the village, and to no other', async () => {
    expect((await addPicture(officer, 'pleiades', { subjectType: 'marker' })).subjectId).toBe('pleiades');
    expect((await addPicture(officer, `f-${figureId}`, { subjectType: 'marker' })).subjectId).toBe(
      `f-${figureId}`,
    );
    for (const subjectId of ['hr9999', 'f-0190a3a0-0000-7000-8000-000000000000']) {
      const input = attachmentInput({ subjectType: 'marker', subjectId });
      expect((await officer.upload(attachmentsPath(officer), input, await plainPicture())).status).toBe(404);
    }
  });

  it('records of it are for whom it is for', async () => {
    const { id } = await addRecording(elder, figureId);
    await elder2.get(`/api/attachments/${id}/parts/1`).expect(200);
    await elder2.get(`/api/attachments/${id}/parts/1`).set('Range', 'bytes=3-').expect(206);
    const actions = async (client: Client) =>
      (
        (await client.get(`/api/communities/${client.communityId}/audit`).expect(200)).body as {
          items: AuditEvent[];
        }
      ).items
        .filter(({ action }) => /^attachment|^kept-read/u.test(action))
        .map(({ action, actorName, subjectName }) => [action, actorName, subjectName]);
    const title = 'Why the bowl is empty';
    expect(await actions(elder)).toEqual([
      ['kept-read', elder2.session.person?.displayName, title],
      ['attachment-added', elder.session.person?.displayName, title],
    ]);
    expect(await actions(officer)).toEqual([]);
  });
});

describe('levels', () => {
  const heard = async (client: Client) => (await listed(client)).length;

  it('a group’s recording is for the group, a sealed one for its giver and one successor', async () => {
    const observer = await api.signIn('observer');
    const group = await addGroup(elder, 'Weavers', [elder, observer]);
    await addRecording(elder, figureId, { sharingLevel: 'group', sharing: details({ groupId: group.id }) });
    expect([await heard(elder), await heard(observer), await heard(elder2)]).toEqual([1, 1, 0]);
    await addRecording(elder, figureId, {
      sharingLevel: 'sealed',
      sharing: details({ successorId: elder2.personId }),
    });
    expect([await heard(elder), await heard(observer), await heard(elder2)]).toEqual([2, 1, 1]);
  });

  it('outside its telling season it is its giver’s alone', async () => {
    const august = { from: { month: 8, day: 1 }, to: { month: 8, day: 31 } };
    await addRecording(elder, figureId, {
      sharingLevel: 'village',
      sharing: details({ tellingSeason: august }),
    });
    expect([await heard(elder), await heard(officer)]).toEqual([1, 0]);
    api.clock.set(new Date('2027-08-10T09:00:00Z'));
    expect(await heard(await api.signIn('officer'))).toBe(1);
  });

  it('an officer who records what an elder gives sends it to its end and does not hear it afterwards', async () => {
    const sent = await addRecording(officer, figureId, { giverId: elder.personId }, ['one', 'two']);
    expect(sent.parts).toHaveLength(3);
    expect((await officer.get(`/api/attachments/${sent.id}`)).status).toBe(404);
    expect((await officer.get(`/api/attachments/${sent.id}/parts/1`)).status).toBe(404);
    expect(await listed(elder)).toMatchObject([{ id: sent.id, may: { remove: true } }]);
    await elder.delete(`/api/attachments/${sent.id}`).expect(204);
  });

  it('a giver who is not to be named is not, to anybody else', async () => {
    await addRecording(elder, figureId, {
      sharingLevel: 'village',
      sharing: details({ naming: 'not-named' }),
    });
    expect(await listed(officer)).toMatchObject([{ speaker: '', addedBy: '', naming: 'not-named' }]);
    expect(await listed(elder)).toMatchObject([{ speaker: 'A-2' }]);
  });

  it('what it belongs to narrows it: with an elders’ figure even the village’s picture is the elders’', async () => {
    await addPicture(officer, figureId);
    const sharing = { level: 'elders', ...details() };
    const way = sharingPath(officer, 'figure', figureId);
    const { version } = (await officer.get(way).expect(200)).body as ItemSharing;
    await officer.put(way, { sharing, version }).expect(200);
    expect(await heard(elder)).toBe(1);
    expect(await heard(await api.signIn('observer'))).toBe(0);
  });

  it.each([
    ['a group without its name', { sharingLevel: 'group' as const }, 'sharing.groupId choose-group'],
    [
      'a giver from nowhere',
      { giverId: '0190a3a0-0000-7000-8000-000000000000' },
      'giverId not-of-this-village',
    ],
  ])('%s is refused at its field', async (_what, changes, field) => {
    const input = recordingInput({ subjectId: figureId, ...changes });
    expect(fieldsOf(await elder.upload(attachmentsPath(elder), input, webm()))).toEqual([field]);
    expect(await keptFiles()).toBe(0);
  });
});
