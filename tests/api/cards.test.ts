import { randomUUID } from 'node:crypto';
import { addDays, addMinutes } from 'date-fns';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { MembershipEntity } from '#server/db/entities/membership.entity.js';
import { PersonEntity } from '#server/db/entities/person.entity.js';
import { SessionEntity } from '#server/db/entities/session.entity.js';
import { SignInCardEntity } from '#server/db/entities/sign-in-card.entity.js';
import type { AuditEvent } from '#shared/contracts/audit.js';
import type { CardHolder, MadeCard } from '#shared/contracts/cards.js';
import type { Problem } from '#shared/contracts/problem.js';
import type { Answer } from '#shared/contracts/reviews.js';
import { openTestApi, TEST_NOW, type Client, type TestApi } from '#tests/support/api.js';
import {
  addEntry,
  beginCalendar,
  openVillage,
  says,
  submit,
  versionPath,
} from '#tests/support/calendar-api.js';
import { readPdfText } from '#tests/support/pdf/read-text.js';

const PIN = '4711';
const WRONG = '9025';

let api: TestApi;
let steward: Client;
let elder: Client;
beforeAll(async () => {
  api = await openTestApi();
});
beforeEach(async () => {
  await api.reset();
  [steward, elder] = await Promise.all([api.signIn('steward'), api.signIn('elder2')]);
});
afterAll(() => api.close());

const cardPath = (client: Client, personId: string) =>
  `/api/communities/${client.communityId}/people/${personId}/card`;

async function makeCard(personId = elder.personId): Promise<string> {
  return ((await steward.post(cardPath(steward, personId)).expect(201)).body as MadeCard).code;
}

/** A card with its PIN, in use. */
async function cardInUse(): Promise<{ code: string; client: Client }> {
  const code = await makeCard();
  const client = await api.visitor();
  await client.post('/api/session/card/pin', { code, pin: PIN }).expect(200);
  return { code, client };
}

async function tryPin(code: string, pin: string): Promise<[number, string]> {
  const answer = await (await api.visitor()).post('/api/session/card', { code, pin });
  const { reason, type } = answer.body as Problem;
  return [answer.status, reason ?? type];
}

async function holder(personId = elder.personId): Promise<CardHolder | undefined> {
  const path = `/api/communities/${steward.communityId}/cards`;
  const { items } = (await steward.get(path).expect(200)).body as { items: CardHolder[] };
  return items.find((each) => each.personId === personId);
}

