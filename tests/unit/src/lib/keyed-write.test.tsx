import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { act, renderHook, waitFor } from '@testing-library/react';
import type { ReactNode } from 'react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { useActualDays } from '#src/lib/use-actual-days.js';
import {
  useAddEntry,
  useDeleteEntry,
  useDuplicateEntry,
  useReorderEntries,
  useRestoreEntry,
  useSubmitDraft,
  useUpdateEntry,
} from '#src/features/calendars/api/entry-mutations.js';
import { useRemoveVariant, useSaveVariant } from '#src/features/calendars/api/variant-queries.js';
import { content } from '#tests/support/draft-of-tazimel.js';
import { variantInput } from '#tests/support/variant-api.js';

import { OFFICER } from '#tests/support/on-board.js';

/** A network that loses what it is told to; `heard` are the writes that came to the server. */
let lose: ('before' | 'after')[];
let heard: { call: string; key: string | null }[];

beforeEach(() => {
  lose = [];
  heard = [];
  vi.stubGlobal('fetch', (address: string, { method = 'GET', headers }: RequestInit = {}) => {
    if (address === '/api/session') return Promise.resolve(Response.json(OFFICER));
    const mishap = lose.shift();
    if (mishap !== 'before') {
      heard.push({ call: `${method} ${address}`, key: new Headers(headers).get('Idempotency-Key') });
    }
    if (mishap !== undefined) return Promise.reject(new TypeError('network'));
    return Promise.resolve(new Response(null, { status: 204 }));
  });
});
afterEach(() => {
  vi.unstubAllGlobals();
});

const around = ({ children }: { children: ReactNode }) => (
  <QueryClientProvider client={new QueryClient({ defaultOptions: { mutations: { retryDelay: 0 } } })}>
    {children}
  </QueryClientProvider>
);
const [calendarId, entryId, other] = ['c1', 'e1', 'e2'].map((word) => word.padEnd(36, '0')) as [
  string,
  string,
  string,
];

/** Every write of the editor, as its screens make it. */
const WRITES: Record<string, () => () => void> = {
  add: () => bound(useAddEntry(calendarId), content()),
  save: () => bound(useUpdateEntry(calendarId), { entryId, content: content(), version: 1 }),
  copy: () => bound(useDuplicateEntry(calendarId), entryId),
  'take out': () => bound(useDeleteEntry(calendarId), entryId),
  'put back': () => bound(useRestoreEntry(calendarId), entryId),
  move: () => bound(useReorderEntries(calendarId), [other, entryId]),
  submit: () => bound(useSubmitDraft(calendarId), undefined),
  'actual day': () =>
    bound(useActualDays(calendarId, entryId).put, {
      ...{ from: '2027-05-04', to: null, saidBy: 'Beyno', plots: '' },
    }),
  'take back the actual day': () => bound(useActualDays(calendarId, entryId).remove, undefined),
  'add a variant': () => bound(useSaveVariant(calendarId, entryId), { content: variantInput(), saved: null }),
  'save a variant': () =>
    bound(useSaveVariant(calendarId, entryId), {
      content: variantInput(),
      saved: { variantId: other, version: 1 },
    }),
  'remove a variant': () => bound(useRemoveVariant(calendarId, entryId), other),
};

function bound<V>({ mutate }: { mutate: (value: V) => void }, value: V): () => void {
  return () => {
    mutate(value);
  };
}

describe.each(Object.entries(WRITES))('%s', (_name, use) => {
  it('comes through where the network loses it on the way there, and has one key also where it loses the answer', async () => {
    const { result, unmount } = renderHook(use, { wrapper: around });
    lose = ['before', 'after'];
    act(result.current);
    await waitFor(() => {
      expect(heard).toHaveLength(2);
    });
    expect(heard[0]?.key).toMatch(/^[\w-]{20,}$/u);
    expect(heard[1]).toEqual(heard[0]);
    unmount();
  });
});

it('pressed again when no answer ever came, it is the same write; once it is answered, the next one is another', async () => {
  const { result } = renderHook(() => useDeleteEntry(calendarId), { wrapper: around });
  const press = async (count: number) => {
    act(() => {
      result.current.mutate(entryId);
    });
    await waitFor(() => {
      expect(heard).toHaveLength(count);
      expect(result.current.isPending).toBe(false);
    });
  };
  lose = ['after', 'after', 'after'];
  await press(3);
  await press(4);
  await press(5);
  const keys = heard.map(({ key }) => key);
  expect(new Set(keys.slice(0, 4)).size).toBe(1);
  expect(keys[4]).not.toBe(keys[3]);
});
