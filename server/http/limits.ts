import type { Request, RequestHandler } from 'express';
import { ipKeyGenerator, rateLimit } from 'express-rate-limit';
import { AppError } from './app-error.js';

export const BODY_LIMIT = '1mb';
const QUARTER_HOUR_MS = 15 * 60 * 1000;
const FAILED_TRIES_PER_ACCOUNT = 10;
const FAILED_TRIES_PER_ADDRESS = 50;
const FEED_FETCHES_PER_ADDRESS = 300;
const LETTERS_PER_ACCOUNT = 5;
const LETTERS_PER_ADDRESS = 30;

/** Slows down guessing of passwords and codes: per account and per network address, failures only. */
export function signInLimits(): RequestHandler[] {
  return [
    limit(FAILED_TRIES_PER_ADDRESS, (request) => ipKeyGenerator(request.ip ?? '')),
    limit(FAILED_TRIES_PER_ACCOUNT, (request) => `account:${accountOf(request)}`),
  ];
}

/** Letters that anybody may ask for: every asking counts. */
export function letterLimits(): RequestHandler[] {
  return [
    limit(LETTERS_PER_ADDRESS, (request) => ipKeyGenerator(request.ip ?? ''), false),
    limit(LETTERS_PER_ACCOUNT, (request) => `account:${accountOf(request)}`, false),
  ];
}

/** Addresses of calendars: guessing is slow, and a telephone that asks all the time is told to wait. */
export function feedLimits(): RequestHandler[] {
  const address = (request: Request) => ipKeyGenerator(request.ip ?? '');
  return [limit(FAILED_TRIES_PER_ADDRESS, address), limit(FEED_FETCHES_PER_ADDRESS, address, false)];
}

function limit(
  tries: number,
  keyGenerator: (request: Request) => string,
  failuresOnly = true,
): RequestHandler {
  return rateLimit({
    windowMs: QUARTER_HOUR_MS,
    limit: tries,
    keyGenerator,
    skipSuccessfulRequests: failuresOnly,
    standardHeaders: 'draft-8',
    legacyHeaders: false,
    handler: () => {
      throw new AppError('too-many-attempts');
    },
  });
}

function accountOf(request: Request): string {
  const { email, code } = (request.body ?? {}) as { email?: unknown; code?: unknown };
  if (typeof email === 'string') return email.trim().toLowerCase().slice(0, 190);
  // A card goes by its code alone.
  return typeof code === 'string'
    ? code
        .toUpperCase()
        .replace(/[^A-Z0-9]/gu, '')
        .slice(0, 190)
    : '';
}
