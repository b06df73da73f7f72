import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { z } from 'zod';
import { rulesVersionSchema, type newRulesSchema } from '../../../../shared/schemas/rules.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { isRefusal } from '../../../lib/api-error.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { rulesQuery } from './list-rules.ts';

/** Makes a new version of a scheme's rules. */
export function useSaveRules(schemeId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (rules: z.infer<typeof newRulesSchema>) =>
      apiSend('POST', apiPath`/api/schemes/${schemeId}/rules`, rulesVersionSchema, rules),
    onSuccess: () => client.invalidateQueries({ queryKey: rulesQuery(schemeId).queryKey }),
    // somebody else was faster: what they saved is asked for
    onError: (error) => {
      if (isRefusal(error, 'conflict')) {
        void client.invalidateQueries({ queryKey: rulesQuery(schemeId).queryKey });
      }
    },
  });
}
