import { connect, createServer, type Server, type Socket } from 'node:net';
import type { AddressInfo } from 'node:net';
import { pino } from 'pino';
import request from 'supertest';
import type { Response } from 'supertest';
import type { DataSource } from 'typeorm';
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest';
import { createApp } from '#server/app.js';
import { parseConfig } from '#server/config/env.js';
import { createDataSource } from '#server/db/data-source.js';
import { DEMO_PASSWORD } from '#server/features/demo/demo-villages.data.js';
import { problem, PROBLEM_TYPES, type ProblemSlug } from '#shared/contracts/problem.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';

let api: TestApi;
let officer: Client;
beforeAll(async () => {
  api = await openTestApi();
  officer = await api.signIn('officer');
});
afterAll(() => api.close());

const places = () => `/api/communities/${officer.communityId}/places`;

/** Every refusal has this shape: RFC 9457, with the status of its type and a sentence. */
function expectProblem(answer: Response, slug: ProblemSlug): void {
  expect([answer.status, answer.type]).toEqual([PROBLEM_TYPES[slug].status, 'application/problem+json']);
  const body = problem.parse(answer.body);
  expect(body).toMatchObject({
    type: `/problems/${slug}`,
    title: PROBLEM_TYPES[slug].title,
    status: PROBLEM_TYPES[slug].status,
    requestId: expect.stringMatching(/^[0-9a-f-]{36}$/) as string,
  });
  expect(body.detail.length).toBeGreaterThan(10);
  expect(body.detail).not.toMatch(/\berror\b/i);
}

describe('a request that cannot be read', () => {
  it('is a malformed request when its JSON is broken', async () => {
    const answer = await officer.post(places()).set('Content-Type', 'application/json').send('{"name": ');
    expectProblem(answer, 'malformed-request');
  });

  it('is a wrong content type when it is a form', async () => {
    const answer = await officer
      .post(places())
      .set('Content-Type', 'application/x-www-form-urlencoded')
      .send('name=Spring');
    expectProblem(answer, 'wrong-content-type');
  });

  it('is too large beyond one megabyte', async () => {
    const answer = await officer.post(places(), { name: 'x'.repeat(1_100_000) });
    expectProblem(answer, 'too-large');
  });

  it.each(['null', '[]', '"text"', '7', 'true'])(
    'names the body when it is %s and not an object',
    async (body) => {
      const answer = await officer.post(places()).set('Content-Type', 'application/json').send(body);
      expectProblem(answer, 'invalid-input');
    },
  );

  it('names every field that is missing when nothing is sent', async () => {
    const answer = await officer.post(places());
    expectProblem(answer, 'invalid-input');
    const fields = problem.parse(answer.body).errors?.map(({ field, code }) => `${field} ${code}`);
    expect(fields).toContain('name required');
    expect(fields).toContain('latitudeDeg not-a-number');
  });

  it('says nothing about a body to somebody who may not send one', async () => {
    const observer = await api.signIn('observer');
    expectProblem(await observer.post(places(), { nonsense: true }), 'not-allowed');
    expectProblem(await (await api.visitor()).post(places(), { nonsense: true }), 'not-signed-in');
  });

  it('is malformed when its address cannot be decoded', async () => {
    expectProblem(await officer.get('/api/places/%E0%A4%A'), 'malformed-request');
  });
});

describe('an address that leads nowhere', () => {
  it.each(['/api', '/api/nothing', '/api/places', '/nothing', '/api/session/more'])(
    'answers 404 to GET %s',
    async (path) => {
      expectProblem(await officer.get(path), 'not-found');
    },
  );

  it('answers 404 to a method that is not offered', async () => {
    expectProblem(await officer.delete('/api/time-zone'), 'not-found');
  });

  it.each([
    ['/api/places/not-a-uuid'],
    ['/api/places/00000000-0000-4000-8000-000000000000'],
    ['/api/communities/1/places'],
    ['/api/calendars/1%20OR%201=1/versions'],
    ['/api/calendars/..%2f..%2fetc/versions/1'],
  ])('answers 404, and not 500 or 422, to an id that is none: %s', async (path) => {
    expectProblem(await officer.get(path), 'not-found');
  });

  it('does not tell a visitor whether there is something', async () => {
    const visitor = await api.visitor();
    expectProblem(await visitor.get('/api/places/not-a-uuid'), 'not-signed-in');
  });
});

