import { fireEvent, render, screen } from '@testing-library/react';
import { describe, expect, it, vi } from 'vitest';
import { setSingleKeys } from '../../../src/config/single-keys.ts';
import { useHotkeys } from '../../../src/hooks/use-hotkeys.ts';

const act = vi.fn();

function Screen({ active = true }: { readonly active?: boolean }) {
  useHotkeys({ j: act, Escape: act }, active);
  return (
    <>
      <input aria-label="Name" />
      <input type="checkbox" aria-label="Mark" />
      <dialog data-testid="dialog" />
    </>
  );
}

function timesPressed(press: () => void): number {
  act.mockClear();
  press();
  return act.mock.calls.length;
}

describe('useHotkeys', () => {
  it('acts on keys, small or large', () => {
    render(<Screen />);
    expect(timesPressed(() => fireEvent.keyDown(document.body, { key: 'j' }))).toBe(1);
    expect(timesPressed(() => fireEvent.keyDown(document.body, { key: 'J' }))).toBe(1);
    expect(timesPressed(() => fireEvent.keyDown(document.body, { key: 'x' }))).toBe(0);
  });

  it('rests while something is written, but not on a tick', () => {
    render(<Screen />);
    expect(timesPressed(() => fireEvent.keyDown(screen.getByLabelText('Name'), { key: 'j' }))).toBe(
      0,
    );
    expect(timesPressed(() => fireEvent.keyDown(screen.getByLabelText('Mark'), { key: 'j' }))).toBe(
      1,
    );
  });

  it('leaves keys with a modifier to the browser', () => {
    render(<Screen />);
    const press = () => fireEvent.keyDown(document.body, { key: 'j', ctrlKey: true });
    expect(timesPressed(press)).toBe(0);
  });

  it('rests while a dialog is open, and when it is not wanted', () => {
    const { rerender } = render(<Screen />);
    screen.getByTestId<HTMLDialogElement>('dialog').showModal();
    expect(timesPressed(() => fireEvent.keyDown(document.body, { key: 'j' }))).toBe(0);
    screen.getByTestId<HTMLDialogElement>('dialog').close();
    rerender(<Screen active={false} />);
    expect(timesPressed(() => fireEvent.keyDown(document.body, { key: 'j' }))).toBe(0);
  });

  it('leaves single keys alone where they are turned off, but not Esc', () => {
    render(<Screen />);
    setSingleKeys(false);
    expect(timesPressed(() => fireEvent.keyDown(document.body, { key: 'j' }))).toBe(0);
    expect(timesPressed(() => fireEvent.keyDown(document.body, { key: 'Escape' }))).toBe(1);
  });
});
