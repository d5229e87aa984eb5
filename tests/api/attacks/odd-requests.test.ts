import request from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { ENDPOINTS } from '#shared/contracts/index.js';
import type { Problem } from '#shared/contracts/problem.js';
import { DEMO_PASSWORD } from '#server/features/demo/demo-villages.data.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import { READING } from '#tests/support/every-endpoint.js';
import { entryInput, reasonOf } from '#tests/support/calendar-api.js';
import { fillPath } from '#shared/contracts/endpoint.js';
import { membersOf, sampleOf } from '#tests/support/sample-of-schema.js';
import { openTwoVillages, type TwoVillages } from '#tests/support/two-villages.js';

/** Requests that no browser of ours sends: too much, too deep, with keys and headers meant for something else. */
let api: TestApi;
let two: TwoVillages;
let officer: Client;
beforeAll(async () => {
  api = await openTestApi();
  two = await openTwoVillages(api);
  ({ officer } = two.village);
});
afterAll(() => api.close());

const own = (path: string) =>
  fillPath(path, {
    ...two.home,
    ...{ itemType: 'entry', itemId: two.home.entryId, markerKey: 'pleiades', number: '1', part: '1' },
    ...{ deviceId: '0'.repeat(64), withdrawalId: two.home.entryId },
  });
const typeOf = (answer: { status: number; body: unknown }) =>
  `${answer.status} ${(answer.body as Problem).type}`;
const WRITING = ENDPOINTS.filter(({ body, upload }) => body !== undefined && upload === null);

describe('a body that is too much', () => {
  it.each(WRITING.map((one) => [one.id, one] as const))(
    '%s refuses more than a megabyte',
    async (_id, { method, path }) => {
      const client = officer;
      const body = { text: 'x'.repeat(1_100_000) };
      const answer = await (method === 'PUT' ? client.put(own(path), body) : client.post(own(path), body));
      expect(typeOf(answer)).toBe('413 /problems/too-large');
    },
  );

  it('is refused by its announced length too, and packed small or not', async () => {
    const path = `/api/communities/${two.home.communityId}/places`;
    const packed = officer.post(path).set('Content-Encoding', 'gzip').set('Content-Type', 'application/json');
    const { gzipSync } = await import('node:zlib');
    const bomb = gzipSync(Buffer.from(`{"name":"${'x'.repeat(20_000_000)}"}`));
    expect(bomb.length).toBeLessThan(100_000);
    const answer = await packed.serialize((raw: unknown) => raw as string).send(bomb as never);
    expect(typeOf(answer)).toBe('413 /problems/too-large');
  });

  it('is answered when it is nested ten thousand deep, or has ten thousand members', async () => {
    const path = `/api/communities/${two.home.communityId}/places`;
    const deep = `${'{"a":'.repeat(10_000)}1${'}'.repeat(10_000)}`;
    const wide = JSON.stringify(
      Object.fromEntries(Array.from({ length: 10_000 }, (_, at) => [`k${at}`, at])),
    );
    for (const text of [deep, wide, `[${'['.repeat(5000)}${']'.repeat(5000)}]`]) {
      const answer = await officer.post(path).set('Content-Type', 'application/json').send(text);
      expect(typeOf(answer)).toBe('422 /problems/invalid-input');
      expect(answer.text.length).toBeLessThan(2_000_000);
    }
  });
});

