import { apiPath } from '../../../lib/api-path.ts';

/** The address of a photograph of a matter, for the team. */
export function teamPhotographPath(
  schemeId: string,
  matterId: string,
  photographId: string,
): string {
  return apiPath`/api/schemes/${schemeId}/matters/${matterId}/photographs/${photographId}`;
}
