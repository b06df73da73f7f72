import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { z } from 'zod';
import {
  decisionsDoneSchema,
  type withdrawDecisionsSchema,
} from '../../../../shared/schemas/decisions.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { refreshDecisions } from './refresh-decisions.ts';

/** Takes back what one prepared and nobody has checked, on the buildings that are meant. */
export function useWithdrawDecisions(schemeId: string, onDone?: () => void) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (asked: z.input<typeof withdrawDecisionsSchema>) =>
      apiSend(
        'POST',
        apiPath`/api/schemes/${schemeId}/decisions/withdrawals`,
        decisionsDoneSchema,
        asked,
      ),
    // told before the lists are fetched anew, which may take away what asked
    ...(onDone !== undefined && { onSuccess: onDone }),
    onSettled: () => refreshDecisions(client, schemeId),
  });
}
