import type { Endpoint } from '#shared/contracts/endpoint.js';
import type { Response } from 'express';

/** An answer that is a file. */
export class FileReply {
  constructor(
    readonly content: Buffer | string,
    readonly fileName: string,
    readonly disposition: 'attachment' | 'inline' = 'attachment',
  ) {}
}

/** RFC 6266: a plain name for old browsers, the real one in UTF-8. */
export function sendFile(response: Response, endpoint: Endpoint, file: FileReply): void {
  const plain = file.fileName.normalize('NFD').replace(/[^\w.-]+/gu, '_');
  const charset = endpoint.fileType?.startsWith('text/') ? '; charset=utf-8' : '';
  response
    .status(endpoint.status)
    .setHeader('Content-Type', `${endpoint.fileType ?? 'application/octet-stream'}${charset}`)
    .setHeader(
      'Content-Disposition',
      `${file.disposition}; filename="${plain}"; filename*=UTF-8''${encodeURIComponent(file.fileName)}`,
    )
    .setHeader('Cache-Control', 'no-store')
    .end(file.content);
}