describe('a card', () => {
  it('opens the village to its person once the PIN is chosen; the same code typed with spaces does too', async () => {
    const { code, client } = await cardInUse();
    expect(client.session).toMatchObject({
      person: { id: elder.personId },
      card: { leaveAfterMinutes: 30 },
    });
    await client.get('/api/calendars').expect(200);
    const spaced = code.toLowerCase().replaceAll('-', ' ');
    expect((await tryPin(spaced, PIN))[0]).toBe(200);
    expect((await holder())?.card).toMatchObject({ state: 'in-use', firstUseUntil: null });
  });

  it('is kept as a hash of more than 80 bits, and its PIN as a slow one', async () => {
    const { code } = await cardInUse();
    // 31 letters: log2(31) = 4.95 bits each.
    expect(code.replaceAll('-', '').length * Math.log2(31)).toBeGreaterThan(80);
    const row = await api.dataSource.getRepository(SignInCardEntity).findOneByOrFail({});
    expect(JSON.stringify(row)).not.toContain(code.replaceAll('-', ''));
    expect(row.pinHash).toMatch(/^\$argon2id\$/u);
  });

  it('refuses PINs that anybody guesses, and a second choice', async () => {
    const code = await makeCard();
    const visitor = await api.visitor();
    for (const pin of ['1111', '1234', '654321', '123', '12a4']) {
      await visitor.post('/api/session/card/pin', { code, pin }).expect(422);
    }
    await visitor.post('/api/session/card/pin', { code, pin: PIN }).expect(200);
    const second = await (await api.visitor()).post('/api/session/card/pin', { code, pin: WRONG });
    expect((second.body as Problem).reason).toBe('pin-is-chosen');
    expect((await tryPin(code, PIN))[0]).toBe(200);
  });

  it('that nobody used for two weeks opens nothing: whoever finds it could choose its PIN', async () => {
    const code = await makeCard();
    api.clock.set(addDays(TEST_NOW, 14));
    await (await api.visitor()).post('/api/session/card/open', { code }).expect(422);
    await (await api.visitor()).post('/api/session/card/pin', { code, pin: PIN }).expect(422);
    steward = await api.signIn('steward');
    expect((await holder())?.card?.state).toBe('run-out');
  });

  it('tells nobody whose it is before the PIN', async () => {
    const code = await makeCard();
    const answer = await (await api.visitor()).post('/api/session/card/open', { code }).expect(200);
    expect(answer.body).toEqual({ next: 'choose-pin' });
  });

  it('is refused to whoever holds a role that it is too weak for, and ends when one is given', async () => {
    const officer = await api.signIn('officer');
    const refused = await steward.post(cardPath(steward, officer.personId)).expect(409);
    expect((refused.body as Problem).reason).toBe('card-too-weak');
    const { code, client } = await cardInUse();
    const rows = api.dataSource.getRepository(MembershipEntity);
    const { version } = await rows.findOneByOrFail({ personId: elder.personId });
    const path = `/api/communities/${steward.communityId}/people/${elder.personId}`;
    await steward.put(path, { roles: ['elder', 'officer'], version }).expect(200);
    await client.get('/api/calendars').expect(401);
    expect((await tryPin(code, PIN))[0]).toBe(422);
    expect((await holder())?.card?.endedWhy).toBe('roles');
  });

  it('holds in one village alone, whatever else its person belongs to', async () => {
    const other = await api.signIn('officer2');
    await api.dataSource.getRepository(MembershipEntity).insert({
      id: '0190a3a0-0000-7000-8000-00000000000a',
      ...{ personId: elder.personId, communityId: other.communityId, roles: ['officer'] },
    });
    const { client } = await cardInUse();
    expect(client.session.memberships).toHaveLength(1);
    await client.get(`/api/communities/${other.communityId}/places`).expect(404);
    const { items } = (await client.get('/api/communities').expect(200)).body as { items: unknown[] };
    expect(items).toHaveLength(1);
    await client.get(`/api/calendars?communityId=${other.communityId}`).expect(404);
  });

  it('opens nothing that asks for the password: no new password, no devices, no records', async () => {
    const { client } = await cardInUse();
    const body = { currentPassword: 'whatever it is', newPassword: 'a new one for me' };
    const calls = [
      client.put('/api/session/password', body),
      client.get('/api/session/devices'),
      client.delete('/api/session/devices'),
      client.get(`/api/communities/${client.communityId}/audit`),
    ];
    for (const call of calls) {
      expect(((await call.expect(403)).body as Problem).reason).toBe('needs-password');
    }
  });
});

describe('guessing a PIN', () => {
  it('locks the card after five wrong ones, for a quarter of an hour, also for the right one', async () => {
    const { code } = await cardInUse();
    for (let tries = 0; tries < 5; tries += 1) expect(await tryPin(code, WRONG)).toEqual([401, 'pin-wrong']);
    expect(await tryPin(code, PIN)).toEqual([429, 'card-locked']);
    expect((await holder())?.card?.lockedUntil).toBe(addMinutes(TEST_NOW, 15).toISOString());
    api.clock.set(addMinutes(TEST_NOW, 15));
    expect((await tryPin(code, PIN))[0]).toBe(200);
  });

  it('makes the card void after ten, and the steward reads it', async () => {
    const { code, client } = await cardInUse();
    for (let tries = 0; tries < 10; tries += 1) {
      if (tries === 5) {
        api.clock.set(addMinutes(TEST_NOW, 15));
        api.restart();
      }
      await tryPin(code, WRONG);
    }
    api.restart();
    expect((await tryPin(code, PIN))[0]).toBe(422);
    await client.get('/api/calendars').expect(401);
    steward = await api.signIn('steward');
    expect((await holder())?.card?.endedWhy).toBe('guessed');
    const audit = await steward.get(`/api/communities/${steward.communityId}/audit`).expect(200);
    const [last] = (audit.body as { items: AuditEvent[] }).items;
    expect(last).toMatchObject({ action: 'card-ended', details: { why: 'guessed' } });
  });

  it('counts every one of many tries at once', async () => {
    const { code } = await cardInUse();
    const visitors = await Promise.all(Array.from({ length: 5 }, () => api.visitor()));
    await Promise.all(visitors.map((visitor) => visitor.post('/api/session/card', { code, pin: WRONG })));
    const row = await api.dataSource.getRepository(SignInCardEntity).findOneByOrFail({});
    expect(row.failedTries).toBe(5);
    expect(await tryPin(code, PIN)).toEqual([429, 'card-locked']);
  });

  it('of cards from one address is slowed down, whatever the codes', async () => {
    const visitor = await api.visitor();
    for (let tries = 0; tries < 50; tries += 1) {
      const code = `AAABBBCCCDDDEEEF${tries + 10}`;
      await visitor.post('/api/session/card/open', { code }).expect(422);
    }
    const code = await makeCard();
    await visitor.post('/api/session/card/open', { code }).expect(429);
  });
});

