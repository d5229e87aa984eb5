import { randomUUID } from 'node:crypto';
import type { Response, Test } from 'supertest';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Entry } from '#shared/contracts/calendars.js';
import { ENDPOINTS } from '#shared/contracts/index.js';
import type { Variant } from '#shared/contracts/variants.js';
import { WRITE_KEY_HEADER } from '#shared/contracts/write-key.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import {
  addEntry,
  beginCalendar,
  entryInput,
  openVillage,
  type Village,
} from '#tests/support/calendar-api.js';
import { addVariant, variantInput } from '#tests/support/variant-api.js';

/**
 * What a network does to a write of the editor: it comes twice at once, once more when its answer was lost, or long after,
 * when somebody else went on. Each kind of write counts once all the same. (One that is lost before it comes is never here:
 * tests/unit/src/lib/keyed-write.test.tsx.)
 */
let api: TestApi;
let village: Village;
let officer: Client;
let year = 2027;
beforeAll(async () => {
  api = await openTestApi();
  village = await openVillage(api);
  ({ officer } = village);
});
afterAll(() => api.close());

/** A draft with two entries, the second done on a day, and with another timing beside the first. */
interface Draft {
  path: string;
  calendarId: string;
  first: Entry;
  second: Entry;
  variant: Variant;
}
let draft: Draft;
beforeEach(async () => {
  const { id: calendarId } = await beginCalendar(village, year);
  const first = await addEntry(officer, calendarId, { titleOfficer: 'Sow' });
  const second = await addEntry(officer, calendarId, { titleOfficer: 'Weed' });
  const path = `/api/calendars/${calendarId}`;
  await officer.put(`${path}/entries/${second.id}/actual-days`, done(year)).expect(200);
  draft = { path, calendarId, first, second, variant: await addVariant(officer, calendarId, first.id) };
  year += 1;
});

const done = (inYear: number, day = '04') => ({
  ...{ from: `${inYear}-05-${day}`, to: null, saidBy: 'Beyno', plots: '' },
});

interface Write {
  send: (draft: Draft) => Test;
  /** How the records call it when it was done. */
  action: string;
  /** What has to be so before. */
  before?: (draft: Draft) => Promise<unknown>;
}

const one = ({ path, first }: Draft) => `${path}/entries/${first.id}`;
const WRITES: Record<string, Write> = {
  addEntry: {
    send: ({ path }) => officer.post(`${path}/entries`, entryInput({ titleOfficer: 'Reap' })),
    action: 'entry-added',
  },
  updateEntry: {
    send: (at) => officer.put(one(at), { content: entryInput({ crop: 'beans' }), version: 1 }),
    action: 'entry-changed',
  },
  duplicateEntry: { send: (at) => officer.post(`${one(at)}/copy`), action: 'entry-copied' },
  deleteEntry: { send: (at) => officer.delete(one(at)), action: 'entry-deleted' },
  restoreEntry: {
    before: (at) => officer.delete(one(at)).expect(204),
    send: (at) => officer.post(`${one(at)}/restore`),
    action: 'entry-restored',
  },
  reorderEntries: {
    send: ({ path, first, second }) => officer.put(`${path}/order`, { entryIds: [second.id, first.id] }),
    action: 'entries-reordered',
  },
  addVariant: {
    send: (at) => officer.post(`${one(at)}/variants`, variantInput({ giver: 'A-4' })),
    action: 'variant-added',
  },
  updateVariant: {
    send: (at) =>
      officer.put(`${one(at)}/variants/${at.variant.variantId}`, {
        content: variantInput({ note: 'Waits longer.' }),
        version: 1,
      }),
    action: 'variant-changed',
  },
  removeVariant: {
    send: (at) => officer.delete(`${one(at)}/variants/${at.variant.variantId}`),
    action: 'variant-removed',
  },
  putActualDays: {
    send: (at) => officer.put(`${one(at)}/actual-days`, done(year - 1, '09')),
    action: 'actual-days-written',
  },
  removeActualDays: {
    send: ({ path, second }) => officer.delete(`${path}/entries/${second.id}/actual-days`),
    action: 'actual-days-removed',
  },
  submitDraft: { send: ({ path }) => officer.post(`${path}/versions`), action: 'submitted' },
};

/** How often the records tell of it in this calendar. */
async function doneTimes(action: string): Promise<number> {
  const rows = await api.dataSource.query<unknown[]>(
    'SELECT 1 FROM audit_event WHERE action = ? AND (subject_id = ? OR details LIKE ?)',
    [action, draft.calendarId, `%${draft.calendarId}%`],
  );
  return rows.length;
}

const ok = (answers: readonly Response[]) => answers.map(({ status }) => status < 300);

describe.each(Object.entries(WRITES))('%s', (_name, { send, action, before }) => {
  it('is done once when it comes twice at once, and again, and after somebody else went on', async () => {
    await before?.(draft);
    const already = await doneTimes(action);
    const key = randomUUID();
    const write = () => send(draft).set(WRITE_KEY_HEADER, key);
    expect(ok(await Promise.all([write(), write()]))).toEqual([true, true]);
    expect(ok([await write()])).toEqual([true]);
    expect((await doneTimes(action)) - already).toBe(1);
    const { path, second } = draft;
    const later = entryInput({ titleOfficer: 'Weed twice' });
    await officer.put(`${path}/entries/${second.id}`, { content: later, version: 1 });
    const between = await doneTimes(action);
    expect(ok([await write()])).toEqual([true]);
    expect(await doneTimes(action)).toBe(between);
  });
});

/** What brings many entries at once is sent twice where it is tested: copies, file-imports and table-imports beside this file. */
const TRIED_BESIDE = ['copyCalendar', 'importCalendarFile', 'importTable'];

it('every write that counts once is tried', () => {
  expect([...Object.keys(WRITES), ...TRIED_BESIDE].toSorted()).toEqual(
    ENDPOINTS.filter(({ countsOnce }) => countsOnce)
      .map(({ id }) => id)
      .toSorted(),
  );
});
