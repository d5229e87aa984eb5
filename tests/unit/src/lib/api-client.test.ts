import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { placesEndpoints } from '#shared/contracts/places.js';
import { sessionEndpoints } from '#shared/contracts/session.js';
import { starsEndpoints } from '#shared/contracts/stars.js';
import { apiUrl, callApi } from '#src/lib/api-client.js';
import { ApiProblem } from '#src/lib/api-problem.js';
import { keepCsrfToken } from '#src/lib/csrf.js';

const COMMUNITY = '0190a3a0-0000-7000-8000-0000000000a1';
const visitor = { person: null, memberships: null, card: null, csrfToken: 'fresh' };
const signIn = { body: { email: 'a@dawnpeg.example', password: 'x' } };

interface Call {
  url: string;
  method: string;
  token: string | null;
  body: unknown;
}
let calls: Call[];
let answers: (() => Response)[];

beforeEach(() => {
  calls = [];
  answers = [];
  keepCsrfToken('kept');
  vi.stubGlobal('fetch', (url: string, init: RequestInit) => {
    const headers = new Headers(init.headers);
    const body = typeof init.body === 'string' ? (JSON.parse(init.body) as unknown) : undefined;
    calls.push({ url, method: init.method ?? 'GET', token: headers.get('X-CSRF-Token'), body });
    const answer = answers.shift();
    return answer ? Promise.resolve(answer()) : Promise.reject(new TypeError('Failed to fetch'));
  });
});
afterEach(() => {
  vi.unstubAllGlobals();
});

function json(body: unknown): () => Response {
  return () => Response.json(body);
}

function refusal(slug: string, status: number, more: object = {}): () => Response {
  return () =>
    new Response(JSON.stringify({ type: `/problems/${slug}`, title: slug, status, detail: 'why', ...more }), {
      status,
      headers: { 'Content-Type': 'application/problem+json; charset=utf-8', 'Retry-After': '90' },
    });
}

async function problemOf(call: Promise<unknown>): Promise<ApiProblem> {
  const cause: unknown = await call.then(
    () => undefined,
    (thrown: unknown) => thrown,
  );
  if (!(cause instanceof ApiProblem)) throw new Error('no ApiProblem was thrown');
  return cause;
}

describe('a call', () => {
  it('fills in parameters and query and parses the answer', async () => {
    answers.push(json({ items: [], nextCursor: null }));
    const list = await callApi(placesEndpoints.list, { params: { communityId: COMMUNITY } });
    expect(list).toEqual({ items: [], nextCursor: null });
    expect(calls[0]?.url).toBe(`/api/communities/${COMMUNITY}/places`);
    expect(apiUrl(starsEndpoints.csv, { params: { placeId: COMMUNITY }, query: { year: -43 } })).toBe(
      `/api/places/${COMMUNITY}/stars.csv?year=-43`,
    );
  });

  it('reads without a token and writes with it', async () => {
    answers.push(json(visitor), json(visitor));
    await callApi(sessionEndpoints.read, {});
    await callApi(sessionEndpoints.signIn, signIn);
    expect(calls.map(({ method, token }) => [method, token])).toEqual([
      ['GET', null],
      ['POST', 'kept'],
    ]);
    expect(calls[1]?.body).toEqual(signIn.body);
  });

  it('takes a new token and tries once more when the old one has died with its session', async () => {
    answers.push(refusal('csrf-token', 403), json(visitor), json(visitor));
    await callApi(sessionEndpoints.signIn, signIn);
    expect(calls.map(({ method, token }) => [method, token])).toEqual([
      ['POST', 'kept'],
      ['GET', null],
      ['POST', 'fresh'],
    ]);
  });

  it('does not go on trying when the new token is refused as well', async () => {
    answers.push(refusal('csrf-token', 403), json(visitor), refusal('csrf-token', 403));
    expect((await problemOf(callApi(sessionEndpoints.signIn, signIn))).slug).toBe('csrf-token');
    expect(calls).toHaveLength(3);
  });
});

describe('a refusal', () => {
  it('carries its type, its fields and how long to wait', async () => {
    const errors = [{ field: 'email', code: 'not-an-email', message: 'Write a whole address.' }];
    answers.push(refusal('invalid-input', 422, { errors, requestId: 'r-1' }));
    const problem = await problemOf(callApi(sessionEndpoints.signIn, signIn));
    expect(problem).toMatchObject({
      slug: 'invalid-input',
      status: 422,
      errors,
      requestId: 'r-1',
      retryAfterS: 90,
    });
  });

  it('with both states lets a screen show both texts', async () => {
    answers.push(refusal('stale', 409, { current: { name: 'theirs' }, sent: { name: 'mine' } }));
    const problem = await problemOf(callApi(sessionEndpoints.signIn, signIn));
    expect(problem).toMatchObject({ slug: 'stale', current: { name: 'theirs' }, sent: { name: 'mine' } });
  });

  it('by something between us and the server is unreadable, not a crash', async () => {
    answers.push(
      () => new Response('<h1>Bad gateway</h1>', { status: 502, headers: { 'Content-Type': 'text/html' } }),
    );
    expect(await problemOf(callApi(sessionEndpoints.read, {}))).toMatchObject({
      slug: 'unreadable',
      status: 502,
    });
  });

  it('for want of a network says so', async () => {
    expect(await problemOf(callApi(sessionEndpoints.read, {}))).toMatchObject({ slug: 'offline', status: 0 });
  });

  it('is also an answer in another shape', async () => {
    answers.push(json({ person: 'somebody' }));
    expect((await problemOf(callApi(sessionEndpoints.read, {}))).slug).toBe('unreadable');
  });
});
