import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { z } from 'zod';
import {
  registerViewSchema,
  type newRegisterViewSchema,
} from '../../../../shared/schemas/register-views.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { registerViewsQuery } from './list-views.ts';

/** Keeps a view of the register under a name; an older one of that name goes. */
export function useKeepView(schemeId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (view: z.input<typeof newRegisterViewSchema>) =>
      apiSend('POST', apiPath`/api/schemes/${schemeId}/register-views`, registerViewSchema, view),
    onSuccess: () => client.invalidateQueries({ queryKey: registerViewsQuery(schemeId).queryKey }),
  });
}
