import { MutationCache, QueryCache, QueryClient } from '@tanstack/react-query';
import { ApiProblem } from './api-problem.js';

const MINUTE_MS = 60_000;

export const SESSION_KEY = ['session'] as const;

/** A refusal stays a refusal; only a missing network or a server in trouble is asked again. */
export function worthRetrying(failureCount: number, problem: Error): boolean {
  if (!(problem instanceof ApiProblem)) return false;
  return failureCount < 2 && (problem.status === 0 || problem.status >= 500);
}

/**
 * When any call learns that the session has ended, the session is asked for again; the shell then leads to the
 * sign-in page and back. What was typed is kept on the device.
 */
export function createQueryClient(): QueryClient {
  const onError = (cause: Error) => {
    if (cause instanceof ApiProblem && cause.slug === 'not-signed-in') {
      void client.invalidateQueries({ queryKey: SESSION_KEY });
    }
  };
  const client = new QueryClient({
    queryCache: new QueryCache({ onError }),
    mutationCache: new MutationCache({ onError }),
    defaultOptions: {
      // 'always': without a network a call fails at once and says so, instead of waiting without a word.
      queries: {
        networkMode: 'always',
        refetchOnReconnect: true,
        retry: worthRetrying,
        staleTime: MINUTE_MS,
        gcTime: 30 * MINUTE_MS,
      },
      mutations: { networkMode: 'always', retry: false },
    },
  });
  return client;
}
