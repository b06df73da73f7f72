import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import type { RegisterFilter } from '../../../../shared/schemas/register.ts';
import { registerIdsQuery } from '../api/get-ids.ts';

/** Marked one by one: more are marked by a filter. */
export const MOST_MARKED = 1000;

const NONE: ReadonlySet<number> = new Set();

export type Marks = {
  readonly count: number;
  readonly isAll: boolean;
  readonly isMarked: (buildingId: number) => boolean;
  readonly toggle: (buildingId: number) => void;
  readonly toggleAll: () => void;
  readonly clear: () => void;
  /** The filter that means what is marked. */
  readonly filter: RegisterFilter;
};

/** Which rows are marked: some by number, or all that the filter finds. */
export function useMarks(schemeId: string, filter: RegisterFilter, found: number): Marks {
  const client = useQueryClient();
  const here = JSON.stringify(filter);
  const [ids, setIds] = useState(NONE);
  const [allOf, setAllOf] = useState<string | null>(null);
  const isAll = allOf === here && found > 0;

  function clear() {
    setIds(NONE);
    setAllOf(null);
  }
  async function allBut(buildingId: number) {
    const all = await client.query(registerIdsQuery(schemeId, filter));
    setIds(new Set(all.ids.filter((id) => id !== buildingId)));
    setAllOf(null);
  }
  return {
    count: isAll ? found : ids.size,
    isAll,
    isMarked: (buildingId) => isAll || ids.has(buildingId),
    toggle: (buildingId) => {
      if (isAll) {
        if (found > MOST_MARKED) clear();
        else void allBut(buildingId);
        return;
      }
      const next = new Set(ids);
      if (!next.delete(buildingId) && next.size < MOST_MARKED) next.add(buildingId);
      setIds(next);
    },
    toggleAll: () => {
      setIds(NONE);
      setAllOf(isAll ? null : here);
    },
    clear,
    filter: isAll ? filter : { ids: [...ids] },
  };
}
