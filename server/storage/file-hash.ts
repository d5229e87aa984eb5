import { createHash } from 'node:crypto';
import { createReadStream } from 'node:fs';
import type { Readable } from 'node:stream';
import { pipeline } from 'node:stream/promises';

/** SHA-256 of a file's bytes as lower-case hex. */
export async function sha256OfFile(path: string): Promise<string> {
  return sha256Of(createReadStream(path));
}

/** The same of whatever is read. */
export async function sha256Of(content: Readable): Promise<string> {
  const hash = createHash('sha256');
  await pipeline(content, hash);
  return hash.digest('hex');
}
