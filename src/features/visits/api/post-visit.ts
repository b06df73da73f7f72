import { photographFileSchema, visitSchema } from '../../../../shared/schemas/visits.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { apiUpload } from '../../../lib/api-upload.ts';
import { sentOf } from '../draft/kept-visit.ts';
import type { VisitPost } from '../draft/send-kept.ts';
import { photographPath } from './photograph-path.ts';

/** Sends visits and their photographs to the server. */
export const postVisits: VisitPost = {
  visit: async (visit) => {
    const { schemeId, buildingId } = visit;
    const path = apiPath`/api/schemes/${schemeId}/buildings/${buildingId}/visits`;
    await apiSend('POST', path, visitSchema, sentOf(visit));
  },
  photograph: async (visit, id, file) => {
    await apiUpload({
      path: photographPath(visit.schemeId, visit.id, id),
      file: new File([file], 'photograph', { type: file.type }),
      schema: photographFileSchema,
      signal: new AbortController().signal,
      onProgress: () => undefined,
    });
  },
};
