import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import {
  layoutSchema,
  layoutsSchema,
  type EvidenceLayout,
  type LayoutAnswer,
} from '../../../../shared/schemas/evidence.ts';
import { apiGet, apiSend, noAnswer } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { evidenceKey } from './evidence-key.ts';

/** The named layouts of a scheme. */
export function layoutsQuery(schemeId: string) {
  return queryOptions({
    queryKey: evidenceKey(schemeId, 'layouts'),
    queryFn: ({ signal }) =>
      apiGet(apiPath`/api/schemes/${schemeId}/layouts`, layoutsSchema, signal),
  });
}

type Named = { readonly name: string; readonly layout: EvidenceLayout };

/** Keeps a layout under a new name, or on top of the version that was seen. */
export function useKeepLayout(
  schemeId: string,
  seen: Pick<LayoutAnswer, 'id' | 'version'> | null,
  onDone: (kept: LayoutAnswer) => void,
) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (named: Named) =>
      seen === null
        ? apiSend('POST', apiPath`/api/schemes/${schemeId}/layouts`, layoutSchema, named)
        : apiSend('PATCH', apiPath`/api/schemes/${schemeId}/layouts/${seen.id}`, layoutSchema, {
            version: seen.version,
            ...named,
          }),
    onSuccess: onDone,
    onSettled: () => client.invalidateQueries({ queryKey: evidenceKey(schemeId, 'layouts') }),
  });
}

/** Removes a named layout. */
export function useRemoveLayout(schemeId: string, onDone: () => void) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (layoutId: string) =>
      apiSend('DELETE', apiPath`/api/schemes/${schemeId}/layouts/${layoutId}`, noAnswer),
    onSuccess: onDone,
    onSettled: () => client.invalidateQueries({ queryKey: evidenceKey(schemeId, 'layouts') }),
  });
}
