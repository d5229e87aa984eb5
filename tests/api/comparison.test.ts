import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Calendar, EntryInput } from '#shared/contracts/calendars.js';
import type { Comparison } from '#shared/contracts/versions.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import {
  addEntry,
  beginCalendar,
  changePlace,
  entriesOf,
  openVillage,
  publish,
  submit,
  takeBack,
  type Village,
} from '#tests/support/calendar-api.js';

let api: TestApi;
let village: Village;
let officer: Client;
let calendar: Calendar;
beforeAll(async () => {
  api = await openTestApi();
});
beforeEach(async () => {
  await api.reset();
  village = await openVillage(api);
  ({ officer } = village);
  calendar = await beginCalendar(village);
  await addEntry(officer, calendar.id, { titleOfficer: 'Sow long millet' });
  await addEntry(officer, calendar.id, { titleOfficer: 'Seed check', crop: 'all seed' });
});
afterAll(() => api.close());

async function edit(index: number, changes: Partial<EntryInput>): Promise<void> {
  const entry = (await entriesOf(officer, calendar.id))[index];
  if (!entry) throw new Error(`no entry ${index}`);
  const body = { content: { ...entry.content, ...changes }, version: entry.version };
  await officer.put(`/api/calendars/${calendar.id}/entries/${entry.id}`, body).expect(200);
}

describe('comparing', () => {
  const compare = async (client: Client, from: string, to: string) =>
    (await client.get(`/api/calendars/${calendar.id}/comparison?from=${from}&to=${to}`).expect(200))
      .body as Comparison;

  it('finds what was added, taken out, changed and kept between two versions', async () => {
    const first = await submit(officer, calendar.id);
    await takeBack(officer, first);
    const offsets = { earliestDays: 5, bestFromDays: 9, bestToDays: 25, lastAdvisedDays: 30 };
    await edit(0, { offsets });
    await officer
      .delete(`/api/calendars/${calendar.id}/entries/${first.entries[1]?.entryId ?? ''}`)
      .expect(204);
    await addEntry(officer, calendar.id, { titleOfficer: 'Weed', crop: 'millet' });
    await submit(officer, calendar.id);
    const result = await compare(village.elder, '1', '2');
    expect(result).toMatchObject({
      from: '1',
      to: '2',
      year: 2027,
      counts: { added: 1, removed: 1, changed: 1, same: 0 },
      header: [],
    });
    expect(result.entries.map(({ change, titleOfficer }) => `${change} ${titleOfficer}`)).toEqual([
      'changed Sow long millet',
      'added Weed',
      'removed Seed check',
    ]);
    expect(result.entries[0]?.fields.map(({ field }) => field)).toEqual(['offsets', 'dates.window']);
    expect(result.entries[0]?.why).toEqual({
      moved: { point: 'earliest', days: 2 },
      causes: [{ cause: 'offsets', days: 2 }],
      togetherDays: 0,
    });
    expect(result.entries[0]?.fields[0]).toMatchObject({
      before: { bestFromDays: 7 },
      after: { bestFromDays: 9 },
    });
  });

  it('takes the draft as either side, for those who see it, and says what moved with the place', async () => {
    const observer = await api.signIn('observer');
    await publish(village, await submit(officer, calendar.id));
    expect(await compare(officer, '1', 'draft')).toMatchObject({
      counts: { added: 0, removed: 0, changed: 0, same: 2 },
      header: [],
    });
    await changePlace(api, village.placeId, { sameSideShiftDeg: 2 });
    const moved = await compare(officer, '1', 'draft');
    expect(moved.header).toEqual([{ field: 'place.sameSideShiftDeg', before: 0, after: 2 }]);
    expect(moved.counts).toMatchObject({ changed: 2 });
    expect(moved.entries[0]?.why?.causes).toMatchObject([{ cause: 'threshold' }]);
    await edit(0, { offsets: { earliestDays: 5, bestFromDays: 9, bestToDays: 25, lastAdvisedDays: 30 } });
    const both = (await compare(officer, '1', 'draft')).entries[0]?.why;
    expect(both?.causes).toContainEqual({ cause: 'offsets', days: 2 });
    const sum = (both?.causes ?? []).reduce((total, { days }) => total + (days ?? 0), 0);
    expect(sum + (both?.togetherDays ?? 0)).toBe(both?.moved?.days);
    expect((await compare(officer, 'draft', '1')).header).toEqual([
      { field: 'place.sameSideShiftDeg', before: 2, after: 0 },
    ]);
    const hidden = `/api/calendars/${calendar.id}/comparison`;
    await observer.get(`${hidden}?from=1&to=draft`).expect(404);
    await observer.get(`${hidden}?from=1&to=1`).expect(200);
    await officer.get(`${hidden}?from=1&to=nine`).expect(422);
  });
});
