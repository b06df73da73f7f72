import { cleanup, configure } from '@testing-library/react';
import { afterEach, beforeEach, vi } from 'vitest';
import { queryClient } from '../../src/lib/query-client.ts';

/** jsdom has no modal dialogs: these open and close, and close on Esc as the browser's do. */
function openDialog(this: HTMLDialogElement): void {
  this.open = true;
  this.querySelector<HTMLElement>('button, input')?.focus();
}

function closeDialog(this: HTMLDialogElement): void {
  if (!this.open) return;
  this.open = false;
  this.dispatchEvent(new Event('close'));
}

function closeOnEscape({ key }: KeyboardEvent): void {
  if (key === 'Escape') document.querySelector<HTMLDialogElement>('dialog[open]')?.close();
}

/** jsdom knows no media: the window is as wide as at a desk, which no query for narrow ones is true of. */
function atDesk(media: string): MediaQueryList {
  return Object.assign(new EventTarget(), {
    media,
    matches: media.includes('min-width'),
    onchange: null,
    addListener: () => undefined,
    removeListener: () => undefined,
  });
}

/** What a page says in the console is a fault of it. */
function fail(...said: readonly unknown[]): never {
  throw new Error(`The console was told: ${said.map(String).join(' ')}`);
}

// modules of plain logic are tested without a page
if (typeof document !== 'undefined') {
  // what a page is to show may take its time on a busy machine
  configure({ asyncUtilTimeout: 30_000 });
  HTMLDialogElement.prototype.showModal = openDialog;
  HTMLDialogElement.prototype.close = closeDialog;
  Element.prototype.scrollIntoView = () => undefined;
  Element.prototype.scrollTo = () => undefined;
  window.matchMedia = atDesk;
  document.addEventListener('keydown', closeOnEscape);

  beforeEach(() => {
    vi.spyOn(console, 'error').mockImplementation(fail);
  });

  afterEach(() => {
    cleanup();
    queryClient.clear();
    localStorage.clear();
    vi.unstubAllGlobals();
    vi.restoreAllMocks();
  });
}
