import { queryOptions } from '@tanstack/react-query';
import type { RegisterFilter } from '../../../../shared/schemas/register.ts';
import { waitingDecisionsAnswerSchema } from '../../../../shared/schemas/decisions.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { decisionsKey } from './decisions-key.ts';

/** What waits for a check on the buildings that are meant. */
export function waitingDecisionsQuery(schemeId: string, filter: RegisterFilter) {
  return queryOptions({
    queryKey: [...decisionsKey(schemeId), 'waiting', filter],
    queryFn: () =>
      apiSend(
        'POST',
        apiPath`/api/schemes/${schemeId}/decisions/waiting`,
        waitingDecisionsAnswerSchema,
        { filter },
      ),
  });
}
