import type { MapPort } from './map-port.ts';
import { createToldBuildings } from './told-buildings.ts';

const NONE: ReadonlySet<number> = new Set();

/** Marks the buildings that are meant. */
export type MeantBuildings = (next: ReadonlySet<number> | undefined, isNewSource: boolean) => void;

export function createMeantBuildings(map: MapPort): MeantBuildings {
  const tell = createToldBuildings<true>(map, (meant) => ({ meant: meant ?? false }));
  let marked = NONE;
  return (next = NONE, isNewSource) => {
    if (next === marked && !isNewSource) return;
    marked = next;
    tell(new Map([...next].map((id) => [id, true])), isNewSource);
  };
}
