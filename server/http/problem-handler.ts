import { PROBLEM_TYPES, problemTypeUri, type Problem, type ProblemSlug } from '#shared/contracts/problem.js';
import type { ErrorRequestHandler, RequestHandler } from 'express';
import type { Logger } from 'pino';
import { AppError } from './app-error.js';
import { errorForLog } from './error-for-log.js';

/** Anything that no route answered. */
export const nothingHere: RequestHandler = () => {
  throw new AppError('not-found');
};

/** The one place that writes an error answer; the same in every environment. */
export function problemHandler(log: Logger): ErrorRequestHandler {
  return (error: unknown, request, response, next) => {
    if (response.headersSent) {
      next(error);
      return;
    }
    const refusal = asAppError(error);
    if (refusal.status >= 500)
      log.error({ err: errorForLog(error), requestId: request.id }, 'request failed');
    response.status(refusal.status).type('application/problem+json').json(problemOf(refusal, request.id));
  };
}

function problemOf(error: AppError, requestId: unknown): Problem {
  const { title, status } = PROBLEM_TYPES[error.slug];
  const { errors, reason, names, current, sent } = error.facts;
  return {
    type: problemTypeUri(error.slug),
    title,
    status,
    detail: error.message,
    ...(typeof requestId === 'string' ? { requestId } : {}),
    ...(errors ? { errors: [...errors] } : {}),
    ...(reason ? { reason } : {}),
    ...(names ? { names: [...names] } : {}),
    ...(error.slug === 'stale' ? { current, sent } : {}),
  };
}

/** Errors of the libraries in our own words. */
function asAppError(error: unknown): AppError {
  if (error instanceof AppError) return error;
  const { code, type, status, driverError } = error as {
    code?: unknown;
    type?: unknown;
    status?: unknown;
    driverError?: { code?: unknown };
  };
  if (code === 'EBADCSRFTOKEN') return new AppError('csrf-token');
  if (type === 'entity.too.large') return new AppError('too-large');
  if (type === 'entity.parse.failed' || (typeof status === 'number' && status >= 400 && status < 500)) {
    return new AppError('malformed-request');
  }
  const databaseCode = driverError?.code ?? code;
  return new AppError(
    typeof databaseCode === 'string' && UNREACHABLE.has(databaseCode)
      ? 'database-unreachable'
      : ('something-broke' satisfies ProblemSlug),
  );
}

const UNREACHABLE = new Set([
  'ECONNREFUSED',
  'ECONNRESET',
  'ENOTFOUND',
  'EPIPE',
  'PROTOCOL_CONNECTION_LOST',
  'ER_SERVER_SHUTDOWN',
  'POOL_CLOSED',
]);
