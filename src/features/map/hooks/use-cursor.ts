import type { Map as MapLibreMap, MapMouseEvent } from 'maplibre-gl';
import { useEffect, useState } from 'react';

/** A place of the map's frame, in pixels. */
export type Pixel = readonly [x: number, y: number];

/** Where the cursor is on the map; null while it is elsewhere. */
export function useCursor(map: MapLibreMap): Pixel | null {
  const [pixel, setPixel] = useState<Pixel | null>(null);
  useEffect(() => {
    const moves = map.on('mousemove', ({ point }: MapMouseEvent) => {
      setPixel([point.x, point.y]);
    });
    const leaves = map.on('mouseout', () => {
      setPixel(null);
    });
    return () => {
      moves.unsubscribe();
      leaves.unsubscribe();
    };
  }, [map]);
  return pixel;
}
