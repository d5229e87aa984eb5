import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Calendar, Entry } from '#shared/contracts/calendars.js';
import type { Problem } from '#shared/contracts/problem.js';
import type { OwnSeen, Sign } from '#shared/contracts/signs.js';
import { PLAIN_DETAILS } from '#shared/contracts/sharing.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import {
  addEntry,
  beginCalendar,
  entriesOf,
  entryInput,
  openVillage,
  publishDraft,
  readVersion,
  reasonOf,
  type Village,
} from '#tests/support/calendar-api.js';
import { tablesWith } from '#tests/support/search-everything.js';
import {
  addSign,
  signInput,
  signNames,
  signsOf,
  signsPath,
  waitingFor,
  waitingForOwn,
} from '#tests/support/sign-api.js';
import { sharingPath } from '#tests/support/sharing-api.js';

let api: TestApi;
let village: Village;
let calendar: Calendar;
let observer: Client;
beforeAll(async () => {
  api = await openTestApi();
});
beforeEach(async () => {
  await api.reset();
  village = await openVillage(api);
  calendar = await beginCalendar(village);
  observer = await api.signIn('observer');
});
afterAll(() => api.close());

const pathOf = ({ id }: Sign) => `${signsPath(village.officer)}/${id}`;
const fieldsOf = (body: unknown) =>
  ((body as Problem).errors ?? []).map(({ field, code }) => `${field}: ${code}`);
const waiting = (signs: readonly Sign[], needed?: number) =>
  addEntry(village.officer, calendar.id, {
    ...{ record: waitingFor(signs, needed), giver: 'Elder A-1', ifLate: 'Sow beans.' },
  });
const only = async (client: Client): Promise<Entry> => {
  const [entry] = await entriesOf(client, calendar.id);
  if (!entry) throw new Error('There is no entry.');
  return entry;
};
const save = ({ id, content, version }: Entry, changes: Partial<Entry['content']>) =>
  village.officer.put(`/api/calendars/${calendar.id}/entries/${id}`, {
    content: { ...content, ...changes },
    version,
  });

describe('a sign of the village’s list', () => {
  it('serves many entries with one description, which follows in every draft', async () => {
    const sign = await addSign(village.officer);
    await waiting([sign]);
    expect(signNames(await only(village.elder))).toEqual(['Wet to the hand']);
    const anew = { ...signInput({ name: 'Wet to the wrist' }), version: sign.version };
    await village.officer.put(pathOf(sign), anew).expect(200);
    expect(signNames(await only(village.elder))).toEqual(['Wet to the wrist']);
    expect(reasonOf(await village.officer.put(pathOf(sign), anew))).toBe('409 stale');
  });

  it('is described in a version as it was when that was frozen', async () => {
    const sign = await addSign(village.officer);
    await waiting([sign]);
    const version = await publishDraft(village, calendar.id);
    const anew = { ...signInput({ name: 'Wet to the wrist' }), version: sign.version };
    await village.officer.put(pathOf(sign), anew).expect(200);
    const [frozen] = (await readVersion(observer, version)).entries;
    expect(frozen && signNames(frozen)).toEqual(['Wet to the hand']);
  });

  it('stays in the list while an entry of a draft waits for it, and can be put back', async () => {
    const { officer } = village;
    const sign = await addSign(officer);
    const entry = await waiting([sign]);
    const refused = await officer.delete(pathOf(sign));
    expect(reasonOf(refused)).toBe('409 sign-in-use');
    expect((refused.body as Problem).names).toEqual(['Sow long millet']);
    await save(entry, { record: undefined }).expect(200);
    await officer.delete(pathOf(sign)).expect(204);
    expect(await signsOf(officer)).toEqual([]);
    const gone = await officer.post(`/api/calendars/${calendar.id}/entries`, {
      ...entry.content,
      record: waitingFor([sign]),
    });
    expect(fieldsOf(gone.body)).toEqual(['record.signs.list.0.sharedId: unknown-sign']);
    await officer.post(`${pathOf(sign)}/restore`).expect(200);
    expect((await signsOf(officer)).map(({ id }) => id)).toEqual([sign.id]);
  });
});

