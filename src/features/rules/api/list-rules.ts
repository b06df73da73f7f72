import { queryOptions } from '@tanstack/react-query';
import { rulesVersionsSchema } from '../../../../shared/schemas/rules.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';

/** Every version of a scheme's rules, the newest first. */
export function rulesQuery(schemeId: string) {
  return queryOptions({
    queryKey: ['schemes', schemeId, 'rules'],
    queryFn: ({ signal }) =>
      apiGet(apiPath`/api/schemes/${schemeId}/rules`, rulesVersionsSchema, signal),
  });
}
