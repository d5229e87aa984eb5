import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { CommunityEntity } from '#server/db/entities/community.entity.js';
import { LetterEntity } from '#server/db/entities/letter.entity.js';
import { OneTimeCodeEntity } from '#server/db/entities/one-time-code.entity.js';
import { PersonEntity } from '#server/db/entities/person.entity.js';
import { DEMO_PASSWORD } from '#server/features/demo/demo-villages.data.js';
import { startDevInbox } from '#server/mail/dev-inbox.js';
import type { DevInbox } from '#server/mail/inbox.js';
import { createSmtpMailer } from '#server/mail/smtp-mailer.js';
import type { AddedPerson } from '#shared/contracts/people.js';
import type { Problem } from '#shared/contracts/problem.js';
import { openTestApi, TEST_NOW, type Client, type TestApi } from '#tests/support/api.js';
import { linkOf } from '#tests/support/letters.js';

/** Letters through a real SMTP server and out of its inbox. */
let api: TestApi;
let inbox: DevInbox;
let seen = 0;
beforeAll(async () => {
  inbox = await startDevInbox(0);
  api = await openTestApi({
    mailer: createSmtpMailer({ url: inbox.smtpUrl, from: 'letters@dawnpeg.example' }),
  });
});
beforeEach(async () => {
  await api.reset();
  seen = inbox.letters().length;
});
afterAll(async () => {
  await api.close();
  await inbox.close();
});

const OFFICER = 'officer@dawnpeg.example';
const round = () => api.app.letters?.run();
const arrived = () => inbox.letters().slice(0, inbox.letters().length - seen);
const typeOf = (answer: { body: unknown }) => (answer.body as Problem).type;
const minutesLater = (minutes: number) => {
  api.clock.set(new Date(TEST_NOW.getTime() + minutes * 60_000));
};

async function invite(): Promise<{ steward: Client; personId: string; path: string }> {
  const steward = await api.signIn('steward');
  const people = `/api/communities/${steward.communityId}/people`;
  const body = { email: 'talu@example.org', displayName: 'Talu', roles: ['observer'] };
  const { person } = (await steward.post(people, body).expect(201)).body as AddedPerson;
  const path = `${people}/${person.id}/invitation`;
  await steward.post(path).expect(204);
  return { steward, personId: person.id, path };
}

async function redeem(link: string, email = 'talu@example.org') {
  const code = decodeURIComponent(link.split('#code=')[1] ?? '');
  const body = { email, code, newPassword: 'holes and pegs' };
  return (await api.visitor()).post('/api/session/code', body);
}

async function askForReset(email: string) {
  return (await api.visitor()).post('/api/letters/reset', { email });
}

async function reset(link: string, newPassword = 'a quiet row of holes') {
  const token = link.split('#token=')[1] ?? '';
  return (await api.visitor()).post('/api/session/reset', { token, newPassword });
}

describe('an invitation by e-mail', () => {
  it('carries a link with which the person chooses a password and is in', async () => {
    await invite();
    await round();
    const [letter] = arrived();
    expect(letter?.recipients).toEqual(['talu@example.org']);
    expect(letter?.subject).toBe('You are invited to Upper Tazimel');
    expect((await redeem(linkOf(letter))).body).toMatchObject({ memberships: [{ roles: ['observer'] }] });
  });

  it('works once, for two weeks, and only until the next one', async () => {
    const { steward, path } = await invite();
    await round();
    const first = linkOf(arrived()[0]);
    await steward.post(path).expect(204);
    await round();
    const second = linkOf(arrived()[0]);
    expect(second).not.toBe(first);
    expect(typeOf(await redeem(first))).toBe('/problems/code-not-valid');
    api.clock.set(new Date(TEST_NOW.getTime() + 15 * 86_400_000));
    expect(typeOf(await redeem(second))).toBe('/problems/code-not-valid');
    api.clock.set(TEST_NOW);
    expect((await redeem(second)).status).toBe(200);
    expect(typeOf(await redeem(second))).toBe('/problems/code-not-valid');
    expect((await steward.post(path)).body).toMatchObject({ reason: 'already-active' });
  });

  it('is of no use to somebody with another address, and not sent once its code is void', async () => {
    const { steward, path } = await invite();
    await steward.post(path.replace('/invitation', '/code')).expect(201);
    await round();
    expect(arrived()).toEqual([]);
    await steward.post(path).expect(204);
    await round();
    expect(typeOf(await redeem(linkOf(arrived()[0]), OFFICER))).toBe('/problems/code-not-valid');
  });

  it('leaves no secret in the outbox: what the table holds is not in the link', async () => {
    await invite();
    await round();
    const code = decodeURIComponent(linkOf(arrived()[0]).split('#code=')[1] ?? '').replaceAll('-', '');
    const rows = [
      ...(await api.dataSource.getRepository(LetterEntity).find()),
      ...(await api.dataSource.getRepository(OneTimeCodeEntity).find()),
    ];
    expect(code).toHaveLength(12);
    expect(JSON.stringify(rows)).not.toContain(code);
  });
});

