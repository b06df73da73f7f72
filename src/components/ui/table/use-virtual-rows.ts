import { useVirtualizer } from '@tanstack/react-virtual';
import type { RefObject } from 'react';

/** From so many rows on, only those in view are in the page. */
const MANY = 100;
const ROW_HEIGHT = 30;

export type VirtualRows = {
  readonly indexes: readonly number[];
  /** Heights of what is left out above and below. */
  readonly above: number;
  readonly below: number;
  readonly measure: ((body: HTMLTableSectionElement | null) => void) | undefined;
  readonly reveal: (index: number) => void;
};

/** Which rows are in the page: all of a few, and of many only those in view. */
export function useVirtualRows(
  count: number,
  scroller: RefObject<HTMLDivElement | null>,
): VirtualRows {
  const isVirtual = count > MANY;
  const virtualizer = useVirtualizer<HTMLDivElement, HTMLTableSectionElement>({
    count,
    enabled: isVirtual,
    getScrollElement: () => scroller.current,
    estimateSize: () => ROW_HEIGHT,
    overscan: 15,
  });
  if (!isVirtual) {
    const indexes = Array.from({ length: count }, (_, index) => index);
    return { indexes, above: 0, below: 0, measure: undefined, reveal: () => undefined };
  }
  const items = virtualizer.getVirtualItems();
  return {
    indexes: items.map(({ index }) => index),
    above: items[0]?.start ?? 0,
    below: virtualizer.getTotalSize() - (items.at(-1)?.end ?? 0),
    measure: virtualizer.measureElement,
    reveal: (index) => {
      virtualizer.scrollToIndex(index);
    },
  };
}
