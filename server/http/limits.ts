import type { Request, RequestHandler } from 'express';
import { ipKeyGenerator, rateLimit } from 'express-rate-limit';
import { AppError } from './app-error.js';

export const BODY_LIMIT = '1mb';
const QUARTER_HOUR_MS = 15 * 60 * 1000;
const FAILED_TRIES_PER_ACCOUNT = 10;
const FAILED_TRIES_PER_ADDRESS = 50;

/** Slows down guessing of passwords and codes: per account and per network address, failures only. */
export function signInLimits(): RequestHandler[] {
  return [
    limit(FAILED_TRIES_PER_ADDRESS, (request) => ipKeyGenerator(request.ip ?? '')),
    limit(FAILED_TRIES_PER_ACCOUNT, (request) => `account:${accountOf(request)}`),
  ];
}

function limit(tries: number, keyGenerator: (request: Request) => string): RequestHandler {
  return rateLimit({
    windowMs: QUARTER_HOUR_MS,
    limit: tries,
    keyGenerator,
    skipSuccessfulRequests: true,
    standardHeaders: 'draft-8',
    legacyHeaders: false,
    handler: () => {
      throw new AppError('too-many-attempts');
    },
  });
}

function accountOf(request: Request): string {
  const { email } = (request.body ?? {}) as { email?: unknown };
  return typeof email === 'string' ? email.trim().toLowerCase().slice(0, 190) : '';
}
