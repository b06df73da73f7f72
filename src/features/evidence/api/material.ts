import { keepPreviousData, queryOptions } from '@tanstack/react-query';
import type { Box } from '../../../../shared/geometry/bounding-box.ts';
import {
  aboutSheetsSchema,
  planMaterialSchema,
} from '../../../../shared/schemas/evidence-material.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { runQuery } from '../../runs/api/get-run.ts';

/** What every sheet of a run says of itself. */
export function aboutQuery(schemeId: string, runId: string) {
  return queryOptions({
    queryKey: [...runQuery(schemeId, runId).queryKey, 'evidence'],
    queryFn: ({ signal }) =>
      apiGet(
        apiPath`/api/schemes/${schemeId}/runs/${runId}/evidence/about`,
        aboutSheetsSchema,
        signal,
      ),
    staleTime: Infinity,
  });
}

/** What a sheet is drawn from; a run never changes, so that it is fetched once for some ground. */
export function materialQuery(schemeId: string, runId: string, { west, south, east, north }: Box) {
  const path = apiPath`/api/schemes/${schemeId}/runs/${runId}/evidence`;
  const query = new URLSearchParams(
    Object.entries({ west, south, east, north }).map(([side, value]) => [side, value.toFixed(1)]),
  );
  return queryOptions({
    queryKey: [...aboutQuery(schemeId, runId).queryKey, query.toString()],
    queryFn: ({ signal }) => apiGet(`${path}?${query.toString()}`, planMaterialSchema, signal),
    staleTime: Infinity,
    placeholderData: keepPreviousData,
  });
}
