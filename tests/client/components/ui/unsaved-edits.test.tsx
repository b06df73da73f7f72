import { fireEvent, screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { Link, useLocation } from 'react-router-dom';
import { UnsavedEdits } from '../../../../src/components/ui/unsaved-edits.tsx';
import { renderPage } from '../../../support/render-page.tsx';

function Place({ hasEdits }: { readonly hasEdits: boolean }) {
  const { pathname } = useLocation();
  return (
    <>
      {pathname === '/' ? <UnsavedEdits hasEdits={hasEdits} /> : <p>Elsewhere</p>}
      <Link to="/other">Go</Link>
    </>
  );
}

/** Whether the browser asks before the window is closed. */
function asksOnClosing(): boolean {
  return !fireEvent(window, new Event('beforeunload', { cancelable: true }));
}

describe('UnsavedEdits', () => {
  it('lets go who has written nothing', async () => {
    renderPage(<Place hasEdits={false} />);
    expect(asksOnClosing()).toBe(false);
    fireEvent.click(screen.getByText('Go'));
    expect(await screen.findByText('Elsewhere')).toBeTruthy();
  });

  it('asks who has written something, and stays or goes as they say', async () => {
    renderPage(<Place hasEdits />);
    expect(asksOnClosing()).toBe(true);
    fireEvent.click(screen.getByText('Go'));
    await screen.findByRole('dialog', { name: 'Leave without saving?' });
    fireEvent.click(screen.getByRole('button', { name: 'Stay here' }));
    expect(screen.queryByText('Elsewhere')).toBeNull();
    fireEvent.click(screen.getByText('Go'));
    fireEvent.click(await screen.findByRole('button', { name: 'Throw it away and leave' }));
    expect(await screen.findByText('Elsewhere')).toBeTruthy();
  });
});
