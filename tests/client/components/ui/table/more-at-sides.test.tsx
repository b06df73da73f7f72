import { act, fireEvent, render, screen } from '@testing-library/react';
import { useRef } from 'react';
import { afterEach, expect, it, vi } from 'vitest';
import { MoreAtSides } from '../../../../../src/components/ui/table/more-at-sides.tsx';

let look: (() => void) | undefined;

class Observer {
  constructor(callback: () => void) {
    look = callback;
  }
  observe(): void {
    // told by hand
  }
  disconnect(): void {
    look = undefined;
  }
}

afterEach(() => {
  vi.unstubAllGlobals();
});

function Wide() {
  const scroller = useRef<HTMLDivElement>(null);
  return (
    <div data-testid="frame">
      <div ref={scroller} data-testid="scroller" />
      <MoreAtSides scroller={scroller} />
    </div>
  );
}

it('shows at which sides there is more', () => {
  vi.stubGlobal('ResizeObserver', Observer);
  render(<Wide />);
  const scroller = screen.getByTestId('scroller');
  const edges = () =>
    [...screen.getByTestId('frame').querySelectorAll('[aria-hidden]')].map(
      ({ className }) => /edge-\w+/.exec(className)?.[0],
    );
  expect(edges()).toEqual([]);
  Object.defineProperties(scroller, {
    clientWidth: { value: 300 },
    scrollWidth: { value: 500 },
  });
  act(() => look?.());
  expect(edges()).toEqual(['edge-right']);
  scroller.scrollLeft = 50;
  fireEvent.scroll(scroller);
  expect(edges()).toEqual(['edge-left', 'edge-right']);
  scroller.scrollLeft = 200;
  fireEvent.scroll(scroller);
  expect(edges()).toEqual(['edge-left']);
});
