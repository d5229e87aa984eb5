import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { MadeCard } from '#shared/contracts/cards.js';
import type { AddedPerson, Community, CommunityPerson } from '#shared/contracts/people.js';
import type { Problem } from '#shared/contracts/problem.js';
import { PIN } from '#tests/support/pin-cards.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';

let api: TestApi;
let steward: Client;
let people: string;
beforeAll(async () => {
  api = await openTestApi();
});
beforeEach(async () => {
  await api.reset();
  steward = await api.signIn('steward');
  people = `/api/communities/${steward.communityId}/people`;
});
afterAll(() => api.close());

const newcomer = { email: 'Talu@example.org', displayName: 'Talu', roles: ['observer'] };

async function add(input: object = newcomer): Promise<AddedPerson> {
  return (await steward.post(people, input).expect(201)).body as AddedPerson;
}
async function find(displayName: string): Promise<CommunityPerson> {
  const { items } = (await steward.get(people).expect(200)).body as { items: CommunityPerson[] };
  const person = items.find((item) => item.displayName === displayName);
  if (!person) throw new Error(`no ${displayName}`);
  return person;
}

describe('adding a person', () => {
  it('shows a one-time code once, with which the person sets a password and is signed in', async () => {
    const { person, oneTimeCode } = await add();
    expect(person).toMatchObject({ email: 'talu@example.org', active: false, roles: ['observer'] });
    expect(oneTimeCode).toMatch(/^[A-Z2-9]{4}-[A-Z2-9]{4}-[A-Z2-9]{4}$/);

    const browser = await api.visitor();
    const typed = (oneTimeCode ?? '').toLowerCase().replaceAll('-', ' ');
    const redeem = { email: newcomer.email, code: typed, newPassword: 'holes and pegs' };
    const answer = await browser.post('/api/session/code', redeem).expect(200);
    expect(answer.body).toMatchObject({
      person: { displayName: 'Talu' },
      memberships: [{ roles: ['observer'] }],
    });
    expect((await find('Talu')).active).toBe(true);
  });

  const redeem = async (code: string | null) =>
    (await api.visitor()).post('/api/session/code', {
      email: newcomer.email,
      code,
      newPassword: 'holes and pegs',
    });

  it('gives a code that works once only', async () => {
    const { oneTimeCode } = await add();
    expect((await redeem(oneTimeCode)).status).toBe(200);
    const again = await redeem(oneTimeCode);
    expect(again.status).toBe(422);
    expect((again.body as Problem).type).toBe('/problems/code-not-valid');
  });

  it('gives a code that works for two weeks only', async () => {
    const { oneTimeCode } = await add();
    api.clock.set(new Date('2026-12-15T06:00:01Z'));
    expect((await redeem(oneTimeCode)).status).toBe(422);
  });

  it('gives a code that is void after ten wrong tries, however slowly they come', async () => {
    const { oneTimeCode } = await add();
    for (let tries = 0; tries < 10; tries += 1) await redeem('ABCD-EFGH-JKMN');
    api.restart();
    expect((await redeem(oneTimeCode)).status).toBe(422);
  });

  it('ends the old code when a new one is made', async () => {
    const { person, oneTimeCode: old } = await add();
    const renewed = (await steward.post(`${people}/${person.id}/code`).expect(201)).body as AddedPerson;
    expect((await redeem(old)).status).toBe(422);
    expect((await redeem(renewed.oneTimeCode)).status).toBe(200);
  });

  it('lets somebody from another village join with the account they have', async () => {
    const { person, oneTimeCode } = await add({
      email: 'officer2@dawnpeg.example',
      displayName: 'Somebody',
      roles: ['officer'],
    });
    expect(oneTimeCode).toBeNull();
    expect(person.displayName).toBe('Lume');
  });

  it('answers 409 for a person who belongs to the village already', async () => {
    const answer = await steward.post(people, { ...newcomer, email: 'officer@dawnpeg.example' });
    expect(answer.status).toBe(409);
    expect((answer.body as Problem).reason).toBe('email-known');
  });
});

