import { BUILDINGS_TILE_LAYER, LABELS_TILE_LAYER, SOURCES } from '../style/source-names.ts';
import type { MapPort } from './map-port.ts';

const NONE: ReadonlyMap<number, number> = new Map();
const LAYERS = [BUILDINGS_TILE_LAYER, LABELS_TILE_LAYER];

/** Gives buildings the numbers of their colours; only those that take another are told to the map. */
export type ShadedBuildings = (
  next: ReadonlyMap<number, number> | undefined,
  isNewSource: boolean,
) => void;

export function createShadedBuildings(map: MapPort): ShadedBuildings {
  let shaded = NONE;

  function set(id: number, shade: number | null): void {
    for (const sourceLayer of LAYERS) {
      map.setFeatureState({ source: SOURCES.buildings, sourceLayer, id }, { shade });
    }
  }
  return (next, isNewSource) => {
    if (isNewSource) shaded = NONE;
    // while no layer asks for them, they may stay
    if (next === undefined || next === shaded) return;
    for (const id of shaded.keys()) if (!next.has(id)) set(id, null);
    for (const [id, shade] of next) if (shaded.get(id) !== shade) set(id, shade);
    shaded = next;
  };
}
