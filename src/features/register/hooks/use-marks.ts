import { useState } from 'react';
import { MOST_NAMED_BUILDINGS, type RegisterFilter } from '../../../../shared/schemas/register.ts';

const NONE: ReadonlySet<number> = new Set();

export type Marks = {
  readonly count: number;
  /** All that are found are marked, or all but those that were let go. */
  readonly isAll: boolean;
  /** How many of all were let go again. */
  readonly letGo: number;
  /** No more can be marked, or let go, one by one. */
  readonly isFull: boolean;
  readonly isMarked: (buildingId: number) => boolean;
  readonly toggle: (buildingId: number) => void;
  readonly toggleAll: () => void;
  readonly clear: () => void;
  /** The filter that means what is marked. */
  readonly filter: RegisterFilter;
};

/** The filter with some buildings left out besides. */
function allBut(filter: RegisterFilter, ids: ReadonlySet<number>): RegisterFilter {
  if (ids.size === 0) return filter;
  return { ...filter, except: [...new Set([...(filter.except ?? []), ...ids])] };
}

/** Which rows are marked: some one by one, or all that the filter finds but some. */
export function useMarks(filter: RegisterFilter, found: number): Marks {
  const here = JSON.stringify(filter);
  /** One by one: those that are marked, or where all are marked those that are not. */
  const [ids, setIds] = useState(NONE);
  const [allOf, setAllOf] = useState<string | null>(null);
  const isAll = allOf === here && found > 0;
  // all of another filter are marked no more, nor is what was let go of them
  const named = allOf === null || isAll ? ids : NONE;
  const room = MOST_NAMED_BUILDINGS - (isAll ? (filter.except?.length ?? 0) : 0);

  function set(next: ReadonlySet<number>, of: string | null) {
    setIds(next);
    setAllOf(of);
  }
  return {
    count: isAll ? found - named.size : named.size,
    isAll,
    letGo: isAll ? named.size : 0,
    isFull: named.size >= room,
    isMarked: (buildingId) => named.has(buildingId) !== isAll,
    toggle: (buildingId) => {
      const next = new Set(named);
      if (!next.delete(buildingId) && next.size < room) next.add(buildingId);
      set(next, isAll ? here : null);
    },
    toggleAll: () => {
      set(NONE, isAll && named.size === 0 ? null : here);
    },
    clear: () => {
      set(NONE, null);
    },
    filter: isAll ? allBut(filter, named) : { ids: [...named] },
  };
}
