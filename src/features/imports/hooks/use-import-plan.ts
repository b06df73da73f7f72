import { useMemo } from 'react';
import { BUILDING_ZOOMS } from '../../../../shared/schemas/tiles.ts';
import type { TileSet } from '../../map/map-plan.ts';
import { useSchemePlan } from '../../plan/hooks/use-scheme-plan.ts';
import { homeOfRows } from '../home-of-rows.ts';
import { isOpen } from '../import-states.ts';
import type { CheckedImport } from './use-last-checked.ts';

function tilesOf(schemeId: string, { id, version, bounds }: CheckedImport): TileSet {
  const path = `/api/schemes/${schemeId}/tiles/imports/${id}/${version}/{z}/{x}/{y}.pbf`;
  return {
    url: `${window.location.origin}${path}`,
    bounds,
    minzoom: BUILDING_ZOOMS.least,
    maxzoom: BUILDING_ZOOMS.most,
  };
}

/** The scheme's map with the rows of an import over it, as they were last checked. */
export function useImportPlan(
  schemeId: string,
  checked: CheckedImport | null,
  places: readonly (readonly [number, number])[],
) {
  const { ready, ...rest } = useSchemePlan();
  const withRows = useMemo(() => {
    if (ready === null) return null;
    const around = checked?.bounds ? homeOfRows(checked.bounds, places) : null;
    const home = around ?? ready.extent.home;
    // once they are in, they are buildings
    const hasRows = checked !== null && (isOpen(checked.state) || checked.state === 'importing');
    if (!hasRows) return { ...ready, home, hasRows };
    return { ...ready, home, hasRows, plan: { ...ready.plan, rows: tilesOf(schemeId, checked) } };
  }, [ready, checked, places, schemeId]);
  return { ...rest, ready: withRows };
}
