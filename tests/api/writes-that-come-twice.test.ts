import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Entry } from '#shared/contracts/calendars.js';
import type { Version } from '#shared/contracts/versions.js';
import { WRITE_KEY_HEADER } from '#shared/contracts/write-key.js';
import { OneKindOfKeys1799600000000 } from '#server/db/migrations/1799600000000-one-kind-of-keys.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import {
  addEntry,
  beginCalendar,
  entriesOf,
  entryInput,
  openVillage,
  reasonOf,
  type Village,
  wholeEntry,
} from '#tests/support/calendar-api.js';

/** A device that heard no answer sends its write again: with the same key it counts once, whatever came between. */
let api: TestApi;
let village: Village;
let officer: Client;
let calendarId: string;
let year = 2027;
beforeAll(async () => {
  api = await openTestApi();
  village = await openVillage(api);
  ({ officer } = village);
});
beforeEach(async () => {
  calendarId = (await beginCalendar(village, year)).id;
  year += 1;
});
afterAll(() => api.close());

const entries = () => `/api/calendars/${calendarId}/entries`;
const titles = async () => (await entriesOf(officer, calendarId)).map(({ content }) => content.titleOfficer);
/** How often the records say that it was done in this calendar. */
const doneTimes = async (action: string) => {
  const rows = await api.dataSource.query<unknown[]>(
    'SELECT 1 FROM audit_event WHERE action = ? AND details LIKE ?',
    [action, `%${calendarId}%`],
  );
  return rows.length;
};
const newKey = () => randomUUID();

describe('a write with its key', () => {
  it('adds one entry, however often and however close together it comes', async () => {
    const key = newKey();
    const add = () => officer.post(entries(), entryInput({ titleOfficer: 'Sow' })).set(WRITE_KEY_HEADER, key);
    const answers = await Promise.all([add(), add(), add()]);
    answers.push(await add());
    expect(answers.map(({ status }) => status)).toEqual([201, 201, 201, 201]);
    expect(new Set(answers.map(({ body }) => (body as Entry).id)).size).toBe(1);
    expect(await titles()).toEqual(['Sow']);
    expect(await doneTimes('entry-added')).toBe(1);
  });

  it('saves once: the second answer is what stands there now, and nobody’s newer text is lost', async () => {
    const { id } = await addEntry(officer, calendarId);
    const key = newKey();
    const save = () =>
      officer
        .put(`${entries()}/${id}`, { content: entryInput({ crop: 'beans' }), version: 1 })
        .set(WRITE_KEY_HEADER, key);
    await save().expect(200);
    const colleague = await api.signIn('officer');
    const newer = { content: entryInput({ crop: 'beans', notes: 'Late' }), version: 2 };
    await colleague.put(`${entries()}/${id}`, newer).expect(200);
    expect((await save().expect(200)).body).toMatchObject({ version: 3, content: { notes: 'Late' } });
    expect(await doneTimes('entry-changed')).toBe(2);
  });

  it('copies, takes out and puts back once', async () => {
    const { id } = await addEntry(officer, calendarId, { titleOfficer: 'Sow' });
    const twice = async (send: (key: string) => PromiseLike<{ status: number }>) => {
      const key = newKey();
      return [(await send(key)).status, (await send(key)).status];
    };
    const path = `${entries()}/${id}`;
    expect(await twice((key) => officer.post(`${path}/copy`).set(WRITE_KEY_HEADER, key))).toEqual([201, 201]);
    expect(await twice((key) => officer.delete(path).set(WRITE_KEY_HEADER, key))).toEqual([204, 204]);
    expect(await titles()).toHaveLength(1);
    expect(await twice((key) => officer.post(`${path}/restore`).set(WRITE_KEY_HEADER, key))).toEqual([
      200, 200,
    ]);
    expect(await titles()).toHaveLength(2);
  });

  it('that is late moves nothing back: the order of whoever came after it stays', async () => {
    const first = await addEntry(officer, calendarId, { titleOfficer: 'Sow' });
    const second = await addEntry(officer, calendarId, { titleOfficer: 'Weed' });
    const order = (ids: string[], key: string) =>
      officer.put(`/api/calendars/${calendarId}/order`, { entryIds: ids }).set(WRITE_KEY_HEADER, key);
    const late = newKey();
    await order([second.id, first.id], late).expect(200);
    await order([first.id, second.id], newKey()).expect(200);
    await order([second.id, first.id], late).expect(200);
    expect(await titles()).toEqual(['Sow', 'Weed']);
  });

  it('submits once, and what was added before is answered while the submission is out', async () => {
    const added = newKey();
    const add = () => officer.post(entries(), wholeEntry()).set(WRITE_KEY_HEADER, added);
    await add().expect(201);
    const key = newKey();
    const submit = () => officer.post(`/api/calendars/${calendarId}/versions`).set(WRITE_KEY_HEADER, key);
    const [one, other] = [await submit().expect(201), await submit().expect(201)];
    expect((one.body as Version).number).toBe((other.body as Version).number);
    await add().expect(201);
    const versions = (await officer.get(`/api/calendars/${calendarId}/versions`).expect(200)).body as {
      items: unknown[];
    };
    expect(versions.items).toHaveLength(1);
  });

  it('that was refused was not done: it may come again', async () => {
    const key = newKey();
    const path = `/api/calendars/${calendarId}/versions`;
    await officer.post(path).set(WRITE_KEY_HEADER, key).expect(409);
    await addEntry(officer, calendarId);
    await officer.post(path).set(WRITE_KEY_HEADER, key).expect(201);
  });
});

