import { buffer } from 'node:stream/consumers';
import { fromBufferPromise } from 'yauzl';
import { ZipFile } from 'yazl';

export interface ZippedFile {
  path: string;
  content: Buffer | string;
  /** Of a Unix file; a plain one unless something else is said. */
  mode?: number;
}

/** A ZIP as somebody packs one by hand: pressed. */
export async function zipped(files: readonly ZippedFile[]): Promise<Buffer> {
  const zip = new ZipFile();
  for (const { path, content, mode = 0o100644 } of files) {
    zip.addBuffer(Buffer.from(content), path, { mode, mtime: new Date('2026-12-01T06:00:00Z') });
  }
  zip.end();
  return buffer(zip.outputStream);
}

/** What stands in a ZIP, in its order, read by a package that did not write it. */
export async function unzipped(zip: Buffer): Promise<ZippedFile[]> {
  const opened = await fromBufferPromise(zip, { strictFileNames: true });
  const files: ZippedFile[] = [];
  for await (const entry of opened.eachEntry()) {
    const content = await buffer(await opened.openReadStreamPromise(entry));
    files.push({ path: entry.fileName, content });
  }
  return files;
}
