import type { QueryClient } from '@tanstack/react-query';
import { createBrowserRouter, type RouteObject } from 'react-router-dom';
import { loadNamespaces } from '#src/lib/i18n.js';
import { sessionQuery } from '#src/lib/session.js';
import { DoorLayout } from './layout/door-layout.js';
import { FirstWait } from './layout/first-wait.js';
import { NeedsVillage, SignedInLayout } from './layout/signed-in-layout.js';
import { ErrorPage, NotFoundPage } from './error-page.js';
import { doorRoutes, personRoutes, villageRoutes, type AppRoute } from './routes.js';

export interface RouteHandle {
  rail: boolean;
}

export function createRouter(queryClient: QueryClient): ReturnType<typeof createBrowserRouter> {
  const toRoute = (route: AppRoute) => routeOf(queryClient, route);
  return createBrowserRouter([
    {
      // Asked while the page's own code is still on its way; a failure shows where the session is used.
      loader: () => {
        queryClient.query(sessionQuery).catch(() => undefined);
        return null;
      },
      shouldRevalidate: () => false,
      errorElement: <ErrorPage />,
      hydrateFallbackElement: <FirstWait />,
      children: [
        { element: <DoorLayout />, errorElement: <ErrorPage />, children: doorRoutes.map(toRoute) },
        {
          element: <SignedInLayout />,
          errorElement: <ErrorPage />,
          children: [
            ...personRoutes.map(toRoute),
            { element: <NeedsVillage />, children: villageRoutes.map(toRoute) },
            { path: '*', element: <NotFoundPage /> },
          ],
        },
      ],
    },
  ]);
}

function routeOf(client: QueryClient, { path, texts, load, askEarly, rail = true }: AppRoute): RouteObject {
  const handle: RouteHandle = { rail };
  return {
    path,
    handle,
    // A failure shows where the answer is used.
    ...(askEarly && {
      loader: ({ params }) => {
        askEarly(client, params).catch(() => undefined);
        return null;
      },
      shouldRevalidate: ({ currentUrl, nextUrl }) => currentUrl.pathname !== nextUrl.pathname,
    }),
    errorElement: <ErrorPage />,
    lazy: async () => {
      const [screen] = await Promise.all([load(), loadNamespaces(...texts)]);
      return { Component: screen.Component };
    },
  };
}
