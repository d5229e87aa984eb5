import type { ReactNode } from 'react';
import { Board } from '#src/ui/surfaces.js';
import { EmptyState, Skeleton, TroubleNote } from '#src/ui/waiting.js';
import { useProblemWords } from './problem-words.js';

interface VillageListProps<T extends { id: string }> {
  /** What TanStack Query has of the list. */
  query: { data: readonly T[] | undefined; error: Error | null; refetch: () => Promise<unknown> };
  /** Leads to a new one; null for whoever may not add. */
  add: ReactNode;
  none: { title: string; hint: ReactNode };
  lead?: string | undefined;
  card: (item: T) => ReactNode;
}

/** Things of a village as cards: on their way, not come through, none yet, or there with a way to add one. */
export function VillageList<T extends { id: string }>({ query, add, none, lead, card }: VillageListProps<T>) {
  const words = useProblemWords();
  const { data: items, error, refetch } = query;
  if (items === undefined) {
    return error === null ? (
      <Board>
        <Skeleton lines={4} />
      </Board>
    ) : (
      <TroubleNote sentence={words.problem(error)} onRetry={() => void refetch()} />
    );
  }
  if (items.length === 0) {
    return (
      <Board>
        <EmptyState title={none.title} action={add ?? undefined}>
          {none.hint}
        </EmptyState>
      </Board>
    );
  }
  return (
    <div className="grid gap-4">
      {lead !== undefined && <p className="text-small text-umber-soft">{lead}</p>}
      <ul className="grid gap-4 mid:grid-cols-2">
        {items.map((item) => (
          <li key={item.id}>{card(item)}</li>
        ))}
      </ul>
      {add !== null && <div>{add}</div>}
    </div>
  );
}
