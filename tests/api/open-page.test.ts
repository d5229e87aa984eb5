import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { ItemSharingEntity } from '#server/db/entities/item-sharing.entity.js';
import { PlaceEntity } from '#server/db/entities/place.entity.js';
import { CONSENT_USES } from '#shared/contracts/consents.js';
import type { LeftOutOfOpenPage, OpenPage, OpenPageState } from '#shared/contracts/open-page.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import {
  addEntry,
  beginCalendar,
  openVillage,
  publishDraft,
  reasonOf,
  type Village,
} from '#tests/support/calendar-api.js';
import { addConsent, asked } from '#tests/support/consent-api.js';
import { addFigure } from '#tests/support/figure-api.js';
import { switchOpenPageOn } from '#tests/support/open-page-api.js';
import { readPdfText } from '#tests/support/pdf/read-text.js';
import { withdraw } from '#tests/support/withdrawal-api.js';

/** A village's page for whoever has its address. */
let api: TestApi;
let village: Village;
let visitor: Client;
let path: string;
let openId: string;
let figureId: string;
const NAME = 'Wurrelkin';
beforeAll(async () => {
  api = await openTestApi();
  village = await openVillage(api);
  visitor = await api.visitor();
  const { officer, elder } = village;
  path = `/api/communities/${officer.communityId}/open-page`;
  const calendarId = (await beginCalendar(village, 2034)).id;
  const people = { giver: NAME, giverId: elder.personId, notes: `Ask ${NAME}` };
  const open = await addEntry(officer, calendarId, {
    ...people,
    ...{ titleOfficer: 'Open to all', sharingLevel: 'open' },
    ...{ hasLastDate: true, lastDate: { date: { month: 7, day: 3 }, source: `Office of ${NAME}` } },
  });
  openId = open.id;
  await addConsent(officer, 'entry', open.id, { uses: [...CONSENT_USES] });
  await addEntry(officer, calendarId, { titleOfficer: 'Nobody was asked', sharingLevel: 'open' });
  await addEntry(officer, calendarId, { titleOfficer: 'The village’s', sharingLevel: 'village' });
  await addEntry(elder, calendarId, { titleOfficer: 'Of the elders', sharingLevel: 'elders' });
  const figure = await addFigure(officer, { names: [{ tag: 'en', name: 'Our own bowl' }] });
  figureId = figure.id;
  const byFigure = await addEntry(officer, calendarId, {
    ...{ titleOfficer: 'By the village’s figure', sharingLevel: 'open' },
    lead: { type: 'marker', markerKey: figure.markerKey, phenomenon: 'heliacal-rising', occurrence: 1 },
  });
  await addConsent(officer, 'entry', byFigure.id, { uses: [...CONSENT_USES] });
  const printed = await addEntry(officer, calendarId, {
    titleOfficer: 'Agreed to for all else',
    sharingLevel: 'open',
  });
  // What is ticked for feeds says nothing about the page.
  const others = CONSENT_USES.filter((use) => use !== 'open-page');
  await addConsent(officer, 'entry', printed.id, { uses: others });
  const answering = await addEntry(officer, calendarId, {
    titleOfficer: 'Still to be answered',
    sharingLevel: 'open',
  });
  await addConsent(officer, 'entry', answering.id, asked());
  const named = await addEntry(officer, calendarId, {
    ...{ titleOfficer: 'Words with a name', sharingLevel: 'open', caution: 'Mind the dog' },
    otherSigns: `When ${village.officer.session.person?.displayName ?? ''} says so`,
  });
  const titled = await addEntry(officer, calendarId, {
    ...{ titleOfficer: `The field of ${NAME.toLowerCase()}`, sharingLevel: 'open' },
  });
  for (const { id } of [named, titled]) await addConsent(officer, 'entry', id, { uses: [...CONSENT_USES] });
  await publishDraft(village, calendarId);
  await addEntry(officer, calendarId, { titleOfficer: 'Later in the draft', sharingLevel: 'open' });
}, 60_000);
afterAll(() => api.close());

const read = (key: string) => visitor.get(`/api/open-page?key=${key}`);
const page = async (key: string) => (await read(key).expect(200)).body as OpenPage;

