import { onlineManager } from '@tanstack/react-query';
import { describe, expect, it } from 'vitest';
import { ApiProblem } from '#src/lib/api-problem.js';
import { createQueryClient, SESSION_KEY, worthRetrying } from '#src/lib/query-client.js';

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

describe('a session that has ended', () => {
  const ended = new ApiProblem({ slug: 'not-signed-in', status: 401, detail: '' });

  it('is asked for again when any read or write learns of it', async () => {
    for (const learn of ['read', 'write'] as const) {
      const client = createQueryClient();
      client.setQueryData(SESSION_KEY, 'somebody');
      const call =
        learn === 'read'
          ? client.query({ queryKey: ['places'], queryFn: () => Promise.reject(ended) })
          : client
              .getMutationCache()
              .build(client, { mutationFn: () => Promise.reject(ended) })
              .execute(undefined);
      await expect(call).rejects.toBe(ended);
      expect(client.getQueryState(SESSION_KEY)?.isInvalidated, learn).toBe(true);
    }
  });

  it('is not suspected because of another refusal', async () => {
    const client = createQueryClient();
    client.setQueryData(SESSION_KEY, 'somebody');
    const queryFn = () => Promise.reject(problem(403));
    await expect(client.query({ queryKey: ['places'], queryFn })).rejects.toBeInstanceOf(ApiProblem);
    expect(client.getQueryState(SESSION_KEY)?.isInvalidated).toBe(false);
  });
});

describe('without a network', () => {
  it('a write fails at once and can say so, instead of waiting for the network', async () => {
    onlineManager.setOnline(false);
    try {
      const client = createQueryClient();
      const offline = new ApiProblem({ slug: 'offline', status: 0, detail: '' });
      const write = client.getMutationCache().build(client, {
        ...client.getDefaultOptions().mutations,
        mutationFn: () => Promise.reject(offline),
      });
      await expect(write.execute(undefined)).rejects.toBe(offline);
    } finally {
      onlineManager.setOnline(true);
    }
  });
});
