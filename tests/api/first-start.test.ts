import { spawn, type ChildProcess } from 'node:child_process';
import { once } from 'node:events';
import { mkdtempSync, rmSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { createConnection } from 'mysql2/promise';
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, inject, it } from 'vitest';
import { DATABASE_COLLATION } from '#server/db/data-source.js';
import { AuditEventEntity } from '#server/db/entities/audit-event.entity.js';
import { firstStewardToken } from '#server/features/session/first-start.service.js';
import type { Problem } from '#shared/contracts/problem.js';
import type { SessionState } from '#shared/contracts/session.js';
import { openTestApi, type TestApi } from '#tests/support/api.js';
import { emptyTestDatabase } from '#tests/support/database.js';
import { freePort } from '../../docker-free-scripts/lib/ports.mjs';

const founder = {
  email: 'First@Example.org',
  displayName: 'First steward',
  newPassword: 'holes and pegs',
  communityName: 'New village',
};
const FIRST_STEWARD = '/api/session/first-steward';

describe('the link of the first steward', () => {
  let api: TestApi;
  beforeAll(async () => {
    api = await openTestApi();
  });
  beforeEach(async () => {
    await emptyTestDatabase(api.dataSource);
    api.restart();
  });
  afterAll(() => api.close());

  const token = async () => (await firstStewardToken(api.dataSource, api.clock)) ?? '';
  const found = async (withToken: string) =>
    (await api.visitor()).post(FIRST_STEWARD, { ...founder, token: withToken });

  it('founds the village, makes its steward and signs them in', async () => {
    const client = await api.visitor();
    const answer = await client.post(FIRST_STEWARD, { ...founder, token: await token() }).expect(200);
    const { person, memberships } = answer.body as SessionState;
    expect(person).toMatchObject({ email: 'first@example.org', displayName: 'First steward' });
    expect(memberships).toMatchObject([{ communityName: 'New village', roles: ['steward'] }]);
    const communityId = memberships?.[0]?.communityId ?? '';
    await client.get(`/api/communities/${communityId}`).expect(200);
    const events = await api.dataSource.getRepository(AuditEventEntity).find();
    expect(events).toMatchObject([{ action: 'community-founded', communityId, actorId: person?.id }]);

    const again = await api.visitor();
    const signIn = { email: founder.email, password: founder.newPassword };
    await again.post('/api/session', signIn).expect(200);
  });

  it('works once: afterwards it is said to sign in instead', async () => {
    const once = await token();
    expect((await found(once)).status).toBe(200);
    const second = await found(once);
    expect([second.status, (second.body as Problem).reason]).toEqual([409, 'set-up-done']);
    expect(await firstStewardToken(api.dataSource, api.clock)).toBeNull();
  });

  it('lets only one of two through that open it at the same moment', async () => {
    const once = await token();
    const answers = await Promise.all([found(once), found(once)]);
    expect(answers.map(({ status }) => status).sort((a, b) => a - b)).toEqual([200, 409]);
  });

  it('of an earlier start is void', async () => {
    const old = await token();
    const fresh = await token();
    expect((await found(old)).status).toBe(422);
    expect((await found(fresh)).status).toBe(200);
  });

  it('is void after a week', async () => {
    const late = await token();
    api.clock.set(new Date(api.clock.now().getTime() + 7 * 86_400_000 + 1000));
    expect((await found(late)).status).toBe(409);
  });

  it('is stored as a hash only', async () => {
    const secret = await token();
    const rows: unknown = await api.dataSource.query('SELECT * FROM one_time_code');
    expect(JSON.stringify(rows)).not.toContain(secret);
  });
});

