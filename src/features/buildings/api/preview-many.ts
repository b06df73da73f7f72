import { queryOptions } from '@tanstack/react-query';
import type { z } from 'zod';
import {
  manyPreviewSchema,
  type previewManySchema,
} from '../../../../shared/schemas/register-changes.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';

/** What many buildings have now where values are to be set; too many are named for an address. */
export function manyPreviewQuery(schemeId: string, wanted: z.input<typeof previewManySchema>) {
  return queryOptions({
    queryKey: ['schemes', schemeId, 'register', 'preview', wanted],
    queryFn: () =>
      apiSend(
        'POST',
        apiPath`/api/schemes/${schemeId}/buildings/edits/preview`,
        manyPreviewSchema,
        wanted,
      ),
  });
}
