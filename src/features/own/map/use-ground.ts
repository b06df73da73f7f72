import { useQuery } from '@tanstack/react-query';
import type { LonLatBounds } from '../../../../shared/schemas/basemap.ts';
import { basemapQuery } from '../../map/api/get-basemap.ts';
import { planOfScheme } from '../../plan/plan-of-scheme.ts';
import { loadPicture } from '../../schemes/picture/load-picture.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import { usePerson } from '../../session/person-context.ts';

type Size = { readonly width: number; readonly height: number };

/** Streets, water, rail and parks of a piece of the map, and no building. */
export function useGround(bounds: LonLatBounds, size: Size) {
  const scheme = useScheme();
  const { demo } = usePerson();
  const basemap = useQuery({ ...basemapQuery, enabled: demo });
  const { data } = useQuery({
    queryKey: ['schemes', scheme.id, 'ground', scheme.backgroundVersion, bounds, size],
    enabled: !(demo && basemap.isPending),
    staleTime: Infinity,
    queryFn: ({ signal }) => {
      const extent = { bounds, home: bounds, crs: scheme.crs, from: 'buildings' as const };
      const { origin } = window.location;
      const plan = planOfScheme({
        ...{ scheme, extent, origin },
        basemap: basemap.data,
        hasBackground: true,
      });
      return loadPicture({ ...plan, buildings: null }, extent, size, signal);
    },
  });
  return data;
}