describe('a key', () => {
  it('belongs to one write: with another text it is refused, so that no text is taken for saved', async () => {
    const key = newKey();
    await officer.post(entries(), entryInput()).set(WRITE_KEY_HEADER, key).expect(201);
    const other = await officer
      .post(entries(), entryInput({ crop: 'beans' }))
      .set(WRITE_KEY_HEADER, key)
      .expect(409);
    expect(reasonOf(other)).toBe('409 write-key-used');
  });

  it('belongs to one person: the same letters from somebody else are another key', async () => {
    const key = newKey();
    await officer.post(entries(), entryInput()).set(WRITE_KEY_HEADER, key).expect(201);
    const kept = entryInput({ sharingLevel: 'elders' });
    await village.elder.post(entries(), kept).set(WRITE_KEY_HEADER, key).expect(201);
    expect(await doneTimes('entry-added')).toBe(2);
  });

  it('has a form; what is none is refused', async () => {
    for (const key of ['short', 'x'.repeat(101), 'with spaces in it, and more']) {
      await officer.post(entries(), entryInput()).set(WRITE_KEY_HEADER, key).expect(400);
    }
    expect(await titles()).toEqual([]);
  });

  it('leaves no word behind, and not itself', async () => {
    const key = newKey();
    await officer.post(entries(), entryInput({ titleOfficer: 'Zqword' })).set(WRITE_KEY_HEADER, key);
    const rows = JSON.stringify(await api.dataSource.query('SELECT * FROM write_key'));
    expect(rows).toContain(officer.personId);
    expect(rows).not.toMatch(new RegExp(`Zqword|${key}`, 'u'));
  });
});

describe('what was brought in before it counted in the same list', () => {
  it('is known by its key after the lists were made one, and not brought in again', async () => {
    const key = newKey();
    const lists = new OneKindOfKeys1799600000000();
    const runner = api.dataSource.createQueryRunner();
    try {
      await lists.down(runner);
      await runner.query(
        'INSERT INTO calendar_import (import_key, calendar_id, brought_by, brought_at, added, refused) VALUES (?, ?, ?, NOW(), 3, 1)',
        [key, calendarId, officer.personId],
      );
      await lists.up(runner);
      await lists.up(runner);
    } finally {
      await runner.release();
    }
    const body = {
      ...{ dryRun: false, dayOrder: null, natureSigns: [] },
      lines: [{ line: 2, cells: { titleOfficer: 'Mend', kind: 'farm', bestFrom: '06-07' } }],
    };
    const bring = (id: string) =>
      officer.post(`/api/calendars/${id}/imports/table`, body).set(WRITE_KEY_HEADER, key);
    expect((await bring(calendarId).expect(200)).body).toEqual({ added: 3, lines: [] });
    expect(await titles()).toEqual([]);
    const other = (await beginCalendar(village, 2099)).id;
    expect(reasonOf(await bring(other))).toBe('409 write-key-used');
  });
});
