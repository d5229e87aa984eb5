import { open, type FileHandle } from 'node:fs/promises';

/** Reads small pieces of a file at given places, so that an hour of voice never stands in memory. */
export interface ByteReader {
  size: number;
  /** At most `length` bytes from `position` on; fewer at the end of the file. */
  at(position: number, length: number): Promise<Buffer>;
}

export async function withByteReader<T>(
  filePath: string,
  work: (reader: ByteReader) => Promise<T>,
): Promise<T> {
  const file = await open(filePath, 'r');
  try {
    return await work(await readerOf(file));
  } finally {
    await file.close();
  }
}

async function readerOf(file: FileHandle): Promise<ByteReader> {
  const { size } = await file.stat();
  return {
    size,
    at: async (position, length) => {
      const { buffer, bytesRead } = await file.read(Buffer.alloc(length), 0, length, position);
      return buffer.subarray(0, bytesRead);
    },
  };
}
