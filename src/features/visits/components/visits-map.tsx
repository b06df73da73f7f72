import { useQuery } from '@tanstack/react-query';
import { useMemo, useState } from 'react';
import type { RegisterRow } from '../../../../shared/schemas/register.ts';
import { Button } from '../../../components/ui/button.tsx';
import { ButtonLink } from '../../../components/ui/button-link.tsx';
import { visitPath } from '../../../config/paths.ts';
import { buildingQuery } from '../../buildings/api/get-building.ts';
import type { MapHandle } from '../../map/map-handle.ts';
import type { MapPlan } from '../../map/map-plan.ts';
import { FIRST_SHADE } from '../../map/shades.ts';
import { LazyPlanMap } from '../../plan/components/lazy-plan-map.tsx';
import { MapPause } from '../../plan/components/map-pause.tsx';
import { useSchemePlan } from '../../plan/hooks/use-scheme-plan.ts';
import { QueryError } from '../../../components/ui/query-error.tsx';
import { useScheme } from '../../schemes/scheme-context.ts';
import { homeOfBuildings } from '../home-of-buildings.ts';
import { usePlaceOnMap } from '../hooks/use-place-on-map.ts';
import { titleOfBuilding } from '../visit-words.ts';

type ChosenProps = { readonly schemeId: string; readonly buildingId: number };

function Chosen({ schemeId, buildingId }: ChosenProps) {
  const { data, error, refetch } = useQuery(buildingQuery(schemeId, buildingId));
  if (error !== null) {
    return <QueryError what="The building" error={error} onRetry={() => void refetch()} />;
  }
  return (
    <div className="flex flex-wrap items-center justify-between gap-3">
      <b className="font-semibold">{data === undefined ? ' ' : titleOfBuilding(data)}</b>
      <ButtonLink kind="main" to={visitPath(schemeId, buildingId)}>
        Visit
      </ButtonLink>
    </div>
  );
}

/** The buildings to visit in the colours of what the run found of them; the others stay plain. */
function planOfVisits(plan: MapPlan, rows: readonly RegisterRow[]): MapPlan {
  const shades = rows.flatMap(({ id, category }) =>
    category === null ? [] : [[id, FIRST_SHADE.category + category] as const],
  );
  return { ...plan, shades: new Map(shades), canDraw: false, hasLine: false };
}

/** Where the buildings to visit stand; one that is pressed can be visited. */
export function VisitsMap({ rows }: { readonly rows: readonly RegisterRow[] }) {
  const { id: schemeId, name } = useScheme();
  const { ready, error, retry } = useSchemePlan();
  const [chosen, setChosen] = useState<number | null>(null);
  const [handle, setHandle] = useState<MapHandle | null>(null);
  const place = usePlaceOnMap(handle);
  const bare = ready?.plan;
  const plan = useMemo(() => bare && planOfVisits(bare, rows), [bare, rows]);
  return (
    <>
      <div className="mt-2 h-[56vh] min-h-[300px] border border-rule">
        {ready !== null && plan !== undefined ? (
          <LazyPlanMap
            plan={plan}
            label={`Map of ${name}`}
            home={homeOfBuildings(rows) ?? ready.extent.home}
            gridDefinition={ready.crs.definition}
            selected={chosen}
            onSelect={setChosen}
            onHandle={setHandle}
          />
        ) : (
          error === null && <MapPause />
        )}
        {error !== null && <QueryError what="The map" error={error} onRetry={retry} />}
      </div>
      <div role="status" className="min-h-14 py-1.5">
        {chosen === null ? (
          <p className="text-small text-ink-2">Press a building to visit it.</p>
        ) : (
          <Chosen schemeId={schemeId} buildingId={chosen} />
        )}
      </div>
      <div className="flex flex-wrap items-center gap-3">
        <Button busy={place.isAsking} onClick={() => void place.show()}>
          Show where I am
        </Button>
        <p role="status" className="text-small text-ink-2">
          {place.words}
        </p>
      </div>
    </>
  );
}
