import { queryOptions } from '@tanstack/react-query';
import {
  buildingOutlinesSchema,
  type OutlineBox,
} from '../../../../shared/schemas/building-outlines.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';

/** The buildings in a box of the grid as one version of the register has them; that never changes. */
export function outlinesQuery(schemeId: string, registerVersion: number, box: OutlineBox) {
  const { west, south, east, north } = box;
  return queryOptions({
    queryKey: ['schemes', schemeId, 'outlines', registerVersion, west, south, east, north],
    queryFn: ({ signal }) =>
      apiGet(
        apiPath`/api/schemes/${schemeId}/building-outlines?west=${west}&south=${south}&east=${east}&north=${north}`,
        buildingOutlinesSchema,
        signal,
      ),
    staleTime: Infinity,
  });
}
