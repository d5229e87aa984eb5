import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { CalendarFeedEntity } from '#server/db/entities/calendar-feed.entity.js';
import { MembershipEntity } from '#server/db/entities/membership.entity.js';
import type { Entry } from '#shared/contracts/calendars.js';
import { FEEDS_MAX, type Feed, type MadeFeed } from '#shared/contracts/exports.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import {
  addEntry,
  beginCalendar,
  openVillage,
  publishDraft,
  reasonOf,
  setRoles,
  type Village,
} from '#tests/support/calendar-api.js';
import { addConsent } from '#tests/support/consent-api.js';
import { tablesWith } from '#tests/support/search-everything.js';

const WORD = 'Kwizzelbrook';
let api: TestApi;
let village: Village;
let staff: Client;
let visitor: Client;
let calendarId: string;
let entry: Entry;
beforeAll(async () => {
  api = await openTestApi();
});
afterAll(() => api.close());
beforeEach(async () => {
  await api.reset();
  village = await openVillage(api);
  staff = await api.signIn('staff');
  visitor = await api.visitor();
  calendarId = (await beginCalendar(village)).id;
  await addEntry(village.officer, calendarId, { titleOfficer: 'Weed' });
  entry = await addEntry(village.officer, calendarId, {
    titleOfficer: WORD,
    giverId: village.elder.personId,
  });
  await publishDraft(village, calendarId);
});

const feedsOf = (client: Client) => `/api/communities/${client.communityId}/feeds`;
const make = async (client: Client) => (await client.post(feedsOf(client)).expect(201)).body as MadeFeed;
const list = async (client: Client) =>
  ((await client.get(feedsOf(client)).expect(200)).body as { items: Feed[] }).items;
const fetched = ({ key }: MadeFeed) => visitor.get(`/api/feed.ics?key=${key}`);
const words = async (feed: MadeFeed) => (await fetched(feed).expect(200)).text.replaceAll('\r\n ', '');

describe('the address of a telephone', () => {
  it('serves what is published to whoever has the key, private, and says when nothing is new', async () => {
    const feed = await make(staff);
    const answer = await fetched(feed).expect(200);
    expect(answer.headers).toMatchObject({
      'content-type': 'text/calendar; charset=utf-8',
      'cache-control': 'private, no-store',
    });
    expect(answer.text).toContain('BEGIN:VCALENDAR');
    expect(answer.text).toContain(WORD);
    const tag = answer.headers['etag'] ?? '';
    await fetched(feed).set('If-None-Match', tag).expect(304);
  });

  it('is shown once, kept as a hash, and nobody guesses it', async () => {
    const feed = await make(staff);
    expect(feed.key).toMatch(/^[\w-]{43}$/u);
    expect(await tablesWith(api, feed.key)).toEqual([]);
    expect(JSON.stringify(await list(staff))).not.toContain(feed.key);
    await visitor.get(`/api/feed.ics?key=${feed.key.slice(0, -1)}`).expect(404);
  });

  it('says on which day it was last fetched, and not when', async () => {
    const feed = await make(staff);
    expect(await list(staff)).toMatchObject([{ id: feed.id, fetchedOn: null }]);
    await fetched(feed).expect(200);
    expect(await list(staff)).toMatchObject([{ id: feed.id, fetchedOn: '2026-12-01' }]);
    expect(await list(village.officer)).toEqual([]);
  });

  it('is ended by its person alone, at once', async () => {
    const feed = await make(staff);
    await village.officer.delete(`${feedsOf(village.officer)}/${feed.id}`).expect(204);
    await fetched(feed).expect(200);
    await staff.delete(`${feedsOf(staff)}/${feed.id}`).expect(204);
    await fetched(feed).expect(404);
    await staff.delete(`${feedsOf(staff)}/${feed.id}`).expect(204);
  });

  it('is one of few', async () => {
    for (let made = 0; made < FEEDS_MAX; made += 1) await make(staff);
    expect(reasonOf(await staff.post(feedsOf(staff)))).toBe('409 too-many-feeds');
  });

  it('goes with the membership', async () => {
    const feed = await make(staff);
    await setRoles(api, staff, []);
    await fetched(feed).expect(404);
    await setRoles(api, staff, ['staff']);
    await api.dataSource
      .getRepository(MembershipEntity)
      .delete({ personId: staff.personId, communityId: staff.communityId });
    await fetched(feed).expect(404);
    expect(await api.dataSource.getRepository(CalendarFeedEntity).count()).toBe(1);
  });

  it('is wiped where the steward ends the membership', async () => {
    const feed = await make(staff);
    const { steward } = village;
    await steward.delete(`/api/communities/${steward.communityId}/people/${staff.personId}`).expect(204);
    expect(await api.dataSource.getRepository(CalendarFeedEntity).count()).toBe(0);
    await fetched(feed).expect(404);
  });
});

describe('what a telephone fetches is decided anew each time', () => {
  const itemPath = () => `/api/communities/${village.elder.communityId}/items/entry/${entry.id}`;

  it('a withdrawn entry is simply no longer there, and the rest is', async () => {
    const feed = await make(staff);
    expect(await words(feed)).toContain(WORD);
    await village.elder.post(`${itemPath()}/withdrawal`, { leavesTrace: true, askedById: null }).expect(204);
    const after = await words(feed);
    expect(after).not.toContain(WORD);
    expect(after).not.toContain(entry.id);
    expect(after).toContain('Weed');
  });

  it('nothing above the village’s level is in it, for nobody', async () => {
    const feeds = [await make(staff), await make(village.elder)];
    const sharing = { ...entry.content.sharing, level: 'elders' };
    const known = (await village.elder.get(`${itemPath()}/sharing`).expect(200)).body as {
      sharing: object;
      version: number;
    };
    const change = { sharing: { ...known.sharing, ...sharing }, version: known.version };
    await village.elder.put(`${itemPath()}/sharing`, change).expect(200);
    for (const feed of feeds) expect(await words(feed)).not.toContain(WORD);
  });

  it('outside its telling season a thing is not in it', async () => {
    const feed = await make(staff);
    const known = (await village.elder.get(`${itemPath()}/sharing`).expect(200)).body as {
      sharing: object;
      version: number;
    };
    const tellingSeason = { from: { month: 6, day: 1 }, to: { month: 6, day: 30 } };
    const change = { sharing: { ...known.sharing, tellingSeason }, version: known.version };
    await village.elder.put(`${itemPath()}/sharing`, change).expect(200);
    expect(await words(feed)).not.toContain(WORD);
    api.clock.set(new Date('2027-06-15T06:00:00Z'));
    expect(await words(feed)).toContain(WORD);
  });

  it('needs the yes to calendars on telephones, where somebody was asked', async () => {
    const feed = await make(staff);
    await addConsent(village.officer, 'entry', entry.id, { uses: ['keep', 'show', 'print'] });
    expect(await words(feed)).not.toContain(WORD);
    const other = await addEntry(village.officer, calendarId, { titleOfficer: 'Told to telephones' });
    await addConsent(village.officer, 'entry', other.id, { uses: ['keep', 'show', 'feed'] });
    await publishDraft(village, calendarId);
    expect(await words(feed)).toContain('Told to telephones');
  });
});
