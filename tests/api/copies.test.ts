import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { MembershipEntity } from '#server/db/entities/membership.entity.js';
import type { Calendar } from '#shared/contracts/calendars.js';
import { EMPTY_RECORD } from '#shared/contracts/event-record.js';
import type { VillageCopy } from '#shared/contracts/imports.js';
import { WRITE_KEY_HEADER } from '#shared/contracts/write-key.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import { addPicture } from '#tests/support/attachment-api.js';
import {
  addEntry,
  beginCalendar,
  changePlace,
  entriesOf,
  openVillage,
  reasonOf,
  setRoles,
  type Village,
} from '#tests/support/calendar-api.js';
import { addConsent } from '#tests/support/consent-api.js';
import { addFigure } from '#tests/support/figure-api.js';
import { firstPlace } from '#tests/support/place-api.js';
import { addVariant } from '#tests/support/variant-api.js';
import { addWord } from '#tests/support/words-api.js';

/** From one village to another, by somebody who compiles for both. */
let api: TestApi;
let village: Village;
let fromId: string;
let into: Calendar;
let theirs: Client;
const NAME = 'Wurrelkin';
beforeAll(async () => {
  api = await openTestApi();
  village = await openVillage(api);
  theirs = await api.signIn('officer2');
  const { officer, elder, elder3 } = village;
  await api.dataSource.getRepository(MembershipEntity).insert({
    ...{ id: randomUUID(), communityId: theirs.communityId, personId: officer.personId },
    roles: ['officer'],
  });
  fromId = (await beginCalendar(village, 2031)).id;
  const place = await firstPlace(theirs);
  // Far enough north that the same star comes days later.
  await changePlace(api, place.id, { latitudeDeg: 45 });
  into = await beginCalendar({ ...village, officer: theirs, placeId: place.id }, 2032);
  const figure = await addFigure(officer, { names: [{ tag: 'en', name: NAME }] });
  const patch = await addFigure(officer, {
    names: [{ tag: 'en', name: 'Dim veil' }],
    ...{ memberHrs: [], indicatorHr: null },
    patch: { rightAscensionDeg: 84, declinationDeg: -5, patchClass: 'faint' },
  });
  const by = (markerKey: string) =>
    ({ type: 'marker', markerKey, phenomenon: 'heliacal-rising', occurrence: 1 }) as const;
  const own = await addWord(officer, 'kinds', { like: 'farm', word: `Work of ${NAME}` });
  const sow = await addEntry(officer, fromId, {
    kindWord: { id: own.key, word: own.word },
    ...{ giver: NAME, giverId: elder.personId, notes: `Ask ${NAME}`, sharingLevel: 'open' },
    ...{ hasLastDate: true, lastDate: { date: { month: 7, day: 5 }, source: `Office of ${NAME}` } },
    record: {
      ...EMPTY_RECORD,
      work: { ...EMPTY_RECORD.work, responsible: NAME, ifEarly: 'Wait' },
      trust: { confidence: 'strong', by: NAME, basis: 'own-years' },
    },
  });
  await addVariant(elder3, fromId, sow.id);
  await addPicture(elder, sow.id, { subjectType: 'entry', title: NAME });
  await addEntry(officer, fromId, {
    titleOfficer: 'Weed',
    lead: { type: 'entry-planned', entryId: sow.id, day: 'bestTo' },
  });
  await addEntry(officer, fromId, { titleOfficer: 'By our figure', lead: by(figure.markerKey) });
  const veil = await addEntry(officer, fromId, { titleOfficer: 'By our veil', lead: by(patch.markerKey) });
  await addEntry(officer, fromId, {
    titleOfficer: 'After the veil',
    lead: { type: 'entry-planned', entryId: veil.id, day: 'bestTo' },
  });
  await addEntry(officer, fromId, {
    titleOfficer: 'Sun over the notch',
    lead: {
      ...{ type: 'sky', occurrence: 1 },
      spec: { kind: 'sun-azimuth', event: 'sunrise', azimuthDeg: 70, pointName: 'notch' },
    },
  });
  await addEntry(elder, fromId, { titleOfficer: 'Kept by elders', sharingLevel: 'elders' });
  const refused = await addEntry(officer, fromId, { titleOfficer: 'Said no' });
  await addConsent(officer, 'entry', refused.id, { answer: 'refused', uses: [] });
}, 60_000);
afterAll(() => api.close());

