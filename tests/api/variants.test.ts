import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Calendar, Entry } from '#shared/contracts/calendars.js';
import type { Outcome } from '#shared/contracts/reviews.js';
import type { Variant } from '#shared/contracts/variants.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import {
  addEntry,
  answerAll,
  beginCalendar,
  openVillage,
  publishDraft,
  readVersion,
  reasonOf,
  submit,
  versionPath,
  type Village,
} from '#tests/support/calendar-api.js';
import { textOf } from '#tests/support/every-endpoint.js';
import { addVariant, variantInput } from '#tests/support/variant-api.js';

let api: TestApi;
let village: Village;
let calendar: Calendar;
let entry: Entry;
beforeAll(async () => {
  api = await openTestApi();
});
beforeEach(async () => {
  await api.reset();
  village = await openVillage(api);
  calendar = await beginCalendar(village);
  entry = await addEntry(village.officer, calendar.id);
});
afterAll(() => api.close());

describe('a variant', () => {
  it('is a whole timing of its own, with its own days, beside the entry', async () => {
    const variant = await addVariant(village.elder3, calendar.id, entry.id);
    expect(variant).toMatchObject({ entryId: entry.id, mine: true, content: variantInput() });
    expect(variant.dates.marker?.expected.gregorian).not.toBe(entry.dates.marker?.expected.gregorian);
    expect(await listed(village.officer)).toHaveLength(1);
  });

  it('makes an elder no writer: they still sign for the village', async () => {
    await addVariant(village.elder, calendar.id, entry.id);
    expect((await publishDraft(village, calendar.id)).state).toBe('published');
  });

  it('is its giver’s and the officer’s to change, with both states when somebody was faster', async () => {
    const { variantId } = await addVariant(village.elder3, calendar.id, entry.id);
    const path = `/api/calendars/${calendar.id}/entries/${entry.id}/variants/${variantId}`;
    const content = variantInput({ note: 'Said again' });
    expect(reasonOf(await village.elder2.put(path, { content, version: 1 }))).toBe('409 not-the-giver');
    await village.elder3.put(path, { content, version: 1 }).expect(200);
    const late = await village.officer.put(path, { content: variantInput(), version: 1 }).expect(409);
    expect(late.body).toMatchObject({
      type: '/problems/stale',
      current: { content: { note: 'Said again' } },
    });
    await village.officer.delete(path).expect(204);
    expect(await listed(village.officer)).toEqual([]);
  });

  it('does not become wider by an edit', async () => {
    const { variantId } = await addVariant(village.elder3, calendar.id, entry.id, { sharingLevel: 'elders' });
    const path = `/api/calendars/${calendar.id}/entries/${entry.id}/variants/${variantId}`;
    await village.elder3.put(path, { content: variantInput(), version: 1 }).expect(422);
  });

  it('waits like the entry while a submission is out', async () => {
    await submit(village.officer, calendar.id);
    const path = `/api/calendars/${calendar.id}/entries/${entry.id}/variants`;
    expect(reasonOf(await village.elder3.post(path, variantInput()))).toBe('409 draft-locked');
  });

  it('is frozen with the version, hashed apart from the entry, and keeps its days', async () => {
    const { variantId, dates } = await addVariant(village.elder3, calendar.id, entry.id);
    const published = await publishDraft(village, calendar.id);
    const [seen] = (await readVersion(village.officer, published)).entries;
    expect(seen?.variants).toMatchObject([{ variantId, dates, forBoard: true }]);
    expect(published.leaves).toHaveLength(16);
  });

  it('asks nobody anew: an entry’s own words are what elders answered to', async () => {
    const before = await submit(village.officer, calendar.id);
    await village.officer
      .post(`${versionPath(before)}/changes-asked`, { reason: 'taken-back', note: '' })
      .expect(200);
    await addVariant(village.elder3, calendar.id, entry.id);
    const after = await submit(village.officer, calendar.id);
    expect(after.entries[0]?.hash).toBe(before.entries[0]?.hash);
  });

  it('makes an agreed entry “agreed with differences”, a full outcome that signs off as any', async () => {
    await addVariant(village.elder3, calendar.id, entry.id);
    const version = await submit(village.officer, calendar.id);
    await answerAll(village.elder, version);
    const answers = await village.officer.get(`${versionPath(version)}/answers`).expect(200);
    expect((answers.body as { outcomes: Outcome[] }).outcomes).toEqual([
      { entryId: entry.id, outcome: 'agreed-with-differences' },
    ]);
  });
});

describe('the board', () => {
  it('shows the entry alone until somebody chooses otherwise, with a reason', async () => {
    const plain = await addEntry(village.officer, calendar.id, {
      titleOfficer: 'Lending evening',
      kind: 'community',
    });
    const { variantId } = await addVariant(village.elder3, calendar.id, plain.id, { giver: 'Quorreb' });
    const path = `/api/calendars/${calendar.id}/entries/${plain.id}`;
    await village.officer
      .put(path, {
        content: { ...plain.content, board: { shows: 'both', variantId, reason: '' } },
        version: 1,
      })
      .expect(422);
    expect(await sheetText('draft')).not.toContain('Quorreb');
    const board = { shows: 'both', variantId: null, reason: 'Both families asked for it' };
    await village.officer.put(path, { content: { ...plain.content, board }, version: 1 }).expect(200);
    expect(await sheetText('draft')).toContain('Quorreb');
  });

  it('shows every timing of what can cost seed, and goes by the later start and the earlier end', async () => {
    const sown = await addEntry(village.officer, calendar.id, {
      titleOfficer: 'Sow short millet',
      crop: 'short millet',
      hasLastDate: true,
      lastDate: { date: { month: 7, day: 25 }, source: 'agricultural office' },
    });
    const variant = await addVariant(village.elder3, calendar.id, sown.id, { giver: 'Quorreb' });
    expect(await sheetText('draft')).toContain('Quorreb');
    await publishDraft(village, calendar.id);
    api.clock.set(new Date(`${sown.dates.window?.earliest ?? ''}T09:00:00Z`));
    expect(await openTitles()).not.toContain('Sow short millet');
    api.clock.set(new Date(`${variant.dates.window?.earliest ?? ''}T09:00:00Z`));
    expect(await openTitles()).toContain('Sow short millet');
  });

  it('is not moved by what its people keep', async () => {
    await addVariant(village.elder3, calendar.id, entry.id, { sharingLevel: 'elders', giver: 'Quorreb' });
    const board = { shows: 'both' as const, variantId: null, reason: 'asked' };
    const path = `/api/calendars/${calendar.id}/entries/${entry.id}`;
    await village.officer.put(path, { content: { ...entry.content, board }, version: 1 }).expect(200);
    expect(await sheetText('draft')).not.toContain('Quorreb');
  });

  async function sheetText(number: string): Promise<string> {
    const path = `/api/calendars/${calendar.id}/versions/${number}/sheet.pdf?layout=month-cards`;
    return (await textOf(village.officer, path, { fileType: 'application/pdf' })).replace(/\s+/gu, ' ');
  }

  async function openTitles(): Promise<string[]> {
    const observer = await api.signIn('observer');
    const answer = await observer.get(`/api/communities/${observer.communityId}/today`).expect(200);
    return (answer.body as { openWindows: { titleOfficer: string }[] }).openWindows.map(
      (one) => one.titleOfficer,
    );
  }
});

async function listed(client: Client): Promise<Variant[]> {
  const path = `/api/calendars/${calendar.id}/entries/${entry.id}/variants`;
  return ((await client.get(path).expect(200)).body as { items: Variant[] }).items;
}
