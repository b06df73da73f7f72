import { queryOptions } from '@tanstack/react-query';
import type { z } from 'zod';
import {
  decisionPreviewSchema,
  type proposedDecisionSchema,
} from '../../../../shared/schemas/decisions.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { decisionsKey } from './decisions-key.ts';

/** What a decision of many buildings would come to; too many are named for an address. */
export function decisionPreviewQuery(
  schemeId: string,
  proposed: z.input<typeof proposedDecisionSchema>,
) {
  return queryOptions({
    queryKey: [...decisionsKey(schemeId), 'preview', proposed],
    queryFn: () =>
      apiSend(
        'POST',
        apiPath`/api/schemes/${schemeId}/decisions/preview`,
        decisionPreviewSchema,
        proposed,
      ),
  });
}
