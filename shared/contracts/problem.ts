import { z } from 'zod';

/** The closed list of problem types (RFC 9457). The `type` of an answer is `/problems/<slug>`. */
export const PROBLEM_TYPES = {
  'malformed-request': { status: 400, title: 'The request could not be read' },
  'not-signed-in': { status: 401, title: 'Sign in first' },
  'wrong-credentials': { status: 401, title: 'E-mail or password does not match' },
  'csrf-token': { status: 403, title: 'The page is out of date' },
  'not-allowed': { status: 403, title: 'Your role does not allow this' },
  'not-found': { status: 404, title: 'Nothing is here for you' },
  stale: { status: 409, title: 'Someone saved a newer state' },
  conflict: { status: 409, title: 'This does not fit the present state' },
  'draft-locked': { status: 409, title: 'The draft is locked while a submission is out' },
  'too-large': { status: 413, title: 'Too much was sent' },
  'wrong-content-type': { status: 415, title: 'Not in a form that is read here' },
  'invalid-input': { status: 422, title: 'Some fields need a change' },
  'code-not-valid': { status: 422, title: 'This code is not valid any more' },
  'link-not-valid': { status: 422, title: 'This link is not valid any more' },
  'too-many-attempts': { status: 429, title: 'Too many tries' },
  'something-broke': { status: 500, title: 'Something went wrong on our side' },
  'database-unreachable': { status: 503, title: 'The records cannot be reached' },
} as const satisfies Record<string, { status: number; title: string }>;

export type ProblemSlug = keyof typeof PROBLEM_TYPES;

export const fieldError = z.strictObject({
  /** Path of the field with dots, e.g. `skyline.3.altitudeDeg`; empty for the whole body. */
  field: z.string(),
  /** Code for a translated message, e.g. `too-long`. */
  code: z.string(),
  /** A sentence in English with the remedy. */
  message: z.string(),
});
export type FieldError = z.infer<typeof fieldError>;

export const problem = z.strictObject({
  type: z.string(),
  title: z.string(),
  status: z.number().int(),
  detail: z.string(),
  /** Also in the log: lets a steward quote it. */
  requestId: z.string().optional(),
  errors: z.array(fieldError).optional(),
  /** A machine-readable reason within the type, e.g. `two-submissions`. */
  reason: z.string().optional(),
  /** With `conflict`: what stands in the way, by name. */
  names: z.array(z.string()).optional(),
  /** With `stale`: what the server holds now, and what was sent. */
  current: z.unknown().optional(),
  sent: z.unknown().optional(),
});
export type Problem = z.infer<typeof problem>;

export function problemTypeUri(slug: ProblemSlug): string {
  return `/problems/${slug}`;
}