describe('a person without an e-mail address', () => {
  const elder = { email: '', displayName: 'Orra', roles: ['elder'] };
  const errorsOf = (answer: { body: unknown }) =>
    (answer.body as Problem).errors?.map(({ field, code }) => `${field}: ${code}`);

  it('is added with a name alone, needs no code, and comes in with a card', async () => {
    const { person, oneTimeCode } = await add(elder);
    expect(person).toMatchObject({ email: '', displayName: 'Orra', active: true });
    expect(oneTimeCode).toBeNull();
    const second = await add({ ...elder, displayName: 'Ulme' });
    expect(second.person.id).not.toBe(person.id);

    const { code } = (await steward.post(`${people}/${person.id}/card`).expect(201)).body as MadeCard;
    const phone = await api.visitor();
    const answer = await phone.post('/api/session/card/pin', { code, pin: PIN }).expect(200);
    expect(answer.body).toMatchObject({ person: { displayName: 'Orra', email: '' } });
    await phone.get(people).expect(200);
  });

  it.each(['officer', 'steward', 'staff'])('is no %s: that role signs in with a password', async (role) => {
    const refused = await steward.post(people, { ...elder, roles: ['elder', role] }).expect(422);
    expect(errorsOf(refused)).toEqual(['email: address-needed']);
    const { person } = await add(elder);
    const later = { roles: [role], version: person.version };
    expect(errorsOf(await steward.put(`${people}/${person.id}`, later).expect(422))).toEqual([
      'email: address-needed',
    ]);
  });

  it('can be given an address later, though not one that somebody has', async () => {
    const { person } = await add(elder);
    const roles = { roles: ['officer'], version: person.version };
    const taken = { ...roles, email: 'officer2@dawnpeg.example' };
    expect(errorsOf(await steward.put(`${people}/${person.id}`, taken).expect(422))).toEqual([
      'email: address-taken',
    ]);
    await steward.put(`${people}/${person.id}`, { ...roles, email: 'Orra@example.org' }).expect(200);
    expect(await find('Orra')).toMatchObject({ email: 'orra@example.org', active: false });
    await steward.post(`${people}/${person.id}/code`).expect(201);
  });

  it('keeps the address that is there: nobody is given another one', async () => {
    const { id, version, email } = await find('Irvel');
    await steward.put(`${people}/${id}`, { roles: ['staff'], version, email: 'x@example.org' }).expect(200);
    expect((await find('Irvel')).email).toBe(email);
  });

  it('gets no code', async () => {
    const { person } = await add(elder);
    const code = await steward.post(`${people}/${person.id}/code`).expect(409);
    expect((code.body as Problem).reason).toBe('no-address');
  });

  it('comes back as who they were, into the village that they left and into no other', async () => {
    const { person } = await add(elder);
    const back = { ...elder, personId: person.id };
    await steward.delete(`${people}/${person.id}`).expect(204);
    const other = await api.signIn('steward2');
    await other.post(`/api/communities/${other.communityId}/people`, back).expect(404);
    expect((await add(back)).person.id).toBe(person.id);
  });
});

