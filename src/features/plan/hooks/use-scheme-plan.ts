import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { backgroundQuery } from '../../background/api/list-background.ts';
import { extentQuery } from '../../buildings/api/get-extent.ts';
import { crsQuery } from '../../crs/api/get-crs.ts';
import { basemapQuery } from '../../map/api/get-basemap.ts';
import { can } from '../../schemes/can.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import { usePerson } from '../../session/person-context.ts';
import { planOfScheme } from '../plan-of-scheme.ts';

/** Everything that the map of the scheme needs, once it is there. */
export function useSchemePlan() {
  const scheme = useScheme();
  const { demo } = usePerson();
  const extent = useQuery(extentQuery(scheme.id));
  const crs = useQuery(crsQuery(scheme.crs));
  const background = useQuery(backgroundQuery(scheme.id));
  const basemap = useQuery({ ...basemapQuery, enabled: demo });
  const needed = [extent, crs, background];
  const error = needed.find((query) => query.error !== null)?.error ?? null;

  const ready = useMemo(() => {
    // without the demo's map, the plan still stands
    const isWaiting = demo && basemap.isPending;
    if (!extent.data || !crs.data || !background.data || isWaiting) return null;
    const hasBackground = background.data.some(({ features }) => features > 0);
    const plan = planOfScheme({
      scheme,
      extent: extent.data,
      basemap: basemap.data,
      hasBackground,
      origin: window.location.origin,
    });
    const canDraw = can(scheme, 'updateRegister') || can(scheme, 'updateAlignments');
    const hasLine = can(scheme, 'readAlignments');
    return { plan: { ...plan, canDraw, hasLine }, extent: extent.data, crs: crs.data };
  }, [scheme, demo, extent.data, crs.data, background.data, basemap.data, basemap.isPending]);

  return {
    ready,
    error,
    retry: () => {
      for (const query of needed) if (query.error !== null) void query.refetch();
    },
  };
}
