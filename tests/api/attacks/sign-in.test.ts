import { afterAll, beforeAll, beforeEach, describe, expect, it, vi } from 'vitest';
import { PersonEntity } from '#server/db/entities/person.entity.js';
import { DEMO_PASSWORD } from '#server/features/demo/demo-villages.data.js';
import { hasher } from '#server/features/session/passwords.service.js';
import type { Problem } from '#shared/contracts/problem.js';
import { openTestApi, type TestApi } from '#tests/support/api.js';

/** Guessing at the door. What takes the time there is one check of a password hash: it is counted, no clock is read. */
const verify = vi.spyOn(hasher, 'verify');

let api: TestApi;
beforeAll(async () => {
  api = await openTestApi();
});
beforeEach(async () => {
  await api.reset();
  verify.mockClear();
});
afterAll(async () => {
  verify.mockRestore();
  await api.close();
});

const OFFICER = 'officer@dawnpeg.example';

async function tryToSignIn(email: string, password = 'wrong') {
  const visitor = await api.visitor();
  return visitor.post('/api/session', { email, password });
}

describe('the time of a sign-in', () => {
  it.each([
    ['with a wrong password', OFFICER],
    ['to an account that there is not', 'nobody@example.org'],
    ['to an account that has no password yet', 'invited@example.org'],
  ])('is that of exactly one checked hash, %s', async (_case, email) => {
    await api.dataSource.getRepository(PersonEntity).insert({
      ...{ id: '0190a3a0-0000-7000-8000-0000000000e1', email: 'invited@example.org', displayName: 'Invited' },
      ...{ passwordHash: null, isDemo: false, createdAt: api.clock.now() },
    });
    const answer = await tryToSignIn(email);
    expect([answer.status, (answer.body as Problem).type]).toEqual([401, '/problems/wrong-credentials']);
    expect(verify).toHaveBeenCalledTimes(1);
  });

  it('is spent on a hash of the same strength for strangers, so that neither answer comes sooner', async () => {
    await tryToSignIn(OFFICER);
    await tryToSignIn('nobody@example.org');
    const [known, stranger] = vi
      .mocked(verify)
      .mock.calls.map(([hash]) => String(hash).split('$').slice(1, 4));
    expect(stranger).toEqual(known);
    expect(known?.[0]).toBe('argon2id');
  });

  it('tells nothing in words either: the answers are the same letter for letter', async () => {
    const answers = [await tryToSignIn(OFFICER), await tryToSignIn('nobody@example.org')];
    const [known, stranger] = answers.map(({ body }) => ({ ...(body as Problem), requestId: '' }));
    expect(stranger).toEqual(known);
  });
});

describe('tries on one account', () => {
  it('count together however the address is written, and from every browser', async () => {
    const spellings = [
      OFFICER,
      ' officer@dawnpeg.example',
      'OFFICER@dawnpeg.example',
      'Officer@Dawnpeg.Example',
    ];
    for (let tries = 0; tries < 10; tries += 1) await tryToSignIn(spellings[tries % 4] ?? OFFICER);
    const answer = await tryToSignIn(OFFICER, DEMO_PASSWORD);
    expect([answer.status, Number(answer.headers['retry-after']) > 0]).toEqual([429, true]);
    expect(verify).toHaveBeenCalledTimes(10);
  });

  it('leave every other account open', async () => {
    for (let tries = 0; tries < 11; tries += 1) await tryToSignIn(OFFICER);
    expect((await tryToSignIn('elder@dawnpeg.example', DEMO_PASSWORD)).status).toBe(200);
  });
});

describe('tries from one address', () => {
  it('are counted by the connection, not by what the request says about itself', async () => {
    const statuses = new Set<number>();
    for (let tries = 0; tries < 52; tries += 1) {
      const visitor = await api.visitor();
      const body = { email: `nobody${tries}@example.org`, password: 'wrong' };
      const asked = visitor.post('/api/session', body).set('X-Forwarded-For', `203.0.113.${tries}`);
      statuses.add((await asked.set('Forwarded', `for=203.0.113.${tries}`)).status);
    }
    expect([...statuses]).toEqual([401, 429]);
  });
});
