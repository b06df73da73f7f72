import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { buildingPath } from '../../../config/paths.ts';
import { useDelayedValue } from '../../../hooks/use-delayed-value.ts';
import { buildingQuery } from '../../buildings/api/get-building.ts';
import type { MapHandle } from '../../map/map-handle.ts';
import { useBringIntoView } from '../../plan/hooks/use-bring-into-view.ts';
import type { MapPane } from './use-map-pane.ts';

/** Rows that are only passed by are not looked up. */
const PASSING_MS = 150;

type OnPlan = {
  readonly activeId: number | null;
  readonly opened: number | null;
  readonly mapPane: MapPane;
};

/** Shows a building on the map at the side, which is opened for it, or else on the plan. */
export function useShowOnPlan(schemeId: string, { activeId, opened, mapPane }: OnPlan) {
  const navigate = useNavigate();
  const [handle, setHandle] = useState<MapHandle | null>(null);
  const settledId = useDelayedValue(activeId, PASSING_MS);
  const building = useQuery({
    ...buildingQuery(schemeId, settledId ?? 0),
    enabled: settledId !== null && mapPane.isShown,
  });
  const bring = useBringIntoView(handle, opened, building.data);
  return {
    handle,
    setHandle,
    showOnPlan: (buildingId: number | null) => {
      if (buildingId === null) return;
      if (!mapPane.hasRoom) {
        void navigate(buildingPath(schemeId, buildingId));
        return;
      }
      if (!mapPane.isShown) mapPane.show(true);
      bring(buildingId);
    },
  };
}
