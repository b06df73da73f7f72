import { BUILDINGS_TILE_LAYER, LABELS_TILE_LAYER, SOURCES } from '../style/source-names.ts';
import type { MapPort } from './map-port.ts';

const NONE: ReadonlySet<number> = new Set();
const LAYERS = [BUILDINGS_TILE_LAYER, LABELS_TILE_LAYER];

/** Marks the buildings that are meant; only those that come and go are told to the map. */
export type MeantBuildings = (next: ReadonlySet<number> | undefined, isNewSource: boolean) => void;

export function createMeantBuildings(map: MapPort): MeantBuildings {
  let marked = NONE;

  function set(id: number, meant: boolean): void {
    for (const sourceLayer of LAYERS) {
      map.setFeatureState({ source: SOURCES.buildings, sourceLayer, id }, { meant });
    }
  }
  return (next = NONE, isNewSource) => {
    if (isNewSource) marked = NONE;
    if (next === marked) return;
    for (const id of marked) if (!next.has(id)) set(id, false);
    for (const id of next) if (!marked.has(id)) set(id, true);
    marked = next;
  };
}