/** The real thing: its own process on its own database. */
describe('npm start in production', () => {
  let database: string;
  let dataDir: string;
  let running: Running | null = null;
  beforeAll(async () => {
    database = `dawnpeg_first_${process.env['VITEST_POOL_ID'] ?? '1'}`;
    dataDir = mkdtempSync(path.join(os.tmpdir(), 'dawnpeg-first-start-'));
    await sql(`DROP DATABASE IF EXISTS ${database}`);
    await sql(`CREATE DATABASE ${database} CHARACTER SET utf8mb4 COLLATE ${DATABASE_COLLATION}`);
  });
  afterEach(async () => {
    await running?.stop();
    running = null;
  });
  afterAll(async () => {
    await sql(`DROP DATABASE IF EXISTS ${database}`);
    rmSync(dataDir, { recursive: true, force: true });
  });

  it('prints the link once, has no demo, and prints none when somebody has an account', async () => {
    running = await start({ NODE_ENV: 'production' });
    expect(running.outcome).toBe('listening');
    const link = /(http:\/\/\S+)\/welcome#first-steward=([0-9A-F]{48})\n/.exec(running.stdout());
    expect(link?.[1]).toBe(running.address);
    const browser = await openBrowser(running.address);
    expect((await browser.post('/api/session', DEMO_SIGN_IN)).status).toBe(401);
    const founded = await browser.post(FIRST_STEWARD, { ...founder, token: link?.[2] });
    expect(founded.status).toBe(200);
    await running.stop();

    running = await start({ NODE_ENV: 'production' });
    expect(running.outcome).toBe('listening');
    expect(running.stdout()).not.toContain('first-steward');
    const later = await openBrowser(running.address);
    const signIn = { email: founder.email, password: founder.newPassword };
    expect((await later.post('/api/session', signIn)).status).toBe(200);
    expect(running.stderr()).toBe('');
  }, 120_000);

  it('refuses a database that holds demo accounts, in one sentence with the remedy', async () => {
    await sql(`DROP DATABASE ${database}`);
    await sql(`CREATE DATABASE ${database} CHARACTER SET utf8mb4 COLLATE ${DATABASE_COLLATION}`);
    running = await start({ NODE_ENV: 'development' });
    expect(running.outcome).toBe('listening');
    const demo = await openBrowser(running.address);
    expect((await demo.post('/api/session', DEMO_SIGN_IN)).status).toBe(200);
    expect(running.stdout()).not.toContain('first-steward');
    await running.stop();

    running = await start({ NODE_ENV: 'production' });
    expect(running.outcome).toBe('ended with 1');
    expect(running.stderr()).toBe(
      `The database ${database} holds demo accounts, whose password everybody knows: set DB_NAME to another database, or run npm run db:reset.\n`,
    );
    expect(running.stdout()).not.toContain('first-steward');
    await expect(fetch(`${running.address}/api/health`)).rejects.toThrow();
  }, 120_000);

  async function start(environment: Record<string, string>): Promise<Running> {
    const server = inject('mariadb');
    return run({
      HOST: '127.0.0.1',
      DB_HOST: server.host,
      DB_PORT: String(server.port),
      DB_NAME: database,
      DB_USER: server.user,
      DB_PASSWORD: server.password,
      DATA_DIR: dataDir,
      SESSION_SECRET: 'only for tests, never for a village',
      ...environment,
    });
  }
});

const DEMO_SIGN_IN = { email: 'officer@dawnpeg.example', password: 'limewash-and-pegs' };

async function sql(statement: string): Promise<void> {
  const connection = await createConnection(inject('mariadb'));
  try {
    await connection.query(statement);
  } finally {
    await connection.end();
  }
}

interface Running {
  address: string;
  /** `listening`, or how the process ended before it did. */
  outcome: string;
  stdout(): string;
  stderr(): string;
  stop(): Promise<void>;
}

/** server/main.ts as a process of its own, until it listens or has ended. */
async function run(environment: Record<string, string>): Promise<Running> {
  const port = await freePort();
  const address = `http://127.0.0.1:${port}`;
  const child = spawn(
    process.execPath,
    ['--import', 'tsx', '--conditions=dawnpeg-source', 'server/main.ts'],
    {
      env: { PATH: process.env['PATH'], PORT: String(port), PUBLIC_URL: address, ...environment },
      stdio: ['ignore', 'pipe', 'pipe'],
    },
  );
  const said = { stdout: '', stderr: '' };
  const outcome = await new Promise<string>((resolve, reject) => {
    child.stdout.on('data', (chunk: Buffer) => {
      said.stdout += chunk.toString();
      if (said.stdout.includes('"msg":"listening"')) resolve('listening');
    });
    child.stderr.on('data', (chunk: Buffer) => {
      said.stderr += chunk.toString();
    });
    child.on('error', reject);
    child.on('close', (code) => {
      resolve(`ended with ${code}`);
    });
  });
  return {
    address,
    outcome,
    stdout: () => said.stdout,
    stderr: () => said.stderr,
    stop: () => end(child),
  };
}

async function end(child: ChildProcess): Promise<void> {
  if (child.exitCode !== null || child.signalCode !== null) return;
  const closed = once(child, 'close');
  child.kill('SIGTERM');
  await closed;
}

/** As little of a browser as signing in takes: a cookie and the token of the page. */
async function openBrowser(address: string) {
  const page = await fetch(`${address}/api/session`);
  const cookie = page.headers.get('set-cookie')?.split(';')[0] ?? '';
  const { csrfToken } = (await page.json()) as SessionState;
  return {
    post: (to: string, body: object) =>
      fetch(address + to, {
        method: 'POST',
        headers: { 'Content-Type': 'application/json', 'X-CSRF-Token': csrfToken, Cookie: cookie },
        body: JSON.stringify(body),
      }),
  };
}