describe('input that does not fit', () => {
  it('names the parameter of a query', async () => {
    const answer = await officer.get('/api/time-zone?latitudeDeg=12');
    expectProblem(answer, 'invalid-input');
    expect(problem.parse(answer.body).errors?.map(({ field }) => field)).toEqual(['longitudeDeg']);
  });

  it('refuses what the contracts do not know instead of dropping it quietly', async () => {
    const answer = await officer.get('/api/calendars?comunityId=typo');
    expectProblem(answer, 'invalid-input');
    expect(problem.parse(answer.body).errors).toMatchObject([{ field: 'comunityId', code: 'not-expected' }]);
  });

  it('has a sentence with a remedy at each field', async () => {
    const answer = await officer.post(places(), { name: '', skyline: [{ azimuthDeg: 400, altitudeDeg: 1 }] });
    for (const { code, message } of problem.parse(answer.body).errors ?? []) {
      expect([code, message.length > 10, message]).toEqual([
        code,
        true,
        expect.not.stringMatching(/zod|expected|invalid/i),
      ]);
    }
  });
});

describe('the headers of an answer', () => {
  it('keep data of villages out of every cache, and scripts of others out of every page', async () => {
    const { headers } = await officer.get(places()).expect(200);
    expect(headers['cache-control']).toBe('no-store');
    expect(headers['x-content-type-options']).toBe('nosniff');
    expect(headers['content-security-policy']).toContain("default-src 'self'");
    expect(headers['x-powered-by']).toBeUndefined();
  });
});

describe('while the database cannot be reached', () => {
  let line: Line;
  let dataSource: DataSource;
  let answerTo: (path: string) => Promise<Response>;
  beforeAll(async () => {
    const server = inject('mariadb');
    line = await openLine(server.port);
    dataSource = createDataSource({
      ...server,
      // Through the line that can be cut.
      socketPath: null,
      port: line.port,
      name: `dawnpeg_test_${process.env['VITEST_POOL_ID'] ?? '1'}`,
      poolSize: 2,
    });
    await dataSource.initialize();
    const { express } = createApp({
      dataSource,
      clock: api.clock,
      config: parseConfig({
        NODE_ENV: 'test',
        DB_PASSWORD: 'unused here',
        SESSION_SECRET: 'only for tests, never for a village',
      }),
      log: pino({ level: 'silent' }),
      productVersion: 'test',
      clientDir: null,
      storage: api.storage,
      withdrawals: api.withdrawals,
      mailer: null,
    });
    const agent = request.agent(express);
    const { csrfToken } = (await agent.get('/api/session')).body as { csrfToken: string };
    await agent
      .post('/api/session')
      .set('X-CSRF-Token', csrfToken)
      .send({ email: 'officer@dawnpeg.example', password: DEMO_PASSWORD })
      .expect(200);
    answerTo = (path) => agent.get(path);
  });
  afterAll(async () => {
    line.cut();
    await dataSource.destroy().catch(() => undefined);
  });

  it('answers 503 everywhere, from the first moment and later, and goes on when it is back', async () => {
    expect((await answerTo('/api/health')).status).toBe(200);
    line.cut();
    for (const path of ['/api/health', '/api/communities', places(), '/api/session']) {
      expectProblem(await answerTo(path), 'database-unreachable');
    }
    await line.mend();
    expect((await answerTo('/api/health')).status).toBe(200);
    expect((await answerTo(places())).status).toBe(200);
  });
});

interface Line {
  port: number;
  /** Ends every connection and takes no new ones, as when the database's machine is gone. */
  cut(): void;
  mend(): Promise<void>;
}

/** A wire to the database that a test can cut. */
async function openLine(toPort: number): Promise<Line> {
  const sockets = new Set<Socket>();
  let server: Server;
  const keep = (socket: Socket) => {
    sockets.add(socket);
    socket.on('close', () => sockets.delete(socket));
    socket.on('error', () => socket.destroy());
  };
  const listen = (port: number) =>
    new Promise<number>((resolve, reject) => {
      server = createServer((near) => {
        const far = connect(toPort, '127.0.0.1');
        keep(near);
        keep(far);
        near.pipe(far).pipe(near);
      });
      server.on('error', reject);
      server.listen(port, '127.0.0.1', () => {
        resolve((server.address() as AddressInfo).port);
      });
    });
  const port = await listen(0);
  return {
    port,
    cut: () => {
      server.close();
      for (const socket of sockets) socket.destroy();
    },
    mend: async () => {
      await listen(port);
    },
  };
}
