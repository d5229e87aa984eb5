import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Calendar, Entry, EntryInput } from '#shared/contracts/calendars.js';
import type { OwnData } from '#shared/contracts/privacy.js';
import type { RolledCalendar } from '#shared/contracts/rollovers.js';
import type { Decision, Lesson, SeasonReview, SeasonTask } from '#shared/contracts/season-reviews.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import {
  addEntry,
  beginCalendar,
  entriesOf,
  openVillage,
  publishDraft,
  type Village,
} from '#tests/support/calendar-api.js';
import { addSign, markSeen, waitingFor, waitingForOwn } from '#tests/support/sign-api.js';
import { details, sharingPath } from '#tests/support/sharing-api.js';
import { noticeInput, weatherPath } from '#tests/support/weather-api.js';

let api: TestApi;
let village: Village;
let calendar: Calendar;
beforeAll(async () => {
  api = await openTestApi();
});
beforeEach(async () => {
  await api.reset();
  village = await openVillage(api);
  calendar = await beginCalendar(village, 2026);
});
afterAll(() => api.close());

const STORING: Partial<EntryInput> = {
  titleOfficer: 'Close the stores',
  kind: 'community',
  lead: { type: 'fixed-date', date: { month: 11, day: 25 }, source: 'the village' },
};
const KEPT: Partial<EntryInput> = { titleOfficer: 'The quiet evening', sharingLevel: 'elders' };

const path = (id = calendar.id) => `/api/calendars/${id}/season-review`;
const tasksPath = (id: string) => `/api/calendars/${id}/season-tasks`;

async function reviewOf(client: Client): Promise<SeasonReview> {
  return (await client.get(path()).expect(200)).body as SeasonReview;
}

async function line(client: Client, entry: Pick<Entry, 'id'>) {
  return (await reviewOf(client)).entries.find(({ entryId }) => entryId === entry.id);
}

async function teach(client: Client, entryId: string | null, text = 'Begin at the stream'): Promise<Lesson> {
  return (await client.post(`${path()}/lessons`, { entryId, text }).expect(201)).body as Lesson;
}

async function decide(
  client: Client,
  entryId: string | null,
  said: { kind: Decision['kind']; text: string } = { kind: 'earlier', text: '' },
): Promise<Decision> {
  return (await client.post(`${path()}/decisions`, { entryId, ...said }).expect(201)).body as Decision;
}

async function rollOver(): Promise<string> {
  const answer = await village.officer.post(`/api/calendars/${calendar.id}/next-year`).expect(200);
  return (answer.body as RolledCalendar).calendarId;
}

async function tasksOf(client: Client, id: string): Promise<SeasonTask[]> {
  return ((await client.get(tasksPath(id)).expect(200)).body as { items: SeasonTask[] }).items;
}

describe('looking back at a year', () => {
  it('tells what was planned by the published calendar beside the days on which it was done', async () => {
    const { officer, elder } = village;
    const sowing = await addEntry(officer, calendar.id);
    const { label } = await publishDraft(village, calendar.id);
    const storing = await addEntry(officer, calendar.id, STORING);
    const done = { from: '2026-06-20', to: '2026-06-24', saidBy: 'Elder A-1', plots: '' };
    await elder.put(`/api/calendars/${calendar.id}/entries/${sowing.id}/actual-days`, done).expect(200);
    await officer.post(`${weatherPath(officer)}/notices`, noticeInput()).expect(201);
    const review = await reviewOf(elder);
    expect(review).toMatchObject({ year: 2026, label, nextCalendarId: null });
    expect(review.notices.map(({ issuer }) => issuer)).toEqual(['National weather service']);
    const [first, second] = review.entries;
    expect(first).toMatchObject({ entryId: sowing.id, isPublished: true, actual: done });
    expect(first?.planned.window).toEqual(sowing.dates.window);
    expect(first?.star).toMatchObject({ name: 'Pleiades', seen: null });
    expect(second).toMatchObject({ entryId: storing.id, isPublished: false, actual: null, star: null });
  });

  it('names signs that came, with their first day, and those that nobody marked', async () => {
    const { officer } = village;
    const came = await addSign(officer, { name: 'Wet to the hand' });
    const missing = await addSign(officer, { name: 'Frogs calling' });
    await markSeen(officer, came, '2026-11-29');
    await markSeen(officer, came, '2026-11-20');
    const entry = await addEntry(officer, calendar.id, { ...STORING, record: waitingFor([came, missing]) });
    expect((await line(officer, entry))?.signs).toEqual([
      { name: 'Wet to the hand', mustHave: true, canBeMarked: true, cameOn: '2026-11-20' },
      { name: 'Frogs calling', mustHave: false, canBeMarked: true, cameOn: null },
    ]);
  });

  it('names a sign in the entry’s own words as well, once somebody marked it', async () => {
    const { officer, elder } = village;
    const entry = await addEntry(officer, calendar.id, { ...STORING, record: waitingForOwn() });
    const ownId = entry.content.record?.signs.list[0]?.ownId ?? '';
    const own = `/api/calendars/${calendar.id}/entries/${entry.id}/signs/${ownId}/seen`;
    expect((await line(officer, entry))?.signs).toMatchObject([{ canBeMarked: true, cameOn: null }]);
    await elder.post(own, { day: '2026-11-22', who: 'Tirel' }).expect(201);
    expect((await line(officer, entry))?.signs).toMatchObject([{ cameOn: '2026-11-22' }]);
  });

  it('keeps lessons with who said them; the same words count once, and only their writer takes them out', async () => {
    const { officer, elder, steward } = village;
    const entry = await addEntry(officer, calendar.id);
    const first = await teach(elder, entry.id);
    expect(await teach(elder, entry.id)).toEqual(first);
    await teach(steward, null, 'Meet earlier');
    const review = await reviewOf(officer);
    expect(review.entries[0]?.lessons).toMatchObject([{ text: 'Begin at the stream', by: 'Elder A-1' }]);
    expect(review.lessons).toMatchObject([{ text: 'Meet earlier', by: 'Ostrel', mine: false }]);
    await officer.delete(`${path()}/lessons/${first.id}`).expect(409);
    await elder.delete(`${path()}/lessons/${first.id}`).expect(204);
    expect((await line(elder, entry))?.lessons).toEqual([]);
    await elder.post(`${path()}/lessons`, { entryId: null, text: ' ' }).expect(422);
    await elder.post(`${path()}/decisions`, { entryId: null, kind: 'earlier', text: 'x' }).expect(403);
  });
});

