import { apiPath } from '../../../lib/api-path.ts';

/** The address of a photograph of a visit. */
export function photographPath(schemeId: string, visitId: string, photographId: string): string {
  return apiPath`/api/schemes/${schemeId}/visits/${visitId}/photographs/${photographId}`;
}
