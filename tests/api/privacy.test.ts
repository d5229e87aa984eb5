import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { z } from 'zod';
import { HELD } from '#server/features/privacy/held.data.js';
import { DEMO_PASSWORD } from '#server/features/demo/demo-villages.data.js';
import { PersonEntity } from '#server/db/entities/person.entity.js';
import type { OwnData, Privacy } from '#shared/contracts/privacy.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import {
  addEntry,
  beginCalendar,
  entriesOf,
  openVillage,
  reasonOf,
  type Village,
} from '#tests/support/calendar-api.js';

let api: TestApi;
let village: Village;
beforeAll(async () => {
  api = await openTestApi();
});
beforeEach(async () => {
  await api.reset();
  village = await openVillage(api);
});
afterAll(() => api.close());

const columns = z.array(z.object({ table: z.string(), column: z.string() }));
async function columnsOf(condition: string) {
  return columns.parse(
    await api.dataSource.query(
      `SELECT TABLE_NAME AS \`table\`, COLUMN_NAME AS \`column\` FROM information_schema.COLUMNS
       WHERE TABLE_SCHEMA = DATABASE() AND TABLE_NAME <> 'schema_migration' AND ${condition}`,
    ),
  );
}

const ownDataOf = async (client: Client) =>
  (await client.get('/api/privacy/own-data').expect(200)).body as OwnData;

describe('the register of purposes', () => {
  it('names every table, and every column that holds a person', async () => {
    const all = await columnsOf('1 = 1');
    expect([...new Set(all.map(({ table }) => table))].filter((table) => !(table in HELD))).toEqual([]);
    const people = await columnsOf(
      "COLUMN_NAME REGEXP '(^|_)(person|actor|elder|giver|author|signer|steward)_id$|_by$|_for$' AND DATA_TYPE = 'uuid'",
    );
    expect(people.length).toBeGreaterThan(15);
    const forgotten = people.filter(({ table, column }) => !HELD[table]?.people.includes(column));
    expect(forgotten).toEqual([]);
  });

  it('names nothing that is not there', async () => {
    const all = await columnsOf('1 = 1');
    const there = new Set(all.map(({ table, column }) => `${table}.${column}`));
    const named = Object.entries(HELD).flatMap(([table, { people, own, secret = [] }]) =>
      [...people, ...(own === 'all' ? [] : own), ...secret].map((column) => `${table}.${column}`),
    );
    expect(named.filter((name) => !there.has(name))).toEqual([]);
  });

  it('is told to everybody, signed in or not', async () => {
    const body = (await (await api.visitor()).get('/api/privacy').expect(200)).body as Privacy;
    expect(body.purposes.every(({ tables }) => tables.length > 0)).toBe(true);
    expect(body).toMatchObject({ hosting: null, sendsLetters: false });
  });
});

describe('taking one’s data along', () => {
  it('gives what is about oneself, without secrets and without what is others’', async () => {
    const calendar = await beginCalendar(village);
    await addEntry(village.officer, calendar.id, {
      titleOfficer: 'Of the village',
      giverId: village.elder.personId,
    });
    const { tables } = await ownDataOf(village.elder);
    expect(tables['person']).toMatchObject([{ email: 'elder@dawnpeg.example' }]);
    expect(tables['item_sharing']).toHaveLength(1);
    expect(tables['membership']).toHaveLength(1);
    const text = JSON.stringify(tables);
    for (const other of [
      'argon2',
      'password_hash',
      'code_hash',
      'sid_hash',
      'Of the village',
      'officer@',
      'steward@',
    ]) {
      expect([other, text.includes(other)]).toEqual([other, false]);
    }
  });
});

describe('leaving for good', () => {
  let staff: Client;
  beforeEach(async () => {
    staff = await api.signIn('staff');
  });

  const leave = (client: Client, changes: object = {}) =>
    client.post('/api/privacy/leaving', { password: DEMO_PASSWORD, takeBackGiven: false, ...changes });

  it('erases name, address and every way in; what was given stays', async () => {
    const calendar = await beginCalendar(village);
    const entry = await addEntry(village.officer, calendar.id, { giverId: staff.personId });
    await leave(staff).expect(204);
    expect(await personsLike('staff')).toEqual([]);
    await staff.get('/api/communities').expect(401);
    expect(
      reasonOf(
        await (
          await api.visitor()
        ).post('/api/session', { email: 'staff@dawnpeg.example', password: DEMO_PASSWORD }),
      ),
    ).toBe('401 wrong-credentials');
    expect((await entriesOf(village.officer, calendar.id)).map(({ id }) => id)).toContain(entry.id);
    for (const [table, { people }] of Object.entries(HELD)) {
      if (
        ![
          'membership',
          'group_member',
          'session',
          'one_time_code',
          'sign_in_card',
          'calendar_feed',
          'letter',
          'letter_choice',
        ].includes(table)
      )
        continue;
      const rows: unknown[] = await api.dataSource.query(
        `SELECT 1 FROM \`${table}\` WHERE \`${people[0] ?? ''}\` = ?`,
        [staff.personId],
      );
      expect([table, rows]).toEqual([table, []]);
    }
  });

  it('takes what was given along where that is chosen', async () => {
    const calendar = await beginCalendar(village);
    const entry = await addEntry(village.officer, calendar.id, { giverId: staff.personId });
    await leave(staff, { takeBackGiven: true }).expect(204);
    expect((await entriesOf(village.officer, calendar.id)).map(({ id }) => id)).not.toContain(entry.id);
  });

  it('asks for the password, and leaves no village without a steward or an elder that its rule names', async () => {
    expect((await leave(staff, { password: 'wrong' })).status).toBe(422);
    expect(reasonOf(await leave(village.steward))).toBe('409 last-steward');
    expect(reasonOf(await leave(village.elder2))).toBe('409 named-in-rule');
    expect(await personsLike('elder2')).toHaveLength(1);
  });

  const personsLike = async (mailbox: string) =>
    api.dataSource.getRepository(PersonEntity).findBy({ email: `${mailbox}@dawnpeg.example` });
});
