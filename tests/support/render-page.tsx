import { QueryClientProvider } from '@tanstack/react-query';
import { render } from '@testing-library/react';
import type { ReactNode } from 'react';
import { createMemoryRouter, RouterProvider } from 'react-router-dom';
import { queryClient, SESSION_KEY } from '../../src/lib/query-client.ts';
import { aSession } from './answers.ts';

/** Renders a part of a page with what every page stands on; unless said otherwise, an assessor looks at it. */
export function renderPage(page: ReactNode, path = '/') {
  if (queryClient.getQueryData(SESSION_KEY) === undefined) {
    queryClient.setQueryData(SESSION_KEY, aSession());
  }
  const router = createMemoryRouter([{ path: '*', element: page }], { initialEntries: [path] });
  return render(
    <QueryClientProvider client={queryClient}>
      <RouterProvider router={router} />
    </QueryClientProvider>,
  );
}
