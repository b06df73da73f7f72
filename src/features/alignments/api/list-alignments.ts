import { queryOptions } from '@tanstack/react-query';
import { alignmentsSchema } from '../../../../shared/schemas/alignments.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';

/** The options for the line of a scheme, by name. */
export function alignmentsQuery(schemeId: string) {
  return queryOptions({
    queryKey: ['schemes', schemeId, 'alignments'],
    queryFn: ({ signal }) =>
      apiGet(apiPath`/api/schemes/${schemeId}/alignments`, alignmentsSchema, signal),
  });
}
