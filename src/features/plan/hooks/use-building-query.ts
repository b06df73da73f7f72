import { useQuery } from '@tanstack/react-query';
import { buildingQuery } from '../../buildings/api/get-building.ts';

/** The building of a number, or of none. */
export function useBuildingQuery(schemeId: string, buildingId: number | null) {
  const building = useQuery({
    ...buildingQuery(schemeId, buildingId ?? 0),
    enabled: buildingId !== null,
  });
  return { building, known: buildingId === null ? undefined : building.data };
}
