import { queryOptions } from '@tanstack/react-query';
import { assessorsSchema } from '../../../../shared/schemas/decision-answers.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { decisionsKey } from './decisions-key.ts';

/** Those who can be given buildings. */
export function assessorsQuery(schemeId: string) {
  return queryOptions({
    queryKey: [...decisionsKey(schemeId), 'assessors'],
    queryFn: ({ signal }) =>
      apiGet(apiPath`/api/schemes/${schemeId}/assessors`, assessorsSchema, signal),
  });
}
