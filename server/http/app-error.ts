import { texts } from '#shared/locales/en/problems.js';
import { PROBLEM_TYPES, type FieldError, type ProblemSlug } from '#shared/contracts/problem.js';

export type ProblemReason = keyof typeof texts.reason;
export type FieldCode = keyof typeof texts.field;

export interface AppErrorFacts {
  /** One entry per refused field. */
  errors?: readonly FieldError[];
  reason?: ProblemReason;
  /** What stands in the way, by name. */
  names?: readonly string[];
  /** With `stale`: what is stored now, and what was sent. */
  current?: unknown;
  sent?: unknown;
}

/** Everything that a service refuses. The problem handler turns it into problem+json; nothing else does. */
export class AppError extends Error {
  readonly slug: ProblemSlug;
  readonly facts: AppErrorFacts;

  constructor(slug: ProblemSlug, facts: AppErrorFacts = {}) {
    super(facts.reason === undefined ? texts.type[slug] : texts.reason[facts.reason]);
    this.name = 'AppError';
    this.slug = slug;
    this.facts = facts;
  }

  get status(): number {
    return PROBLEM_TYPES[this.slug].status;
  }
}

export function notFound(): AppError {
  return new AppError('not-found');
}

export function conflict(reason: ProblemReason, names?: readonly string[]): AppError {
  return new AppError('conflict', { reason, ...(names ? { names } : {}) });
}

/** A refusal of one field, for rules that no schema can know. */
export function invalidField(field: string, code: FieldCode): AppError {
  return new AppError('invalid-input', { errors: [{ field, code, message: texts.field[code] }] });
}

export function stale(current: unknown, sent: unknown): AppError {
  return new AppError('stale', { current, sent });
}
