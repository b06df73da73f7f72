import { useState, type KeyboardEvent, type PointerEvent } from 'react';
import type { Spot } from '../../../../shared/evidence/marks.ts';

/** How far an arrow key moves a frame on paper, in mm. */
const STEP = 10;

const ARROWS: Readonly<Record<string, Spot>> = {
  ArrowLeft: [STEP, 0],
  ArrowRight: [-STEP, 0],
  ArrowUp: [0, STEP],
  ArrowDown: [0, -STEP],
};

type Drag = { readonly from: Spot; readonly shift: Spot };

/** Moves what a sheet shows under its frame, by hand or with the arrow keys; told in mm at the end. Escape gives a drag up. */
export function useDrag(width: number, onMove: ((by: Spot) => void) | null) {
  const [drag, setDrag] = useState<Drag | null>(null);
  const perPixel = (target: Element) => width / Math.max(1, target.getBoundingClientRect().width);
  function shiftTo(event: PointerEvent, { from }: Drag): Spot {
    const scale = perPixel(event.currentTarget);
    return [(event.clientX - from[0]) * scale, (event.clientY - from[1]) * scale];
  }
  const shift = drag?.shift ?? ([0, 0] as const);
  if (onMove === null) return { shift, handlers: {} };
  return {
    shift,
    handlers: {
      onPointerDown: (event: PointerEvent) => {
        if (event.button !== 0) return;
        event.currentTarget.setPointerCapture(event.pointerId);
        setDrag({ from: [event.clientX, event.clientY], shift: [0, 0] });
      },
      onPointerMove: (event: PointerEvent) => {
        if (drag !== null) setDrag({ ...drag, shift: shiftTo(event, drag) });
      },
      onPointerUp: (event: PointerEvent) => {
        if (drag === null) return;
        setDrag(null);
        const by = shiftTo(event, drag);
        if (by[0] !== 0 || by[1] !== 0) onMove(by);
      },
      onPointerCancel: () => {
        setDrag(null);
      },
      onKeyDown: (event: KeyboardEvent) => {
        if (event.key === 'Escape' && drag !== null) {
          event.stopPropagation();
          setDrag(null);
          return;
        }
        const by = ARROWS[event.key];
        if (by === undefined || event.altKey || event.ctrlKey || event.metaKey) return;
        event.preventDefault();
        onMove(by);
      },
    },
  };
}
