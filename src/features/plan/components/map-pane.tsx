import { QueryError } from '../../../components/ui/query-error.tsx';
import type { PlanMapProps } from '../../map/components/plan-map-props.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import type { useSchemePlan } from '../hooks/use-scheme-plan.ts';
import { LazyPlanMap } from './lazy-plan-map.tsx';
import { MapPause } from './map-pause.tsx';

type MapPaneProps = ReturnType<typeof useSchemePlan> &
  Pick<PlanMapProps, 'selected' | 'drawing' | 'line' | 'wordsAt' | 'onSelect' | 'onHandle'>;

/** The map, or why it is not there. */
export function MapPane({ ready, error, retry, ...map }: MapPaneProps) {
  const { name } = useScheme();
  if (ready !== null) {
    return (
      <LazyPlanMap
        {...map}
        plan={ready.plan}
        label={`Map of ${name}`}
        home={ready.extent.bounds}
        gridDefinition={ready.crs.definition}
      />
    );
  }
  if (error === null) return <MapPause />;
  return (
    <div className="max-w-[640px] p-4">
      <QueryError what="The map" error={error} onRetry={retry} />
    </div>
  );
}
