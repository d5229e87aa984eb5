import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { SessionEntity } from '#server/db/entities/session.entity.js';
import { removeExpiredSessions } from '#server/features/session/end-sessions.service.js';
import type { Problem } from '#shared/contracts/problem.js';
import { openTestApi, type TestApi } from '#tests/support/api.js';

let api: TestApi;
beforeAll(async () => {
  api = await openTestApi();
});
beforeEach(() => api.reset());
afterAll(() => api.close());

const officer = { email: 'officer@dawnpeg.example', password: 'limewash-and-pegs' };

describe('GET /api/session', () => {
  it('answers nobody and a token to a visitor', async () => {
    const visitor = await api.visitor();
    expect(visitor.session).toEqual({
      person: null,
      memberships: null,
      card: null,
      csrfToken: expect.any(String) as string,
    });
  });

  it('answers the person and their memberships after signing in', async () => {
    const client = await api.signIn('officer');
    const answer = await client.get('/api/session').expect(200);
    expect(answer.body).toMatchObject({
      person: { email: officer.email, displayName: 'Beyno' },
      memberships: [{ communityName: 'Upper Tazimel', roles: ['officer'] }],
    });
  });
});

describe('POST /api/session', () => {
  it('gives the session a new id, so an id from before opens nothing', async () => {
    const client = await api.visitor();
    const before = await client.get('/api/session');
    const after = await client.post('/api/session', officer);
    expect(cookieOf(after)).not.toBe('');
    expect(cookieOf(after)).not.toBe(cookieOf(before));
  });

  it('sets a cookie that scripts and other sites cannot use', async () => {
    const answer = await (await api.visitor()).post('/api/session', officer);
    expect(String(answer.headers['set-cookie'])).toMatch(/HttpOnly; SameSite=Lax/);
  });

  it('keeps no session id in the table that a thief could use', async () => {
    const answer = await (await api.visitor()).post('/api/session', officer);
    const rows = await api.dataSource.getRepository(SessionEntity).find();
    const sid = decodeURIComponent(cookieOf(answer)).slice(2).split('.')[0] ?? '?';
    expect(rows.map((row) => row.sidHash)).not.toContain(sid);
  });

  it.each([
    ['a wrong password', { ...officer, password: 'limewash-and-peg' }],
    ['an unknown address', { ...officer, email: 'nobody@dawnpeg.example' }],
    ['a person without a password yet', { ...officer, email: 'elder-b3@dawnpeg.example' }],
  ])('answers the same 401 for %s', async (_what, input) => {
    const answer = await (await api.visitor()).post('/api/session', input);
    expect(answer.status).toBe(401);
    expect(answer.type).toBe('application/problem+json');
    expect((answer.body as Problem).type).toBe('/problems/wrong-credentials');
  });

  it('answers 422 with one entry per bad field', async () => {
    const answer = await (await api.visitor()).post('/api/session', { email: 'x', password: '', more: 1 });
    expect(answer.status).toBe(422);
    expect((answer.body as Problem).errors?.map(({ field, code }) => [field, code])).toEqual([
      ['email', 'not-an-email'],
      ['password', 'required'],
      ['more', 'not-expected'],
    ]);
  });

  it('answers 429 after ten failed tries on one account, also to the right password', async () => {
    const client = await api.visitor();
    for (let tries = 0; tries < 10; tries += 1) {
      await client.post('/api/session', { ...officer, password: 'wrong' }).expect(401);
    }
    await client.post('/api/session', officer).expect(429);
    await client.post('/api/session', { ...officer, email: 'staff@dawnpeg.example' }).expect(200);
  });
});

describe('the token', () => {
  it('is asked for on every write', async () => {
    const client = await api.signIn('officer');
    client.session = { ...client.session, csrfToken: 'made up' };
    const answer = await client.delete('/api/session');
    expect(answer.status).toBe(403);
    expect((answer.body as Problem).type).toBe('/problems/csrf-token');
  });

  it('of before the sign-in is worth nothing after it', async () => {
    const client = await api.visitor();
    const old = client.session.csrfToken;
    await client.post('/api/session', officer).expect(200);
    client.session = { ...client.session, csrfToken: old };
    await client.delete('/api/session').expect(403);
  });
});

describe('DELETE /api/session', () => {
  it('ends the session', async () => {
    const client = await api.signIn('officer');
    await client.delete('/api/session').expect(200);
    await client.get('/api/communities').expect(401);
  });
});

describe('PUT /api/session/password', () => {
  const change = { currentPassword: officer.password, newPassword: 'a quiet row of holes' };

  it('changes the password and signs the other devices out', async () => {
    const here = await api.signIn('officer');
    const elsewhere = await api.signIn('officer');
    await here.put('/api/session/password', change).expect(200);
    await here.get('/api/communities').expect(200);
    await elsewhere.get('/api/communities').expect(401);
    const fresh = await api.visitor();
    await fresh.post('/api/session', officer).expect(401);
    await fresh.post('/api/session', { ...officer, password: change.newPassword }).expect(200);
  });

  it('names the field when the present password is wrong or the new one short', async () => {
    const client = await api.signIn('officer');
    const wrong = await client.put('/api/session/password', { ...change, currentPassword: 'no' });
    expect((wrong.body as Problem).errors?.[0]).toMatchObject({
      field: 'currentPassword',
      code: 'wrong-current-password',
    });
    const short = await client.put('/api/session/password', { ...change, newPassword: 'eleven sign' });
    expect((short.body as Problem).errors?.[0]).toMatchObject({
      field: 'newPassword',
      code: 'password-too-short',
    });
  });
});

function cookieOf(answer: { headers: Record<string, unknown> }): string {
  return /dawnpeg\.session=([^;]+)/.exec(String(answer.headers['set-cookie']))?.[1] ?? '';
}

describe('old sessions', () => {
  it('are taken away once their time is over, and no others', async () => {
    const client = await api.signIn('officer');
    await removeExpiredSessions(api.dataSource.manager, new Date('2026-12-15T05:59:59Z'));
    await client.get('/api/communities').expect(200);
    await removeExpiredSessions(api.dataSource.manager, new Date('2026-12-15T06:00:01Z'));
    expect(await api.dataSource.getRepository(SessionEntity).count()).toBe(0);
  });
});
