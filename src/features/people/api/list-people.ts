import { queryOptions } from '@tanstack/react-query';
import { z } from 'zod';
import { personSchema } from '../../../../shared/schemas/people.ts';
import { apiGet } from '../../../lib/api-client.ts';

/** How often is looked while a letter waits to go out. */
const LOOK_AGAIN_MS = 3000;

/** Everybody who has an account. */
export const peopleQuery = queryOptions({
  queryKey: ['people'],
  queryFn: ({ signal }) => apiGet('/api/people', z.array(personSchema), signal),
  refetchInterval: ({ state }) =>
    state.data?.some(({ letter }) => letter?.state === 'waiting') === true && LOOK_AGAIN_MS,
});
