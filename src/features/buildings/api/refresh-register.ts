import type { QueryClient } from '@tanstack/react-query';
import { schemeQuery } from '../../schemes/api/get-scheme.ts';
import { waitingQuery } from '../../waiting/api/get-waiting.ts';
import { extentQuery } from './get-extent.ts';

/**
 * After any change of a register: its rows, its buildings, where the scheme is, and the version that is part
 * of the address of its tiles.
 */
export async function refreshRegister(client: QueryClient, schemeId: string): Promise<void> {
  const { queryKey } = schemeQuery(schemeId);
  void client.invalidateQueries({ queryKey: waitingQuery.queryKey });
  await Promise.all([
    client.invalidateQueries({ queryKey, exact: true }),
    client.invalidateQueries({ queryKey: [...queryKey, 'register'] }),
    client.invalidateQueries({ queryKey: [...queryKey, 'buildings'] }),
    client.invalidateQueries({ queryKey: extentQuery(schemeId).queryKey }),
  ]);
}