describe('the page for everybody', () => {
  it('is off at first, and switched on and off by officer and steward alone', async () => {
    expect((await village.officer.get(path).expect(200)).body).toMatchObject({ key: null });
    for (const paper of ['code.svg', 'card.pdf']) {
      expect((await village.officer.get(`${path}/${paper}`)).status).toBe(404);
    }
    expect(reasonOf(await village.elder.put(path, { placeShown: 'name' }))).toBe('403 not-allowed');
    const key = await switchOpenPageOn(village.steward);
    expect(key).toMatch(/^(?:[A-HJKMNP-Z2-9]{4}-){4}[A-HJKMNP-Z2-9]{4}$/u);
    expect(await switchOpenPageOn(village.officer, 'degree')).toBe(key);
    await read(key).expect(200);
    await village.officer.delete(path).expect(204);
    await read(key).expect(404);
    await village.officer.delete(path).expect(204);
    expect(await switchOpenPageOn(village.officer)).not.toBe(key);
  });

  it('holds what is open of the newest published version, and no person', async () => {
    const answer = await read(await switchOpenPageOn(village.officer)).expect(200);
    const { entries, version } = answer.body as OpenPage;
    expect(entries.map(({ titleOfficer }) => titleOfficer)).toEqual(['Open to all', 'Words with a name']);
    expect(entries[1]).toMatchObject({ otherSigns: '', caution: 'Mind the dog' });
    expect(version).toMatchObject({ year: 2034, label: '2034-1' });
    expect(entries[0]?.window?.lastAdvised).toBe('2034-07-03');
    expect(answer.text).not.toMatch(new RegExp(`${NAME}|giver|bowl`, 'u'));
    expect(answer.headers).toMatchObject({
      'x-robots-tag': 'noindex, nofollow',
      'cache-control': 'no-store',
    });
  });

  it('tells of the place what the village chose, and no more', async () => {
    const places = api.dataSource.getRepository(PlaceEntity);
    await places.update({ id: village.placeId }, { latitudeDeg: 12.3456, longitudeDeg: -38.1554 });
    // What was published before keeps its place; a reading rounds what the version holds.
    const frozen = await page(await switchOpenPageOn(village.officer, 'tenth'));
    expect(JSON.stringify(frozen)).not.toMatch(/12\.3456|-38\.1554/u);
    const told = async (shown: string) => {
      const { placeName, place } = await page(await switchOpenPageOn(village.officer, shown));
      return [placeName !== null, place?.roundedToDeg ?? null, decimalsOf(place?.latitudeDeg ?? 0)];
    };
    expect(await told('nothing')).toEqual([false, null, 0]);
    expect(await told('name')).toEqual([true, null, 0]);
    expect(await told('degree')).toEqual([true, 1, 0]);
    expect((await told('tenth')).slice(0, 2)).toEqual([true, 0.1]);
    expect(decimalsOf(frozen.place?.latitudeDeg ?? 0)).toBeLessThanOrEqual(1);
  });

  it('loses at once what is taken back or made narrower', async () => {
    const key = await switchOpenPageOn(village.officer);
    const item = `/api/communities/${village.elder.communityId}/items/entry/${openId}`;
    await village.elder.post(`${item}/pause`, { askedById: null }).expect(204);
    expect((await page(key)).entries.map(({ entryId }) => entryId)).not.toContain(openId);
    await village.elder.delete(`${item}/pause`).expect(204);
    expect((await page(key)).entries.map(({ entryId }) => entryId)).toContain(openId);
  });

  it('tells its keepers what is open and stays out, and nobody else', async () => {
    const list = async (client: Client) =>
      ((await client.get(`${path}/left-out`).expect(200)).body as { items: LeftOutOfOpenPage[] }).items;
    const name = village.officer.session.person?.displayName ?? '';
    const seen = (await list(village.steward)).map(({ title, awaited, found }) => [
      ...[title, awaited.map(({ itemType, what }) => `${itemType} ${what}`), namesOf(found)],
    ]);
    expect(seen).toEqual([
      ['Nobody was asked', ['entry nobody-asked'], []],
      ['By the village’s figure', ['figure not-open', 'figure nobody-asked'], []],
      ['Agreed to for all else', ['entry not-agreed'], []],
      ['Still to be answered', ['entry no-answer'], []],
      ['Words with a name', [], [['otherSigns', name]]],
      [`The field of ${NAME.toLowerCase()}`, [], [['titleOfficer', NAME]]],
    ]);
    expect(await list(village.officer)).toHaveLength(seen.length);
    expect(reasonOf(await village.elder.get(`${path}/left-out`))).toBe('403 not-allowed');
  });

  it('waits for the yes about the figure that an entry goes by, until nobody is left to be asked', async () => {
    const key = await switchOpenPageOn(village.officer);
    const titles = async () => (await page(key)).entries.map(({ titleOfficer }) => titleOfficer);
    const sharing = api.dataSource.getRepository(ItemSharingEntity);
    await sharing.update({ itemType: 'figure', itemId: figureId }, { level: 'open' });
    expect(await titles()).not.toContain('By the village’s figure');
    await addConsent(village.officer, 'figure', figureId, { uses: ['keep', 'show', 'feed', 'open-page'] });
    expect(await titles()).toContain('By the village’s figure');
    await withdraw(village.officer, 'figure', figureId, { askedById: village.elder.personId }).expect(204);
    expect(await titles()).toContain('By the village’s figure');
    expect((await read(key)).text).not.toContain('Our own bowl');
  });

  it('is drawn as a code and printed to hang up, typed in letters of any size, and slow to guess', async () => {
    const state = (await village.officer.get(path).expect(200)).body as OpenPageState;
    const code = await village.officer.get(`${path}/code.svg`).expect(200);
    expect(code.headers['content-type']).toBe('image/svg+xml');
    expect(Buffer.from(code.body as Buffer).toString()).toMatch(/^<svg /u);
    const card = await village.officer.get(`${path}/card.pdf`).responseType('blob');
    expect([card.status, card.headers['content-type']]).toEqual([200, 'application/pdf']);
    const words = readPdfText(card.body as Buffer).replace(/\s+/gu, ' ');
    expect(words).toContain('Anybody can read this.');
    expect(words.replaceAll(' ', '')).toContain(`/open?page=${state.key ?? ''}`);
    expect((await read((state.key ?? '').toLowerCase().replaceAll('-', ''))).status).toBe(200);
    const guesses = await Promise.all(
      Array.from({ length: 60 }, (_, index) => read(`guess-${String(index)}`)),
    );
    expect(guesses.map(({ status }) => status)).toContain(429);
    expect((await read(state.key ?? '')).status).toBe(429);
    api.restart();
  });
});

function namesOf(found: LeftOutOfOpenPage['found']): string[][] {
  return found.map(({ word, names }) => [word, ...names.map(({ name }) => name)]);
}

function decimalsOf(value: number): number {
  return String(value).split('.')[1]?.length ?? 0;
}
