import {
  chmodSync,
  existsSync,
  mkdirSync,
  mkdtempSync,
  readdirSync,
  readFileSync,
  rmSync,
  writeFileSync,
} from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { gunzipSync } from 'node:zlib';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { ensureBuilt } from '../../docker-free-scripts/lib/build.mjs';
import { freePort } from '../../docker-free-scripts/lib/ports.mjs';
import { openClient, signInAs, type Client } from '#tests/support/api.js';
import { addPicture, addRecording, attachmentsPath } from '#tests/support/attachment-api.js';
import { addFigure } from '#tests/support/figure-api.js';
import { startScript, type Started } from '#tests/support/start-script.js';

/** A village is saved while people work in it, its machine is lost, and another one takes over. */
const TIMEOUT_MS = 300_000;
const KEPT = 'Zqkeptbowl';
const TAKEN_BACK = 'Zqtakenback';

let base: string;
let ports: { readonly product: number; readonly database: number };
let running: Started | null = null;

beforeAll(async () => {
  await ensureBuilt();
  base = mkdtempSync(path.join(os.tmpdir(), `dawnpeg-test-${process.pid}-backup-`));
  chmodSync(base, 0o755); // MariaDB's own user must be able to enter
  ports = { product: await freePort(), database: await freePort() };
}, TIMEOUT_MS);

afterAll(async () => {
  running?.kill('SIGINT');
  await running?.ended;
  rmSync(base, { recursive: true, force: true });
});

describe('a backup', () => {
  it(
    'brings everything back on another machine, but not what was taken back since',
    { timeout: TIMEOUT_MS },
    async () => {
      const officer = await startOn('old');
      const figure = await addFigure(officer, { story: KEPT });
      const picture = await addPicture(officer, figure.id, { title: KEPT });
      const elder = await signedIn('elder');
      const recording = await addRecording(elder, figure.id, { title: TAKEN_BACK });
      const before = filesOn('old');

      const saved = await script(['backup.mjs', 'backup', '--to', path.join(base, 'disk')], 'old');
      expect(saved).toMatchObject({ code: 0 });
      expect(tablesIn(onlyBackup())).toContain(TAKEN_BACK);

      const item = `/api/communities/${elder.communityId}/items/attachment/${recording.id}`;
      await elder.post(`${item}/withdrawal`, { leavesTrace: false, askedById: null }).expect(204);
      const gone = before.filter((file) => !filesOn('old').includes(file));
      expect(gone.length).toBeGreaterThan(1);
      await stop();

      const restored = await script(
        [
          'backup.mjs',
          'restore',
          onlyBackup(),
          '--withdrawals',
          path.join(base, 'old/withdrawals/list.jsonl'),
        ],
        'new',
      );
      expect(restored.output).toContain('Taken back since and gone again: 1.');
      const after = await startOn('new');
      const there = await after.get(`/api/communities/${after.communityId}/figures`).expect(200);
      expect(JSON.stringify(there.body)).toContain(figure.id);
      const image = await after.get(`/api/attachments/${picture.id}/parts/1`).expect(200);
      expect((image.body as Buffer).length).toBeGreaterThan(100);
      const elderAgain = await signedIn('elder');
      await elderAgain.get(`/api/attachments/${recording.id}`).expect(404);
      const list = await elderAgain
        .get(`${attachmentsPath(elderAgain)}?subjectType=figure&subjectId=${figure.id}`)
        .expect(200);
      expect(JSON.stringify(list.body)).not.toContain(TAKEN_BACK);
      await stop();

      const again = await script(['backup.mjs', 'backup'], 'new');
      expect(again.code).toBe(0);
      const [own = ''] = readdirSync(path.join(base, 'new/backups'));
      expect(tablesIn(path.join(base, 'new/backups', own))).not.toContain(TAKEN_BACK);
      expect(filesOn('new').filter((file) => gone.includes(file))).toEqual([]);
    },
  );

  it(
    'is not put over villages that are there, unless one says so; they are saved first',
    { timeout: TIMEOUT_MS },
    async () => {
      const refused = await script(['backup.mjs', 'restore', onlyBackup()], 'new');
      expect([refused.code, refused.output]).toEqual([
        1,
        expect.stringContaining('nothing was changed. Add --replace'),
      ]);
      const before = readdirSync(path.join(base, 'new/backups')).length;
      const replaced = await script(['backup.mjs', 'restore', onlyBackup(), '--replace'], 'new');
      expect(replaced.output).toContain('Taken back since and gone again: 1.');
      expect(readdirSync(path.join(base, 'new/backups'))).toHaveLength(before + 1);
    },
  );

  it('that is damaged changes nothing', { timeout: TIMEOUT_MS }, async () => {
    writeFileSync(path.join(onlyBackup(), 'tables.sql.gz'), 'half a');
    const refused = await script(['backup.mjs', 'restore', onlyBackup(), '--replace'], 'new');
    expect([refused.code, refused.output]).toEqual([
      1,
      expect.stringContaining('missing or damaged; nothing was changed'),
    ]);
  });

  it('is removed by a later one after 35 days', { timeout: TIMEOUT_MS }, async () => {
    const old = path.join(base, 'new/backups/dawnpeg-old');
    mkdirSync(old);
    const manifest = { format: 'dawnpeg-backup', formatVersion: 1, productVersion: '0', files: [] };
    const madeAt = new Date(Date.now() - 36 * 86_400_000).toISOString();
    writeFileSync(path.join(old, 'manifest.json'), JSON.stringify({ ...manifest, madeAt }));
    await script(['backup.mjs', 'backup'], 'new');
    expect(existsSync(old)).toBe(false);
  });
});

function settingsOf(machine: string): Record<string, string> {
  return {
    DATA_DIR: path.join(base, machine),
    PORT: String(ports.product),
    DB_PORT: String(ports.database),
  };
}

async function startOn(machine: string): Promise<Client> {
  running = startScript(['docker-free-scripts/start.mjs'], settingsOf(machine));
  await running.ready;
  return signedIn('officer');
}

async function signedIn(mailbox: string): Promise<Client> {
  const client = await openClient(`http://127.0.0.1:${ports.product}`);
  await signInAs(client, mailbox);
  return client;
}

async function stop(): Promise<void> {
  running?.kill('SIGINT');
  expect(await running?.ended).toBe(0);
  running = null;
}

async function script([file = '', ...words]: readonly string[], machine: string) {
  const done = startScript([`docker-free-scripts/${file}`, ...words], settingsOf(machine));
  return { code: await done.ended, output: done.output() };
}

function onlyBackup(): string {
  const [name = '', ...others] = readdirSync(path.join(base, 'disk'));
  expect(others).toEqual([]);
  return path.join(base, 'disk', name);
}

function tablesIn(backup: string): string {
  return gunzipSync(readFileSync(path.join(backup, 'tables.sql.gz'))).toString('utf8');
}

/** The files of recordings and pictures that are kept on this machine. */
function filesOn(machine: string): string[] {
  const folder = path.join(base, machine, 'attachments');
  return readdirSync(folder, { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile())
    .map((entry) => path.relative(folder, path.join(entry.parentPath, entry.name)));
}
