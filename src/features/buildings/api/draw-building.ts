import type { z } from 'zod';
import {
  registerChangeSchema,
  type drawBuildingSchema,
} from '../../../../shared/schemas/register-changes.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';

/** Puts a building that was drawn into the register. */
export function drawBuilding(schemeId: string, building: z.input<typeof drawBuildingSchema>) {
  return apiSend(
    'POST',
    apiPath`/api/schemes/${schemeId}/buildings`,
    registerChangeSchema,
    building,
  );
}
