import request from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { HttpMethod } from '#shared/contracts/endpoint.js';
import { ENDPOINTS } from '#shared/contracts/index.js';
import type { Problem } from '#shared/contracts/problem.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';

/** Writes that another site, or another person's page, would send with somebody's cookie. */
let api: TestApi;
let officer: Client;
let elder: Client;
beforeAll(async () => {
  api = await openTestApi();
  officer = await api.signIn('officer');
  elder = await api.signIn('elder');
});
afterAll(() => api.close());

const WRITING = ENDPOINTS.filter(({ method }) => method !== 'GET');
const REFUSED = [403, '/problems/csrf-token'];

function send(endpoint: { method: HttpMethod; path: string }, headers: Record<string, string>) {
  const way = endpoint.path
    .replace(/:\w*Id/gu, '0190a3a0-0000-7000-8000-000000000001')
    .replace(':itemType', 'entry')
    .replace(':number', '1');
  const sender = request(api.app.express);
  const method = endpoint.method.toLowerCase() as 'post';
  return sender[method](way).set({ Cookie: officer.cookie, ...headers });
}

const typeOf = (answer: { status: number; body: unknown }) => [answer.status, (answer.body as Problem).type];

describe('a write with somebody’s cookie', () => {
  it.each(WRITING.map((one) => [one.id, one] as const))(
    '%s is refused without a token, with a made-up one, and with the token of another session',
    async (_id, endpoint) => {
      for (const token of [undefined, 'made up', '', elder.session.csrfToken]) {
        const headers: Record<string, string> = token === undefined ? {} : { 'X-CSRF-Token': token };
        const answer =
          endpoint.upload === null
            ? await send(endpoint, headers).send({})
            : await send(endpoint, headers).field('meta', '{}').attach('file', Buffer.from('x'), 'x.png');
        expect([token, ...typeOf(answer)]).toEqual([token, ...REFUSED]);
      }
    },
  );

  it('takes the token from its header alone: not from the address, not from a field of a form', async () => {
    const token = officer.session.csrfToken;
    const { express } = api.app;
    const cookie = { Cookie: officer.cookie };
    const inAddress = await request(express).delete(`/api/session?_csrf=${token}`).set(cookie);
    const inForm = await request(express)
      .post('/api/session')
      .set(cookie)
      .type('form')
      .send({ _csrf: token });
    const inBody = await request(express)
      .post('/api/session')
      .set(cookie)
      .send({ _csrf: token, csrfToken: token });
    for (const answer of [inAddress, inForm, inBody]) expect(typeOf(answer)).toEqual(REFUSED);
  });

  it('is not turned into another method by a header or a field', async () => {
    for (const name of ['X-HTTP-Method-Override', 'X-HTTP-Method', 'X-Method-Override']) {
      await request(api.app.express)
        .get('/api/session')
        .set({ Cookie: officer.cookie, [name]: 'DELETE' })
        .expect(200);
    }
    await officer.get('/api/communities?_method=DELETE').expect(200);
    await officer.get('/api/communities').expect(200);
  });

  it('lets no other site read an answer: no header of ours invites one', async () => {
    const answer = await request(api.app.express)
      .get('/api/session')
      .set({ Cookie: officer.cookie, Origin: 'https://elsewhere.example' });
    expect(Object.keys(answer.headers).filter((name) => name.startsWith('access-control-'))).toEqual([]);
    const asked = await request(api.app.express)
      .options('/api/session')
      .set({ Origin: 'https://elsewhere.example', 'Access-Control-Request-Method': 'DELETE' });
    expect(Object.keys(asked.headers).filter((name) => name.startsWith('access-control-'))).toEqual([]);
  });
});
