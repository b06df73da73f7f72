import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import type { RegisterRow } from '../../../../shared/schemas/register.ts';
import { registerPlaceQuery } from '../api/get-place.ts';
import type { Which } from '../api/which-buildings.ts';
import type { RegisterRows } from './use-register-rows.ts';

/** A building, and where it was last seen among the rows. */
type Reached = {
  readonly id: number | null;
  readonly at: { readonly rows: string; readonly index: number } | null;
};

export type ActiveBuilding = {
  /** Its row; −1 where there is none. */
  readonly index: number;
  readonly id: number | null;
  readonly row: RegisterRow | undefined;
  /** It was reached from outside of the table, and the filter leaves it out. */
  readonly isLeftOut: boolean;
  readonly reachRow: (index: number) => void;
  readonly reachBuilding: (buildingId: number | null) => void;
};

/** The building that has been reached, by row or from the map; it keeps its row in another order. */
export function useActiveBuilding(
  schemeId: string,
  which: Which,
  { rowAt }: Pick<RegisterRows, 'rowAt'>,
  initial: number | null,
): ActiveBuilding {
  const rows = JSON.stringify(which);
  const [{ id, at }, setReached] = useState<Reached>({ id: initial, at: null });
  const seen = at?.rows === rows ? at.index : null;
  const rowSeen = seen === null ? undefined : rowAt(seen);
  // after a change another building may stand in the same place
  const isHeld = seen !== null && (id === null || rowSeen === undefined || rowSeen.id === id);
  const place = useQuery({
    ...registerPlaceQuery(schemeId, which, id ?? 0),
    enabled: id !== null && !isHeld,
  });
  const index = isHeld ? seen : id === null ? -1 : (place.data?.index ?? -1);
  const row = index < 0 ? undefined : rowAt(index);
  return {
    index,
    id: id ?? row?.id ?? null,
    row,
    isLeftOut: id !== null && !isHeld && place.data?.index === null,
    reachRow: (next) => {
      setReached({ id: rowAt(next)?.id ?? null, at: { rows, index: next } });
    },
    reachBuilding: (buildingId) => {
      setReached({ id: buildingId, at: null });
    },
  };
}
