import { useEffect, useEffectEvent, useRef, useState } from 'react';
import type { BuildingRow } from '../../../../shared/schemas/buildings.ts';
import type { MapHandle } from '../../map/map-handle.ts';
import { stepThrough } from '../step-through.ts';

/** Buildings that were searched for, to be gone through one by one. */
export type Trail = { readonly words: string; readonly ids: readonly number[] };

/** Buildings that were in view when one began to go through them, and the one that was reached. */
type Walk = { readonly ids: readonly number[]; readonly at: number };

type Around = {
  readonly handle: Pick<MapHandle, 'buildingsInView' | 'onceStill'> | null;
  readonly selected: number | null;
  /** The map has been brought to what is selected. */
  readonly isThere: boolean;
  readonly goTo: (buildingId: number) => void;
};

/**
 * Going through what was found, or else through what is in view. A walk keeps to what was in view when it
 * began, so that it goes on while the map draws, and ends where somebody leaves it on the map.
 */
export function useSteps({ handle, selected, isThere, goTo }: Around) {
  const [trail, setTrail] = useState<Trail | null>(null);
  const [awaited, setAwaited] = useState<1 | -1 | null>(null);
  const walk = useRef<Walk | null>(null);
  // what was gone to and the page does not show as selected yet
  const ahead = useRef<number | null>(null);
  useEffect(() => {
    ahead.current = null;
  }, [selected]);

  /** Null while it cannot be told. */
  function idsNow(): readonly number[] | null {
    if (trail !== null) return trail.ids;
    const isSettled = isThere && ahead.current === null;
    const seen = isSettled ? (handle?.buildingsInView() ?? null) : null;
    const { current } = walk;
    if (current?.at !== (ahead.current ?? selected)) return seen;
    return seen === null || seen.includes(current.at) ? current.ids : seen;
  }
  function stepNow(by: 1 | -1): boolean {
    const ids = idsNow();
    if (ids === null) return false;
    const next = stepThrough(ids, ahead.current ?? selected, by);
    if (next === null) return true;
    walk.current = { ids, at: next };
    ahead.current = next === selected ? null : next;
    goTo(next);
    return true;
  }
  const arrive = useEffectEvent(() => {
    if (awaited !== null) stepNow(awaited);
    setAwaited(null);
  });
  useEffect(() => {
    if (awaited === null || handle === null || !isThere) return undefined;
    return handle.onceStill(() => {
      arrive();
    });
  }, [awaited, handle, isThere]);

  return {
    trail,
    follow: (words: string, found: readonly BuildingRow[]) => {
      setTrail({ words, ids: found.map(({ id }) => id) });
    },
    leave: () => {
      setTrail(null);
    },
    step: (by: 1 | -1) => {
      // what was pressed before the map was there is done once it is
      if (!stepNow(by)) setAwaited(by);
    },
  };
}
