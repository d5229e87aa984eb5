import type { Readable } from 'node:stream';

/** Bytes from `start` to `end`, both counted from 0 and both included. */
export interface ByteRange {
  start: number;
  end: number;
}

export interface StoredFacts {
  bytes: number;
  storedAt: Date;
}

/**
 * Where attachments are kept. The product knows this interface only: a folder on this machine today, another store
 * tomorrow. `tests/support/file-store-rules.ts` holds every implementation to the same rules.
 */
export interface FileStore {
  /** Keeps the whole content under a new key, or nothing at all. A key that is taken is refused. */
  put(content: Readable, key: string): Promise<void>;
  /** @throws {FileNotStored} where nothing is kept under the key. */
  read(key: string, range?: ByteRange): Promise<Readable>;
  /** Null where nothing is kept under the key. */
  stat(key: string): Promise<StoredFacts | null>;
  /** Takes the file away; one that is gone already stays gone. */
  remove(key: string): Promise<void>;
  /** Every key, in no order. */
  keys(): AsyncIterable<string>;
}

/** Nothing is kept under the key. */
export class FileNotStored extends Error {
  override readonly name = 'FileNotStored';
}

/** 128 random bits as lower-case hex: nobody can guess one, and it says nothing about what it names. */
export const STORAGE_KEY = /^[0-9a-f]{32}$/u;
