import { useEffect, useEffectEvent, useRef, type RefObject } from 'react';

type Revealed = {
  readonly active: number;
  readonly startsAnewWith: string | undefined;
  readonly scroller: RefObject<HTMLDivElement | null>;
  readonly reveal: (index: number) => void;
};

/** Scrolls to the row that is reached from outside, and to the top when the rows are others. */
export function useRevealed({ active, startsAnewWith, scroller, reveal }: Revealed): void {
  const last = useRef(startsAnewWith);
  const show = useEffectEvent(reveal);
  useEffect(() => {
    if (last.current === startsAnewWith) return;
    last.current = startsAnewWith;
    scroller.current?.scrollTo({ top: 0 });
  }, [startsAnewWith, scroller]);
  useEffect(() => {
    if (active >= 0) show(active);
  }, [active]);
}
