import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { z } from 'zod';
import type { checkDecisionSchema } from '../../../../shared/schemas/decisions.ts';
import { apiSend, noAnswer } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { refreshDecisions } from './refresh-decisions.ts';

/** Checks or returns one decision. */
export function useCheckDecision(schemeId: string, decisionId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (asked: z.input<typeof checkDecisionSchema>) =>
      apiSend(
        'POST',
        apiPath`/api/schemes/${schemeId}/decisions/${decisionId}/check`,
        noAnswer,
        asked,
      ),
    onSettled: () => refreshDecisions(client, schemeId),
  });
}
