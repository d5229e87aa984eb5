import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { AddedPerson } from '#shared/contracts/people.js';
import type { SessionState } from '#shared/contracts/session.js';
import { openTestApi, type TestApi } from '#tests/support/api.js';
import { outcomes, reasonOf } from '#tests/support/calendar-api.js';
import { linkOf, openTestPost } from '#tests/support/letters.js';

/** Links and codes that work once, used twice: later, or both at the same moment. */
const post = openTestPost();
let api: TestApi;
beforeAll(async () => {
  api = await openTestApi({ mailer: post });
});
beforeEach(async () => {
  await api.reset();
  post.sent.length = 0;
});
afterAll(() => api.close());

const TALU = 'talu@example.org';
const OFFICER = 'officer@dawnpeg.example';
const TIMES = 6;

async function invite(email = TALU): Promise<{ code: string; path: string }> {
  const steward = await api.signIn('steward');
  const people = `/api/communities/${steward.communityId}/people`;
  const body = { email, displayName: 'Talu', roles: ['observer'] };
  const added = (await steward.post(people, body).expect(201)).body as AddedPerson;
  return { code: added.oneTimeCode ?? '', path: `${people}/${added.person.id}` };
}

async function redeem(code: string, email = TALU, newPassword = 'holes and pegs') {
  return (await api.visitor()).post('/api/session/code', { email, code, newPassword });
}

async function resetTokens(count: number): Promise<string[]> {
  for (let each = 0; each < count; each += 1) {
    await (await api.visitor()).post('/api/letters/reset', { email: OFFICER }).expect(204);
    api.clock.set(new Date(api.clock.now().getTime() + 20 * 60_000));
    await api.app.letters?.run();
  }
  return post.sent.map((letter) => linkOf(letter).split('#token=')[1] ?? '');
}

const reset = async (token: string, newPassword: string) =>
  (await api.visitor()).post('/api/session/reset', { token, newPassword });

describe('a one-time code', () => {
  it('lets one through of many that use it at the same moment, and the password is that one’s', async () => {
    const { code } = await invite();
    const passwords = Array.from({ length: TIMES }, (_, at) => `holes and pegs ${at}`);
    const answers = await Promise.all(passwords.map((password) => redeem(code, TALU, password)));
    expect(outcomes(answers)).toEqual(['200', ...Array<string>(TIMES - 1).fill('422 code-not-valid')]);
    const won = answers.findIndex(({ status }) => status === 200);
    const visitor = await api.visitor();
    await visitor.post('/api/session', { email: TALU, password: passwords[won] }).expect(200);
  });

  it('is worth nothing with another address, nor after the membership has ended', async () => {
    const { code } = await invite();
    expect(reasonOf(await redeem(code, OFFICER))).toBe('422 code-not-valid');
    expect(reasonOf(await redeem(code, 'nobody@example.org'))).toBe('422 code-not-valid');
    const fresh = await invite('oma@example.org');
    const steward = await api.signIn('steward');
    await steward.delete(fresh.path).expect(204);
    const answer = await redeem(fresh.code, 'oma@example.org');
    expect((answer.body as SessionState).memberships ?? []).toEqual([]);
  });
});

describe('the link of a letter', () => {
  it('lets one through of many that use it at the same moment', async () => {
    const [token = ''] = await resetTokens(1);
    const answers = await Promise.all(
      Array.from({ length: TIMES }, (_, at) => reset(token, `a quiet row ${at}`)),
    );
    expect(outcomes(answers)).toEqual(['200', ...Array<string>(TIMES - 1).fill('422 link-not-valid')]);
  });

  it('makes every other void, also when two are used at the same moment', async () => {
    const tokens = await resetTokens(2);
    expect(new Set(tokens).size).toBe(2);
    const answers = await Promise.all(tokens.map((token, at) => reset(token, `a quiet row ${at}`)));
    expect(answers.filter(({ status }) => status === 200)).toHaveLength(1);
  });

  it('begins with the address of the product, whatever host the request named', async () => {
    const visitor = await api.visitor();
    await visitor
      .post('/api/letters/reset', { email: OFFICER })
      .set({ Host: 'evil.example', 'X-Forwarded-Host': 'evil.example', Origin: 'https://evil.example' })
      .expect(204);
    await api.app.letters?.run();
    const [letter] = post.sent;
    expect(linkOf(letter)).toContain('#token=');
    expect(`${letter?.text ?? ''}${letter?.html ?? ''}`).not.toContain('evil.example');
  });
});

describe('a session that has ended', () => {
  it('opens nothing with its old cookie: after signing out, a new password, or its time', async () => {
    const out = await api.signIn('officer');
    const { cookie } = out;
    await out.delete('/api/session').expect(200);
    const visitor = await api.visitor();
    await visitor.get('/api/communities').set('Cookie', cookie).expect(401);
    const late = await api.signIn('officer');
    api.clock.set(new Date(api.clock.now().getTime() + 15 * 24 * 3600_000));
    await late.get('/api/communities').expect(401);
  });
});
