import { queryOptions } from '@tanstack/react-query';
import { matterSchema } from '../../../../shared/schemas/matter-answers.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { mattersKey } from './list-matters.ts';

/** One matter with everything that was written. */
export function matterQuery(schemeId: string, matterId: string) {
  return queryOptions({
    queryKey: [...mattersKey(schemeId), 'one', matterId],
    queryFn: ({ signal }) =>
      apiGet(apiPath`/api/schemes/${schemeId}/matters/${matterId}`, matterSchema, signal),
  });
}
