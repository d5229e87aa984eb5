import { PROBLEM_TYPES, problem, type FieldError, type ProblemSlug } from '#shared/contracts/problem.js';

/** `offline` and `unreadable` never come from the server: no network, or an answer that is not ours. */
export type ProblemWord = ProblemSlug | 'offline' | 'unreadable';

interface ProblemFacts {
  slug: ProblemWord;
  status: number;
  detail: string;
  errors?: readonly FieldError[];
  reason?: string | undefined;
  /** What stands in the way, by name. */
  names?: readonly string[] | undefined;
  requestId?: string | undefined;
  current?: unknown;
  sent?: unknown;
  /** From the Retry-After header, seconds. */
  retryAfterS?: number | undefined;
}

/** What every failed call throws. Screens show it through the `problems` texts, never through `message`. */
export class ApiProblem extends Error {
  readonly slug: ProblemWord;
  readonly status: number;
  readonly errors: readonly FieldError[];
  readonly reason: string | undefined;
  readonly names: readonly string[];
  readonly requestId: string | undefined;
  /** With `stale`: what the server holds now, and what was sent. */
  readonly current: unknown;
  readonly sent: unknown;
  readonly retryAfterS: number | undefined;

  constructor(facts: ProblemFacts) {
    super(facts.detail);
    this.name = 'ApiProblem';
    this.slug = facts.slug;
    this.status = facts.status;
    this.errors = facts.errors ?? [];
    this.reason = facts.reason;
    this.names = facts.names ?? [];
    this.requestId = facts.requestId;
    this.current = facts.current;
    this.sent = facts.sent;
    this.retryAfterS = facts.retryAfterS;
  }
}

/** Reads a failed answer. Anything that is not problem+json (a proxy's page, say) becomes `unreadable`. */
export async function readProblem(response: Response): Promise<ApiProblem> {
  const retryAfterS = seconds(response.headers.get('Retry-After'));
  const body: unknown = isProblemJson(response) ? await response.json().catch(() => null) : null;
  const parsed = problem.safeParse(body);
  if (!parsed.success) {
    return new ApiProblem({
      slug: 'unreadable',
      status: response.status,
      detail: `${String(response.status)} without a readable explanation`,
      retryAfterS,
    });
  }
  const { type, status, detail, errors, reason, names, requestId, current, sent } = parsed.data;
  return new ApiProblem({
    slug: slugOf(type),
    status,
    detail,
    errors: errors ?? [],
    reason,
    names,
    requestId,
    current,
    sent,
    retryAfterS,
  });
}

function isProblemJson(response: Response): boolean {
  return (response.headers.get('Content-Type') ?? '').includes('problem+json');
}

function slugOf(type: string): ProblemWord {
  const slug = type.slice(type.lastIndexOf('/') + 1);
  return slug in PROBLEM_TYPES ? (slug as ProblemSlug) : 'unreadable';
}

function seconds(header: string | null): number | undefined {
  const value = Number(header);
  return header !== null && Number.isFinite(value) && value > 0 ? value : undefined;
}
