import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { z } from 'zod';
import {
  registerChangeSchema,
  type editBuildingSchema,
} from '../../../../shared/schemas/register-changes.ts';
import { apiSend } from '../../../lib/api-client.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { refreshRegister } from './refresh-register.ts';

type Change = z.input<typeof editBuildingSchema>;

/** Changes the reference, values or outline of one building. */
export function changeBuilding(schemeId: string, buildingId: number, change: Change) {
  return apiSend(
    'PATCH',
    apiPath`/api/schemes/${schemeId}/buildings/${buildingId}`,
    registerChangeSchema,
    change,
  );
}

export function useChangeBuilding(schemeId: string, buildingId: number) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (change: Change) => changeBuilding(schemeId, buildingId, change),
    onSuccess: () => refreshRegister(client, schemeId),
  });
}
