import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { z } from 'zod';
import { groundSchema, type groundLevelSchema } from '../../../../shared/schemas/ground.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { keepGround } from './keep-ground.ts';

/** Gives the whole scheme one level. */
export function useSetLevel(schemeId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (level: z.infer<typeof groundLevelSchema>) =>
      apiSend('PUT', apiPath`/api/schemes/${schemeId}/ground`, groundSchema, level),
    onSuccess: (answer) => keepGround(client, schemeId, answer),
  });
}
