import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { AuditEventEntity } from '#server/db/entities/audit-event.entity.js';
import type { AuditEvent } from '#shared/contracts/audit.js';
import type { Entry } from '#shared/contracts/calendars.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import {
  addEntry,
  answerAll,
  beginCalendar,
  changePlace,
  entriesOf,
  entryInput,
  openVillage,
  publishDraft,
  says,
  sign,
  submit,
  takeBack,
  versionPath,
  type Village,
  wholeEntry,
} from '#tests/support/calendar-api.js';

let api: TestApi;
let village: Village;
let officer: Client;
beforeAll(async () => {
  api = await openTestApi();
});
beforeEach(async () => {
  await api.reset();
  village = await openVillage(api);
  ({ officer } = village);
});
afterAll(() => api.close());

interface Page {
  items: AuditEvent[];
  nextCursor: string | null;
}
const page = async (query = '', client = officer) =>
  (await client.get(`/api/communities/${client.communityId}/audit${query}`).expect(200)).body as Page;
const lines = ({ items }: Page) =>
  items.map(({ actorName, action, subjectName }) => `${actorName}: ${action} ${subjectName ?? '–'}`);

describe('the audit', () => {
  it('tells who changed which entry, place and state, newest first', async () => {
    const { id } = await beginCalendar(village);
    const entries = `/api/calendars/${id}/entries`;
    const sowing = await addEntry(officer, id);
    const content = wholeEntry({ notes: 'Upper terraces first', crop: 'millet' });
    await officer.put(`${entries}/${sowing.id}`, { content, version: 1 }).expect(200);
    const copy = (await officer.post(`${entries}/${sowing.id}/copy`).expect(201)).body as Entry;
    await officer.put(`/api/calendars/${id}/order`, { entryIds: [copy.id, sowing.id] }).expect(200);
    await officer.delete(`${entries}/${copy.id}`).expect(204);
    await officer.post(`${entries}/${copy.id}/restore`).expect(200);
    expect(lines(await page())).toEqual([
      'Beyno: entry-restored Sow long millet',
      'Beyno: entry-deleted Sow long millet',
      'Beyno: entries-reordered Upper terraces 2027',
      'Beyno: entry-copied Sow long millet',
      'Beyno: entry-changed Sow long millet',
      'Beyno: entry-added Sow long millet',
      'Beyno: calendar-begun Upper terraces 2027',
    ]);
    const changed = (await page()).items.find(({ action }) => action === 'entry-changed');
    expect(changed?.details).toEqual({ calendarId: id, fields: ['crop', 'notes'] });
    expect(changed?.at).toBe('2026-12-01T06:00:00.000Z');
  });

  it('tells every step of reviews and versions', async () => {
    const { id } = await beginCalendar(village);
    await addEntry(officer, id);
    const version = await submit(officer, id);
    const answer = `${versionPath(version)}/entries/${version.entries[0]?.entryId ?? ''}/answer`;
    await village.elder3.put(answer, says({ answer: 'change-this', note: 'Later' })).expect(200);
    await village.elder3.post(`${answer}/stand`).expect(200);
    await village.elder3.delete(answer).expect(204);
    const spoken = says({ onBehalfOf: village.elder3.personId, witness: 'Irvel' });
    await officer.put(answer, spoken).expect(200);
    await answerAll(village.elder, version);
    await sign(village.elder, version, 'elder').expect(200);
    await takeBack(officer, version);
    expect(lines(await page('?limit=8'))).toEqual([
      'Beyno: changes-asked Upper terraces 2027',
      'Elder A-1: signed Upper terraces 2027',
      'Elder A-1: answered Sow long millet',
      'Beyno: answered-on-behalf Sow long millet',
      'Elder A-3: answer-taken-back Sow long millet',
      'Elder A-3: difference-let-stand Sow long millet',
      'Elder A-3: answered Sow long millet',
      'Beyno: submitted Upper terraces 2027',
    ]);
    await publishDraft(village, id);
    const second = await publishDraft(village, id);
    await officer.post(`${versionPath(second)}/recall`, { note: 'Wrong last date' }).expect(200);
    const { items } = await page('?limit=200');
    const states = ['signed-off', 'published', 'replaced', 'recalled'];
    expect(
      items
        .filter(({ action }) => states.includes(action))
        .map(({ action, details }) => [action, details['number'], details['label'] ?? null]),
    ).toEqual([
      ['recalled', 3, '2027-2'],
      ['published', 3, '2027-2'],
      ['replaced', 2, '2027-1'],
      ['signed-off', 3, null],
      ['published', 2, '2027-1'],
      ['signed-off', 2, null],
    ]);
  });

  it('holds ids and codes and no word that anybody gave', async () => {
    const { id } = await beginCalendar(village);
    const words = { titleOfficer: 'Xyzzy sowing', titleVillage: 'Ŋɔ́rɛ̃', notes: 'plugh', giver: 'Old Veshta' };
    const entry = await addEntry(officer, id, words);
    const content = wholeEntry({ ...words, notes: 'plover' });
    await officer.put(`/api/calendars/${id}/entries/${entry.id}`, { content, version: 1 }).expect(200);
    const version = await submit(officer, id);
    const answer = `${versionPath(version)}/entries/${entry.id}/answer`;
    await village.elder3.put(answer, says({ answer: 'change-this', note: 'quux' })).expect(200);
    const spoken = says({ note: 'grault', onBehalfOf: village.elder.personId, witness: 'Garply' });
    await officer.put(answer, spoken).expect(200);
    await officer
      .post(`${versionPath(version)}/changes-asked`, { reason: 'elder-asked', note: 'waldo' })
      .expect(200);
    const rows = await api.dataSource.getRepository(AuditEventEntity).find();
    const everything = JSON.stringify(rows);
    expect(rows).toHaveLength(7);
    const given = ['Xyzzy', 'Ŋɔ́rɛ̃', 'plugh', 'plover', 'Veshta', 'quux', 'grault', 'Garply', 'waldo'];
    expect(given.filter((word) => everything.includes(word))).toEqual([]);
  });

  it('calls things by the names they have today', async () => {
    const { id } = await beginCalendar(village);
    await addEntry(officer, id);
    await changePlace(api, village.placeId, { name: 'Lower terraces' });
    const [entry] = await entriesOf(officer, id);
    const content = wholeEntry({ titleOfficer: 'Sow early millet' });
    await officer.put(`/api/calendars/${id}/entries/${entry?.id ?? ''}`, { content, version: 1 }).expect(200);
    expect(lines(await page())).toEqual([
      'Beyno: entry-changed Sow early millet',
      'Beyno: entry-added Sow early millet',
      'Beyno: calendar-begun Lower terraces 2027',
    ]);
  });

  it('says nothing of what was refused', async () => {
    const { id } = await beginCalendar(village);
    const { id: entryId } = await addEntry(officer, id);
    await submit(officer, id);
    const before = lines(await page());
    await officer.post(`/api/calendars/${id}/entries`, entryInput()).expect(409);
    await officer.delete(`/api/calendars/${id}/entries/${entryId}`).expect(409);
    await officer.post(`/api/calendars/${id}/versions`).expect(409);
    await village.elder.post(`/api/calendars/${id}/versions/1/signatures`, { role: 'elder' }).expect(409);
    expect(lines(await page())).toEqual(before);
  });

  it('comes in pages that neither skip nor repeat, also while it grows', async () => {
    const { id } = await beginCalendar(village);
    for (let count = 0; count < 4; count += 1) await addEntry(officer, id);
    const first = await page('?limit=2');
    await addEntry(officer, id);
    const second = await page(`?limit=2&cursor=${first.nextCursor ?? ''}`);
    const third = await page(`?limit=2&cursor=${second.nextCursor ?? ''}`);
    expect(third.nextCursor).toBeNull();
    const ids = [first, second, third].flatMap(({ items }) => items.map((item) => item.id));
    const { items } = await page();
    expect(ids).toEqual(items.slice(1).map((item) => item.id));
    await officer.get(`/api/communities/${officer.communityId}/audit?cursor=1%20OR%201`).expect(422);
    await officer.get(`/api/communities/${officer.communityId}/audit?limit=0`).expect(422);
  });

  it('is for officer, elder and steward of the village', async () => {
    await beginCalendar(village);
    const path = `/api/communities/${officer.communityId}/audit`;
    for (const client of [village.elder, village.steward])
      expect((await page('', client)).items).toHaveLength(1);
    for (const mailbox of ['staff', 'observer']) await (await api.signIn(mailbox)).get(path).expect(403);
    const stranger = await api.signIn('officer2');
    await stranger.get(path).expect(404);
    expect((await page('', stranger)).items).toEqual([]);
  });
});
