/** Where a line is cut, as chainage, shared by the strip and the map; null until somebody points. */
export type SectionStore = {
  readonly get: () => number | null;
  readonly set: (chainage: number) => void;
  readonly subscribe: (changed: () => void) => () => void;
};

/** Kept beside the page, so that only what shows the section is drawn again as the cursor moves. */
export function createSectionStore(): SectionStore {
  const listeners = new Set<() => void>();
  let chainage: number | null = null;
  return {
    get: () => chainage,
    set: (next) => {
      if (next === chainage) return;
      chainage = next;
      for (const listener of listeners) listener();
    },
    subscribe: (changed) => {
      listeners.add(changed);
      return () => {
        listeners.delete(changed);
      };
    },
  };
}
