import { QueryClient } from '@tanstack/react-query';
import { ApiProblem } from './api-problem.js';

const MINUTE_MS = 60_000;

/** A refusal stays a refusal; only a missing network or a server in trouble is asked again. */
export function worthRetrying(failureCount: number, problem: Error): boolean {
  if (!(problem instanceof ApiProblem)) return false;
  return failureCount < 2 && (problem.status === 0 || problem.status >= 500);
}

export function createQueryClient(): QueryClient {
  return new QueryClient({
    defaultOptions: {
      queries: { retry: worthRetrying, staleTime: MINUTE_MS, gcTime: 30 * MINUTE_MS },
      mutations: { retry: false },
    },
  });
}
