import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { z } from 'zod';
import { matterSchema, type Matter } from '../../../../shared/schemas/matter-answers.ts';
import type {
  changeMatterSchema,
  takeSuggestionSchema,
  teamMessageSchema,
} from '../../../../shared/schemas/matters.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { schemeQuery } from '../../schemes/api/get-scheme.ts';
import { waitingQuery } from '../../waiting/api/get-waiting.ts';
import { matterQuery } from './get-matter.ts';
import { mattersKey } from './list-matters.ts';

/** What is done with a matter. */
export type MatterStep =
  | { readonly kind: 'write'; readonly body: z.infer<typeof teamMessageSchema> }
  | { readonly kind: 'change'; readonly body: z.infer<typeof changeMatterSchema> }
  | { readonly kind: 'take over'; readonly body: z.infer<typeof takeSuggestionSchema> };

function send(schemeId: string, matterId: string, { kind, body }: MatterStep): Promise<Matter> {
  const path = apiPath`/api/schemes/${schemeId}/matters/${matterId}`;
  if (kind === 'change') return apiSend('PATCH', path, matterSchema, body);
  const part = kind === 'write' ? 'messages' : 'taking-over';
  return apiSend('POST', `${path}/${part}`, matterSchema, body);
}

/** Writes to a matter, changes where it stands or takes its suggestion over. */
export function useMatterStep(schemeId: string, matterId: string, onDone?: () => void) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (step: MatterStep) => send(schemeId, matterId, step),
    onSuccess: (matter, { kind }) => {
      client.setQueryData(matterQuery(schemeId, matterId).queryKey, matter);
      void client.invalidateQueries({ queryKey: [...mattersKey(schemeId), 'list'] });
      void client.invalidateQueries({ queryKey: waitingQuery.queryKey });
      // the register has changed, and with it all that is shown of it
      if (kind === 'take over') {
        void client.invalidateQueries({ queryKey: schemeQuery(schemeId).queryKey });
      }
      onDone?.();
    },
  });
}
