import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { z } from 'zod';
import {
  decisionsDoneSchema,
  type assignBuildingsSchema,
} from '../../../../shared/schemas/decisions.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { refreshDecisions } from './refresh-decisions.ts';

/** Gives buildings to an assessor, or to nobody. */
export function useAssignBuildings(schemeId: string, onDone: () => void) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (asked: z.input<typeof assignBuildingsSchema>) =>
      apiSend('POST', apiPath`/api/schemes/${schemeId}/assignments`, decisionsDoneSchema, asked),
    // told before the lists are fetched anew, which may take away what asked
    onSuccess: onDone,
    onSettled: () => refreshDecisions(client, schemeId),
  });
}
