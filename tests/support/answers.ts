import { vi } from 'vitest';
import { OFFICER } from './on-board.js';

export interface Sent {
  method: string;
  path: string;
  body: unknown;
}

/** Answers by `METHOD /path` without the query: a value, or a function of what was sent. */
export type Answers = Readonly<Record<string, unknown>>;

/**
 * Replaces `fetch` with answers of one's own and keeps what was sent. What has no answer is refused loudly; the
 * session answers by itself, because every first write asks it for its token.
 */
export function answerWith(own: Answers): Sent[] {
  const answers: Answers = { 'GET /api/session': OFFICER, ...own };
  const log: Sent[] = [];
  vi.stubGlobal('fetch', async (address: string, init: RequestInit = {}) => {
    const url = new URL(address, 'http://board.example');
    const method = init.method ?? 'GET';
    const body: unknown = typeof init.body === 'string' ? JSON.parse(init.body) : undefined;
    const sent = { method, path: url.pathname, body };
    log.push(sent);
    const key = `${method} ${url.pathname}`;
    if (!(key in answers)) throw new Error(`No answer for ${key}`);
    const answer = answers[key];
    const value: unknown =
      typeof answer === 'function' ? await (answer as AnswerFunction)(sent, url.searchParams) : answer;
    return value instanceof Response ? value : Response.json(value);
  });
  return log;
}

type AnswerFunction = (sent: Sent, search: URLSearchParams) => unknown;

/** A refusal as the server sends it. */
export function refusal(slug: string, status: number, more: Record<string, unknown> = {}): Response {
  const problem = { type: `/problems/${slug}`, title: slug, status, detail: slug, ...more };
  return new Response(JSON.stringify(problem), {
    status,
    headers: { 'Content-Type': 'application/problem+json' },
  });
}
