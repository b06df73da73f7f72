import { queryOptions } from '@tanstack/react-query';
import { schemesSchema } from '../../../../shared/schemas/schemes.ts';
import { apiGet } from '../../../lib/api-client.ts';

/** The schemes that the person has a part in. */
export const schemesQuery = queryOptions({
  queryKey: ['schemes'],
  queryFn: ({ signal }) => apiGet('/api/schemes', schemesSchema, signal),
});
