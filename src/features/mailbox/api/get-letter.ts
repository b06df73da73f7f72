import { queryOptions } from '@tanstack/react-query';
import { mailboxLetterSchema } from '../../../../shared/schemas/mailbox.ts';
import { apiGet } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';

/** One letter that the demo has sent. */
export function letterQuery(id: string) {
  return queryOptions({
    queryKey: ['mailbox', id],
    queryFn: ({ signal }) => apiGet(apiPath`/api/mailbox/${id}`, mailboxLetterSchema, signal),
    staleTime: Infinity,
  });
}
