import { createHash } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { CalendarVersionEntity } from '#server/db/entities/calendar-version.entity.js';
import { versionHashText } from '#shared/calendar/hash-text.js';
import type { TodaysEngine } from '#shared/contracts/todays-engine.js';
import type { Version, VersionHeader } from '#shared/contracts/versions.js';
import { canonicalJson } from '#shared/kernel/canonical-json.js';
import { ENGINE_VERSION } from '#shared/sky/index.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import {
  addEntry,
  beginCalendar,
  openVillage,
  publishDraft,
  readVersion,
  versionPath,
  type Village,
} from '#tests/support/calendar-api.js';

let api: TestApi;
let village: Village;
let staff: Client;
let published: Version;
beforeAll(async () => {
  api = await openTestApi();
  village = await openVillage(api);
  staff = await api.signIn('staff');
  const { id } = await beginCalendar(village);
  const sow = await addEntry(village.officer, id);
  await addEntry(village.officer, id, {
    titleOfficer: 'Weed',
    lead: { type: 'entry-planned', entryId: sow.id, day: 'bestTo' },
  });
  await addEntry(village.officer, id, {
    titleOfficer: 'Store',
    lead: { type: 'fixed-date', date: { month: 11, day: 20 }, source: 'office' },
  });
  published = await publishDraft(village, id);
});
afterAll(() => api.close());

const todaysOf = async (client: Client) =>
  (await client.get(`${versionPath(published)}/todays-engine`).expect(200)).body as TodaysEngine;

/** The version as an engine would have frozen it that took other air for the same days: only the header changes its text. */
async function frozenBefore(changes: Partial<VersionHeader>): Promise<void> {
  const versions = api.dataSource.getRepository(CalendarVersionEntity);
  const row = await versions.findOneByOrFail({ id: published.id });
  const sha256 = (text: string) => createHash('sha256').update(text, 'utf8').digest('hex');
  const headerText = canonicalJson({ ...(JSON.parse(row.headerText) as VersionHeader), ...changes });
  const headerHash = sha256(headerText);
  const hash = sha256(versionHashText(2, headerHash, row.leaves ?? []));
  await versions.update({ id: row.id }, { headerText, headerHash, hash });
}

describe('a version that an older engine reckoned', () => {
  it('is left alone while the engine is the same', async () => {
    expect(await readVersion(staff, published)).not.toHaveProperty('todaysEngine');
    expect(await todaysOf(staff)).toEqual({
      ...{ frozenBy: ENGINE_VERSION, today: ENGINE_VERSION, entryCount: 3, differences: [] },
    });
  });

  it('still shows its own days, and says what today’s engine would say, the biggest difference first', async () => {
    const place = { ...published.header.place, sameSideShiftDeg: 2 };
    await frozenBefore({ engineVersion: '1.0.0', place });
    const read = await readVersion(staff, published);
    expect(read.todaysEngine).toBe(ENGINE_VERSION);
    expect(read.entries.map(({ dates }) => dates)).toEqual(published.entries.map(({ dates }) => dates));
    const { frozenBy, today, entryCount, differences } = await todaysOf(staff);
    expect([frozenBy, today, entryCount]).toEqual(['1.0.0', ENGINE_VERSION, 3]);
    expect(differences.map(({ titleOfficer }) => titleOfficer).toSorted()).toEqual([
      'Sow long millet',
      'Weed',
    ]);
    expect(differences[0]?.frozen).not.toEqual(differences[0]?.today);
    expect(differences.every(({ days }) => days !== null && days > 0)).toBe(true);
    expect(await todaysOf(staff)).toEqual({ frozenBy, today, entryCount, differences });
  });
});
