import { Map as MapLibreMap, setWorkerUrl } from 'maplibre-gl';
import 'maplibre-gl/dist/maplibre-gl.css';
import workerUrl from 'maplibre-gl/dist/maplibre-gl-worker.mjs?worker&url';
import { fitBounds, type CameraBounds } from './camera.ts';
import { addDamageImages } from './style/damage-images.ts';
import { addHatches } from './style/hatch-images.ts';
import { loadLabelFonts } from './load-label-fonts.ts';

/** About 400 km across a wide screen: a region, beyond which nothing is drawn. */
const FARTHEST = 8;
const NEAREST = 22;

setWorkerUrl(workerUrl);

/** Where a map is drawn, what it is called and where it starts. */
export type MapStart = {
  readonly container: HTMLElement;
  readonly label: string;
  readonly home: CameraBounds;
};

/**
 * Opens an empty map that stands still unless it is moved, north up. Throws where the browser cannot
 * draw one; `signal` gives it up.
 */
export async function openMap(start: MapStart, signal: AbortSignal): Promise<MapLibreMap> {
  await loadLabelFonts();
  signal.throwIfAborted();
  const map = new MapLibreMap({
    container: start.container,
    // no glyphs: letters are drawn from the fonts of the page
    style: { version: 8, sources: {}, layers: [] },
    locale: { 'Map.Title': start.label },
    attributionControl: false,
    keyboard: false,
    reduceMotion: true,
    fadeDuration: 0,
    dragRotate: false,
    pitchWithRotate: false,
    touchPitch: false,
    renderWorldCopies: false,
    minZoom: FARTHEST,
    maxZoom: NEAREST,
  });
  map.touchZoomRotate.disableRotation();
  signal.addEventListener('abort', () => {
    map.remove();
  });
  fitBounds(map, start.home);
  await map.once('style.load');
  signal.throwIfAborted();
  addHatches(map);
  addDamageImages(map);
  return map;
}
