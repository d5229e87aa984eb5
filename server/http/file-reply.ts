import type { Endpoint } from '#shared/contracts/endpoint.js';
import type { Request, Response } from 'express';
import type { Readable } from 'node:stream';
import { pipeline } from 'node:stream/promises';

/** An answer that is a file. */
export class FileReply {
  constructor(
    readonly content: Buffer | string,
    readonly fileName: string,
    readonly disposition: 'attachment' | 'inline' = 'attachment',
  ) {}
}

export interface StoredFile {
  bytes: number;
  /** From a closed list: never what a sender said. */
  contentType: string;
  fileName: string;
  /** Changes when the content does. */
  tag: string;
  open: (range?: { start: number; end: number }) => Promise<Readable>;
}

/** An answer that is a kept file: whole, or one range of its bytes (RFC 9110, section 14). */
export class StoredFileReply {
  constructor(readonly file: StoredFile) {}
}

/** An answer that is a file made while it is sent; how large it becomes is known before. */
export class StreamedFileReply {
  constructor(readonly file: { content: Readable; bytes: number; fileName: string }) {}
}

/** RFC 6266: a plain name for old browsers, the real one in UTF-8. */
export function sendFile(response: Response, endpoint: Endpoint, file: FileReply): void {
  const charset = endpoint.fileType?.startsWith('text/') ? '; charset=utf-8' : '';
  response
    .status(endpoint.status)
    .setHeader('Content-Type', `${endpoint.fileType ?? 'application/octet-stream'}${charset}`)
    .setHeader('Content-Disposition', disposition(file.disposition, file.fileName))
    .setHeader('Cache-Control', 'no-store')
    .end(file.content);
}

/** What breaks in the middle breaks the connection: nobody takes half of it for the whole. */
export async function sendStreamedFile(
  request: Request,
  response: Response,
  endpoint: Endpoint,
  { content, bytes, fileName }: StreamedFileReply['file'],
): Promise<void> {
  response.status(endpoint.status).set({
    'Cache-Control': 'private, no-store',
    'Content-Disposition': disposition('attachment', fileName),
    'Content-Length': String(bytes),
    'Content-Type': endpoint.fileType ?? 'application/octet-stream',
    'X-Content-Type-Options': 'nosniff',
  });
  if (request.method === 'HEAD') {
    content.destroy();
    response.end();
  } else await pipeline(content, response).catch(swallowHangUp(response));
}

/** No cache may hold it, no page may run in it, no browser may guess another type. */
export async function sendStoredFile(request: Request, response: Response, file: StoredFile): Promise<void> {
  const etag = `"${file.tag}"`;
  response.set({
    ETag: etag,
    'Accept-Ranges': 'bytes',
    'Cache-Control': 'private, no-store',
    'Content-Disposition': disposition('inline', file.fileName),
    'Content-Security-Policy': "default-src 'none'; sandbox",
    'X-Content-Type-Options': 'nosniff',
  });
  if (request.get('If-None-Match') === etag) {
    response.status(304).end();
    return;
  }
  const range = wantedRange(request, file.bytes, etag);
  if (range === 'beyond') {
    response.status(416).set('Content-Range', `bytes */${file.bytes}`).end();
    return;
  }
  // Opened before anything is said about it: a file that is gone meanwhile is simply not there.
  const content = request.method === 'HEAD' ? null : await file.open(range ?? undefined);
  response.set({
    'Content-Type': file.contentType,
    'Content-Length': String(range === null ? file.bytes : range.end - range.start + 1),
  });
  if (range !== null) {
    response.status(206).set('Content-Range', `bytes ${range.start}-${range.end}/${file.bytes}`);
  }
  if (content === null) response.end();
  else await pipeline(content, response).catch(swallowHangUp(response));
}

/** One range is answered; several at once, or one of an older state, get the whole file. */
function wantedRange(
  request: Request,
  bytes: number,
  etag: string,
): { start: number; end: number } | 'beyond' | null {
  const condition = request.get('If-Range');
  if (condition !== undefined && condition !== etag) return null;
  const ranges = request.range(bytes);
  if (ranges === undefined || ranges === -2) return null;
  if (ranges === -1) return 'beyond';
  const [first, ...others] = ranges;
  return first === undefined || others.length > 0 || ranges.type !== 'bytes' ? null : first;
}

/** A listener who leaves in the middle is nobody's fault; a store that fails in the middle breaks the connection. */
function swallowHangUp(response: Response) {
  return (cause: unknown) => {
    response.destroy();
    if ((cause as { code?: unknown }).code !== 'ERR_STREAM_PREMATURE_CLOSE') throw cause;
  };
}

function disposition(kind: 'attachment' | 'inline', fileName: string): string {
  const plain = fileName.normalize('NFD').replace(/[^\w.-]+/gu, '_');
  return `${kind}; filename="${plain}"; filename*=UTF-8''${encodeURIComponent(fileName)}`;
}
