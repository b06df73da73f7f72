import type { QueryClient } from '@tanstack/react-query';
import { schemeQuery } from '../../schemes/api/get-scheme.ts';
import { waitingQuery } from '../../waiting/api/get-waiting.ts';
import { backgroundQuery } from './list-background.ts';

/** The layers, and the version of the scheme's background that is part of the address of its tiles. */
export async function refreshBackground(client: QueryClient, schemeId: string): Promise<void> {
  void client.invalidateQueries({ queryKey: waitingQuery.queryKey });
  await Promise.all([
    client.invalidateQueries({ queryKey: schemeQuery(schemeId).queryKey, exact: true }),
    client.invalidateQueries({ queryKey: backgroundQuery(schemeId).queryKey }),
  ]);
}
