import type { Map as MapLibreMap } from 'maplibre-gl';
import { useMapFigure } from '../hooks/use-map-figure.ts';
import type { MapPlan } from '../map-plan.ts';

type ZoomHintProps = { readonly map: MapLibreMap; readonly plan: MapPlan };

/** Says why no buildings are drawn where the map shows too much ground at once. */
export function ZoomHint({ map, plan }: ZoomHintProps) {
  const least = (plan.rows ?? plan.buildings)?.minzoom ?? 0;
  const isFar = useMapFigure(map, () => (map.getZoom() < least ? 1 : 0)) === 1;
  if (!isFar) return null;
  return (
    <div className="pointer-events-none! absolute inset-x-3 top-16 flex justify-center">
      <p
        role="status"
        className="rounded border border-rule bg-paper-raised px-2 py-1 text-small text-ink-2"
      >
        Zoom in to see the buildings.
      </p>
    </div>
  );
}
