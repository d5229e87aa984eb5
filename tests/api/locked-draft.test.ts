import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Calendar } from '#shared/contracts/calendars.js';
import { openTestApi, type TestApi } from '#tests/support/api.js';
import {
  addEntry,
  beginCalendar,
  entriesOf,
  entryInput,
  openVillage,
  outcomes,
  reasonOf,
  submit,
  takeBack,
  versionPath,
  type Village,
  wholeEntry,
} from '#tests/support/calendar-api.js';

let api: TestApi;
let village: Village;
let calendar: Calendar;
let entries: string;
beforeAll(async () => {
  api = await openTestApi();
});
beforeEach(async () => {
  await api.reset();
  village = await openVillage(api);
  calendar = await beginCalendar(village);
  entries = `/api/calendars/${calendar.id}/entries`;
});
afterAll(() => api.close());

describe('while a submission is out', () => {
  it('every write to the draft answers 409, and reading goes on', async () => {
    const { id } = await addEntry(village.officer, calendar.id);
    const { id: gone } = await addEntry(village.officer, calendar.id);
    await village.officer.delete(`${entries}/${gone}`).expect(204);
    const version = await submit(village.officer, calendar.id);
    const writes = () => [
      village.officer.post(entries, entryInput()),
      village.officer.put(`${entries}/${id}`, { content: entryInput({ notes: 'late' }), version: 1 }),
      village.officer.post(`${entries}/${id}/copy`),
      village.officer.delete(`${entries}/${id}`),
      village.officer.post(`${entries}/${gone}/restore`),
      village.officer.put(`/api/calendars/${calendar.id}/order`, { entryIds: [id] }),
    ];
    for (const write of writes()) expect(reasonOf(await write)).toBe('409 draft-locked');
    expect(await entriesOf(village.officer, calendar.id)).toHaveLength(1);
    await takeBack(village.officer, version);
    expect(outcomes(await Promise.all([village.officer.post(entries, entryInput())]))).toEqual(['201']);
  });

  it('an edit at the same moment as the submission is in it or refused, never lost', async () => {
    let { id, version } = await addEntry(village.officer, calendar.id);
    for (const notes of ['first', 'second', 'third', 'fourth']) {
      const [saved, submitted] = await Promise.all([
        village.officer.put(`${entries}/${id}`, { content: wholeEntry({ notes }), version }),
        village.officer.post(`/api/calendars/${calendar.id}/versions`),
      ]);
      expect(submitted.status).toBe(201);
      const frozen = submitted.body as Parameters<typeof takeBack>[1];
      const isFrozen = frozen.entries[0]?.content.notes === notes;
      expect(isFrozen ? '200' : '409 draft-locked').toBe(outcomes([saved])[0]);
      await village.officer.get(versionPath(frozen)).expect(200);
      await takeBack(village.officer, frozen);
      ({ id, version } = (await entriesOf(village.officer, calendar.id))[0] ?? { id, version });
    }
  });
});
