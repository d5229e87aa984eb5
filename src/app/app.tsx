import { QueryClientProvider } from '@tanstack/react-query';
import { useState } from 'react';
import { RouterProvider } from 'react-router-dom';
import { createQueryClient } from '#src/lib/query-client.js';
import { createRouter } from './router.js';

export function App() {
  const [queryClient] = useState(createQueryClient);
  const [router] = useState(() => createRouter(queryClient));
  return (
    <QueryClientProvider client={queryClient}>
      <RouterProvider router={router} />
    </QueryClientProvider>
  );
}
