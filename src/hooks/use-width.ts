import { useLayoutEffect, useRef, useState } from 'react';

/** The width of an element as it is laid out, so that a drawing in it keeps the size of its letters. */
export function useWidth(before: number) {
  const [width, setWidth] = useState(before);
  const frame = useRef<HTMLDivElement>(null);
  useLayoutEffect(() => {
    const element = frame.current;
    if (element === null || typeof ResizeObserver === 'undefined') return undefined;
    const observer = new ResizeObserver(() => {
      if (element.clientWidth > 0) setWidth(element.clientWidth);
    });
    observer.observe(element);
    return () => {
      observer.disconnect();
    };
  }, []);
  return { width, frame };
}
