import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { NoNameEntity } from '#server/db/entities/no-name.entity.js';
import { PersonEntity } from '#server/db/entities/person.entity.js';
import type { AuditEvent } from '#shared/contracts/audit.js';
import type { Calendar, Entry } from '#shared/contracts/calendars.js';
import { CONSENT_USES } from '#shared/contracts/consents.js';
import type { LeftOutOfOpenPage, OpenPage } from '#shared/contracts/open-page.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import {
  addEntry,
  beginCalendar,
  openVillage,
  publishDraft,
  reasonOf,
  type Village,
} from '#tests/support/calendar-api.js';
import { addConsent } from '#tests/support/consent-api.js';
import { switchOpenPageOn } from '#tests/support/open-page-api.js';
import { withdraw } from '#tests/support/withdrawal-api.js';

/** A common word that is taken for somebody's name, and those who keep the page know better. */
let api: TestApi;
let village: Village;
let visitor: Client;
let path: string;
let key: string;
let calendar: Calendar;
let entry: Entry;
const SIGN = 'When Heron comes back to the stream';

beforeAll(async () => {
  api = await openTestApi();
  village = await openVillage(api);
  visitor = await api.visitor();
  path = `/api/communities/${village.officer.communityId}/open-page`;
  calendar = await beginCalendar(village, 2035);
  await call(village.elder, 'Heron Talvick');
  entry = await addEntry(village.officer, calendar.id, {
    ...{ titleOfficer: 'Mend the weir', otherSigns: SIGN, caution: SIGN, sharingLevel: 'open' },
    ...{ giver: 'A keeper', giverId: village.elder2.personId },
  });
  await addConsent(village.officer, 'entry', entry.id, { uses: [...CONSENT_USES] });
  await publishDraft(village, calendar.id);
  key = await switchOpenPageOn(village.officer);
}, 60_000);
afterAll(() => api.close());

async function call({ personId }: Client, displayName: string): Promise<void> {
  await api.dataSource.getRepository(PersonEntity).update({ id: personId }, { displayName });
}

async function leftOut(): Promise<LeftOutOfOpenPage> {
  const { items } = (await village.officer.get(`${path}/left-out`).expect(200)).body as {
    items: LeftOutOfOpenPage[];
  };
  return items[0] ?? { entryId: '', title: '', awaited: [], found: [], noNames: [] };
}

async function signsShown(): Promise<string | undefined> {
  const { entries } = (await visitor.get(`/api/open-page?key=${key}`).expect(200)).body as OpenPage;
  return entries[0]?.otherSigns;
}

const found = async () =>
  (await leftOut()).found.find(({ word }) => word === 'otherSigns')?.names.map(({ name }) => name) ?? [];

async function saying(who: Client) {
  const { entryId, found: words } = await leftOut();
  const there = words.find(({ word }) => word === 'otherSigns');
  return who.post(`${path}/no-names`, {
    ...{ entryId, word: 'otherSigns', key: there?.names[0]?.key ?? '0'.repeat(64) },
  });
}

describe('a word that is no name', () => {
  it('stands on the page once a keeper says so, for those words alone, with who said it and when', async () => {
    expect(await found()).toEqual(['Heron Talvick']);
    expect(await signsShown()).toBe('');
    expect(reasonOf(await saying(village.elder3))).toBe('403 not-allowed');
    expect((await saying(village.officer)).status).toBe(204);
    expect(await signsShown()).toBe(SIGN);
    const { found: left, noNames } = await leftOut();
    expect(left.map(({ word }) => word)).toEqual(['caution']);
    expect(noNames).toEqual([
      {
        ...{ id: expect.any(String) as string, word: 'otherSigns', text: SIGN, name: 'Heron Talvick' },
        saidByName: village.officer.session.person?.displayName,
        saidAt: api.clock.now().toISOString(),
      },
    ]);
    const { items } = (await village.steward.get(`/api/communities/${village.steward.communityId}/audit`))
      .body as { items: AuditEvent[] };
    expect(items.find(({ action }) => action === 'no-name-said')).toMatchObject({
      subjectName: 'Mend the weir',
      details: { word: 'otherSigns' },
    });
  });

  it('is asked anew when somebody else is called so, and when somebody joins who is', async () => {
    await call(village.elder3, 'Heron Ostby');
    expect([await signsShown(), await found()]).toEqual(['', ['Heron Ostby']]);
    await call(village.elder3, 'Heron Talvick');
    expect([await signsShown(), await found()]).toEqual(['', ['Heron Talvick']]);
    await call(village.elder3, 'Tirel');
    expect(await signsShown()).toBe(SIGN);
  });

  it('is taken back by any keeper, and off the page at once', async () => {
    const id = (await leftOut()).noNames[0]?.id ?? '';
    expect(reasonOf(await village.elder3.delete(`${path}/no-names/${id}`))).toBe('403 not-allowed');
    await village.steward.delete(`${path}/no-names/${id}`).expect(204);
    expect([await signsShown(), await found()]).toEqual(['', ['Heron Talvick']]);
    await village.steward.delete(`${path}/no-names/${id}`).expect(204);
  });

  it('counts only for the words and the name that were read', async () => {
    const about = { entryId: entry.id, word: 'otherSigns' };
    const keyOf = async (word: string) =>
      (await leftOut()).found.find((each) => each.word === word)?.names[0]?.key ?? '';
    const refused = '409 no-such-name-there';
    const say = async (body: object) => reasonOf(await village.officer.post(`${path}/no-names`, body));
    const read = await keyOf('otherSigns');
    expect(await say({ ...about, key: 'f'.repeat(64) })).toBe(refused);
    expect(await say({ ...about, word: 'crop', key: read })).toBe(refused);
    await call(village.elder, 'Heron Dunmar');
    expect(await say({ ...about, key: read })).toBe(refused);
    await call(village.elder, 'Heron Talvick');
    expect((await saying(village.officer)).status).toBe(204);
    expect(await signsShown()).toBe(SIGN);
  });

  it('is asked anew when the words are others in the next version', async () => {
    const words = 'When Heron nests at the stream';
    const now = (await village.officer.get(`/api/calendars/${calendar.id}/entries`)).body as {
      items: Entry[];
    };
    const { content, version } = now.items[0] ?? entry;
    await village.officer
      .put(`/api/calendars/${calendar.id}/entries/${entry.id}`, {
        content: { ...content, otherSigns: words },
        version,
      })
      .expect(200);
    expect(await signsShown()).toBe(SIGN);
    await publishDraft(village, calendar.id);
    expect([await signsShown(), await found()]).toEqual(['', ['Heron Talvick']]);
    expect((await saying(village.officer)).status).toBe(204);
    expect(await signsShown()).toBe(words);
  });

  it('goes with an entry that is taken back', async () => {
    const rows = api.dataSource.getRepository(NoNameEntity);
    expect(await rows.countBy({ entryId: entry.id })).toBe(2);
    await withdraw(village.elder2, 'entry', entry.id).expect(204);
    expect(await rows.count()).toBe(0);
  });
});