describe('a decision', () => {
  it('stands in next year’s draft beside its entry, is ticked with day and name, and unticked', async () => {
    const { officer, elder } = village;
    const entry = await addEntry(officer, calendar.id);
    await decide(officer, entry.id);
    const next = await rollOver();
    const [rolled] = await entriesOf(officer, next);
    const [task] = await tasksOf(elder, next);
    expect(task).toMatchObject({ entryId: rolled?.id, title: 'Sow long millet', fromYear: 2026, done: null });
    const donePath = `${tasksPath(next)}/${task?.id ?? ''}/done`;
    await elder.put(donePath).expect(403);
    const ticked = (await officer.put(donePath).expect(200)).body as SeasonTask;
    expect(ticked.done).toEqual({ on: api.clock.now().toISOString().slice(0, 10), by: 'Beyno' });
    expect((await line(elder, entry))?.decisions[0]?.done).toEqual(ticked.done);
    expect(((await officer.delete(donePath).expect(200)).body as SeasonTask).done).toBeNull();
  });

  it('is there once, also where it was written after the roll-over or next year began by itself', async () => {
    const { officer, steward } = village;
    const entry = await addEntry(officer, calendar.id);
    const next = await rollOver();
    await decide(steward, entry.id);
    await decide(steward, null, { kind: 'own-words', text: 'Two people at the rain gauge' });
    expect((await tasksOf(officer, next)).map(({ kind, text }) => [kind, text]).sort()).toEqual([
      ['earlier', ''],
      ['own-words', 'Two people at the rain gauge'],
    ]);
    await officer.delete(`/api/calendars/${next}/entries/${(await entriesOf(officer, next))[0]?.id ?? ''}`);
    const titles = (await tasksOf(officer, next)).map(({ entryId, title }) => [entryId, title]);
    expect(titles).toContainEqual([null, 'Sow long millet']);
    expect((await reviewOf(officer)).nextCalendarId).toBe(next);
    // Two years on it is nobody's task any more.
    const later = await beginCalendar(village, 2028);
    expect(await tasksOf(officer, later.id)).toEqual([]);
  });

  it('needs words where its kind says nothing', async () => {
    const { officer } = village;
    await officer.post(`${path()}/decisions`, { entryId: null, kind: 'earlier', text: '' }).expect(422);
    await officer.post(`${path()}/decisions`, { entryId: null, kind: 'own-words', text: '' }).expect(422);
  });
});

describe('what is kept', () => {
  it('has no line, lesson or task for whoever does not see its entry', async () => {
    const { officer, elder, elder2, steward } = village;
    await addEntry(officer, calendar.id);
    const kept = await addEntry(elder, calendar.id, KEPT);
    await teach(elder, kept.id, 'Speak lower');
    const next = await rollOver();
    for (const blind of [officer, steward]) {
      const review = await reviewOf(blind);
      expect(review.entries).toHaveLength(1);
      expect(JSON.stringify(review)).not.toMatch(/quiet evening|Speak lower/u);
      await blind.post(`${path()}/lessons`, { entryId: kept.id, text: 'x' }).expect(422);
      await blind.post(`${path()}/decisions`, { entryId: kept.id, kind: 'earlier', text: '' }).expect(422);
    }
    expect((await line(elder2, kept))?.lessons).toMatchObject([{ text: 'Speak lower' }]);
    expect(await tasksOf(elder2, next)).toEqual([]);
  });

  it('hides a task where its entry became narrower since', async () => {
    const { officer, elder, elder2 } = village;
    const entry = await addEntry(officer, calendar.id, { giverId: elder.personId });
    await decide(officer, entry.id);
    const next = await rollOver();
    const sharing = sharingPath(elder, 'entry', entry.id);
    const { version } = (await elder.get(sharing).expect(200)).body as { version: number };
    await elder.put(sharing, { sharing: { level: 'elders', ...details() }, version }).expect(200);
    expect(await tasksOf(officer, next)).toEqual([]);
    expect(await tasksOf(elder2, next)).toHaveLength(1);
  });
});

describe('people who go', () => {
  it('find their lessons in their own data, and take them along when they leave', async () => {
    const { officer, elder3 } = village;
    await teach(elder3, null, 'Watch the red star');
    const own = (await elder3.get('/api/privacy/own-data').expect(200)).body as OwnData;
    expect(JSON.stringify(own.tables['season_lesson'])).toContain('Watch the red star');
    const community = `/api/communities/${elder3.communityId}`;
    await village.steward.get(community).expect(200);
    await api.dataSource.query(
      `UPDATE community SET sign_off_rule = JSON_SET(sign_off_rule, '$.mustSign', JSON_ARRAY(), '$.oneOf', JSON_ARRAY())`,
    );
    await elder3
      .post('/api/privacy/leaving', { takeBackGiven: true, password: 'limewash-and-pegs' })
      .expect(204);
    expect((await reviewOf(officer)).lessons).toEqual([]);
  });
});
