import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { z } from 'zod';
import {
  decisionsDoneSchema,
  type newDecisionsSchema,
} from '../../../../shared/schemas/decisions.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { refreshDecisions } from './refresh-decisions.ts';

/** Prepares a decision on the buildings that are meant, for somebody else to check. */
export function usePrepareDecisions(schemeId: string, onDone: () => void) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (asked: z.input<typeof newDecisionsSchema>) =>
      apiSend('POST', apiPath`/api/schemes/${schemeId}/decisions`, decisionsDoneSchema, asked),
    // told before the lists are fetched anew, which may take away what asked
    onSuccess: onDone,
    onSettled: () => refreshDecisions(client, schemeId),
  });
}
