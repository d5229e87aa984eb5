import { PassThrough } from 'node:stream';
import { pino } from 'pino';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { OneTimeCodeEntity } from '#server/db/entities/one-time-code.entity.js';
import { removeOldCodes } from '#server/features/session/old-codes.service.js';
import { DEMO_PASSWORD } from '#server/features/demo/demo-villages.data.js';
import { openTestApi, TEST_NOW, type TestApi } from '#tests/support/api.js';
import { addEntry, beginCalendar, entryInput, openVillage } from '#tests/support/calendar-api.js';

/** What a thief of the log, or of an old table, would find. */
const WORD = 'Kwizzelbrook';
let api: TestApi;
let logged = '';
beforeAll(async () => {
  const stream = new PassThrough();
  stream.on('data', (part: Buffer) => {
    logged += part.toString();
  });
  api = await openTestApi({ log: pino({ level: 'trace' }, stream) });
});
afterAll(() => api.close());

describe('the log', () => {
  it('at its most talkative holds no word, address, password, cookie, token or query, also when something breaks', async () => {
    const village = await openVillage(api);
    const { officer } = village;
    const calendar = await beginCalendar(village);
    await addEntry(officer, calendar.id, { titleOfficer: WORD });
    const entries = `/api/calendars/${calendar.id}/entries`;
    await officer.post(entries, { ...entryInput(), titleOfficer: WORD, more: WORD }).expect(422);
    await officer.get(`/api/places/${village.placeId}/finder?from=${WORD}`);
    await (
      await api.visitor()
    )
      .post('/api/session', { email: `${WORD}@example.org`, password: WORD })
      .expect(401);
    await api.dataSource.query('RENAME TABLE entry TO entry_aside');
    await officer.post(entries, entryInput({ titleOfficer: WORD })).expect(500);
    await api.dataSource.query('RENAME TABLE entry_aside TO entry');

    expect(logged).toContain('request failed');
    expect(logged).toContain('ER_NO_SUCH_TABLE');
    for (const secret of [
      WORD,
      'dawnpeg.example',
      DEMO_PASSWORD,
      officer.cookie,
      officer.session.csrfToken,
      'INSERT',
      '127.0.0.1',
    ]) {
      expect([secret, logged.includes(secret)]).toEqual([secret, false]);
    }
  });
});

describe('codes and links', () => {
  it('are taken away a month after their time is over, and no others', async () => {
    const rows = api.dataSource.getRepository(OneTimeCodeEntity);
    const code = (id: string, expiresAt: Date) => ({
      ...{ id, purpose: 'join' as const, personId: null, codeHash: '0'.repeat(64) },
      ...{ failedTries: 0, expiresAt, usedAt: null },
    });
    const [old, kept] = ['0190a3a0-0000-4000-8000-000000000001', '0190a3a0-0000-4000-8000-000000000002'];
    const daysAgo = (days: number) => new Date(TEST_NOW.getTime() - days * 86_400_000);
    await rows.insert([code(old, daysAgo(31)), code(kept, daysAgo(29))]);
    await removeOldCodes(api.dataSource.manager, TEST_NOW);
    expect((await rows.find()).map(({ id }) => id)).toEqual([kept]);
  });
});
