import { queryOptions } from '@tanstack/react-query';
import { ownMattersSchema } from '../../../../shared/schemas/matter-answers.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { ownKey } from './get-own.ts';

/** What an owner has brought up, with the answers. */
export function ownMattersQuery(schemeId: string) {
  return queryOptions({
    queryKey: [...ownKey(schemeId), 'matters'],
    queryFn: ({ signal }) =>
      apiGet(apiPath`/api/schemes/${schemeId}/own/matters`, ownMattersSchema, signal),
  });
}
