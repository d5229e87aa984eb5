import { archivedPath } from '#shared/contracts/calendar-archive.js';
import { PassThrough, type Readable } from 'node:stream';
import { ZipFile } from 'yazl';
import { endingOf } from '../../media/file-endings.js';

/** A file to pack; it is opened when its turn comes. */
export interface FileToPack {
  sha256: string;
  contentType: string;
  bytes: number;
  open: () => Promise<Readable>;
}

interface CalendarToPack {
  fileName: string;
  json: string;
  at: Date;
}

/**
 * The calendar first, then each file once, none of them pressed: sounds and pictures are so already, and like this the size of
 * the whole is known before it begins.
 */
export function packCalendar(
  { fileName, json, at: mtime }: CalendarToPack,
  files: readonly FileToPack[],
): { content: Readable; bytes: number } {
  const zip = new ZipFile();
  const content = new PassThrough();
  let reading: Readable | null = null;
  zip.outputStream.pipe(content);
  zip.on('error', (cause: Error) => content.destroy(cause));
  // Whoever hangs up in the middle leaves no file open.
  content.on('close', () => reading?.destroy());
  const asItIs = { compress: false, mtime };
  zip.addBuffer(Buffer.from(json, 'utf8'), fileName, asItIs);
  for (const { sha256, contentType, bytes: size, open } of bySha256(files)) {
    zip.addReadStreamLazy(archivedPath(sha256, endingOf(contentType)), { ...asItIs, size }, (begin) => {
      const fail = (cause: Error) => content.destroy(cause);
      open().then((stream) => {
        reading = stream.on('error', fail);
        if (content.destroyed) stream.destroy();
        else begin(null, stream);
      }, fail);
    });
  }
  let bytes = 0;
  zip.end(undefined, (...[whole = 0]: number[]) => {
    bytes = whole;
  });
  return { content, bytes };
}

function bySha256(files: readonly FileToPack[]): FileToPack[] {
  return [...new Map(files.map((file) => [file.sha256, file])).values()];
}
