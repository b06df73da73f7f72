import { lazy, Suspense } from 'react';
import type { PlanMapProps } from '../../map/components/plan-map-props.ts';
import { MapPause } from './map-pause.tsx';

/** The map and its library come only where a map is shown. */
const PlanMap = lazy(async () => {
  const { PlanMap: component } = await import('../../map/components/plan-map.tsx');
  return { default: component };
});

export function LazyPlanMap(props: PlanMapProps) {
  return (
    <Suspense fallback={<MapPause />}>
      <PlanMap {...props} />
    </Suspense>
  );
}
