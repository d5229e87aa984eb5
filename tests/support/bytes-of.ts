import type { Client } from './api.js';

/** An answer as the bytes that it is, whatever its type. */
export async function bytesOf(client: Client, path: string): Promise<Buffer> {
  return (await client.get(path).buffer(true).parse(asBuffer)).body as Buffer;
}

/** supertest reads files as text otherwise. Its type of the answer leaves the stream out. */
export function asBuffer(response: unknown, done: (error: Error | null, body: Buffer) => void): void {
  const stream = response as NodeJS.ReadableStream;
  const parts: Buffer[] = [];
  stream.on('data', (part: Buffer) => parts.push(part));
  stream.on('end', () => {
    done(null, Buffer.concat(parts));
  });
}
