import type { z } from 'zod';
import {
  registerChangeSchema,
  type splitBuildingSchema,
} from '../../../../shared/schemas/register-changes.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';

/** Cuts a building in two along a line. */
export function splitBuilding(
  schemeId: string,
  buildingId: number,
  cut: z.input<typeof splitBuildingSchema>,
) {
  return apiSend(
    'POST',
    apiPath`/api/schemes/${schemeId}/buildings/${buildingId}/split`,
    registerChangeSchema,
    cut,
  );
}
