import type { MapPort } from './map-port.ts';
import { createToldBuildings, type ToldBuildings } from './told-buildings.ts';

/** Gives buildings the numbers of their colours. */
export function createShadedBuildings(map: MapPort): ToldBuildings<number> {
  return createToldBuildings(map, (shade) => ({ shade: shade ?? null }));
}
