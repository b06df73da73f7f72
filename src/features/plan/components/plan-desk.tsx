import { useQuery } from '@tanstack/react-query';
import { useRef, useState } from 'react';
import { QueryError } from '../../../components/ui/query-error.tsx';
import { useHotkeys } from '../../../hooks/use-hotkeys.ts';
import { buildingQuery } from '../../buildings/api/get-building.ts';
import type { MapHandle } from '../../map/map-handle.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import { useBringIntoView } from '../hooks/use-bring-into-view.ts';
import { useSchemePlan } from '../hooks/use-scheme-plan.ts';
import { useSelectedBuilding } from '../hooks/use-selected-building.ts';
import { useSteps } from '../hooks/use-steps.ts';
import { LazyPlanMap } from './lazy-plan-map.tsx';
import { MapPause } from './map-pause.tsx';
import { PlanBasis } from './plan-basis.tsx';
import { PlanSide } from './plan-side.tsx';

/** The map, the side, and the keys that work on both. */
export function PlanDesk() {
  const scheme = useScheme();
  const { ready, error, retry } = useSchemePlan();
  const [selected, select] = useSelectedBuilding();
  const [handle, setHandle] = useState<MapHandle | null>(null);
  const building = useQuery({
    ...buildingQuery(scheme.id, selected ?? 0),
    enabled: selected !== null,
  });
  const bring = useBringIntoView(handle, selected, building.data);
  const chosen = useRef<HTMLDivElement>(null);

  function goTo(buildingId: number): void {
    bring(buildingId);
    select(buildingId);
  }
  const steps = useSteps(selected, () => handle?.buildingsInView() ?? [], goTo);
  const zoom = (by: number) => () => handle?.zoomBy(by);
  useHotkeys({
    j: () => { steps.step(1); },
    k: () => { steps.step(-1); },
    f: () => { if (ready !== null) handle?.fit(ready.extent.bounds); },
    '+': zoom(1),
    '=': zoom(1),
    '-': zoom(-1),
    Escape: () => { select(null); },
  }); // prettier-ignore

  return (
    <>
      <PlanBasis scheme={scheme} crs={ready?.crs} />
      <div className="grid min-h-0 flex-1 grid-cols-[minmax(0,1fr)_312px] max-md:flex max-md:flex-none max-md:flex-col">
        <div className="min-w-0 max-md:h-[46vh] max-md:min-h-[300px]">
          {ready === null ? (
            <MapPause />
          ) : (
            <LazyPlanMap
              plan={ready.plan}
              label={`Map of ${scheme.name}`}
              home={ready.extent.bounds}
              gridDefinition={ready.crs.definition}
              selected={selected}
              onSelect={select}
              onHandle={setHandle}
            />
          )}
        </div>
        <aside
          aria-label="Buildings"
          className="min-h-0 overflow-auto border-l border-ink bg-paper px-4 pt-3.5 pb-6 max-md:overflow-visible max-md:border-t max-md:border-l-0"
        >
          {error !== null && <QueryError what="The plan" error={error} onRetry={retry} />}
          <PlanSide
            hasBuildings={ready === null ? null : ready.extent.from === 'buildings'}
            selected={selected}
            building={building}
            steps={steps}
            onGoTo={goTo}
            onDeselect={() => {
              select(null);
            }}
            chosen={chosen}
          />
        </aside>
      </div>
    </>
  );
}
