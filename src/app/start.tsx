import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { Providers } from './providers.tsx';

/** Draws the application into the page. */
export function start(): void {
  const root = document.getElementById('root');
  if (root === null) throw new Error('index.html has lost its root.');
  createRoot(root).render(
    <StrictMode>
      <Providers />
    </StrictMode>,
  );
}
