import { mkdtempSync, rmSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { pino, type Logger } from 'pino';
import request from 'supertest';
import type { Response, Test } from 'supertest';
import type { DataSource } from 'typeorm';
import { createApp, type App } from '#server/app.js';
import { parseConfig } from '#server/config/env.js';
import { DEMO_DOMAIN, DEMO_PASSWORD } from '#server/features/demo/demo-villages.data.js';
import { seedDemoVillages } from '#server/features/demo/demo.service.js';
import { hasher } from '#server/features/session/passwords.service.js';
import type { Mailer } from '#server/mail/mailer.js';
import type { FileScan } from '#server/storage/file-scan.js';
import { WithdrawalFile } from '#server/storage/withdrawal-list.js';
import { LocalFileStore } from '#server/storage/local-file-store.js';
import type { SessionState } from '#shared/contracts/session.js';
import { emptyTestDatabase, openTestDatabase } from './database.js';

const { verify } = hasher;
const verified = new Map<string, Promise<boolean>>();

/** The same password against the same hash is worked out once: demo people sign in thousands of times. */
hasher.verify = (hashed, password, ...more) => {
  const key = `${String(hashed)} ${String(password)}`;
  const known = verified.get(key) ?? verify(hashed, password, ...more);
  verified.set(key, known);
  return known;
};

/** A morning on which the demo year has just begun; tests move it on by hand. */
export const TEST_NOW = new Date('2026-12-01T06:00:00Z');

export interface TestApi {
  dataSource: DataSource;
  app: App;
  /** Where attachments are kept; a folder that is gone after `close`. */
  storage: LocalFileStore;
  withdrawals: WithdrawalFile;
  dataDir: string;
  clock: { now(): Date; set(now: Date): void };
  /** A new browser without a sign-in. */
  visitor(): Promise<Client>;
  /** A browser signed in as a demo person, by the mailbox name, e.g. `officer`. */
  signIn(mailbox: string): Promise<Client>;
  /** The same database behind a new process: what is only remembered in memory (limits) is gone. */
  restart(): void;
  /** Empty tables and fresh demo villages. */
  reset(): Promise<void>;
  close(): Promise<void>;
}

/** One browser: keeps its cookie and sends the token with every write. */
export interface Client {
  session: SessionState;
  get(path: string): Test;
  head(path: string): Test;
  post(path: string, body?: unknown): Test;
  put(path: string, body?: unknown): Test;
  delete(path: string): Test;
  /** Multipart: the input as JSON, then the file; without a file only the input. */
  upload(path: string, meta: unknown, file: Buffer | null): Test;
  /** As a browser sends it. */
  cookie: string;
  /** Community of the first membership. */
  communityId: string;
  personId: string;
}

/** The product on this worker's own database, with the demo villages and a clock that stands still. */
export async function openTestApi({
  mailer = null,
  scan = null,
  log = pino({ level: 'silent' }),
  settings = {},
}: {
  mailer?: Mailer | null;
  scan?: FileScan | null;
  log?: Logger;
  /** Of the environment, besides what every test has. */
  settings?: Record<string, string>;
} = {}): Promise<TestApi> {
  const dataSource = await openTestDatabase();
  let now = TEST_NOW;
  const clock = {
    now: () => now,
    set: (next: Date) => {
      now = next;
    },
  };
  const dataDir = mkdtempSync(path.join(os.tmpdir(), 'dawnpeg-test-files-'));
  const storage = new LocalFileStore(path.join(dataDir, 'attachments'));
  const withdrawals = new WithdrawalFile(path.join(dataDir, 'withdrawals', 'list.jsonl'));
  const config = parseConfig({
    NODE_ENV: 'test',
    DATA_DIR: dataDir,
    DB_PASSWORD: 'unused here',
    SESSION_SECRET: 'only for tests, never for a village',
    ...settings,
  });
  const build = () =>
    createApp({
      dataSource,
      mailer,
      storage,
      withdrawals,
      scan,
      clock,
      config,
      log,
      productVersion: 'test',
      clientDir: null,
    });
  const api: TestApi = {
    dataSource,
    storage,
    withdrawals,
    dataDir,
    app: build(),
    clock,
    visitor: () => openClient(api.app.express),
    signIn: async (mailbox) => {
      const client = await openClient(api.app.express);
      await signInAs(client, mailbox);
      return client;
    },
    reset: async () => {
      now = TEST_NOW;
      await emptyTestDatabase(dataSource);
      rmSync(dataDir, { recursive: true, force: true });
      await seedDemoVillages(dataSource, clock);
      api.restart();
    },
    restart: () => {
      api.app = build();
    },
    close: async () => {
      await dataSource.destroy();
      rmSync(dataDir, { recursive: true, force: true });
    },
  };
  await seedDemoVillages(dataSource, clock);
  return api;
}

/** Signs a browser in as a demo person, by the mailbox name. */
export async function signInAs(client: Client, mailbox: string): Promise<void> {
  const answer = await client.post('/api/session', {
    email: `${mailbox}@${DEMO_DOMAIN}`,
    password: DEMO_PASSWORD,
  });
  if (answer.status !== 200) throw new Error(`${mailbox} cannot sign in: ${JSON.stringify(answer.body)}`);
}

/** A new browser, before the product of this process or before one that listens at an address. */
export async function openClient(product: App['express'] | string): Promise<Client> {
  const agent = request.agent(product);
  let cookie = '';
  const keepCookie = ({ headers }: Response) => {
    const [sent] = (headers['set-cookie'] ?? []) as readonly string[];
    if (sent !== undefined) cookie = sent.split(';')[0] ?? '';
  };
  const read = async () => {
    const answer = await agent.get('/api/session');
    keepCookie(answer);
    return answer.body as SessionState;
  };
  const client: Client = {
    session: await read(),
    get: (path) => agent.get(path),
    head: (path) => agent.head(path),
    post: (path, body) => write(agent.post(path), body),
    put: (path, body) => write(agent.put(path), body),
    delete: (path) => write(agent.delete(path)),
    upload: (path, meta, file) => {
      const sent = write(agent.post(path)).field('meta', JSON.stringify(meta));
      // The name says nothing on purpose: only the content counts.
      return file === null ? sent : sent.attach('file', file, 'upload.bin');
    },
    get cookie() {
      return cookie;
    },
    get communityId() {
      return this.session.memberships?.[0]?.communityId ?? '';
    },
    get personId() {
      return this.session.person?.id ?? '';
    },
  };
  function write(test: Test, body?: unknown): Test {
    const sent = test.set('X-CSRF-Token', client.session.csrfToken);
    sent.on('response', (response: Response) => {
      keepCookie(response);
      const next = response.body as Partial<SessionState> | undefined;
      if (typeof next?.csrfToken === 'string') client.session = next as SessionState;
    });
    return body === undefined ? sent : sent.send(body as object);
  }
  return client;
}