describe('ending a card', () => {
  it('ends its session with the next request, and the code stays void', async () => {
    const { code, client } = await cardInUse();
    await steward.delete(cardPath(steward, elder.personId)).expect(204);
    await client.get('/api/calendars').expect(401);
    expect(await tryPin(code, PIN)).toEqual([422, '/problems/code-not-valid']);
    // The session with the password is another one.
    await elder.get('/api/calendars').expect(200);
  });

  it('holds against a request that writes the session back', async () => {
    const { client } = await cardInUse();
    const rows = api.dataSource.getRepository(SessionEntity);
    const all = await rows.find();
    const own = all.find(({ cardId }) => cardId !== null);
    await steward.delete(cardPath(steward, elder.personId)).expect(204);
    await rows.insert(own ?? {});
    await client.get('/api/calendars').expect(401);
  });

  it('follows from a newer card: one lives at a time', async () => {
    const { code, client } = await cardInUse();
    await Promise.all([makeCard(), makeCard()]);
    await client.get('/api/calendars').expect(401);
    expect((await tryPin(code, PIN))[0]).toBe(422);
    const rows = api.dataSource.getRepository(SignInCardEntity);
    expect(await rows.countBy({ liveFor: elder.personId })).toBe(1);
  });

  it('is open to its owner, and to nobody else but the steward', async () => {
    const { client } = await cardInUse();
    const elder3 = await api.signIn('elder3');
    await elder3.delete(cardPath(elder3, elder.personId)).expect(409);
    const own = (await client.get(`/api/communities/${client.communityId}/cards`).expect(200)).body as {
      items: CardHolder[];
    };
    expect(own.items.map(({ personId }) => personId)).toEqual([elder.personId]);
    await client.delete(cardPath(client, elder.personId)).expect(204);
    await client.get('/api/calendars').expect(401);
  });

  it('comes by itself after so long without use', async () => {
    const { client } = await cardInUse();
    api.clock.set(addMinutes(TEST_NOW, 29));
    await client.get('/api/calendars').expect(200);
    api.clock.set(addMinutes(TEST_NOW, 58));
    await client.get('/api/calendars').expect(200);
    api.clock.set(addMinutes(TEST_NOW, 88));
    await client.get('/api/calendars').expect(401);
  });
});

