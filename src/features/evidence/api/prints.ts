import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import {
  printSchema,
  printsSchema,
  type EvidenceLayout,
  type PrintAnswer,
} from '../../../../shared/schemas/evidence.ts';
import { apiGet, apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { evidenceKey } from './evidence-key.ts';

/** How often prints that are being made are asked for, in milliseconds. */
const EVERY = 500;

/** Whether a print is still waiting or being made. */
export function isBeingMade({ state }: Pick<PrintAnswer, 'state'>): boolean {
  return state === 'waiting' || state === 'printing';
}

/** The newest prints of a scheme, asked for again while one is being made. */
export function printsQuery(schemeId: string) {
  return queryOptions({
    queryKey: evidenceKey(schemeId, 'prints'),
    queryFn: ({ signal }) => apiGet(apiPath`/api/schemes/${schemeId}/prints`, printsSchema, signal),
    refetchInterval: ({ state }) => (state.data?.some(isBeingMade) === true ? EVERY : false),
  });
}

/** Where the file of a print is. */
export function printFilePath(schemeId: string, printId: string): string {
  return apiPath`/api/schemes/${schemeId}/prints/${printId}/file`;
}

type Asked = { readonly runId: string; readonly name: string; readonly layout: EvidenceLayout };

/** Asks for a print of a run. */
export function useAskPrint(schemeId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ runId, ...asked }: Asked) =>
      apiSend('POST', apiPath`/api/schemes/${schemeId}/runs/${runId}/prints`, printSchema, asked),
    onSettled: () => client.invalidateQueries({ queryKey: evidenceKey(schemeId, 'prints') }),
  });
}

/** Stops a print that is not done. */
export function useCancelPrint(schemeId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (printId: string) =>
      apiSend('POST', apiPath`/api/schemes/${schemeId}/prints/${printId}/cancel`, printSchema),
    onSettled: () => client.invalidateQueries({ queryKey: evidenceKey(schemeId, 'prints') }),
  });
}
