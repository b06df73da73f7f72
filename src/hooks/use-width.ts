import { useLayoutEffect, useRef, useState } from 'react';
import { usePrinting } from './use-printing.ts';

/**
 * The width of an element as it is laid out, so that a drawing in it keeps the size of its letters; on paper
 * that which it has there, since nothing is measured between the screen and the paper.
 */
export function useWidth(before: number, onPaper: number) {
  const [width, setWidth] = useState(before);
  const isPrinting = usePrinting();
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
  return { width: isPrinting ? onPaper : width, frame };
}
