import type { Map as MapLibreMap } from 'maplibre-gl';
import { useEffect, useEffectEvent, useRef } from 'react';
import { useHotkeys } from '../../../hooks/use-hotkeys.ts';
import type { MapController } from '../controller/map-controller.ts';
import { closedShapes, lassoOutline, lassoShapes } from '../lasso-outline.ts';
import type { MapLasso } from '../map-lasso.ts';
import { installLassoMode } from '../modes/lasso-mode.ts';
import type { GridPlace, GridProjection } from '../place/grid-projection.ts';
import { metresPerPixel } from '../place/view-of-map.ts';
import { draftFeatures } from '../style/draft-features.ts';

/** How far the outline may stray from what was drawn, in pixels. */
const SLACK = 1.5;

/** Draws an outline round buildings while it is asked for, and shows the one that was drawn last. */
export function useLasso(
  map: MapLibreMap,
  controller: MapController,
  projection: GridProjection,
  lasso: MapLasso | undefined,
): void {
  const places = useRef<readonly GridPlace[]>([]);
  const isThere = lasso !== undefined;
  const isDrawing = lasso?.isDrawing === true;
  const outline = lasso?.outline ?? null;

  const draw = useEffectEvent((under: GridPlace | null) => {
    controller.drawDraft(draftFeatures(projection, lassoShapes(places.current, under)));
  });
  function finish() {
    const slack = SLACK * (metresPerPixel(map, projection) ?? 1);
    const drawn = lassoOutline(places.current, slack, projection);
    if (drawn !== null) lasso?.onClose(drawn);
  }
  const close = useEffectEvent(finish);
  useEffect(() => {
    if (!isThere || isDrawing) return;
    controller.drawDraft(draftFeatures(projection, closedShapes(outline, projection)));
  }, [controller, projection, isThere, isDrawing, outline]);
  useEffect(() => {
    if (!isDrawing) return undefined;
    places.current = [];
    draw(null);
    return installLassoMode(map, projection, {
      places: () => places.current,
      show: (under) => {
        draw(under);
      },
      add: (place) => {
        places.current = [...places.current, place];
        draw(null);
      },
      close: () => {
        close();
      },
    });
  }, [map, projection, isDrawing]);
  useHotkeys(
    {
      Enter: finish,
      Escape: () => lasso?.onLeave(),
    },
    isDrawing,
    true,
  );
}
