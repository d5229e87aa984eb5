import { WRITE_KEY, WRITE_KEY_HEADER } from '#shared/contracts/write-key.js';
import type { Endpoint } from '#shared/contracts/endpoint.js';
import type { Request } from 'express';
import { createHash } from 'node:crypto';
import { AppError } from './app-error.js';
import type { Actor, WriteKey } from './actor.js';

/**
 * The key that a write came with; undefined for one without. It is the person's own: the same letters from another are another.
 * @param body what was asked for, whole: of a file its hash beside the words that came with it
 */
export function writeKeyOf(
  endpoint: Endpoint,
  request: Request,
  { person }: Actor,
  body: unknown,
): WriteKey | undefined {
  const key = request.get(WRITE_KEY_HEADER);
  if (!endpoint.countsOnce || key === undefined) return undefined;
  if (!WRITE_KEY.test(key)) throw new AppError('malformed-request');
  const asked = [request.method, request.originalUrl, body ?? null];
  return {
    keyHash: sha256(JSON.stringify([person.id, key])),
    callHash: sha256(JSON.stringify([key, ...asked])),
  };
}

function sha256(text: string): string {
  return createHash('sha256').update(text).digest('hex');
}