describe('a forgotten password', () => {
  it('is replaced with the link of a letter; all devices but this one are signed out', async () => {
    const elsewhere = await api.signIn('officer');
    await askForReset(' Officer@Dawnpeg.example ');
    await round();
    const letter = arrived()[0];
    expect(letter?.recipients).toEqual([OFFICER]);
    const answer = await reset(linkOf(letter));
    expect(answer.body).toMatchObject({ person: { email: OFFICER } });
    await elsewhere.get('/api/communities').expect(401);
    const visitor = await api.visitor();
    await visitor.post('/api/session', { email: OFFICER, password: DEMO_PASSWORD }).expect(401);
    await visitor.post('/api/session', { email: OFFICER, password: 'a quiet row of holes' }).expect(200);
  });

  it('has a link that works once, for two hours, and not when a letter of it is changed', async () => {
    await askForReset(OFFICER);
    await round();
    const link = linkOf(arrived()[0]);
    const changed = link.replace(/.$/u, (last) => (last === 'A' ? 'B' : 'A'));
    expect(typeOf(await reset(changed))).toBe('/problems/link-not-valid');
    minutesLater(121);
    expect(typeOf(await reset(link))).toBe('/problems/link-not-valid');
    minutesLater(60);
    expect((await reset(link, 'short')).status).toBe(422);
    expect((await reset(link)).status).toBe(200);
    expect(typeOf(await reset(link))).toBe('/problems/link-not-valid');
  });

  it('makes every other link of the person void', async () => {
    await askForReset(OFFICER);
    minutesLater(6);
    await askForReset(OFFICER);
    await round();
    const [second, first] = arrived();
    expect((await reset(linkOf(second))).status).toBe(200);
    expect(typeOf(await reset(linkOf(first)))).toBe('/problems/link-not-valid');
  });

  it('tells nobody who has an account: same answer, same row, and nothing is kept of a stranger', async () => {
    const answers = [await askForReset(OFFICER), await askForReset('nobody@example.org')];
    expect(answers.map(({ status, text }) => [status, text])).toEqual([
      [204, ''],
      [204, ''],
    ]);
    const letters = api.dataSource.getRepository(LetterEntity);
    const shape = ({ kind, personId, communityId, state, nextAt }: LetterEntity) => [
      kind,
      personId,
      communityId,
      state,
      nextAt,
    ];
    const [a, b] = await letters.find();
    expect(a && shape(a)).toEqual(b && shape(b));
    await round();
    expect(arrived().map(({ recipients }) => recipients)).toEqual([[OFFICER]]);
    expect((await letters.find()).map(({ email }) => email)).toEqual([null, null]);
  });

  it('sends one letter however often it is asked for, and then asks for patience', async () => {
    for (let times = 0; times < 5; times += 1) expect((await askForReset(OFFICER)).status).toBe(204);
    expect((await askForReset(OFFICER)).status).toBe(429);
    for (let times = 0; times < 5; times += 1) expect((await askForReset('x@example.org')).status).toBe(204);
    expect((await askForReset('x@example.org')).status).toBe(429);
    await round();
    expect(arrived()).toHaveLength(1);
  });
});

describe('names and addresses', () => {
  it('begin no header and reach nobody else, whatever stands in them', async () => {
    const evil = 'Ala\r\nBcc: thief@example.org\r\n\r\n<b>x</b>';
    await api.dataSource.getRepository(PersonEntity).update({ email: OFFICER }, { displayName: evil });
    await api.dataSource
      .getRepository(CommunityEntity)
      .update({ name: 'Upper Tazimel' }, { name: 'V\r\nX-Evil: 1 <i>' });
    await askForReset(OFFICER);
    await invite();
    await round();
    const letters = arrived();
    expect(letters.map(({ recipients }) => recipients).sort()).toEqual([[OFFICER], ['talu@example.org']]);
    expect(letters.flatMap(({ headerNames }) => headerNames)).not.toContain('bcc');
    expect(letters.flatMap(({ headerNames }) => headerNames)).not.toContain('x-evil');
    for (const { html } of letters) expect(html).not.toMatch(/<(b|i)>/u);
  });

  it('of another form are refused before anything is written', async () => {
    for (const email of [
      'a@example.org,b@example.org',
      'a@example.org\r\nBcc: b@example.org',
      '<a@example.org>',
    ]) {
      expect((await askForReset(email)).status).toBe(422);
    }
    expect(await api.dataSource.getRepository(LetterEntity).count()).toBe(0);
  });
});

describe('without a mail server', () => {
  it('the product says that letters are off, and codes on paper remain', async () => {
    const quiet = await openTestApi();
    const steward = await quiet.signIn('steward');
    const people = `/api/communities/${steward.communityId}/people`;
    const body = { email: 'talu@example.org', displayName: 'Talu', roles: ['observer'] };
    const { person, oneTimeCode } = (await steward.post(people, body).expect(201)).body as AddedPerson;
    expect(oneTimeCode).not.toBeNull();
    expect((await steward.post(`${people}/${person.id}/invitation`)).body).toMatchObject({
      reason: 'letters-off',
    });
    expect((await steward.get('/api/letters')).body).toEqual({ on: false });
    await steward.post('/api/letters/reset', { email: OFFICER }).expect(204);
    expect(quiet.app.letters).toBeNull();
    await steward.get('/dev/letters').expect(404);
    await quiet.close();
  });
});
