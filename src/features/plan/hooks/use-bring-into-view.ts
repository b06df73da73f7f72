import { useEffect, useRef } from 'react';
import type { BuildingAnswer } from '../../../../shared/schemas/buildings.ts';
import type { MapHandle } from '../../map/map-handle.ts';

/** Moves the map to a building once both are there: the one of the address at first, later on demand. */
export function useBringIntoView(
  handle: MapHandle | null,
  selected: number | null,
  building: BuildingAnswer | undefined,
): (buildingId: number) => void {
  const awaited = useRef(selected);

  useEffect(() => {
    if (handle === null || building?.id !== awaited.current) return;
    awaited.current = null;
    handle.bringIntoView(building.bounds);
  }, [handle, building]);

  return (buildingId) => {
    if (building?.id === buildingId && handle !== null) handle.bringIntoView(building.bounds);
    else awaited.current = buildingId;
  };
}
