import type { z } from 'zod';
import {
  registerChangeSchema,
  type joinBuildingsSchema,
} from '../../../../shared/schemas/register-changes.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';

/** Makes one building of several. */
export function joinBuildings(schemeId: string, join: z.input<typeof joinBuildingsSchema>) {
  return apiSend(
    'POST',
    apiPath`/api/schemes/${schemeId}/buildings/joins`,
    registerChangeSchema,
    join,
  );
}
