import { BUILDINGS_TILE_LAYER, LABELS_TILE_LAYER, SOURCES } from '../style/source-names.ts';
import type { MapPort } from './map-port.ts';

/** Every tile looks through all that a frame is told, so what is not seen is told so many a frame. */
const A_FRAME = 10_000;

type Shades = ReadonlyMap<number, number>;
type Change = readonly [id: number, shade: number | undefined];

/** Gives buildings the numbers of their colours; only those that take another are told to the map. */
export type ShadedBuildings = (next: Shades | undefined, isNewSource: boolean) => void;

/** What one layer of the tiles has been told, and what it has still to be told. */
type ToldLayer = {
  /** Tells what is to be told first of what is other; few changes are told all at once. */
  readonly take: (next: Shades, isFirst: (id: number) => boolean) => void;
  /** Tells a frame's share of the rest; false where nothing is left. */
  readonly more: () => boolean;
  readonly forget: () => void;
};

function createToldLayer(map: MapPort, sourceLayer: string): ToldLayer {
  let told = new Map<number, number>();
  let left: readonly Change[] = [];

  function tell(changes: readonly Change[]): void {
    for (const [id, shade] of changes) {
      const state = { shade: shade ?? null };
      map.setFeatureState({ source: SOURCES.buildings, sourceLayer, id }, state);
      if (shade === undefined) told.delete(id);
      else told.set(id, shade);
    }
  }
  return {
    take: (next, isFirst) => {
      const gone = [...told.keys()].filter((id) => !next.has(id));
      const other = [...next].filter(([id, shade]) => told.get(id) !== shade);
      const changes = [...gone.map((id): Change => [id, undefined]), ...other];
      const isFew = changes.length <= A_FRAME;
      tell(isFew ? changes : changes.filter(([id]) => isFirst(id)));
      left = isFew ? [] : changes.filter(([id]) => !isFirst(id));
    },
    more: () => {
      if (left.length === 0) return false;
      tell(left.slice(0, A_FRAME));
      left = left.slice(A_FRAME);
      return true;
    },
    forget: () => {
      [told, left] = [new Map<number, number>(), []];
    },
  };
}

export function createShadedBuildings(map: MapPort): ShadedBuildings {
  const shapes = createToldLayer(map, BUILDINGS_TILE_LAYER);
  const labels = createToldLayer(map, LABELS_TILE_LAYER);
  let wanted: Shades | null = null;
  let isWaiting = false;

  function tellMoreEachFrame(): void {
    if (isWaiting) return;
    isWaiting = true;
    map.afterFrame(() => {
      isWaiting = false;
      if (shapes.more() || labels.more()) tellMoreEachFrame();
    });
  }
  return (next, isNewSource) => {
    if (isNewSource) {
      wanted = null;
      for (const layer of [shapes, labels]) layer.forget();
    }
    // while no layer asks for them, they may stay
    if (next === undefined || next === wanted) return;
    wanted = next;
    let seen: ReadonlySet<number> | null | undefined;
    const seenNear = () => (seen === undefined ? (seen = map.buildingsSeenNear()) : seen);
    shapes.take(next, (id) => seenNear()?.has(id) ?? true);
    // from far off nothing is written in buildings
    labels.take(next, (id) => seenNear()?.has(id) ?? false);
    tellMoreEachFrame();
  };
}
