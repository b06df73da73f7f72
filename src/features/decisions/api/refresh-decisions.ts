import type { QueryClient } from '@tanstack/react-query';
import { refreshRegister } from '../../buildings/api/refresh-register.ts';
import { decisionsKey } from './decisions-key.ts';

/** After anything that moves decisions on: the lists, the sheets, the counts and what waits for whom. */
export async function refreshDecisions(client: QueryClient, schemeId: string): Promise<void> {
  await Promise.all([
    client.invalidateQueries({ queryKey: decisionsKey(schemeId) }),
    refreshRegister(client, schemeId),
  ]);
}
