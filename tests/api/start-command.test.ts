import { chmodSync, mkdtempSync, readdirSync, readFileSync, rmSync, statSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';
import { ensureBuilt } from '../../docker-free-scripts/lib/build.mjs';
import { freePort, isFree } from '../../docker-free-scripts/lib/ports.mjs';
import { startScript, type Started } from '#tests/support/start-script.js';

/** `npm start` as a person meets it, on a data folder and ports of its own. */
const TIMEOUT_MS = 300_000;

let dataDir: string;
let ports: { readonly product: number; readonly database: number };
const children: Started[] = [];

beforeAll(async () => {
  await ensureBuilt();
  dataDir = mkdtempSync(path.join(os.tmpdir(), `dawnpeg-test-${process.pid}-start-`));
  chmodSync(dataDir, 0o755); // MariaDB's own user must be able to enter
  ports = { product: await freePort(), database: await freePort() };
}, TIMEOUT_MS);

afterAll(async () => {
  for (const child of children) child.kill('SIGKILL');
  await nothingListens();
  rmSync(dataDir, { recursive: true, force: true });
});

describe('npm start', () => {
  it('stops with one sentence for a setting that cannot be used', { timeout: TIMEOUT_MS }, async () => {
    const started = start({ PORT: '99999' });
    expect(await started.ended).toBe(1);
    expect(started.output().trim()).toBe('PORT must be a port number between 1 and 65535, such as 4173.');
  });

  it(
    'serves from its own data folder, names address and accounts, and keeps the passwords to itself',
    { timeout: TIMEOUT_MS },
    async () => {
      const started = start();
      await started.ready;
      expect(started.output()).toContain(`Dawnpeg is ready at http://127.0.0.1:${ports.product}`);
      expect(started.output()).toMatch(/NAME@dawnpeg\.example.*\n +Upper Tazimel: officer,/u);
      const health = await fetch(`http://127.0.0.1:${ports.product}/api/health`);
      expect(health.status).toBe(200);
      expect(statSync(path.join(dataDir, 'secrets.json')).mode & 0o777).toBe(0o600);
      expect(statSync(path.join(dataDir, 'mariadb')).mode & 0o777).toBe(0o700);
      expect(listeningBeyondThisMachine([ports.product, ports.database])).toEqual([]);

      const second = start();
      expect(await second.ended).toBe(1);
      expect(second.output()).toMatch(/Something listens on .* already/);

      started.kill('SIGINT');
      expect(await started.ended).toBe(0);
      expect(await isFree(ports.product)).toBe(true);
      expect(await isFree(ports.database)).toBe(true);
    },
  );

  it(
    'leaves no server behind when it is killed itself, and starts again on the same data',
    { timeout: TIMEOUT_MS },
    async () => {
      const killed = start();
      await killed.ready;
      const secrets = readFileSync(path.join(dataDir, 'secrets.json'), 'utf8');
      killed.kill('SIGKILL');
      await killed.ended;
      await nothingListens();

      const again = start();
      await again.ready;
      expect(readFileSync(path.join(dataDir, 'secrets.json'), 'utf8')).toBe(secrets);
      again.kill('SIGTERM');
      expect(await again.ended).toBe(0);
    },
  );

  it(
    'says so when the database ends by itself, and stops the server too',
    { timeout: TIMEOUT_MS },
    async () => {
      const started = start();
      await started.ready;
      const pid = Number(readFileSync(path.join(dataDir, 'mariadb/data/mariadb.pid'), 'utf8'));
      process.kill(pid, 'SIGKILL');
      expect(await started.ended).toBe(1);
      expect(started.output()).toContain('MariaDB ended by itself');
      expect(await isFree(ports.product)).toBe(true);
    },
  );
});

function start(settings: Record<string, string> = {}): Started {
  const started = startScript(['docker-free-scripts/start.mjs'], {
    DATA_DIR: dataDir,
    PORT: String(ports.product),
    DB_PORT: String(ports.database),
    ...settings,
  });
  children.push(started);
  return started;
}

/** Waits until both ports are free again: the kernel tells the servers that their script has died. */
async function nothingListens(): Promise<void> {
  await vi.waitFor(
    async () => {
      expect([await isFree(ports.product), await isFree(ports.database)]).toEqual([true, true]);
    },
    { timeout: 60_000, interval: 100 },
  );
}

/** Of these ports, those on which the machine answers to others, by the kernel's own tables of sockets. */
function listeningBeyondThisMachine(wanted: readonly number[]): string[] {
  const LISTEN = '0A';
  return readdirSync('/proc/net')
    .filter((name) => /^tcp6?$/.test(name))
    .flatMap((name) => readFileSync(`/proc/net/${name}`, 'utf8').split('\n').slice(1))
    .map((line) => line.trim().split(/\s+/))
    .filter(
      ([, local = '', , state]) =>
        state === LISTEN && wanted.includes(parseInt(local.split(':')[1] ?? '', 16)),
    )
    .map(([, local = '']) => local)
    .filter((local) => !local.startsWith('0100007F:')); // 127.0.0.1
}
