import { queryOptions } from '@tanstack/react-query';
import { z } from 'zod';
import { personSchema } from '../../../../shared/schemas/people.ts';
import { apiGet } from '../../../lib/api-client.ts';

/** Everybody who has an account. */
export const peopleQuery = queryOptions({
  queryKey: ['people'],
  queryFn: ({ signal }) => apiGet('/api/people', z.array(personSchema), signal),
});
