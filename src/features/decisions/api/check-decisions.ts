import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { z } from 'zod';
import {
  decisionsDoneSchema,
  type checkDecisionsSchema,
} from '../../../../shared/schemas/decisions.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { refreshDecisions } from './refresh-decisions.ts';

/** Checks or returns what waits on the buildings that are meant. */
export function useCheckDecisions(schemeId: string, onDone: () => void) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (asked: z.input<typeof checkDecisionsSchema>) =>
      apiSend(
        'POST',
        apiPath`/api/schemes/${schemeId}/decisions/checks`,
        decisionsDoneSchema,
        asked,
      ),
    // told before the lists are fetched anew, which may take away what asked
    onSuccess: onDone,
    onSettled: () => refreshDecisions(client, schemeId),
  });
}
