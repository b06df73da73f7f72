import { useRef, type KeyboardEvent, type PointerEvent } from 'react';
import { STRIP_HEIGHT, type StripChoice } from '../hooks/use-strip-choice.ts';

/** The upper edge of the strip, by which it is made higher or lower. */
export function StripEdge({ strip: { height, resize } }: { readonly strip: StripChoice }) {
  const held = useRef<{ y: number; height: number } | null>(null);

  function take(event: PointerEvent<HTMLDivElement>): void {
    event.currentTarget.setPointerCapture(event.pointerId);
    held.current = { y: event.clientY, height };
  }
  function drag({ clientY }: PointerEvent): void {
    if (held.current !== null) resize(held.current.height + held.current.y - clientY);
  }
  function drop(): void {
    held.current = null;
  }
  function press(event: KeyboardEvent): void {
    const by = { ArrowUp: STRIP_HEIGHT.step, ArrowDown: -STRIP_HEIGHT.step }[event.key];
    if (by === undefined) return;
    event.preventDefault();
    resize(height + by);
  }
  return (
    <div
      role="separator"
      aria-orientation="horizontal"
      aria-label="Height of the section"
      aria-valuenow={height}
      aria-valuemin={STRIP_HEIGHT.least}
      aria-valuemax={STRIP_HEIGHT.most}
      tabIndex={0}
      onPointerDown={take}
      onPointerMove={drag}
      onPointerUp={drop}
      onPointerCancel={drop}
      onKeyDown={press}
      className="absolute -top-[3px] right-0 left-0 z-10 h-[7px] cursor-ns-resize touch-none hover:bg-rule/50 max-sm:hidden print:hidden"
    />
  );
}
