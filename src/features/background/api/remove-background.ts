import { useMutation, useQueryClient } from '@tanstack/react-query';
import { z } from 'zod';
import type { BackgroundLayer } from '../../../../shared/schemas/background.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { refreshBackground } from './refresh-background.ts';

/** Takes a layer out of a scheme's background. */
export function useRemoveBackground(schemeId: string, layer: BackgroundLayer) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: () =>
      apiSend('DELETE', apiPath`/api/schemes/${schemeId}/background/${layer}`, z.unknown()),
    onSuccess: () => refreshBackground(client, schemeId),
  });
}
