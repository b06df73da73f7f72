import { BUILDINGS_TILE_LAYER, LABELS_TILE_LAYER, SOURCES } from '../style/source-names.ts';
import type { MapPort } from './map-port.ts';

/** Every tile looks through all that a frame is told, so of what is not seen so many are told a frame. */
const A_FRAME = 10_000;

type Values<T> = ReadonlyMap<number, T>;
type Change<T> = readonly [id: number, value: T | undefined];

/** Gives buildings values by which they are drawn; only those that take another are told to the map. */
export type ToldBuildings<T> = (next: Values<T> | undefined, isNewSource: boolean) => void;

/** What the map keeps of a building that has a value, or none any more. */
type StateOf<T> = (value: T | undefined) => Readonly<Record<string, boolean | number | null>>;

/** What one layer of the tiles has been told, and what it has still to be told. */
type ToldLayer<T> = {
  /** Tells what is to be told first of what is other; few changes are told all at once. */
  readonly take: (next: Values<T>, isFirst: (id: number) => boolean) => void;
  /** Tells a frame's share of the rest; false where nothing is left. */
  readonly more: () => boolean;
  readonly forget: () => void;
};

function createToldLayer<T>(map: MapPort, sourceLayer: string, stateOf: StateOf<T>): ToldLayer<T> {
  let told = new Map<number, T>();
  let left: readonly Change<T>[] = [];

  function tell(changes: readonly Change<T>[]): void {
    for (const [id, value] of changes) {
      map.setFeatureState({ source: SOURCES.buildings, sourceLayer, id }, stateOf(value));
      if (value === undefined) told.delete(id);
      else told.set(id, value);
    }
  }
  return {
    take: (next, isFirst) => {
      const gone = [...told.keys()].filter((id) => !next.has(id));
      const other = [...next].filter(([id, value]) => told.get(id) !== value);
      const changes = [...gone.map((id): Change<T> => [id, undefined]), ...other];
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
      [told, left] = [new Map<number, T>(), []];
    },
  };
}

export function createToldBuildings<T>(map: MapPort, stateOf: StateOf<T>): ToldBuildings<T> {
  const shapes = createToldLayer(map, BUILDINGS_TILE_LAYER, stateOf);
  const labels = createToldLayer(map, LABELS_TILE_LAYER, stateOf);
  let wanted: Values<T> | null = null;
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
