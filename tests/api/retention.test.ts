import { afterAll, beforeEach, beforeAll, describe, expect, it } from 'vitest';
import { removeWhatIsOver } from '#server/features/privacy/retention.service.js';
import type { AddedPerson } from '#shared/contracts/people.js';
import { KEPT_DAYS } from '#shared/contracts/privacy.js';
import { WRITE_KEY_HEADER } from '#shared/contracts/write-key.js';
import { en } from '#shared/locales/index.js';
import { openTestApi, TEST_NOW, type Client, type TestApi } from '#tests/support/api.js';
import { beginCalendar, entryInput, openVillage } from '#tests/support/calendar-api.js';
import { openTestPost } from '#tests/support/letters.js';
import { addGroup } from '#tests/support/sharing-api.js';

/** What the page on data protection promises to keep for some days is kept until their last second, and no longer. */
let api: TestApi;
let steward: Client;
beforeAll(async () => {
  api = await openTestApi({ mailer: openTestPost() });
});
beforeEach(async () => {
  await api.reset();
  steward = await api.signIn('steward');
});
afterAll(() => api.close());

const DAY_MS = 24 * 60 * 60 * 1000;
const SECOND_MS = 1000;
const CODE_DAYS = 14;

const people = () => `/api/communities/${steward.communityId}/people`;
const rowsOf = async (table: string): Promise<number> =>
  (await api.dataSource.query<unknown[]>(`SELECT 1 FROM \`${table}\``)).length;

async function tidyAt(ms: number): Promise<void> {
  api.clock.set(new Date(TEST_NOW.getTime() + ms));
  await removeWhatIsOver(api.dataSource.manager, api.clock.now());
}

async function codeForGuest(): Promise<void> {
  const guest = { email: 'guest@example.org', displayName: 'Guest', roles: ['observer'] };
  await steward.post(people(), guest).expect(201);
}

async function askedForLink(): Promise<void> {
  await (await api.visitor()).post('/api/letters/reset', { email: 'officer@dawnpeg.example' }).expect(204);
}

async function endedCard(): Promise<void> {
  const card = `${people()}/${(await api.signIn('observer')).personId}/card`;
  await steward.post(card).expect(201);
  await steward.delete(card).expect(204);
}

async function addedOnce(): Promise<void> {
  const village = await openVillage(api);
  const { id } = await beginCalendar(village);
  const path = `/api/calendars/${id}/entries`;
  await village.officer.post(path, entryInput()).set(WRITE_KEY_HEADER, 'once-and-for-all').expect(201);
}

describe('what has done its service', () => {
  /** What makes a row, its table, days until it is over by itself, and how long it is kept from then on. */
  it.each([
    ['sessions', 'session', () => Promise.resolve(), 0, KEPT_DAYS.session],
    ['codes', 'one_time_code', codeForGuest, CODE_DAYS, KEPT_DAYS.endedWayIn],
    ['ended cards', 'sign_in_card', endedCard, 0, KEPT_DAYS.endedWayIn],
    ['letters', 'letter', askedForLink, 0, KEPT_DAYS.letter],
    ['keys of writes', 'write_key', addedOnce, 0, KEPT_DAYS.writeKey],
  ] as const)(
    '%s are kept to their last second and gone after it',
    async (_, table, make, lastsDays, keptDays) => {
      await make();
      const over = (lastsDays + keptDays) * DAY_MS;
      await tidyAt(over - SECOND_MS);
      expect(await rowsOf(table)).toBeGreaterThan(0);
      await tidyAt(over + SECOND_MS);
      expect(await rowsOf(table)).toBe(0);
    },
  );

  it('is kept longer where a session is used: its days begin anew', async () => {
    const half = (KEPT_DAYS.session - 1) * DAY_MS;
    await tidyAt(half);
    await steward.get('/api/communities').expect(200);
    await tidyAt(half + half);
    await steward.get('/api/communities').expect(200);
    await tidyAt(half + half + KEPT_DAYS.session * DAY_MS + SECOND_MS);
    await steward.get('/api/communities').expect(401);
  });

  it('goes with a membership: nobody who comes back is still in a group', async () => {
    const guest = { email: 'guest@example.org', displayName: 'Guest', roles: ['observer'] };
    const { person } = (await steward.post(people(), guest).expect(201)).body as AddedPerson;
    const elder = await api.signIn('elder');
    await addGroup(elder, 'Weavers', [elder, { ...elder, personId: person.id }]);
    await steward.delete(`${people()}/${person.id}`).expect(204);
    const left: unknown = await api.dataSource.query(
      'SELECT person_id FROM group_member WHERE person_id = ?',
      [person.id],
    );
    expect(left).toEqual([]);
  });
});

describe('the page on data protection', () => {
  it('promises no number of days but those, and each of those', () => {
    const promises = Object.values(en.privacy.purpose).map(({ until }) => until);
    const named = promises.flatMap((text) => [...text.matchAll(/\{\{(\w+)\}\}/gu)].map(([, name]) => name));
    expect(named.sort()).toEqual(Object.keys(KEPT_DAYS).sort());
    const periods = promises.join(' ').match(/\S+ (?:days?|weeks?|months?|years?)\b/gu) ?? [];
    expect(periods.filter((period) => !period.startsWith('{{'))).toEqual([]);
  });
});
