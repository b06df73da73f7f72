import { queryOptions } from '@tanstack/react-query';
import { z } from 'zod';
import { mailboxEntrySchema } from '../../../../shared/schemas/mailbox.ts';
import { apiGet } from '../../../lib/api-client.ts';

/** The letters that the demo has sent, newest first. */
export const lettersQuery = queryOptions({
  queryKey: ['mailbox'],
  queryFn: ({ signal }) => apiGet('/api/mailbox', z.array(mailboxEntrySchema), signal),
  staleTime: 0,
  // what was sent a moment ago may still wait its turn
  refetchInterval: 3000,
});
