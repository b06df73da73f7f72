import type { Map as MapLibreMap } from 'maplibre-gl';
import { panBy } from './camera.ts';

const STEP_PIXELS = 100;

const DIRECTIONS: Readonly<Record<string, readonly [number, number]>> = {
  ArrowLeft: [-1, 0],
  ArrowRight: [1, 0],
  ArrowUp: [0, -1],
  ArrowDown: [0, 1],
};

/** Lets the arrows move the map while it has the focus; what it returns takes that away again. */
export function installArrowKeys(map: MapLibreMap): () => void {
  const canvas = map.getCanvas();
  function press(event: KeyboardEvent): void {
    const direction = DIRECTIONS[event.key];
    if (direction === undefined || event.ctrlKey || event.metaKey || event.altKey) return;
    event.preventDefault();
    panBy(map, direction[0] * STEP_PIXELS, direction[1] * STEP_PIXELS);
  }
  canvas.addEventListener('keydown', press);
  return () => {
    canvas.removeEventListener('keydown', press);
  };
}
