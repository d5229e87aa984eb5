import type { Upload } from '#shared/contracts/endpoint.js';
import type { Request, Response } from 'express';
import multer, { diskStorage, MulterError } from 'multer';
import { randomUUID } from 'node:crypto';
import { mkdir, rm, stat } from 'node:fs/promises';
import path from 'node:path';
import { AppError, invalidField } from './app-error.js';

/** A file that came with a call. It lies in a waiting folder until the call is answered, then it is gone. */
export interface UploadedFile {
  path: string;
  bytes: number;
}

/** What came: the input as it was sent, still to be checked, and the file. */
interface Received {
  meta: unknown;
  file: UploadedFile;
}

const META_MAX_BYTES = 64 * 1024;
const OWNER_ONLY = 0o700;

/**
 * Takes a multipart body in: the field `meta` (JSON) and one file in the field `file`. Call it once it is known
 * that the person may send at all; before that nothing of the body is read. The file is removed when `work` ends,
 * however it ends.
 */
export async function withUpload<T>(
  {
    request,
    response,
    folder,
    upload,
  }: { request: Request; response: Response; folder: string; upload: Upload },
  work: (received: Received) => Promise<T>,
): Promise<T> {
  if (request.is('multipart/form-data') === false) throw new AppError('wrong-content-type');
  await mkdir(folder, { recursive: true, mode: OWNER_ONLY });
  const filePath = path.join(folder, randomUUID());
  try {
    await takeIn(request, response, filePath, upload);
    const { file } = request;
    if (file === undefined) throw invalidField('file', 'required');
    const { size: bytes } = await stat(filePath);
    return await work({ meta: metaOf(request), file: { path: filePath, bytes } });
  } finally {
    await rm(filePath, { force: true });
  }
}

function takeIn(request: Request, response: Response, filePath: string, { maxBytes }: Upload): Promise<void> {
  const receive = multer({
    storage: diskStorage({
      destination: path.dirname(filePath),
      filename: (_request, _file, done) => {
        done(null, path.basename(filePath));
      },
    }),
    limits: { fileSize: maxBytes, files: 1, fields: 1, fieldSize: META_MAX_BYTES, parts: 2 },
  }).single('file');
  return new Promise((resolve, reject) => {
    receive(request, response, (cause: unknown) => {
      if (cause === undefined || cause === null) resolve();
      else reject(refusalOf(cause));
    });
  });
}

function refusalOf(cause: unknown): AppError {
  if (cause instanceof MulterError && cause.code === 'LIMIT_FILE_SIZE') {
    return new AppError('too-large', { reason: 'file-too-large' });
  }
  // A torn connection, a broken form, fields that nobody asked for: nothing that could be answered better.
  return new AppError('malformed-request');
}

function metaOf(request: Request): unknown {
  const { meta } = (request.body ?? {}) as { meta?: unknown };
  if (typeof meta !== 'string') throw invalidField('meta', 'required');
  try {
    return JSON.parse(meta) as unknown;
  } catch {
    throw new AppError('malformed-request');
  }
}
