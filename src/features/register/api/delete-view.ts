import { useMutation, useQueryClient } from '@tanstack/react-query';
import { apiSend, noAnswer } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { registerViewsQuery } from './list-views.ts';

/** Deletes a kept view. */
export function useDeleteView(schemeId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (viewId: string) =>
      apiSend('DELETE', apiPath`/api/schemes/${schemeId}/register-views/${viewId}`, noAnswer),
    onSuccess: () => client.invalidateQueries({ queryKey: registerViewsQuery(schemeId).queryKey }),
  });
}
