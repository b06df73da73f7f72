import { BUILDINGS_TILE_LAYER, LABELS_TILE_LAYER, SOURCES } from '../style/source-names.ts';
import type { MapPort } from './map-port.ts';

const LAYERS = [BUILDINGS_TILE_LAYER, LABELS_TILE_LAYER];
/** Every tile looks through all that a frame is told, so what is not seen is told so many a frame. */
const A_FRAME = 10_000;

type Change = readonly [id: number, shade: number | undefined];

/** Gives buildings the numbers of their colours; only those that take another are told to the map. */
export type ShadedBuildings = (
  next: ReadonlyMap<number, number> | undefined,
  isNewSource: boolean,
) => void;

export function createShadedBuildings(map: MapPort): ShadedBuildings {
  let wanted: ReadonlyMap<number, number> | null = null;
  let told = new Map<number, number>();
  let left: readonly Change[] = [];
  let isWaiting = false;

  function tell(changes: readonly Change[]): void {
    for (const [id, shade] of changes) {
      for (const sourceLayer of LAYERS) {
        const state = { shade: shade ?? null };
        map.setFeatureState({ source: SOURCES.buildings, sourceLayer, id }, state);
      }
      if (shade === undefined) told.delete(id);
      else told.set(id, shade);
    }
  }
  function tellMoreEachFrame(): void {
    if (isWaiting || left.length === 0) return;
    isWaiting = true;
    map.afterFrame(() => {
      isWaiting = false;
      tell(left.slice(0, A_FRAME));
      left = left.slice(A_FRAME);
      tellMoreEachFrame();
    });
  }
  function changesTo(next: ReadonlyMap<number, number>): Change[] {
    const gone = [...told.keys()].filter((id) => !next.has(id));
    const other = [...next].filter(([id, shade]) => told.get(id) !== shade);
    return [...gone.map((id) => [id, undefined] as const), ...other];
  }
  return (next, isNewSource) => {
    if (isNewSource) [wanted, told, left] = [null, new Map<number, number>(), []];
    // while no layer asks for them, they may stay
    if (next === undefined || next === wanted) return;
    wanted = next;
    const changes = changesTo(next);
    const seen = changes.length > A_FRAME ? map.buildingsSeenNear() : null;
    tell(seen === null ? changes : changes.filter(([id]) => seen.has(id)));
    left = seen === null ? [] : changes.filter(([id]) => !seen.has(id));
    tellMoreEachFrame();
  };
}
