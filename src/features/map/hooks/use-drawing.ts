import type { Map as MapLibreMap } from 'maplibre-gl';
import { useEffect, useEffectEvent, useRef } from 'react';
import type { MapController } from '../controller/map-controller.ts';
import type { Aim, AimRequest, Handle, MapDrawing } from '../map-drawing.ts';
import { DRAFT_MODES } from '../modes/modes.ts';
import type { GridProjection } from '../place/grid-projection.ts';
import { draftFeatures } from '../style/draft-features.ts';

/** Draws what is being drawn, and keeps the mode that draws it installed. */
export function useDrawing(
  map: MapLibreMap,
  controller: MapController,
  projection: GridProjection,
  drawing: MapDrawing | null,
): void {
  const aimed = useRef<Aim | null>(null);
  // places come in the order in which they were set, whatever has to be fetched for them
  const order = useRef(Promise.resolve());
  const isEmpty = useRef(true);
  const mode = drawing?.mode ?? 'none';

  const draw = useEffectEvent((aim: Aim | null) => {
    aimed.current = aim;
    const shapes = drawing?.shapes(aim) ?? [];
    if (isEmpty.current && shapes.length === 0) return;
    isEmpty.current = shapes.length === 0;
    controller.drawDraft(draftFeatures(projection, shapes));
  });
  const show = useEffectEvent((request: AimRequest | null) => {
    draw(request === null ? null : (drawing?.aim(request) ?? null));
  });
  const handles = useEffectEvent(() => drawing?.handles ?? []);
  const press = useEffectEvent((handle: Handle) => drawing?.press(handle));
  const settle = useEffectEvent((request: AimRequest) => drawing?.settle(request));
  const put = useEffectEvent((aim: Aim) => {
    // what was held is where it was put from now on
    if (aim.held !== null) aimed.current = null;
    drawing?.put(aim);
  });

  useEffect(() => {
    draw(mode === 'line' ? aimed.current : null);
  }, [controller, projection, drawing, mode]);

  useEffect(() => {
    if (mode === 'none') return undefined;
    return DRAFT_MODES[mode](map, projection, {
      handles: () => handles(),
      show: (request) => {
        show(request);
      },
      press: (handle) => {
        press(handle);
      },
      put: (request) => {
        order.current = order.current.then(async () => {
          const aim = await settle(request);
          if (aim !== undefined) put(aim);
        });
      },
    });
  }, [map, projection, mode]);
}
