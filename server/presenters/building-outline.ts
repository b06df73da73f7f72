import type { BuildingOutline } from '../../shared/schemas/building-outlines.ts';
import type { OutlinedBuilding } from '../models/find-outlines-in-box.ts';

/** What leaves the server of a building that a section cuts. */
export function presentBuildingOutline(building: OutlinedBuilding): BuildingOutline {
  const { id, reference, name, storeys, eavesHeight, footprint } = building;
  return {
    ...{ id, reference, name, storeys, eavesHeight },
    footprint: footprint.map((rings) => rings.map((ring) => ring.map(([e, n]) => [e, n]))),
  };
}
