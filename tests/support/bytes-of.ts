import type { Client } from './api.js';

/** An answer as the bytes that it is, whatever its type. */
export async function bytesOf(client: Client, path: string): Promise<Buffer> {
  const answer = await client
    .get(path)
    .buffer(true)
    .parse((response, done) => {
      const parts: Buffer[] = [];
      response.on('data', (part: Buffer) => parts.push(part));
      response.on('end', () => {
        done(null, Buffer.concat(parts));
      });
    });
  return answer.body as Buffer;
}
