import type { Map as MapLibreMap } from 'maplibre-gl';
import { useEffect, useEffectEvent, useLayoutEffect, useMemo, useState } from 'react';
import { installArrowKeys } from '../arrow-keys.ts';
import { createMapController, type MapController } from '../controller/map-controller.ts';
import { portOfMap } from '../controller/port-of-map.ts';
import { useCursorPlace } from '../hooks/use-cursor-place.ts';
import { useDrawing } from '../hooks/use-drawing.ts';
import { useDrawnLine } from '../hooks/use-drawn-line.ts';
import { useGridCrosses } from '../hooks/use-grid-crosses.ts';
import { useLasso } from '../hooks/use-lasso.ts';
import { useMapState } from '../hooks/use-map-state.ts';
import { useMode } from '../hooks/use-mode.ts';
import { handleOfMap } from '../map-handle.ts';
import type { BuildingMarks, MapPlan } from '../map-plan.ts';
import { createMissedTiles, type MissedTiles } from '../missed-tiles.ts';
import { createGridProjection } from '../place/grid-projection.ts';
import { BuildingTip } from './building-tip.tsx';
import { CursorPlace } from './cursor-place.tsx';
import { LassoButton, LassoHint } from './lasso-button.tsx';
import { MapButtons } from './map-buttons.tsx';
import { MapGaps } from './map-gaps.tsx';
import type { PlanMapProps } from './plan-map-props.ts';
import { ScaleBar } from './scale-bar.tsx';
import { ZoomHint } from './zoom-hint.tsx';

/** Keeps the map as the plan and the marks say. */
function useController(
  map: MapLibreMap,
  missed: MissedTiles,
  plan: MapPlan,
  marks: BuildingMarks,
): MapController {
  const controller = useMemo(() => createMapController(portOfMap(map, missed)), [map, missed]);
  useLayoutEffect(() => {
    controller.show(plan);
  }, [controller, plan]);
  useEffect(() => {
    controller.mark(marks);
  }, [controller, marks]);
  return controller;
}

function useMissedTiles(map: MapLibreMap): MissedTiles {
  return useMemo(
    () =>
      createMissedTiles((source, tiles) => {
        if (map.getSource(source) !== undefined) map.refreshTiles(source, tiles);
      }),
    [map],
  );
}

/** A map that is open, with what stands on it: scale, north, place and buttons. */
export function OpenPlanMap(props: PlanMapProps & { readonly map: MapLibreMap }) {
  const { map, plan, home, gridDefinition, selected, onSelect, drawing = null, lasso } = props;
  const isDrawing = drawing !== null && drawing.mode !== 'none';
  const isSelecting = !isDrawing && lasso?.isDrawing !== true;
  const [hovered, setHovered] = useState<number | null>(null);
  const marks = useMemo(() => ({ selected, hovered }), [selected, hovered]);
  const projection = useMemo(() => createGridProjection(gridDefinition), [gridDefinition]);
  const missed = useMissedTiles(map);
  const controller = useController(map, missed, plan, marks);
  const { isBusy, hasGaps, fetchAgain } = useMapState(map, missed);
  const handle = useMemo(() => handleOfMap(map, projection), [map, projection]);
  const giveHandle = useEffectEvent(props.onHandle);
  useGridCrosses(map, controller, projection);
  useDrawnLine(controller, projection, props.line, props.section);
  useCursorPlace(map, projection, props.onCursor);
  useDrawing(map, controller, projection, drawing);
  useLasso(map, controller, projection, lasso);
  useMode(map, isSelecting ? 'select' : null, { select: onSelect, hover: setHovered });
  useEffect(() => installArrowKeys(map), [map]);
  useEffect(() => {
    giveHandle(handle);
    return () => {
      giveHandle(null);
    };
  }, [handle]);

  return (
    <div
      aria-busy={isBusy}
      className="pointer-events-none absolute inset-0 [&>*]:pointer-events-auto"
    >
      <div className="absolute top-3 left-3 flex items-start gap-2">
        <MapButtons
          onZoom={handle.zoomBy}
          onFit={() => {
            handle.fit(home);
          }}
        />
        {lasso !== undefined && <LassoButton {...lasso} />}
      </div>
      <div className="absolute top-3 right-3">
        <ScaleBar map={map} projection={projection} />
      </div>
      <div className="absolute bottom-3 left-3 max-w-[calc(100%-24px)]">
        <CursorPlace map={map} projection={projection} wordsAt={props.wordsAt} />
      </div>
      <BuildingTip map={map} lines={hovered === null ? null : (props.tipOf?.(hovered) ?? null)} />
      {lasso?.isDrawing === true && <LassoHint />}
      <ZoomHint map={map} plan={plan} />
      {hasGaps && (
        <div className="absolute right-3 bottom-12 left-3 flex justify-center">
          <MapGaps onRetry={fetchAgain} />
        </div>
      )}
    </div>
  );
}