describe('an elder’s PIN on a helper’s device', () => {
  it('stands instead of a witness, for any member who reviews; the records say so', async () => {
    const village = await openVillage(api);
    const calendar = await beginCalendar(village);
    const entry = await addEntry(village.officer, calendar.id);
    const path = `${versionPath(await submit(village.officer, calendar.id))}/entries/${entry.id}/answer`;
    await cardInUse();
    const word = says({ onBehalfOf: elder.personId, witness: null });
    await village.officer.put(path, word).expect(422);
    await village.elder3.put(path, { ...word, witness: 'Tirel' }).expect(403);
    const wrong = (await village.elder3.put(path, { ...word, pin: WRONG }).expect(422)).body as Problem;
    expect(wrong.errors?.map(({ field, code }) => [field, code])).toEqual([['pin', 'pin-wrong']]);
    const answer = (await village.elder3.put(path, { ...word, pin: PIN }).expect(200)).body as Answer;
    expect(answer).toMatchObject({ elderId: elder.personId, witness: null });
    expect(answer.recordedByName).not.toBeNull();
    const audit = await steward.get(`/api/communities/${steward.communityId}/audit`).expect(200);
    const [last] = (audit.body as { items: AuditEvent[] }).items;
    expect(last).toMatchObject({ action: 'answered-on-behalf', details: { proof: 'pin' } });
  });

  it('is guessed no longer than at the door: the tries count on the same card', async () => {
    const village = await openVillage(api);
    const calendar = await beginCalendar(village);
    const entry = await addEntry(village.officer, calendar.id);
    const path = `${versionPath(await submit(village.officer, calendar.id))}/entries/${entry.id}/answer`;
    const { code } = await cardInUse();
    const word = says({ onBehalfOf: elder.personId, witness: null });
    for (let tries = 0; tries < 5; tries += 1) {
      await village.officer.put(path, { ...word, pin: WRONG }).expect(422);
    }
    await village.officer.put(path, { ...word, pin: PIN }).expect(429);
    expect(await tryPin(code, PIN)).toEqual([429, 'card-locked']);
  });
});

describe('the printed card', () => {
  it('has the letters, the village and the name as wished; another code makes no paper', async () => {
    const code = await makeCard();
    const path = `${cardPath(steward, elder.personId)}/print`;
    for (const size of ['a6', 'a7']) {
      const pdf = await steward.post(path, { code, name: 'Grandmother', size }).responseType('blob');
      expect([pdf.status, pdf.headers['content-type']]).toEqual([200, 'application/pdf']);
      const text = readPdfText(pdf.body as Buffer).replace(/\s+/gu, ' ');
      for (const group of code.split('-')) expect(text).toContain(group);
      expect(text).toContain('Grandmother');
    }
    const wrong = { code: 'AAABBBCCCDDDEEEFFF', name: '', size: 'a7' };
    await steward.post(path, wrong).expect(422);
  });
});

describe('whoever has only a card', () => {
  const leave = (client: Client, proof: object) =>
    client.post('/api/privacy/leaving', { takeBackGiven: false, ...proof });
  const asCardHolder = async () => {
    const observer = await api.signIn('observer');
    await api.dataSource.getRepository(PersonEntity).update(observer.personId, { passwordHash: null });
    const code = await makeCard(observer.personId);
    const client = await api.visitor();
    await client.post('/api/session/card/pin', { code, pin: PIN }).expect(200);
    return { code, client, personId: observer.personId };
  };

  it('takes along what is kept about them', async () => {
    const { client, personId } = await asCardHolder();
    const { text } = await client.get('/api/privacy/own-data').expect(200);
    expect(text).toContain(personId);
  });

  it('leaves for good with the PIN, never with a wrong one or none, and the card opens nothing afterwards', async () => {
    const { code, client, personId } = await asCardHolder();
    expect((await leave(client, {}).expect(422)).body).toMatchObject({ errors: [{ field: 'pin' }] });
    expect((await leave(client, { password: PIN }).expect(422)).body).toMatchObject({
      errors: [{ field: 'pin' }],
    });
    expect((await leave(client, { pin: '9025' }).expect(422)).body).toMatchObject({
      errors: [{ field: 'pin', code: 'pin-wrong' }],
    });
    await leave(client, { pin: PIN }).expect(204);
    expect(await api.dataSource.getRepository(MembershipEntity).countBy({ personId })).toBe(0);
    await client.get('/api/communities').expect(401);
    expect((await tryPin(code, PIN))[0]).toBeGreaterThanOrEqual(400);
  });

  it('does not end their place in a village that the card does not open', async () => {
    const { client, personId } = await asCardHolder();
    const { communityId } = await api.signIn('officer2');
    await api.dataSource
      .getRepository(MembershipEntity)
      .insert({ id: randomUUID(), personId, communityId, roles: ['observer'] });
    const answer = await leave(client, { pin: PIN }).expect(403);
    expect(answer.body).toMatchObject({ reason: 'needs-password' });
  });
});
