import { useVirtualizer } from '@tanstack/react-virtual';
import { useEffect, useEffectEvent, type RefObject } from 'react';
import { NARROW, useMedia } from '../../../hooks/use-media.ts';
import { usePrinting } from '../../../hooks/use-printing.ts';

/** From so many rows on, only those in view are in the page. */
const MANY = 100;
const ROW_HEIGHT = 30;
const TOUCH_ROW_HEIGHT = 44;
/** The headings lie over the rows while these are scrolled. */
const HEAD_HEIGHT = 44;
/** So many rows are printed: some forty pages. */
const MOST_PRINTED = 2000;

export type VirtualRows = {
  readonly indexes: readonly number[];
  /** Heights of what is left out above and below. */
  readonly above: number;
  readonly below: number;
  readonly measure: ((body: HTMLTableSectionElement | null) => void) | undefined;
  readonly reveal: (index: number) => void;
  /** How many rows are left out on paper. */
  readonly unprinted: number;
};

function allOf(count: number, most: number): VirtualRows {
  return {
    indexes: Array.from({ length: Math.min(count, most) }, (_, index) => index),
    above: 0,
    below: 0,
    measure: undefined,
    reveal: () => undefined,
    unprinted: Math.max(0, count - most),
  };
}

/** Scrolls as little as shows a row of a table that has all its rows in the page. */
function revealAmongAll(scroller: HTMLDivElement | null, index: number): void {
  scroller?.querySelector(`[data-row="${index}"]`)?.scrollIntoView({ block: 'nearest' });
}

/** Which rows are in the page: all of a few; of many those in view, and on paper the first. */
export function useVirtualRows(
  count: number,
  scroller: RefObject<HTMLDivElement | null>,
  onView: ((first: number, last: number) => void) | undefined,
): VirtualRows {
  const isVirtual = count > MANY;
  const isPrinting = usePrinting();
  const isNarrow = useMedia(NARROW);
  const virtualizer = useVirtualizer<HTMLDivElement, HTMLTableSectionElement>({
    count,
    enabled: isVirtual,
    getScrollElement: () => scroller.current,
    estimateSize: () => (isNarrow ? TOUCH_ROW_HEIGHT : ROW_HEIGHT),
    scrollPaddingEnd: HEAD_HEIGHT,
    overscan: 15,
  });
  const items = isVirtual ? virtualizer.getVirtualItems() : [];
  const first = isVirtual ? (items[0]?.index ?? 0) : 0;
  const last = isVirtual ? (items.at(-1)?.index ?? 0) : Math.max(0, count - 1);
  const tell = useEffectEvent((from: number, to: number) => onView?.(from, to));
  useEffect(() => {
    tell(first, last);
  }, [first, last]);

  if (isPrinting) return allOf(count, MOST_PRINTED);
  if (!isVirtual) {
    return {
      ...allOf(count, MANY),
      reveal: (index) => {
        revealAmongAll(scroller.current, index);
      },
    };
  }
  return {
    indexes: items.map(({ index }) => index),
    above: items[0]?.start ?? 0,
    below: virtualizer.getTotalSize() - (items.at(-1)?.end ?? 0),
    measure: virtualizer.measureElement,
    reveal: (index) => {
      virtualizer.scrollToIndex(index);
    },
    unprinted: 0,
  };
}
