import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { render, type RenderResult } from '@testing-library/react';
import userEvent, { type UserEvent } from '@testing-library/user-event';
import i18next from 'i18next';
import { Suspense, type ReactNode } from 'react';
import { initReactI18next } from 'react-i18next';
import { createMemoryRouter, RouterProvider } from 'react-router-dom';
import type { SessionState } from '#shared/contracts/session.js';
import { resources } from '#shared/locales/index.js';
import { CurrentCommunityProvider } from '#src/lib/community.js';
import { sessionQuery } from '#src/lib/session.js';
import { ToastProvider } from '#src/ui/toast.js';

export const VISITOR: SessionState = { person: null, memberships: null, card: null, csrfToken: 'test' };

export const OFFICER: SessionState = {
  person: {
    id: '0190a3a0-0000-7000-8000-000000000001',
    email: 'officer@dawnpeg.example',
    displayName: 'Beyno',
  },
  memberships: [
    {
      communityId: '0190a3a0-0000-7000-8000-0000000000a1',
      communityName: 'Upper Tazimel',
      roles: ['officer'],
    },
  ],
  card: null,
  csrfToken: 'test',
};

interface BoardOptions {
  session?: SessionState;
  /** The address on screen. */
  path?: string;
  /** Pattern of the address, for screens that read its parameters. */
  pattern?: string;
  queryClient?: QueryClient;
}

/**
 * Puts a screen or a part of one on the board: with the real English texts, a session, an address and toasts.
 * Calls to the API go to `fetch`, which the test replaces.
 */
export async function renderOnBoard(
  element: ReactNode,
  { session = OFFICER, path = '/', pattern = '*', queryClient = testQueryClient() }: BoardOptions = {},
): Promise<RenderResult & { user: UserEvent; queryClient: QueryClient; address: () => string }> {
  await startTexts();
  queryClient.setQueryData(sessionQuery.queryKey, session);
  const router = createMemoryRouter(
    [
      { path: pattern, element },
      { path: '*', element: null },
    ],
    { initialEntries: [path] },
  );
  const view = render(
    <QueryClientProvider client={queryClient}>
      <ToastProvider>
        <CurrentCommunityProvider>
          <Suspense fallback="waiting">
            <RouterProvider router={router} />
          </Suspense>
        </CurrentCommunityProvider>
      </ToastProvider>
    </QueryClientProvider>,
  );
  const address = () => router.state.location.pathname + router.state.location.search;
  return { ...view, user: userEvent.setup({ delay: null }), queryClient, address };
}

export function testQueryClient(): QueryClient {
  return new QueryClient({
    defaultOptions: { queries: { retry: false, staleTime: Infinity }, mutations: { retry: false } },
  });
}

async function startTexts(): Promise<void> {
  if (i18next.isInitialized) return;
  await i18next.use(initReactI18next).init({
    lng: 'en',
    defaultNS: 'common',
    resources,
    interpolation: { escapeValue: false },
    returnNull: false,
  });
}
