import { useMutation, useQueryClient } from '@tanstack/react-query';
import { z } from 'zod';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { importsQuery } from './list-imports.ts';

/** Gives an import up; the register stays as it is. */
export function useCancelImport(schemeId: string, importId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: () =>
      apiSend('DELETE', apiPath`/api/schemes/${schemeId}/imports/${importId}`, z.unknown()),
    onSettled: () => client.invalidateQueries({ queryKey: importsQuery(schemeId).queryKey }),
  });
}
