import type { QueryClient } from '@tanstack/react-query';
import { forgetWhere } from './device-storage.js';

/** A place on this device that keeps something of what people gave, e.g. recordings that were not sent. */
export type Forget = (ids: ReadonlySet<string>) => Promise<void> | void;

/** Lists of what is gone name its ids and nothing else; they are no trace of it. */
export const WITHDRAWN_KEY = 'withdrawn';

const keepers = new Set<Forget>();

/** Whoever keeps more than small texts on the device says here how it is forgotten. */
export function alsoForget(forget: Forget): void {
  keepers.add(forget);
}

/**
 * Takes things out of everything this device holds: texts that were not saved, what was read, what other parts keep.
 * What is on screen is asked for again. A place that cannot forget keeps no other from it.
 */
export async function forgetThings(client: QueryClient, ids: readonly string[]): Promise<void> {
  if (ids.length === 0) return;
  const gone = new Set(ids);
  forgetWhere((key) => key.split('.').some((part) => gone.has(part)));
  const holdsOne = ({ queryKey, state }: { queryKey: readonly unknown[]; state: { data: unknown } }) => {
    if (queryKey[0] === WITHDRAWN_KEY) return false;
    const text = JSON.stringify([queryKey, state.data]);
    return ids.some((id) => text.includes(id));
  };
  client.removeQueries({ type: 'inactive', predicate: holdsOne });
  await Promise.allSettled([
    client.invalidateQueries({ predicate: holdsOne }),
    ...[...keepers].map(async (forget) => forget(gone)),
  ]);
}
