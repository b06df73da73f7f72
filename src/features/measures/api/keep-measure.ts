import { useMutation, useQueryClient } from '@tanstack/react-query';
import {
  measureSchema,
  type Measure,
  type MeasureValues,
} from '../../../../shared/schemas/measures.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { measuresKey } from './list-measures.ts';

/** Adds a measure, or writes one anew on top of the version that was seen. */
export function useKeepMeasure(
  schemeId: string,
  seen: Pick<Measure, 'id' | 'version'> | null,
  onDone: () => void,
) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (values: MeasureValues) =>
      seen === null
        ? apiSend('POST', apiPath`/api/schemes/${schemeId}/measures`, measureSchema, values)
        : apiSend('PUT', apiPath`/api/schemes/${schemeId}/measures/${seen.id}`, measureSchema, {
            version: seen.version,
            values,
          }),
    onSuccess: onDone,
    onSettled: () => client.invalidateQueries({ queryKey: measuresKey(schemeId) }),
  });
}
