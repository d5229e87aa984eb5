import { mkdtempSync, readdirSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { mkdtemp } from 'node:fs/promises';
import os from 'node:os';
import path from 'node:path';
import { Readable } from 'node:stream';
import { afterAll, describe, expect, it } from 'vitest';
import { LocalFileStore } from '#server/storage/local-file-store.js';
import { holdsToTheRulesOfAFileStore } from '#tests/support/file-store-rules.js';

const home = mkdtempSync(path.join(os.tmpdir(), 'dawnpeg-test-store-'));
afterAll(() => {
  rmSync(home, { recursive: true, force: true });
});
const newFolder = () => mkdtemp(path.join(home, 'store-'));
const KEY = 'abcd0123456789abcdef0123456789ab';

describe('a folder of this machine', () => {
  holdsToTheRulesOfAFileStore(async () => new LocalFileStore(await newFolder()));

  it('lays files two folders deep, for its owner alone', async () => {
    const folder = await newFolder();
    await new LocalFileStore(folder).put(Readable.from('a voice'), KEY);
    const file = path.join(folder, 'ab', 'cd', KEY);
    expect(statSync(file).mode & 0o777).toBe(0o600);
    expect(statSync(path.dirname(file)).mode & 0o777).toBe(0o700);
  });

  it('clears away what a power cut left half written, and nothing else', async () => {
    const folder = await newFolder();
    const store = new LocalFileStore(folder);
    await store.put(Readable.from('a voice'), KEY);
    writeFileSync(path.join(folder, 'ab', 'cd', 'abcd.part'), 'half');
    expect(await store.removeUnfinished()).toBe(1);
    expect(readdirSync(path.join(folder, 'ab', 'cd'))).toEqual([KEY]);
  });

  it('is empty before the first file, even without its folder', async () => {
    const store = new LocalFileStore(path.join(home, 'not-made-yet'));
    expect(await store.keys().next()).toEqual({ value: undefined, done: true });
    expect(await store.removeUnfinished()).toBe(0);
  });
});
