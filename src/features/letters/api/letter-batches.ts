import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import {
  batchDetailSchema,
  batchesSchema,
  batchSchema,
  recipientsSchema,
  type BatchPreview,
  type NewBatch,
} from '../../../../shared/schemas/letter-batches.ts';
import { apiGet, apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { lettersKey } from './letters-key.ts';

/** What has been prepared and sent, the newest first; looked at again while mails are on their way. */
export function batchesQuery(schemeId: string) {
  return queryOptions({
    queryKey: [...lettersKey(schemeId), 'batches'],
    queryFn: ({ signal }) =>
      apiGet(apiPath`/api/schemes/${schemeId}/letter-batches`, batchesSchema, signal),
    refetchInterval: ({ state }) =>
      state.data?.some(({ deliveries }) => (deliveries?.waiting ?? 0) > 0) === true ? 2000 : false,
  });
}

/** One batch with its letters. */
export function batchQuery(schemeId: string, batchId: string) {
  return queryOptions({
    queryKey: [...lettersKey(schemeId), 'batch', batchId],
    queryFn: ({ signal }) =>
      apiGet(
        apiPath`/api/schemes/${schemeId}/letter-batches/${batchId}`,
        batchDetailSchema,
        signal,
      ),
    refetchInterval: ({ state }) =>
      (state.data?.batch.deliveries?.waiting ?? 0) > 0 ? 2000 : false,
  });
}

/** Who would get a letter, and why. */
export function recipientsQuery(schemeId: string, asked: BatchPreview) {
  return queryOptions({
    queryKey: [...lettersKey(schemeId), 'preview', asked],
    queryFn: () =>
      apiSend(
        'POST',
        apiPath`/api/schemes/${schemeId}/letter-batches/preview`,
        recipientsSchema,
        asked,
      ),
    placeholderData: (before) => before,
  });
}

/** Writes the letters of a batch; they wait for a second person. */
export function usePrepareBatch(schemeId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (asked: NewBatch) =>
      apiSend('POST', apiPath`/api/schemes/${schemeId}/letter-batches`, batchSchema, asked),
    onSettled: () => client.invalidateQueries({ queryKey: lettersKey(schemeId) }),
  });
}

/** What can be done with a batch that is there. */
export type BatchStep =
  | { readonly step: 'check'; readonly verdict: 'checked' | 'returned'; readonly comment: string }
  | { readonly step: 'withdraw' | 'send' | 'printed' };

/** Moves a batch on. */
export function useMoveBatch(schemeId: string, batchId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ step, ...body }: BatchStep) => {
      const path = apiPath`/api/schemes/${schemeId}/letter-batches/${batchId}/${step}`;
      return apiSend('POST', path, batchSchema, step === 'check' ? body : undefined);
    },
    onSettled: () => client.invalidateQueries({ queryKey: lettersKey(schemeId) }),
  });
}