describe('keys that belong to the language', () => {
  it.each(WRITING.map((one) => [one.id, one] as const))(
    '%s takes none of them in',
    async (_id, { method, path, body }) => {
      if (body === undefined) throw new Error('it has a body');
      const sample = JSON.stringify(sampleOf(body, { text: 'a word', id: two.away.entryId }));
      const evil = sample.replace(
        /^\{/u,
        '{"__proto__":{"isAdmin":true,"roles":["steward"]},"constructor":{"prototype":{"isAdmin":true}},',
      );
      const sent = (method === 'PUT' ? officer.put(own(path)) : officer.post(own(path)))
        .set('Content-Type', 'application/json')
        .send(evil);
      const answer = await sent;
      expect([200, 201, 204, 500]).not.toContain(answer.status);
      expect(({} as { isAdmin?: boolean }).isAdmin).toBeUndefined();
    },
  );

  it('give nobody a role or an id that the contract does not offer', async () => {
    const calendar = `/api/calendars/${two.home.calendarId}/entries`;
    for (const more of [
      { id: two.away.entryId },
      { communityId: two.away.communityId },
      { updatedBy: 'x' },
      { version: 1 },
    ]) {
      const answer = await officer.post(calendar, { ...entryInput(), ...more });
      expect(typeOf(answer)).toBe('422 /problems/invalid-input');
    }
    const person = {
      email: 'x@example.org',
      displayName: 'X',
      roles: ['observer'],
      isDemo: true,
      passwordHash: 'x',
    };
    const people = `/api/communities/${two.home.communityId}/people`;
    expect(typeOf(await two.village.steward.post(people, person))).toBe('422 /problems/invalid-input');
  });
});

describe('words of the database in a query', () => {
  const TRICKS = [
    "' OR '1'='1",
    "1'; DROP TABLE person; -- ",
    '1 UNION SELECT password_hash FROM person',
    '"',
    '\\',
    '%',
    '_',
    '\u0000',
    '1e309',
    '-1',
    '[object Object]',
  ];

  it.each(READING.filter(({ query }) => query !== undefined).map((one) => [one.path, one] as const))(
    '%s takes them as words, or refuses them',
    async (_path, { path, query }) => {
      if (query === undefined) throw new Error('it has a query');
      for (const name of membersOf(query)) {
        for (const trick of TRICKS) {
          const answer = await officer.get(`${own(path)}?${name}=${encodeURIComponent(trick)}`);
          expect([name, trick, answer.status < 500]).toEqual([name, trick, true]);
          expect(answer.text).not.toMatch(/argon2id|ER_[A-Z]|SQL syntax|at \/|node_modules/u);
        }
        const many = await officer.get(
          `${own(path)}?${name}[$ne]=1&${name}=a&${name}=b&${name}[__proto__]=1`,
        );
        expect([name, many.status < 500]).toEqual([name, true]);
      }
    },
  );

  it('sign nobody in', async () => {
    const visitor = await api.visitor();
    for (const email of [
      "officer@dawnpeg.example' -- ",
      "' OR '1'='1' -- @x.example",
      { $ne: null },
      ['officer@dawnpeg.example'],
      true,
    ]) {
      for (const password of ["' OR '1'='1", { $ne: null }, [DEMO_PASSWORD], true]) {
        const answer = await visitor.post('/api/session', { email, password });
        expect([401, 422, 429]).toContain(answer.status);
      }
    }
    api.restart();
  });

  it('leave every table where it was', async () => {
    expect((await officer.get('/api/communities').expect(200)).body).toMatchObject({
      items: [{ name: 'Upper Tazimel' }],
    });
  });
});

describe('headers that say something else', () => {
  it('reach no answer: neither a line of their own nor an address elsewhere', async () => {
    for (const [name, value] of [
      ['X-Forwarded-Host', 'evil.example'],
      ['X-Original-URL', '/api/communities'],
      ['X-Rewrite-URL', '/api/communities'],
      ['X-Forwarded-Proto', 'gopher'],
      ['Referer', 'https://evil.example/'],
    ] as const) {
      const answer = await request(api.app.express)
        .get('/api/session')
        .set(name, value)
        .set('Host', 'evil.example');
      expect(answer.status).toBe(200);
      expect(`${JSON.stringify(answer.headers)}${answer.text}`).not.toContain('evil.example');
    }
  });

  it('cannot be split into two by what a thing is called', async () => {
    const names = ['a\r\nSet-Cookie: x=1', 'a\nX-Evil: 1', 'a\u0000b'];
    for (const name of names) {
      const place = { ...two.place, name };
      const { id, communityId, version, ...input } = place;
      expect(version).toBeGreaterThan(0);
      const answer = await officer.post(`/api/communities/${communityId}/places`, input);
      expect([id === '', reasonOf(answer)]).toEqual([false, '422 invalid-input']);
    }
  });

  it('lead nowhere outside: no answer of ours is a redirection', async () => {
    for (const path of [
      '//evil.example',
      '/\\evil.example',
      '/%2f%2fevil.example',
      '/sign-in?next=//evil.example',
      '/api//evil.example',
    ]) {
      const answer = await request(api.app.express).get(path);
      expect([path, answer.status >= 300 && answer.status < 400, answer.headers['location']]).toEqual([
        path,
        false,
        undefined,
      ]);
    }
  });
});

describe('whatever answers', () => {
  it.each(READING.map((one) => [one.path, one] as const))(
    '%s is kept in no cache, guessed by no browser and framed by no page',
    async (_path, { path }) => {
      const answer = await officer.get(own(path));
      expect(answer.headers['x-content-type-options']).toBe('nosniff');
      expect(answer.headers['content-security-policy']).toMatch(
        /default-src 'self'|default-src 'none'; sandbox/u,
      );
      expect(answer.headers['content-type'] ?? '').not.toMatch(/html|svg|javascript/u);
      if (answer.status < 300) expect(answer.headers['cache-control']).toMatch(/no-store/u);
      expect(answer.headers['x-powered-by']).toBeUndefined();
    },
  );

  it('lets pages fetch from here alone: no directive names another origin', async () => {
    const answer = await officer.get('/api/session');
    const policy = String(answer.headers['content-security-policy']);
    const sources = policy.split(';').flatMap((directive) => directive.trim().split(/\s+/u).slice(1));
    const ours = ["'self'", "'none'", "'unsafe-inline'", 'data:', 'blob:', 'https:'];
    expect(sources.filter((source) => !ours.includes(source))).toEqual([]);
    const carries = (directive: string) =>
      policy.split(';').find((part) => part.trim().startsWith(directive)) ?? '';
    for (const name of [
      'script-src',
      'default-src',
      'frame-ancestors',
      'form-action',
      'object-src',
      'base-uri',
    ]) {
      expect([name, /'(self|none)'/u.test(carries(name)), /https:|unsafe/u.test(carries(name))]).toEqual([
        name,
        true,
        false,
      ]);
    }
  });
});