describe('roles', () => {
  it('count from the next request on', async () => {
    const staff = await api.signIn('staff');
    await staff.get(people).expect(403);
    const { id, version } = await find('Irvel');
    await steward.put(`${people}/${id}`, { roles: ['staff', 'officer'], version }).expect(200);
    await staff.get(people).expect(200);
  });

  it('answers 409 with both states to a save over a newer one', async () => {
    const { id, version } = await find('Irvel');
    await steward.put(`${people}/${id}`, { roles: ['staff', 'observer'], version }).expect(200);
    const answer = await steward.put(`${people}/${id}`, { roles: ['officer'], version });
    expect(answer.status).toBe(409);
    expect(answer.body).toMatchObject({
      type: '/problems/stale',
      current: { roles: ['staff', 'observer'] },
      sent: { roles: ['officer'] },
    });
  });

  it('never leave a village without a steward, nor its rule without the elder it names', async () => {
    const ostrel = await find('Ostrel');
    const last = await steward.put(`${people}/${ostrel.id}`, { roles: ['staff'], version: ostrel.version });
    expect((last.body as Problem).reason).toBe('last-steward');
    const elder = await find('Elder A-2');
    const named = await steward.delete(`${people}/${elder.id}`);
    expect((named.body as Problem).reason).toBe('named-in-rule');
  });

  it('end with the membership, and what belonged to the village with them', async () => {
    const staff = await api.signIn('staff');
    const { id } = await find('Irvel');
    await steward.delete(`${people}/${id}`).expect(204);
    await staff.get(`/api/communities/${steward.communityId}`).expect(404);
  });

  it('decide who sees e-mail addresses', async () => {
    const officer = await api.signIn('officer');
    const { items } = (await officer.get(people).expect(200)).body as { items: CommunityPerson[] };
    expect(items.map((person) => person.email)).toEqual(items.map(() => ''));
  });
});

describe('settings', () => {
  it('are saved by the steward, and a stale save answers 409 with both states', async () => {
    const path = `/api/communities/${steward.communityId}`;
    const { id: _id, ...settings } = (await steward.get(path)).body as Community;
    const saved = (await steward.put(path, { ...settings, weatherContact: 'Call 111' }).expect(200))
      .body as Community;
    expect(saved).toMatchObject({ weatherContact: 'Call 111', version: settings.version + 1 });
    const late = await steward.put(path, { ...settings, weatherContact: 'Call 222' });
    expect(late.status).toBe(409);
    expect((late.body as Problem).current).toMatchObject({ weatherContact: 'Call 111' });
  });

  it('hold names of months in the order of the village’s year, and say which of them cannot be', async () => {
    const path = `/api/communities/${steward.communityId}`;
    const { id: _id, ...settings } = (await steward.get(path)).body as Community;
    const begins = (name: string, month: number, day: number) => ({ name, begins: { month, day } });
    const withMonths = (...localMonths: object[]) => ({ ...settings, localMonths });
    const unnamed = await steward.put(path, withMonths(begins('Wet', 6, 8), begins('', 3, 1)));
    expect((unnamed.body as Problem).errors).toMatchObject([
      { field: 'localMonths.1.name', code: 'required' },
    ]);
    const oneDay = await steward.put(path, withMonths(begins('Wet', 6, 8), begins('Dry', 6, 8)));
    expect(oneDay.status).toBe(422);
    expect((oneDay.body as Problem).errors).toMatchObject([
      { field: 'localMonths.1.begins', code: 'day-taken' },
    ]);

    const moonNames = settings.moonNames.map((_, index) => (index === 12 ? ' Late ' : ''));
    const sent = { ...withMonths(begins('Hot', 3, 1), begins('Wet', 6, 8), begins('Dry', 11, 2)), moonNames };
    await steward.put(path, sent).expect(200);
    const saved = (await steward.get(path).expect(200)).body as Community;
    expect(saved.localMonths.map(({ name }) => name)).toEqual(['Wet', 'Dry', 'Hot']);
    expect(saved.moonNames[12]).toBe('Late');
  });

  it('name only elders of the village in the sign-off rule, and ask for no more than there are', async () => {
    const path = `/api/communities/${steward.communityId}`;
    const { id: _id, ...settings } = (await steward.get(path)).body as Community;
    const withRule = (rule: object) => ({ ...settings, signOffRule: { ...settings.signOffRule, ...rule } });
    const stranger = await steward.put(path, withRule({ mustSign: [steward.personId] }));
    expect((stranger.body as Problem).reason).toBe('members-missing');
    const tooMany = await steward.put(path, withRule({ minElders: 4 }));
    expect((tooMany.body as Problem).reason).toBe('rule-impossible');
  });
});
