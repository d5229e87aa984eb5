import { describe, expect, it } from 'vitest';
import { ApiProblem } from '#src/lib/api-problem.js';
import { worthRetrying } from '#src/lib/query-client.js';

const problem = (status: number) => new ApiProblem({ slug: 'unreadable', status, detail: '' });

describe('asking again', () => {
  it('helps against a missing network and a server in trouble, twice', () => {
    for (const status of [0, 500, 503]) {
      expect(worthRetrying(0, problem(status))).toBe(true);
      expect(worthRetrying(1, problem(status))).toBe(true);
      expect(worthRetrying(2, problem(status))).toBe(false);
    }
  });

  it('does not help against a refusal, nor against a fault of our own', () => {
    for (const status of [401, 403, 404, 409, 422, 429])
      expect(worthRetrying(0, problem(status))).toBe(false);
    expect(worthRetrying(0, new TypeError('ours'))).toBe(false);
  });
});
