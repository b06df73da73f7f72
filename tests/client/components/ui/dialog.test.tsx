import { fireEvent, render, screen } from '@testing-library/react';
import { useState } from 'react';
import { describe, expect, it, vi } from 'vitest';
import { Button } from '../../../../src/components/ui/button.tsx';
import { ConfirmDialog } from '../../../../src/components/ui/confirm-dialog.tsx';
import { Dialog } from '../../../../src/components/ui/dialog.tsx';
import { axeFaults } from '../../../support/axe-faults.ts';

function Asking({ onClose }: { readonly onClose: () => void }) {
  const [open, setOpen] = useState(false);
  return (
    <>
      <Button
        onClick={() => {
          setOpen(true);
        }}
      >
        Ask
      </Button>
      <Dialog
        open={open}
        title="Keys here"
        onClose={() => {
          setOpen(false);
          onClose();
        }}
      >
        <input aria-label="Search" data-first-in-focus />
      </Dialog>
    </>
  );
}

describe('Dialog', () => {
  it('opens with its title and the focus where it is wanted, and closes on Esc', async () => {
    const onClose = vi.fn();
    render(<Asking onClose={onClose} />);
    expect(screen.queryByRole('dialog')).toBeNull();
    fireEvent.click(screen.getByRole('button', { name: 'Ask' }));
    expect(screen.getByRole('dialog', { name: 'Keys here' })).toBeTruthy();
    expect(document.activeElement).toBe(screen.getByLabelText('Search'));
    expect(await axeFaults()).toEqual([]);
    fireEvent.keyDown(document.body, { key: 'Escape' });
    expect(onClose).toHaveBeenCalled();
    expect(screen.queryByRole('dialog')).toBeNull();
  });

  it('closes by its button and by a press outside, not by one inside', () => {
    const onClose = vi.fn();
    render(
      <Dialog open title="Keys here" onClose={onClose}>
        <p>Inside</p>
      </Dialog>,
    );
    fireEvent.mouseDown(screen.getByText('Inside'));
    expect(onClose).not.toHaveBeenCalled();
    fireEvent.mouseDown(screen.getByRole('dialog'));
    fireEvent.click(screen.getByRole('button', { name: 'Close' }));
    expect(onClose).toHaveBeenCalledTimes(2);
  });
});

describe('ConfirmDialog', () => {
  it('names what will be done and begins at the way out', () => {
    const [onConfirm, onClose] = [vi.fn(), vi.fn()];
    const props = { title: 'Archive it?', doIt: 'Archive it', onConfirm, onClose };
    render(
      <ConfirmDialog open {...props}>
        It can be brought back.
      </ConfirmDialog>,
    );
    const leave = screen.getByRole('button', { name: 'Leave it as it is' });
    expect(document.activeElement).toBe(leave);
    fireEvent.click(leave);
    fireEvent.click(screen.getByRole('button', { name: 'Archive it' }));
    expect(onClose).toHaveBeenCalledOnce();
    expect(onConfirm).toHaveBeenCalledOnce();
  });
});
