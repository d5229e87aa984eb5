import { randomUUID } from 'node:crypto';
import { constants } from 'node:fs';
import { access, mkdir, open, readdir, rename, rm, stat, writeFile } from 'node:fs/promises';
import path from 'node:path';
import type { Readable } from 'node:stream';
import {
  FileNotStored,
  STORAGE_KEY,
  type ByteRange,
  type FileStore,
  type StoredFacts,
} from './file-store.js';

const OWNER_ONLY_FILE = 0o600;
const OWNER_ONLY_FOLDER = 0o700;
const UNFINISHED = '.part';

/**
 * Files in a folder of this machine, two levels deep (`ab/cd/abcd…`). A file is written beside its place, brought to
 * the disk, then renamed, so that a power cut leaves it whole or not there.
 */
export class LocalFileStore implements FileStore {
  constructor(private readonly folder: string) {}

  async put(content: Readable, key: string): Promise<void> {
    const target = this.pathOf(key);
    const folder = path.dirname(target);
    await mkdir(folder, { recursive: true, mode: OWNER_ONLY_FOLDER });
    if (await exists(target)) throw new Error('This storage key is taken');
    const unfinished = `${target}.${randomUUID()}${UNFINISHED}`;
    try {
      const file = await open(unfinished, 'wx', OWNER_ONLY_FILE);
      try {
        await writeFile(file, content);
        await file.sync();
      } finally {
        await file.close();
      }
      await rename(unfinished, target);
      await syncFolder(folder);
    } catch (error) {
      await rm(unfinished, { force: true });
      throw error;
    }
  }

  async read(key: string, range?: ByteRange): Promise<Readable> {
    const file = await open(this.pathOf(key), 'r').catch(notStored);
    return file.createReadStream(range ? { start: range.start, end: range.end } : {});
  }

  async stat(key: string): Promise<StoredFacts | null> {
    try {
      const { size, mtime } = await stat(this.pathOf(key));
      return { bytes: size, storedAt: mtime };
    } catch (error) {
      if (isMissing(error)) return null;
      throw error;
    }
  }

  async remove(key: string): Promise<void> {
    await rm(this.pathOf(key), { force: true });
  }

  async *keys(): AsyncGenerator<string> {
    for (const first of await namesIn(this.folder)) {
      for (const second of await namesIn(path.join(this.folder, first))) {
        for (const name of await namesIn(path.join(this.folder, first, second))) {
          if (STORAGE_KEY.test(name)) yield name;
        }
      }
    }
  }

  /** Takes away what a process that ended in the middle of `put` left behind. For the start, before anybody writes. */
  async removeUnfinished(): Promise<number> {
    let removed = 0;
    for (const name of await readdir(this.folder, { recursive: true }).catch(nothing)) {
      if (!name.endsWith(UNFINISHED)) continue;
      await rm(path.join(this.folder, name), { force: true });
      removed += 1;
    }
    return removed;
  }

  private pathOf(key: string): string {
    if (!STORAGE_KEY.test(key)) throw new TypeError('A storage key is 32 characters of lower-case hex');
    return path.join(this.folder, key.slice(0, 2), key.slice(2, 4), key);
  }
}

/** The folder's own entry must reach the disk too, or the renamed file may be gone after a power cut. */
async function syncFolder(folder: string): Promise<void> {
  const handle = await open(folder, 'r');
  try {
    await handle.sync();
  } finally {
    await handle.close();
  }
}

async function exists(file: string): Promise<boolean> {
  return access(file, constants.F_OK).then(
    () => true,
    () => false,
  );
}

async function namesIn(folder: string): Promise<string[]> {
  return readdir(folder).catch(nothing);
}

function nothing(error: unknown): string[] {
  if (isMissing(error)) return [];
  throw error;
}

function notStored(error: unknown): never {
  throw isMissing(error) ? new FileNotStored('Nothing is kept under this key') : error;
}

function isMissing(error: unknown): boolean {
  const code = (error as { code?: unknown }).code;
  return code === 'ENOENT' || code === 'ENOTDIR';
}