describe('seeing a sign', () => {
  const seen = { day: '2026-11-29', who: 'Tirel' };

  it('is said by any member and taken back by whoever said it', async () => {
    const sign = await addSign(village.officer);
    const marked = (await observer.post(`${pathOf(sign)}/seen`, seen).expect(201)).body as Sign;
    expect(marked.seen).toMatchObject([{ ...seen, mine: true }]);
    const [known] = await signsOf(village.elder);
    expect(known?.seen).toMatchObject([{ ...seen, mine: false }]);
    const one = `${pathOf(sign)}/seen/${marked.seen[0]?.id ?? ''}`;
    expect(reasonOf(await village.officer.delete(one))).toBe('409 not-the-marker');
    expect(((await observer.delete(one).expect(200)).body as Sign).seen).toEqual([]);
  });

  it('has happened, and not long ago', async () => {
    const sign = await addSign(village.officer);
    const answers = [];
    for (const day of ['2030-01-01', '2020-01-01']) {
      answers.push(...fieldsOf((await observer.post(`${pathOf(sign)}/seen`, { ...seen, day })).body));
    }
    expect(answers).toEqual(['day: still-to-come', 'day: too-long-ago']);
  });
});

describe('a sign in an entry’s own words', () => {
  const seen = { day: '2026-11-29', who: 'Tirel' };
  const own = async () => {
    const record = waitingForOwn();
    const entry = await addEntry(village.officer, calendar.id, {
      ...{ record, giver: 'Elder A-1', ifLate: 'Sow beans.' },
    });
    const ownId = entry.content.record?.signs.list[0]?.ownId ?? '';
    return { entry, ownId, path: `/api/calendars/${calendar.id}/entries/${entry.id}/signs/${ownId}/seen` };
  };
  const told = async (client: Client) => {
    const path = `/api/communities/${client.communityId}/own-signs-seen`;
    return ((await client.get(path).expect(200)).body as { items: OwnSeen[] }).items;
  };

  it('is marked like one of the list, by whoever sees it, and taken back by whoever marked it', async () => {
    const { entry, ownId, path } = await own();
    const marked = (await village.elder.post(path, seen).expect(201)).body as OwnSeen;
    expect(marked).toMatchObject({ entryId: entry.id, ownId, seen: [{ ...seen, mine: true }] });
    expect(await told(village.officer)).toMatchObject([{ ownId, seen: [{ ...seen, mine: false }] }]);
    const one = `${path}/${marked.seen[0]?.id ?? ''}`;
    expect(reasonOf(await village.officer.delete(one))).toBe('409 not-the-marker');
    expect(((await village.elder.delete(one).expect(200)).body as OwnSeen).seen).toEqual([]);
    expect(await told(village.officer)).toEqual([]);
  });

  it('leaves no trace of a draft for others, and is theirs to mark once it was published', async () => {
    const { path } = await own();
    await village.elder.post(path, seen).expect(201);
    expect(reasonOf(await observer.post(path, seen))).toBe('404 not-found');
    expect(await told(observer)).toEqual([]);
    await publishDraft(village, calendar.id);
    await observer.post(path, { ...seen, who: 'Sanwe' }).expect(201);
    expect((await told(observer)).flatMap(({ seen: all }) => all.map(({ who }) => who)).sort()).toEqual([
      ...['Sanwe', 'Tirel'],
    ]);
  });

  it('keeps its sightings while its words are mended, and loses them with its entry', async () => {
    const { entry, ownId, path } = await own();
    await village.elder.post(path, { ...seen, who: 'Zqseen' }).expect(201);
    const { record } = entry.content;
    if (record === undefined) throw new Error('There is no record.');
    const list = record.signs.list.map((sign) => ({ ...sign, name: 'Foam on the water' }));
    await save(entry, { record: { ...record, signs: { ...record.signs, list } } }).expect(200);
    expect((await only(village.officer)).content.record?.signs.list[0]).toMatchObject({ ownId });
    expect(await told(village.officer)).toHaveLength(1);
    const withdrawal = `/api/communities/${village.officer.communityId}/items/entry/${entry.id}/withdrawal`;
    await village.officer.post(withdrawal, { leavesTrace: true, askedById: null }).expect(204);
    expect(await tablesWith(api, 'Zqseen')).toEqual([]);
  });
});

