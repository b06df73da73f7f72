import { useEffect, useState, type RefObject } from 'react';
import { classNames } from '../../../lib/class-names.ts';

/** Where more is at a side: how far in from it the edge lies; undefined where there is no more. */
type More = { readonly left?: number; readonly right?: number; readonly height: number };

const NOTHING: More = { height: 0 };

/** How far the columns go that stay in view. */
function stuckWidth(scroller: HTMLElement): number {
  const start = scroller.getBoundingClientRect().left;
  const ends = [...scroller.querySelectorAll('th')]
    .filter((heading, index) => index === 0 || heading.style.left !== '')
    .map((heading) => heading.getBoundingClientRect().right - start);
  return Math.max(0, ...ends);
}

function moreOf(scroller: HTMLElement): More {
  const { scrollLeft, clientWidth, clientHeight, offsetWidth, scrollWidth } = scroller;
  return {
    ...(scrollLeft > 1 && { left: stuckWidth(scroller) }),
    ...(scrollLeft + clientWidth < scrollWidth - 1 && { right: offsetWidth - clientWidth }),
    height: clientHeight,
  };
}

function useMore(scroller: RefObject<HTMLElement | null>): More {
  const [more, setMore] = useState(NOTHING);
  useEffect(() => {
    const { current } = scroller;
    if (current === null || typeof ResizeObserver === 'undefined') return undefined;
    function look() {
      if (current === null) return;
      const next = moreOf(current);
      setMore((now) => (JSON.stringify(now) === JSON.stringify(next) ? now : next));
    }
    const observer = new ResizeObserver(look);
    observer.observe(current);
    for (const child of current.children) observer.observe(child);
    current.addEventListener('scroll', look, { passive: true });
    return () => {
      observer.disconnect();
      current.removeEventListener('scroll', look);
    };
  }, [scroller]);
  return more;
}

const EDGE = 'pointer-events-none absolute top-0 z-30 w-4 print:hidden';

/** A soft shadow at each side at which a table has more to be scrolled to. */
export function MoreAtSides({ scroller }: { readonly scroller: RefObject<HTMLElement | null> }) {
  const { left, right, height } = useMore(scroller);
  return (
    <>
      {left !== undefined && (
        <div
          aria-hidden="true"
          className={classNames(EDGE, 'edge-left')}
          style={{ left, height }}
        />
      )}
      {right !== undefined && (
        <div
          aria-hidden="true"
          className={classNames(EDGE, 'edge-right')}
          style={{ right, height }}
        />
      )}
    </>
  );
}
