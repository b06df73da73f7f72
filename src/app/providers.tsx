import { QueryClientProvider } from '@tanstack/react-query';
import { createBrowserRouter, RouterProvider } from 'react-router-dom';
import { queryClient } from '../lib/query-client.ts';
import { ROUTES } from './router.tsx';

const router = createBrowserRouter([...ROUTES]);

/** What every page stands on: what has been fetched, and the address. */
export function Providers() {
  return (
    <QueryClientProvider client={queryClient}>
      <RouterProvider router={router} />
    </QueryClientProvider>
  );
}
