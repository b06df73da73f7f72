import { queryOptions } from '@tanstack/react-query';
import { z } from 'zod';
import { registerViewSchema } from '../../../../shared/schemas/register-views.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';

/** The views of the register that the person keeps. */
export function registerViewsQuery(schemeId: string) {
  return queryOptions({
    queryKey: ['schemes', schemeId, 'register-views'],
    queryFn: ({ signal }) =>
      apiGet(apiPath`/api/schemes/${schemeId}/register-views`, z.array(registerViewSchema), signal),
  });
}