describe('an elder', () => {
  it('puts a sign on the list at their own level, mends it, and leaves those of others alone', async () => {
    const { officer, elder, elder2 } = village;
    const kept = await addSign(elder, { name: 'Kept call', sharingLevel: 'elders' });
    expect(await signsOf(observer)).toEqual([]);
    expect((await signsOf(elder2)).map(({ name, mine }) => [name, mine])).toEqual([['Kept call', false]]);
    const anew = { ...signInput({ name: 'Low call', sharingLevel: 'elders' }), version: kept.version };
    expect(reasonOf(await elder2.put(pathOf(kept), anew))).toBe('409 not-the-giver');
    await elder.put(pathOf(kept), anew).expect(200);
    const offices = await addSign(officer);
    expect(reasonOf(await elder.delete(pathOf(offices)))).toBe('409 not-the-giver');
    expect(reasonOf(await observer.post(signsPath(observer), signInput()))).toMatch(/^403/u);
  });
});

describe('a sign that fewer people see', () => {
  it('is not there for others: not in the list, not to be marked, not in an entry that they see', async () => {
    const { officer, elder } = village;
    const kept = await addSign(officer, { name: 'Kept call', sharingLevel: 'elders' });
    expect((await signsOf(elder)).map(({ name }) => name)).toEqual(['Kept call']);
    expect(await signsOf(observer)).toEqual([]);
    const seen = { day: '2026-11-29', who: 'Tirel' };
    expect(reasonOf(await observer.post(`${pathOf(kept)}/seen`, seen))).toBe('404 not-found');
    const refused = await officer.post(`/api/calendars/${calendar.id}/entries`, {
      ...entryInput(),
      record: waitingFor([kept]),
    });
    expect(fieldsOf(refused.body)).toEqual(['record.signs.list.0.sharedId: sign-kept']);
  });

  it('leaves entries and versions when it becomes so, and what was not shown is not lost by a save', async () => {
    const { officer, elder } = village;
    const sign = await addSign(officer);
    const other = await addSign(officer, { name: 'Frogs call' });
    await waiting([sign, other], 2);
    const version = await publishDraft(village, calendar.id);
    const path = sharingPath(officer, 'sign', sign.id);
    const { version: shared } = (await officer.get(path).expect(200)).body as { version: number };
    const tighter = { level: 'elders', ...PLAIN_DETAILS };
    await officer.put(path, { sharing: tighter, version: shared }).expect(200);
    const entry = await only(elder);
    expect(entry.content.record?.signs).toMatchObject({
      list: [{ name: 'Frogs call' }],
      needed: 1,
      mustHave: null,
    });
    const [frozen] = (await readVersion(observer, version)).entries;
    expect(frozen && signNames(frozen)).toEqual(['Frogs call']);
    await save(await only(officer), { notes: 'Changed' }).expect(200);
    expect(await tablesWith(api, sign.id)).toContain('entry.content');
  });

  it('vanishes everywhere when it is taken back', async () => {
    const { officer } = village;
    const word = 'Vanishing-call';
    const sign = await addSign(officer, { name: word, look: word, where: word });
    await waiting([sign]);
    const version = await publishDraft(village, calendar.id);
    await observer.post(`${pathOf(sign)}/seen`, { day: '2026-11-29', who: word }).expect(201);
    const items = `/api/communities/${officer.communityId}/items/sign/${sign.id}`;
    await officer.post(`${items}/withdrawal`, { leavesTrace: true, askedById: null }).expect(204);
    expect(await tablesWith(api, word)).toEqual([]);
    expect(await signsOf(observer)).toEqual([]);
    expect(signNames(await only(officer))).toEqual([]);
    expect(JSON.stringify(await readVersion(observer, version))).not.toContain(word);
  });
});
