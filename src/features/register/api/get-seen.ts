import type { QueryClient } from '@tanstack/react-query';
import {
  MOST_REGISTER_ROWS,
  REGISTER_ORDER,
  type RegisterFilter,
} from '../../../../shared/schemas/register.ts';
import type { SeenBuilding } from '../../buildings/api/remove-buildings.ts';
import { registerPageQuery } from './get-page.ts';

/** The buildings that a filter means with their versions, at most as many as one request gives. */
export async function fetchSeen(
  client: QueryClient,
  schemeId: string,
  filter: RegisterFilter,
): Promise<readonly SeenBuilding[]> {
  const which = { filter, sort: REGISTER_ORDER };
  const query = registerPageQuery(schemeId, which, 0, MOST_REGISTER_ROWS);
  const { rows } = await client.query({ ...query, staleTime: 0 });
  return rows.map(({ id, version }) => ({ id, version }));
}
