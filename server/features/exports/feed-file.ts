import { createHash } from 'node:crypto';
import { Readable } from 'node:stream';
import type { StoredFile } from '../../http/file-reply.js';

/** A calendar for telephones as a file with a tag, so that one that has not changed is not sent again. */
export function feedFile(text: string): StoredFile {
  const content = Buffer.from(text, 'utf8');
  return {
    bytes: content.length,
    contentType: 'text/calendar; charset=utf-8',
    fileName: 'calendar.ics',
    tag: createHash('sha256').update(content).digest('hex'),
    open: (range) =>
      Promise.resolve(Readable.from([range ? content.subarray(range.start, range.end + 1) : content])),
  };
}
