import { useMemo } from 'react';
import { QueryError } from '../../../components/ui/query-error.tsx';
import type { PlanMapProps } from '../../map/components/plan-map-props.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import type { useSchemePlan } from '../hooks/use-scheme-plan.ts';
import { LazyPlanMap } from './lazy-plan-map.tsx';
import { MapPause } from './map-pause.tsx';

export type MapPaneProps = ReturnType<typeof useSchemePlan> &
  Pick<
    PlanMapProps,
    | 'selected'
    | 'drawing'
    | 'lasso'
    | 'line'
    | 'section'
    | 'wordsAt'
    | 'tipOf'
    | 'onCursor'
    | 'onSelect'
    | 'onHandle'
  > & {
    /** The colours that buildings take by what was found of them; null where nothing was. */
    readonly shades?: ReadonlyMap<number, number> | null;
  };

/** The map, or why it is not there. */
export function MapPane({ ready, error, retry, shades = null, ...map }: MapPaneProps) {
  const { name } = useScheme();
  const bare = ready?.plan;
  const plan = useMemo(
    () => (bare === undefined || shades === null ? bare : { ...bare, shades }),
    [bare, shades],
  );
  if (ready !== null && plan !== undefined) {
    return (
      <LazyPlanMap
        {...map}
        plan={plan}
        label={`Map of ${name}`}
        home={ready.extent.home}
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
