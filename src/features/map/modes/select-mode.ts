import type { Map as MapLibreMap, MapMouseEvent } from 'maplibre-gl';
import { buildingAt } from './building-at.ts';
import type { ModeHost } from './mode.ts';

/** How far beside a building a finger may come down, in pixels. */
const FINGER = 8;

function reachOf({ originalEvent }: MapMouseEvent): number {
  const isFinger = originalEvent instanceof PointerEvent && originalEvent.pointerType === 'touch';
  return isFinger ? FINGER : 0;
}

/** A click selects a building, one beside buildings selects nothing. */
export function installSelectMode(map: MapLibreMap, host: ModeHost): () => void {
  const canvas = map.getCanvas();

  function click(event: MapMouseEvent): void {
    host.select(buildingAt(map, event.point, reachOf(event)));
  }
  function move({ point }: MapMouseEvent): void {
    const id = map.isMoving() ? null : buildingAt(map, point);
    canvas.style.cursor = id === null ? '' : 'pointer';
    host.hover(id);
  }
  function leave(): void {
    host.hover(null);
  }

  map.on('click', click);
  map.on('mousemove', move);
  map.on('mouseout', leave);
  // what was under the cursor is not any more
  map.on('movestart', leave);
  return () => {
    map.off('click', click);
    map.off('mousemove', move);
    map.off('mouseout', leave);
    map.off('movestart', leave);
    canvas.style.cursor = '';
    host.hover(null);
  };
}
