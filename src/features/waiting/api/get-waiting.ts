import { queryOptions } from '@tanstack/react-query';
import { waitingSchema } from '../../../../shared/schemas/waiting.ts';
import { apiGet } from '../../../lib/api-client.ts';

/** What waits for the person, by scheme. */
export const waitingQuery = queryOptions({
  queryKey: ['waiting'],
  queryFn: ({ signal }) => apiGet('/api/waiting', waitingSchema, signal),
  staleTime: 0,
});