const send = (client: Client, changes: object = {}, calendarId = fromId, key = randomUUID()) =>
  client
    .post(`/api/calendars/${calendarId}/copies`, {
      ...{ dryRun: false, toCalendarId: into.id },
      ...changes,
    })
    .set(WRITE_KEY_HEADER, key);

describe('a calendar for another village', () => {
  it('is looked at first: what comes, what is otherwise there, what stays behind and why', async () => {
    const answer = await send(village.officer, { dryRun: true }).expect(200);
    const { added, mediaLeft, entries } = answer.body as VillageCopy;
    expect([added, mediaLeft]).toEqual([3, 1]);
    expect(entries.map(({ title, comes, notes }) => [title, comes, notes])).toEqual([
      ['Sow long millet', true, ['last-date-dropped', 'timings-dropped']],
      ['Weed', true, []],
      ['By our figure', true, ['star-instead-of-figure']],
      ['By our veil', false, ['figure-left-out']],
      ['After the veil', false, ['anchor-left-out']],
      ['Sun over the notch', false, ['skyline-left-out']],
    ]);
    expect(answer.text).not.toMatch(/Kept by elders|Said no/u);
    expect(await entriesOf(theirs, into.id)).toEqual([]);
  });

  it('comes once, computed for the other place, as a draft without names, levels and yeses', async () => {
    const key = randomUUID();
    const copy = () => send(village.officer, {}, fromId, key);
    const first = (await copy().expect(200)).body as VillageCopy;
    expect((await copy().expect(200)).body).toMatchObject({ added: 3 });
    const seen = await entriesOf(theirs, into.id);
    const [sow, weed, byFigure] = seen;
    expect(seen).toHaveLength(3);
    expect(JSON.stringify(seen)).not.toContain(NAME);
    expect(sow?.content).toMatchObject({
      ...{ sharingLevel: 'village', giver: '', notes: '', hasLastDate: false, agreedToPrint: false },
      record: { work: { ifEarly: 'Wait', responsible: '' }, trust: { by: '', confidence: null } },
    });
    expect(weed?.content.lead).toMatchObject({ type: 'entry-planned', entryId: sow?.id });
    expect(byFigure?.content.lead).toMatchObject({ markerKey: expect.stringMatching(/^hr\d+$/u) as string });
    const [original] = await entriesOf(village.officer, fromId);
    expect(sow?.dates.window).not.toBeNull();
    expect(sow?.dates.window?.bestFrom).toBe(first.entries[0]?.window?.bestFrom);
    expect(sow?.dates.window?.bestFrom.slice(5)).not.toBe(original?.dates.window?.bestFrom.slice(5));
    expect(weed?.dates.window).toEqual(first.entries[1]?.window);
  });

  it('asks for consent anew: nothing of it is printed or put into files before there is a yes', async () => {
    const [sow] = await entriesOf(theirs, into.id);
    const items = `/api/communities/${theirs.communityId}/items/entry/${sow?.id ?? ''}`;
    const asked = await theirs.get(`${items}/consents`).expect(200);
    expect(asked.body).toMatchObject({ items: [{ content: { answer: 'asked', giverId: null } }] });
    const csv = (await theirs.get(`/api/calendars/${into.id}/versions/draft/calendar.csv`).expect(200)).text;
    expect(csv).not.toContain('Sow long millet');
  });

  it('stands in the records of both villages', async () => {
    const actions = async (client: Client) =>
      (
        (await client.get(`/api/communities/${client.communityId}/audit?limit=200`).expect(200)).body as {
          items: { action: string; details: unknown }[];
        }
      ).items.map(({ action }) => action);
    expect(await actions(village.steward)).toContain('entries-copied-away');
    expect(await actions(theirs)).toContain('entries-brought-in');
  });

  it('is not for who does not compile for both, and not within one village', async () => {
    const own = await beginCalendar(village, 2033);
    expect(reasonOf(await send(village.officer, { toCalendarId: own.id }))).toBe('409 same-village');
    expect(reasonOf(await send(village.officer, { toCalendarId: randomUUID() }))).toBe('404 not-found');
    expect(reasonOf(await send(theirs, {}, fromId))).toBe('404 not-found');
    await setRoles(api, { ...village.officer, communityId: theirs.communityId }, ['staff']);
    expect(reasonOf(await send(village.officer))).toBe('403 not-allowed');
    await setRoles(api, { ...village.officer, communityId: theirs.communityId }, ['officer']);
  });
});
