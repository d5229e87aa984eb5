import { useMutation } from '@tanstack/react-query';
import { useRef } from 'react';
import { sameJson } from '#shared/kernel/canonical-json.js';
import { ApiProblem } from './api-problem.js';
import { newId } from './new-id.js';
import { worthRetrying } from './query-client.js';

interface Keyed<V> {
  value: V;
  key: string;
}

interface KeyedWrite<T, V, C> {
  /** Sends the value with its key. */
  write: (value: V, writeKey: string) => Promise<T>;
  onMutate?: (value: V) => Promise<C>;
  onSuccess: (result: T, value: V) => void;
  onError?: (before: C | undefined) => void;
}

interface After<T> {
  onSuccess?: (result: T) => void;
  onError?: (cause: Error) => void;
}

/**
 * A write that counts once, however often it is sent: where no answer is heard it is tried again by itself, with the same
 * key. Whoever keeps the key can send it again later, too.
 */
export function useKeyedWrite<T, V, C = undefined>({
  write,
  onMutate,
  onSuccess,
  onError,
}: KeyedWrite<T, V, C>) {
  const unheard = useRef<Keyed<V> | null>(null);
  const mutation = useMutation<T, Error, Keyed<V>, C | undefined>({
    mutationFn: ({ value, key }) => write(value, key),
    retry: worthRetrying,
    onMutate: async ({ value }) => (onMutate ? onMutate(value) : undefined),
    onSuccess: (result, { value }) => {
      unheard.current = null;
      onSuccess(result, value);
    },
    onError: (cause, keyed, before) => {
      unheard.current = isUnheard(cause) ? keyed : null;
      onError?.(before);
    },
  });
  // Asked for again because no answer came: it is the same write, and may have been done.
  const keyed = (value: V): Keyed<V> => {
    const last = unheard.current;
    return { value, key: last !== null && sameJson(last.value, value) ? last.key : newId() };
  };
  return {
    isPending: mutation.isPending,
    error: mutation.error,
    mutate: (value: V, { onSuccess: done, onError: failed }: After<T> = {}) => {
      mutation.mutate(keyed(value), {
        onSuccess: (result) => done?.(result),
        onError: (cause) => failed?.(cause),
      });
    },
    send: (value: V) => mutation.mutateAsync(keyed(value)),
    /** For whoever keeps keys by themselves. */
    mutateAsync: (value: V, key: string) => mutation.mutateAsync({ value, key }),
  };
}

/** Nobody knows whether it was done: no answer came, or none that can be read. */
export function isUnheard(cause: unknown): boolean {
  if (!(cause instanceof ApiProblem)) return false;
  return cause.status === 0 || cause.status >= 500 || cause.slug === 'unreadable';
}
