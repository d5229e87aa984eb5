import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Calendar, Entry } from '#shared/contracts/calendars.js';
import type { RestoredDraft } from '#shared/contracts/restored-draft.js';
import type { Answer } from '#shared/contracts/reviews.js';
import type { Version } from '#shared/contracts/versions.js';
import { openTestApi, type TestApi } from '#tests/support/api.js';
import {
  addEntry,
  beginCalendar,
  entriesOf,
  openVillage,
  publishDraft,
  reasonOf,
  submit,
  versionPath,
  type Village,
} from '#tests/support/calendar-api.js';
import { details } from '#tests/support/sharing-api.js';

let api: TestApi;
let village: Village;
let calendar: Calendar;
let sow: Entry;
let check: Entry;
let published: Version;
beforeAll(async () => {
  api = await openTestApi();
});
beforeEach(async () => {
  await api.reset();
  village = await openVillage(api);
  calendar = await beginCalendar(village);
  sow = await addEntry(village.officer, calendar.id, { giverId: village.elder.personId });
  check = await addEntry(village.officer, calendar.id, { titleOfficer: 'Seed check', crop: 'all seed' });
  published = await publishDraft(village, calendar.id);
});
afterAll(() => api.close());

const entryPath = ({ id }: Entry) => `/api/calendars/${calendar.id}/entries/${id}`;
const restore = async () =>
  (await village.officer.post(`${versionPath(published)}/restore`).expect(200)).body as RestoredDraft;
const told = ({ entries }: RestoredDraft) =>
  entries.map(({ titleOfficer, outcome }) => `${titleOfficer}: ${outcome}`);

async function changeSowing(): Promise<void> {
  const [now] = await entriesOf(village.officer, calendar.id);
  const body = { content: { ...sow.content, crop: 'sorghum' }, version: now?.version };
  await village.officer.put(entryPath(sow), body).expect(200);
}

describe('setting the draft back to a version', () => {
  it('brings back words and order under the same ids, takes out what came in since, and says so', async () => {
    await changeSowing();
    await village.officer.delete(entryPath(check)).expect(204);
    await addEntry(village.officer, calendar.id, { titleOfficer: 'Weed' });
    const report = await restore();
    expect(report).toMatchObject({ number: 1, label: '2027-1', withdrawnCount: 0 });
    expect(told(report)).toEqual([
      'Sow long millet: set-back',
      'Seed check: brought-back',
      'Weed: taken-out',
    ]);
    const draft = await entriesOf(village.officer, calendar.id);
    expect(draft.map(({ id, content }) => [id, content])).toEqual([
      [sow.id, sow.content],
      [check.id, check.content],
    ]);
    expect(told(await restore())).toEqual(['Sow long millet: as-it-was', 'Seed check: as-it-was']);
  });

  it('makes nothing agreed: what is set back is asked about anew, what stayed keeps its answers', async () => {
    await changeSowing();
    await restore();
    const { number } = await submit(village.officer, calendar.id);
    const path = `${versionPath({ calendarId: calendar.id, number })}/answers`;
    const { items } = (await village.officer.get(path).expect(200)).body as { items: Answer[] };
    expect([...new Set(items.map(({ entryId }) => entryId))]).toEqual([check.id]);
  });

  it('brings nothing back that was withdrawn, and no level that was made tighter or name that changed', async () => {
    const item = (id: string) => `/api/communities/${village.elder.communityId}/items/entry/${id}`;
    const shared = (await village.elder.get(`${item(sow.id)}/sharing`).expect(200)).body as {
      version: number;
    };
    const tighter = { level: 'village', ...details({ naming: 'not-named' }) };
    await village.elder
      .put(`${item(sow.id)}/sharing`, { sharing: tighter, version: shared.version })
      .expect(200);
    await village.steward
      .post(`${item(check.id)}/withdrawal`, { leavesTrace: true, askedById: village.elder.personId })
      .expect(204);
    const report = await restore();
    expect(told(report)).toEqual(['Sow long millet: as-it-was']);
    expect(report.withdrawnCount).toBe(1);
    expect(report.entries[0]?.sharingStays).toBe(true);
    const draft = await entriesOf(village.officer, calendar.id);
    expect(draft.map(({ content }) => content.sharingLevel)).toEqual(['village']);
  });

  it('leaves alone what the officer does not see', async () => {
    const lamp = await addEntry(village.elder, calendar.id, {
      titleOfficer: 'Lamp of the ridge',
      ...{ sharingLevel: 'elders', sharing: details({ trace: 'none' }) },
    });
    const report = await restore();
    expect(JSON.stringify(report)).not.toContain('Lamp');
    const elders = await entriesOf(village.elder, calendar.id);
    expect(elders.map(({ id }) => id)).toContain(lamp.id);
  });

  it('waits until nothing is out for review, and is the officer’s', async () => {
    const path = `${versionPath(published)}/restore`;
    expect(reasonOf(await village.elder.post(path))).toBe('403 not-allowed');
    const none = `/api/calendars/${calendar.id}/versions/9/restore`;
    expect(reasonOf(await village.officer.post(none))).toBe('404 not-found');
    await submit(village.officer, calendar.id);
    expect(reasonOf(await village.officer.post(path))).toBe('409 draft-locked');
  });
});
