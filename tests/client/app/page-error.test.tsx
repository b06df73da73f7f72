import { render, screen } from '@testing-library/react';
import { createMemoryRouter, RouterProvider } from 'react-router-dom';
import { expect, it, vi } from 'vitest';
import { PageError } from '../../../src/app/page-error.tsx';

function Broken(): never {
  throw new Error('x is not defined');
}

it('stands in for a page that failed, says what stands and offers to load it again', async () => {
  // React tells the console of every error that a boundary catches
  vi.spyOn(console, 'error').mockImplementation(() => undefined);
  const routes = [{ path: '/', Component: Broken, ErrorBoundary: PageError }];
  render(<RouterProvider router={createMemoryRouter(routes)} />);
  expect(await screen.findByRole('heading', { name: 'This page stopped' })).toBeTruthy();
  expect(screen.getByRole('alert').textContent).not.toContain('x is not defined');
  expect(screen.getByRole('button', { name: 'Load it again' })).toBeTruthy();
});
